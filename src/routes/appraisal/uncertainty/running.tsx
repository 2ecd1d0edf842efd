/** How mean net benefits against the comparator settle as draws are added. */
import { useMemo } from 'react';
import type { Draws } from '../../../../shared/analysis/psa/draws.ts';
import {
  type RunningMeanPoint,
  runningMean,
} from '../../../../shared/analysis/psa/running-mean.ts';
import { FigureFrame } from '../../../components/chart/figure-frame.tsx';
import { LazyLines } from '../../../components/chart/lazy.ts';
import type { ChartTable } from '../../../components/chart/table.ts';
import type { FigureWords } from '../figure-words.ts';
import type { FigureProps } from './page.tsx';

const POINTS = 80;

interface Settling {
  readonly strategy: string;
  readonly points: readonly RunningMeanPoint[];
}

export function Running({ draws, threshold, words }: FigureProps) {
  const { t, symbol, nameOf, number, strategies, document } = words;
  const { comparator } = document.question;
  const settling = useMemo(
    () => settlingOf(draws, comparator, threshold),
    [draws, comparator, threshold],
  );
  const last = ({ points }: Settling) => points.at(-1);
  const widest = settling.reduce((a, b) => ((last(b)?.se ?? 0) > (last(a)?.se ?? 0) ? b : a));
  const error = last(widest)?.se ?? null;
  const title =
    error === null
      ? t('uncertainty.running.titleOne')
      : t('uncertainty.running.title', {
          strategy: nameOf(widest.strategy),
          error: words.money(2 * error),
        });
  return (
    <FigureFrame
      title={title}
      file="running-means"
      source={words.source}
      height={340}
      language={words.language}
      table={() => runningTable(settling, words)}
      note={t('uncertainty.running.note')}
    >
      <LazyLines
        x={settling[0]?.points.map((point) => point.draws) ?? []}
        lines={settling.flatMap(({ strategy, points }) => {
          const own = strategies.find(({ id }) => id === strategy);
          if (!own) return [];
          return {
            ...own,
            values: points.map(({ mean }) => mean),
            band: points.map(({ mean, se }) =>
              se === null ? null : ([mean - 2 * se, mean + 2 * se] as const),
            ),
          };
        })}
        xTitle={t('uncertainty.running.xTitle')}
        yTitle={t('uncertainty.running.yTitle', { comparator: nameOf(comparator), symbol })}
        writeX={number}
        writeY={number}
        alt={t('charts.alt', { title })}
      />
    </FigureFrame>
  );
}

/** Incremental net benefit of each strategy but the comparator, draw by draw. */
function settlingOf(draws: Draws, comparator: string, threshold: number): Settling[] {
  const base = draws.strategies.indexOf(comparator);
  const nmb = (s: number, i: number) =>
    threshold * (draws.health[s]?.[i] ?? 0) - (draws.cost[s]?.[i] ?? 0);
  return draws.strategies.flatMap((strategy, s) => {
    if (s === base) return [];
    const column = (draws.cost[s] as Float64Array).map((_, i) => nmb(s, i) - nmb(base, i));
    return { strategy, points: runningMean(column, POINTS) };
  });
}

function runningTable(
  settling: readonly Settling[],
  { t, symbol, nameOf, number }: FigureWords,
): ChartTable {
  const two = (value: number) => number(value, 2);
  return {
    columns: [
      { head: t('uncertainty.running.xTitle'), write: number },
      ...settling.flatMap(({ strategy }) => {
        const who = { strategy: nameOf(strategy), symbol };
        return [
          { head: t('uncertainty.running.mean', who), write: two },
          { head: t('uncertainty.running.error', who), write: two },
        ];
      }),
    ],
    rows: (settling[0]?.points ?? []).map(({ draws }, i) => [
      draws,
      ...settling.flatMap(({ points }) => [points[i]?.mean ?? null, points[i]?.se ?? null]),
    ]),
  };
}
