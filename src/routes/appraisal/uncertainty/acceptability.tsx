/** Acceptability curves and their frontier over thresholds. */

import { FigureFrame } from '../../../components/chart/figure-frame.tsx';
import { LazyLines } from '../../../components/chart/lazy.ts';
import type { ChartTable } from '../../../components/chart/table.ts';
import { type Curves, curvesAt } from '../../../store/curves.ts';
import type { FigureWords } from '../figure-words.ts';
import type { CurvesProps } from './page.tsx';

export function Acceptability({ draws, curves, threshold, words }: CurvesProps) {
  const { t, strategies, symbol, outcome, nameOf, percent, number } = words;
  const here = curvesAt(draws, threshold).acceptability;
  const likeliest = here.reduce((a, b) =>
    (b.probabilities[0] ?? 0) > (a.probabilities[0] ?? 0) ? b : a,
  );
  const title = t('uncertainty.acceptability.title', {
    strategy: nameOf(likeliest.strategy),
    share: percent(likeliest.probabilities[0] ?? 0),
    threshold: words.threshold(threshold),
  });
  const frontier = {
    id: 'frontier',
    name: t('uncertainty.acceptability.frontier'),
    mark: { color: 'var(--rule-strong)', dash: '', marker: '' },
    values: curves.frontier.map(({ probability }) => probability),
    under: true,
  };
  return (
    <FigureFrame
      title={title}
      file="acceptability"
      source={words.source}
      height={340}
      language={words.language}
      table={() => acceptabilityTable(curves, words)}
      note={t('uncertainty.acceptability.note')}
    >
      <LazyLines
        x={curves.thresholds}
        lines={[
          frontier,
          ...strategies.map((strategy, index) => ({
            ...strategy,
            values: curves.acceptability[index]?.probabilities ?? [],
          })),
        ]}
        xTitle={t('uncertainty.acceptability.xTitle', { symbol, unit: outcome.per })}
        yTitle={t('uncertainty.acceptability.yTitle')}
        writeX={number}
        writeY={(value) => number(value, 2)}
        mark={{ at: threshold, label: words.threshold(threshold) }}
        span={[0, 1]}
        alt={t('charts.alt', { title })}
      />
    </FigureFrame>
  );
}

export function acceptabilityTable(
  { thresholds, acceptability, frontier }: Curves,
  { t, symbol, outcome, nameOf, number }: FigureWords,
): ChartTable {
  return {
    columns: [
      {
        head: t('uncertainty.acceptability.xTitle', { symbol, unit: outcome.per }),
        write: number,
      },
      ...acceptability.map(({ strategy }) => ({
        head: nameOf(strategy),
        write: (value: number) => number(value, 3),
      })),
      { head: t('uncertainty.acceptability.onFrontier') },
    ],
    rows: thresholds.map((threshold, i) => [
      threshold,
      ...acceptability.map(({ probabilities }) => probabilities[i] ?? null),
      nameOf(frontier[i]?.strategy ?? ''),
    ]),
  };
}
