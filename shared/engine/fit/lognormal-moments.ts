/** Log-normal from a mean and its standard error on the natural scale. */
import ln from '@stdlib/math-base-special-ln';
import log1p from '@stdlib/math-base-special-log1p';
import { type Fitted, fitted, refused } from './fitted.ts';

/**
 * sdlog^2 = ln(1 + (se / mean)^2), meanlog = ln(mean) - sdlog^2 / 2 (Briggs, Claxton and
 * Sculpher 2006). Refused: `fit.meanOutside` (mean not > 0), `fit.standardError` (not > 0).
 */
export function lognormalFromMoments(of: { mean: number; se: number }): Fitted<'lognormal'> {
  const { mean, se } = of;
  if (!(mean > 0 && mean < Infinity)) return refused('fit.meanOutside', { mean, low: 0 });
  if (!(se > 0 && se < Infinity)) return refused('fit.standardError', { se });
  const variance = log1p((se / mean) ** 2);
  return fitted<'lognormal'>({
    type: 'lognormal',
    meanlog: ln(mean) - variance / 2,
    sdlog: Math.sqrt(variance),
  });
}
