/** The draws themselves: the first on screen, all of them as CSV. */
import { toHealth } from '../../../../shared/analysis/direction.ts';
import type { Draws } from '../../../../shared/analysis/psa/draws.ts';
import { FigureFrame } from '../../../components/chart/figure-frame.tsx';
import type { ChartTable } from '../../../components/chart/table.ts';
import type { FigureWords } from '../figure-words.ts';

const SHOWN = 20;

export function DrawsTable({ draws, words }: { draws: Draws; words: FigureWords }) {
  return (
    <FigureFrame
      title={words.t('uncertainty.draws.title', { count: draws.cost[0]?.length ?? 0 })}
      file="draws"
      source={words.source}
      height={0}
      language={words.language}
      mostRows={SHOWN}
      table={() => drawsTable(draws, words)}
    />
  );
}

/** Costs and outcomes in their own direction, one row a draw. */
export function drawsTable(draws: Draws, words: FigureWords): ChartTable {
  const { t, nameOf, symbol, outcome, number, document } = words;
  const { direction } = document.question.outcome;
  return {
    columns: [
      { head: t('uncertainty.plane.draw'), write: number },
      ...draws.strategies.flatMap((id) => [
        {
          head: t('uncertainty.draws.cost', { strategy: nameOf(id), symbol }),
          write: (value: number) => number(value, 2),
        },
        {
          head: t('uncertainty.draws.outcome', { strategy: nameOf(id), unit: outcome.plural }),
          write: (value: number) => number(value, 4),
        },
      ]),
    ],
    rows: Array.from({ length: draws.cost[0]?.length ?? 0 }, (_, i) => [
      i + 1,
      ...draws.strategies.flatMap((_, s) => [
        draws.cost[s]?.[i] ?? null,
        toHealth(draws.health[s]?.[i] ?? Number.NaN, direction),
      ]),
    ]),
  };
}
