/** Gamma whose interval has the given limits. */
import exp from '@stdlib/math-base-special-exp';
import ln from '@stdlib/math-base-special-ln';
import { gammaInverse } from '../distributions/regularised-gamma.ts';
import { type Fitted, fitted, refused } from './fitted.ts';
import { type Interval, intervalTails, refuseInterval } from './interval.ts';
import { rootOf } from './root.ts';

/** Logs of the shapes that are searched: an interval of 1 to 10^9, or 0.2% wide, is within. */
const LOG_SHAPES = [ln(0.05), ln(1e7)] as const;

/**
 * The shape whose quantiles are in the proportion upper / lower, then the scale. Refused:
 * `fit.interval` (limits not rising and above 0), `fit.level`, `fit.noSolution` (limits too
 * far apart or too close for any shape from 0.05 to 10^7).
 */
export function gammaFromQuantiles(interval: Interval): Fitted<'gamma'> {
  const refusal = refuseInterval(interval, 0);
  if (refusal) return refusal;
  const { lower, upper } = interval;
  const [low, high] = intervalTails(interval);
  const target = ln(upper / lower);
  const excess = (logShape: number) => {
    const shape = exp(logShape);
    return target - ln(gammaInverse(shape, high) / gammaInverse(shape, low));
  };
  const logShape = rootOf(excess, ...LOG_SHAPES);
  if (logShape === undefined) return refused('fit.noSolution', { lower, upper });
  const shape = exp(logShape);
  return fitted<'gamma'>({ type: 'gamma', shape, scale: upper / gammaInverse(shape, high) });
}
