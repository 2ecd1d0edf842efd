/** Log-normal whose interval has the given limits. */
import ln from '@stdlib/math-base-special-ln';
import { type Fitted, fitted } from './fitted.ts';
import { type Interval, intervalZ, refuseInterval } from './interval.ts';

/**
 * meanlog = (ln lower + ln upper) / 2, sdlog = (ln upper - ln lower) / (2 z). Refused:
 * `fit.interval` (limits not rising and above 0), `fit.level`.
 */
export function lognormalFromQuantiles(interval: Interval): Fitted<'lognormal'> {
  const refusal = refuseInterval(interval, 0);
  if (refusal) return refusal;
  const [low, high] = [ln(interval.lower), ln(interval.upper)];
  const sdlog = (high - low) / (2 * intervalZ(interval));
  return fitted<'lognormal'>({ type: 'lognormal', meanlog: (low + high) / 2, sdlog });
}
