/** Means over the draws, with 95% intervals and Monte Carlo standard errors. */
import { mean, standardError } from './column.ts';
import { type Draws, requireDraws } from './draws.ts';
import { percentile } from './percentile.ts';

/** The interval runs between these percentiles of the draws (type 7). */
export const INTERVAL = [0.025, 0.975] as const;

export interface Summary {
  readonly mean: number;
  /** Monte Carlo standard error of the mean; null for one draw. */
  readonly se: number | null;
  /** 2.5th and 97.5th percentile of the draws. */
  readonly low: number;
  readonly high: number;
}

export interface StrategyMeans {
  readonly strategy: string;
  readonly cost: Summary;
  readonly health: Summary;
  /** Net monetary benefit at the threshold, money per person. */
  readonly nmb: Summary;
  /** Against the comparator, draw by draw; null for the comparator itself. */
  readonly incremental: {
    readonly cost: Summary;
    readonly health: Summary;
    readonly nmb: Summary;
  } | null;
}

/**
 * Strategies in the order of the draws.
 * @param threshold 0 or more, finite.
 * @throws DocumentError see `requireDraws`; RangeError where the comparator is missing.
 */
export function means(draws: Draws, comparator: string, threshold: number): StrategyMeans[] {
  requireDraws(draws);
  const base = draws.strategies.indexOf(comparator);
  if (base < 0) throw new RangeError(`comparator ${comparator}`);
  const baseCost = draws.cost[base] as Float64Array;
  const baseHealth = draws.health[base] as Float64Array;
  return draws.strategies.map((strategy, s) => {
    const cost = draws.cost[s] as Float64Array;
    const health = draws.health[s] as Float64Array;
    return {
      strategy,
      ...three(cost, health, threshold),
      incremental:
        s === base ? null : three(minus(cost, baseCost), minus(health, baseHealth), threshold),
    };
  });
}

/** @param column 1 draw or more. */
export function summarise(column: Float64Array): Summary {
  const centre = mean(column);
  const sorted = Float64Array.from(column).sort();
  return {
    mean: centre,
    se: standardError(column, centre),
    low: percentile(sorted, INTERVAL[0]),
    high: percentile(sorted, INTERVAL[1]),
  };
}

function three(cost: Float64Array, health: Float64Array, threshold: number) {
  const nmb = cost.map((money, i) => threshold * (health[i] as number) - money);
  return { cost: summarise(cost), health: summarise(health), nmb: summarise(nmb) };
}

function minus(a: Float64Array, b: Float64Array): Float64Array {
  return a.map((value, i) => value - (b[i] as number));
}
