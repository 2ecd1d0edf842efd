/** Draws of a probabilistic analysis, as the analyses take them. */
import type { DrawsBlock } from '../../engine/results.ts';
import { DocumentError, error } from '../../model/issue.ts';
import { type Direction, toHealthColumn } from '../direction.ts';

/** Columns by strategy, one value a draw; draw i is the same world for all of them. */
export interface Draws {
  readonly strategies: readonly string[];
  /** Money per person. */
  readonly cost: readonly Float64Array[];
  /** Primary outcome per person, more being better. */
  readonly health: readonly Float64Array[];
}

/**
 * The engine's blocks, in any order, joined into whole columns and turned to health.
 * @throws DocumentError `analysis.drawsMissing` where blocks leave a gap or overlap.
 */
export function joinBlocks(
  strategies: readonly string[],
  blocks: readonly DrawsBlock[],
  direction: Direction,
): Draws {
  const ordered = [...blocks].sort((a, b) => a.from - b.from);
  let expected = 0;
  for (const { from, to } of ordered) {
    if (from !== expected) throw missing(expected);
    expected = to;
  }
  const join = (measure: 'cost' | 'outcome', s: number) => {
    const column = new Float64Array(expected);
    for (const block of ordered) column.set(block[measure][s] as Float64Array, block.from);
    return column;
  };
  return {
    strategies,
    cost: strategies.map((_, s) => join('cost', s)),
    health: strategies.map((_, s) => toHealthColumn(join('outcome', s), direction)),
  };
}

/**
 * The number of draws, 1 or more.
 * @throws DocumentError `analysis.noDraws`, `analysis.drawsMissing`,
 *   `analysis.drawNotFinite` with strategy, quantity and draw of each column's first.
 */
export function requireDraws(draws: Draws): number {
  const columns = [...draws.cost, ...draws.health];
  const count = columns[0]?.length ?? 0;
  if (count === 0) throw new DocumentError([error('analysis.noDraws')]);
  if (columns.length !== 2 * draws.strategies.length || columns.some((c) => c.length !== count)) {
    throw missing(Math.min(...columns.map((column) => column.length)));
  }
  const issues = draws.strategies.flatMap((strategy, s) =>
    (['cost', 'health'] as const).flatMap((quantity) => {
      const draw = (draws[quantity][s] as Float64Array).findIndex((x) => !Number.isFinite(x));
      if (draw < 0) return [];
      return [error('analysis.drawNotFinite', [], { strategy, quantity, draw })];
    }),
  );
  if (issues.length > 0) throw new DocumentError(issues);
  return count;
}

function missing(draw: number): DocumentError {
  return new DocumentError([error('analysis.drawsMissing', [], { draw })]);
}
