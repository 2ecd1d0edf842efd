/**
 * Which strategy is best at which threshold: the upper envelope of the net monetary
 * benefits, whose corners are the ICERs along the frontier.
 */
import { frontierRows, type IncrementalRow } from './incremental.ts';

export interface FrontierSegment {
  readonly strategy: string;
  /** Others of the same cost and health, in order of the rows. */
  readonly tied: readonly string[];
  /** Thresholds, money per unit of health; at a corner both neighbours are best. */
  readonly from: number;
  readonly to: number;
}

/**
 * Segments that cover [0, max] without gaps, in order of threshold.
 * @param rows as `incremental` gives them.
 * @param max above 0; Infinity for all thresholds.
 */
export function frontierSegments(rows: readonly IncrementalRow[], max: number): FrontierSegment[] {
  const frontier = frontierRows(rows);
  const corners = [0, ...frontier.slice(1).map((row) => row.icer ?? Number.POSITIVE_INFINITY)];
  return frontier
    .map((row, i) => ({
      strategy: row.id,
      tied: rows.filter(({ tiedWith }) => tiedWith === row.id).map(({ id }) => id),
      from: corners[i] as number,
      to: Math.min(corners[i + 1] ?? max, max),
    }))
    .filter(({ from }) => from < max);
}
