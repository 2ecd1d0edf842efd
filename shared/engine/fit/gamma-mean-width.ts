/** Gamma with a given mean whose interval has a given width. */
import exp from '@stdlib/math-base-special-exp';
import ln from '@stdlib/math-base-special-ln';
import { gammaInverse } from '../distributions/regularised-gamma.ts';
import { type Fitted, fitted, refused } from './fitted.ts';
import { type Interval, intervalTails, refuseInterval } from './interval.ts';
import { rootOf } from './root.ts';

/**
 * Only above a shape of 2 does the width of the 95% interval surely fall as the shape rises,
 * so that one shape fits (tests/golden/fit.json has the same limit).
 */
const LOG_SHAPES = [ln(2), ln(1e7)] as const;

/**
 * scale = mean / shape, with the shape that makes the interval as wide as stated; its limits
 * need not be the stated ones. Refused: `fit.interval` (limits not rising), `fit.level`,
 * `fit.meanOutside` (mean not > 0), `fit.noSolution` (too wide or too narrow for the mean).
 */
export function gammaFromMeanAndWidth(of: Interval & { mean: number }): Fitted<'gamma'> {
  const refusal = refuseInterval(of);
  if (refusal) return refusal;
  const { mean, lower, upper } = of;
  if (!(mean > 0 && mean < Infinity)) return refused('fit.meanOutside', { mean, low: 0 });
  const [low, high] = intervalTails(of);
  const width = (upper - lower) / mean;
  const excess = (logShape: number) => {
    const shape = exp(logShape);
    return width - (gammaInverse(shape, high) - gammaInverse(shape, low)) / shape;
  };
  const logShape = rootOf(excess, ...LOG_SHAPES);
  if (logShape === undefined) return refused('fit.noSolution', { mean, lower, upper });
  const shape = exp(logShape);
  return fitted<'gamma'>({ type: 'gamma', shape, scale: mean / shape });
}
