/** Beta from a mean and its standard error, by the method of moments. */
import { type Fitted, fitted, refused } from './fitted.ts';

/**
 * k = mean (1 - mean) / se^2 - 1, alpha = mean k, beta = (1 - mean) k (Briggs, Claxton and
 * Sculpher 2006). Refused: `fit.meanOutside` (not inside (0, 1)), `fit.standardError`
 * (not > 0), `fit.tooWide` where se^2 >= mean (1 - mean); its `limit` is the largest se.
 */
export function betaFromMoments({ mean, se }: { mean: number; se: number }): Fitted<'beta'> {
  if (!(mean > 0 && mean < 1)) return refused('fit.meanOutside', { mean, low: 0, high: 1 });
  if (!(se > 0)) return refused('fit.standardError', { se });
  const spread = mean * (1 - mean);
  const total = spread / (se * se) - 1;
  if (!(total > 0)) return refused('fit.tooWide', { se, limit: Math.sqrt(spread) });
  return fitted<'beta'>({ type: 'beta', alpha: mean * total, beta: (1 - mean) * total });
}
