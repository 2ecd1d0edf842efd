/** Confidence intervals: their checks and the normal quantile of their level. */
import { standardNormalQuantile } from '../distributions/normal.ts';
import { refused } from './fitted.ts';

export interface Interval {
  readonly lower: number;
  readonly upper: number;
  /** Share between the limits, the rest halved between the tails; 0.95 where absent. */
  readonly level?: number;
}

/** z of the upper limit: 1.959963984540054 at 95%. */
export function intervalZ({ level = 0.95 }: Interval): number {
  return standardNormalQuantile((1 + level) / 2);
}

/** The probabilities below the two limits. */
export function intervalTails({ level = 0.95 }: Interval): readonly [number, number] {
  return [(1 - level) / 2, (1 + level) / 2];
}

/**
 * Undefined where the interval can be used; else `fit.interval` (limits not rising or not
 * finite, or outside `from`..`to`, limits not included) or `fit.level`.
 */
export function refuseInterval(interval: Interval, from = -Infinity, to = Infinity) {
  const { lower, upper, level = 0.95 } = interval;
  if (!(lower > from && upper > lower && upper < to)) {
    return refused('fit.interval', { lower, upper });
  }
  return level > 0 && level < 1 ? undefined : refused('fit.level', { level });
}
