/** Gamma from a mean and its standard error, by the method of moments. */
import { type Fitted, fitted, refused } from './fitted.ts';

/**
 * shape = (mean / se)^2, scale = se^2 / mean (Briggs, Claxton and Sculpher 2006).
 * Refused: `fit.meanOutside` (mean not > 0), `fit.standardError` (not > 0).
 */
export function gammaFromMoments({ mean, se }: { mean: number; se: number }): Fitted<'gamma'> {
  if (!(mean > 0 && mean < Infinity)) return refused('fit.meanOutside', { mean, low: 0 });
  if (!(se > 0 && se < Infinity)) return refused('fit.standardError', { se });
  return fitted<'gamma'>({ type: 'gamma', shape: (mean / se) ** 2, scale: (se * se) / mean });
}
