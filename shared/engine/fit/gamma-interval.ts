/** Gamma from a mean and an interval whose standard error is taken as a normal's. */
import type { Fitted } from './fitted.ts';
import { gammaFromMoments } from './gamma-moments.ts';
import { type Interval, intervalZ, refuseInterval } from './interval.ts';

/**
 * se = (upper - lower) / (2 z), then the method of moments: an approximation, for the
 * interval of a gamma is not symmetric. Refused as by `gammaFromMoments`, and
 * `fit.interval`, `fit.level`.
 */
export function gammaFromInterval(of: Interval & { mean: number }): Fitted<'gamma'> {
  const refusal = refuseInterval(of);
  if (refusal) return refusal;
  return gammaFromMoments({ mean: of.mean, se: (of.upper - of.lower) / (2 * intervalZ(of)) });
}
