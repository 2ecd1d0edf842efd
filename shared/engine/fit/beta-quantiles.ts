/** Beta whose interval has the given limits. */
import exp from '@stdlib/math-base-special-exp';
import ln from '@stdlib/math-base-special-ln';
import { beta } from '../distributions/beta.ts';
import { type Fitted, fitted, refused } from './fitted.ts';
import { type Interval, intervalTails, refuseInterval } from './interval.ts';
import { rootOf } from './root.ts';

/** Logs of alpha + beta that are searched. */
const LOG_TOTALS = [ln(0.05), ln(1e7)] as const;

/**
 * alpha and beta with cdf(lower) and cdf(upper) at the tails of the level: for each total
 * alpha + beta the mean that puts the lower limit right, then the total that puts the upper
 * limit right. Refused: `fit.interval` (limits not rising inside (0, 1)), `fit.level`,
 * `fit.noSolution` (no total from 0.05 to 10^7 fits).
 */
export function betaFromQuantiles(interval: Interval): Fitted<'beta'> {
  const refusal = refuseInterval(interval, 0, 1);
  if (refusal) return refusal;
  const { lower, upper } = interval;
  const high = intervalTails(interval)[1];
  const excess = (logTotal: number) => {
    const shapes = shapesFor(exp(logTotal), interval);
    return shapes ? beta(shapes).cdf(upper) - high : -1;
  };
  const logTotal = rootOf(excess, ...LOG_TOTALS);
  const shapes = logTotal === undefined ? undefined : shapesFor(exp(logTotal), interval);
  if (!shapes) return refused('fit.noSolution', { lower, upper });
  return fitted<'beta'>({ type: 'beta', ...shapes });
}

/** alpha and beta of this sum with the right probability below the lower limit. */
function shapesFor(total: number, interval: Interval): { alpha: number; beta: number } | undefined {
  const low = intervalTails(interval)[0];
  const shapes = (mean: number) => ({ alpha: total * mean, beta: total * (1 - mean) });
  const excess = (mean: number) => low - beta(shapes(mean)).cdf(interval.lower);
  const mean = rootOf(excess, 1e-9, 1 - 1e-9);
  return mean === undefined ? undefined : shapes(mean);
}
