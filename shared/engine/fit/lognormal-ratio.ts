/** Log-normal for a ratio (relative risk, odds ratio, hazard ratio) from its interval. */
import ln from '@stdlib/math-base-special-ln';
import { type Fitted, fitted, refused } from './fitted.ts';
import { type Interval, intervalZ, refuseInterval } from './interval.ts';

interface Ratio extends Interval {
  readonly point: number;
  /** What the point estimate is of the distribution; its median where absent. */
  readonly pointIs?: 'median' | 'mean';
}

/**
 * sdlog = (ln upper - ln lower) / (2 z), meanlog = ln point, less sdlog^2 / 2 where the point
 * is to be the mean (Briggs, Claxton and Sculpher 2006). Refused: `fit.interval` (limits not
 * rising and above 0), `fit.level`, `fit.pointOutside` (the point not within the limits).
 */
export function lognormalFromRatio(ratio: Ratio): Fitted<'lognormal'> {
  const { point, lower, upper, pointIs = 'median' } = ratio;
  const refusal = refuseInterval(ratio, 0);
  if (refusal) return refusal;
  if (!(point >= lower && point <= upper)) {
    return refused('fit.pointOutside', { point, lower, upper });
  }
  const sdlog = (ln(upper) - ln(lower)) / (2 * intervalZ(ratio));
  const shift = pointIs === 'mean' ? (sdlog * sdlog) / 2 : 0;
  return fitted<'lognormal'>({ type: 'lognormal', meanlog: ln(point) - shift, sdlog });
}
