/**
 * Cost-effectiveness plane: incremental health (east) and incremental cost (north) of
 * each draw against the comparator.
 * Source: Black 1990, Medical Decision Making 10:212-214 (from memory).
 */
import { difference } from '../tie.ts';
import { type Draws, requireDraws } from './draws.ts';

/** Shares of the draws; `onAxis`: no difference in cost or none in health. They sum to 1. */
export interface QuadrantShares {
  readonly northEast: number;
  readonly southEast: number;
  readonly southWest: number;
  readonly northWest: number;
  readonly onAxis: number;
}

export interface PlaneCloud {
  readonly strategy: string;
  /** Units of health per person, one a draw; exactly 0 where tied. */
  readonly health: Float64Array;
  /** Money per person, one a draw; exactly 0 where tied. */
  readonly cost: Float64Array;
  readonly shares: QuadrantShares;
}

/**
 * One cloud a strategy other than the comparator, in the order of the draws.
 * @throws DocumentError see `requireDraws`; RangeError where the comparator is missing.
 */
export function plane(draws: Draws, comparator: string): PlaneCloud[] {
  requireDraws(draws);
  const base = draws.strategies.indexOf(comparator);
  if (base < 0) throw new RangeError(`comparator ${comparator}`);
  const against = (columns: readonly Float64Array[], s: number) =>
    (columns[s] as Float64Array).map((value, i) =>
      difference(value, (columns[base] as Float64Array)[i] as number),
    );
  return draws.strategies.flatMap((strategy, s) => {
    if (s === base) return [];
    const health = against(draws.health, s);
    const cost = against(draws.cost, s);
    return [{ strategy, health, cost, shares: quadrants(health, cost) }];
  });
}

function quadrants(health: Float64Array, cost: Float64Array): QuadrantShares {
  const counts = { northEast: 0, southEast: 0, southWest: 0, northWest: 0, onAxis: 0 };
  for (let i = 0; i < health.length; i++) {
    counts[quadrant(health[i] as number, cost[i] as number)]++;
  }
  const share = (count: number) => count / health.length;
  return {
    northEast: share(counts.northEast),
    southEast: share(counts.southEast),
    southWest: share(counts.southWest),
    northWest: share(counts.northWest),
    onAxis: share(counts.onAxis),
  };
}

function quadrant(health: number, cost: number): keyof QuadrantShares {
  if (health === 0 || cost === 0) return 'onAxis';
  if (health > 0) return cost > 0 ? 'northEast' : 'southEast';
  return cost > 0 ? 'northWest' : 'southWest';
}
