/** Normal from a confidence interval. */
import { type Fitted, fitted } from './fitted.ts';
import { type Interval, intervalZ, refuseInterval } from './interval.ts';

/**
 * mean = (lower + upper) / 2, sd = (upper - lower) / (2 z). Refused: `fit.interval`,
 * `fit.level`.
 */
export function normalFromInterval(interval: Interval): Fitted<'normal'> {
  const refusal = refuseInterval(interval);
  if (refusal) return refusal;
  const { lower, upper } = interval;
  const sd = (upper - lower) / (2 * intervalZ(interval));
  return fitted<'normal'>({ type: 'normal', mean: (lower + upper) / 2, sd });
}
