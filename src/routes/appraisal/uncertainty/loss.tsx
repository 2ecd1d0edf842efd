/** Expected loss of each strategy over thresholds. */
import { FigureFrame } from '../../../components/chart/figure-frame.tsx';
import { LazyLines } from '../../../components/chart/lazy.ts';
import type { ChartTable } from '../../../components/chart/table.ts';
import { type Curves, curvesAt } from '../../../store/curves.ts';
import type { FigureWords } from '../figure-words.ts';
import type { CurvesProps } from './page.tsx';

export function ExpectedLoss({ draws, curves, threshold, words }: CurvesProps) {
  const { t, strategies, symbol, outcome, nameOf, number } = words;
  const here = curvesAt(draws, threshold).losses;
  const least = here.reduce((a, b) => ((b.losses[0] ?? 0) < (a.losses[0] ?? 0) ? b : a));
  const title = t('uncertainty.loss.title', {
    strategy: nameOf(least.strategy),
    amount: words.money(least.losses[0] ?? 0),
    threshold: words.threshold(threshold),
  });
  return (
    <FigureFrame
      title={title}
      file="expected-loss"
      source={words.source}
      height={340}
      language={words.language}
      table={() => lossTable(curves, words)}
      note={t('uncertainty.loss.note')}
    >
      <LazyLines
        x={curves.thresholds}
        lines={strategies.map((strategy, index) => ({
          ...strategy,
          values: curves.losses[index]?.losses ?? [],
        }))}
        xTitle={t('uncertainty.acceptability.xTitle', { symbol, unit: outcome.per })}
        yTitle={t('uncertainty.loss.yTitle', { symbol })}
        writeX={number}
        writeY={number}
        mark={{ at: threshold, label: words.threshold(threshold) }}
        fromZero
        alt={t('charts.alt', { title })}
      />
    </FigureFrame>
  );
}

function lossTable(
  { thresholds, losses }: Curves,
  { t, symbol, outcome, nameOf, number }: FigureWords,
): ChartTable {
  return {
    columns: [
      {
        head: t('uncertainty.acceptability.xTitle', { symbol, unit: outcome.per }),
        write: number,
      },
      ...losses.map(({ strategy }) => ({
        head: nameOf(strategy),
        write: (value: number) => number(value, 2),
      })),
    ],
    rows: thresholds.map((threshold, i) => [
      threshold,
      ...losses.map(({ losses: own }) => own[i] ?? null),
    ]),
  };
}
