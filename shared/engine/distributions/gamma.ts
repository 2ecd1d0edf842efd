/** Gamma distribution (Johnson, Kotz and Balakrishnan 1994, chapter 17). */
import exp from '@stdlib/math-base-special-exp';
import gammaln from '@stdlib/math-base-special-gammaln';
import ln from '@stdlib/math-base-special-ln';
import { timesLog } from './powers.ts';
import {
  gammaInverse,
  gammaLower,
  gammaPrefactor,
  gammaUpper,
  isLargeShape,
} from './regularised-gamma.ts';
import type { Univariate } from './univariate.ts';
import { isProbability } from './univariate.ts';

/** Mean `shape` times `scale`, both > 0 (the rate is 1 / scale). */
export function gamma({ shape, scale }: { shape: number; scale: number }): Univariate {
  const logpdf = (x: number) => (x < 0 ? -Infinity : standardLogpdf(shape, x / scale) - ln(scale));
  return {
    quantile: (p) => (isProbability(p) ? scale * gammaInverse(shape, p) : Number.NaN),
    cdf: (x) => gammaLower(shape, x / scale),
    sf: (x) => gammaUpper(shape, x / scale),
    pdf: (x) => exp(logpdf(x)),
    logpdf,
    mean: shape * scale,
    variance: shape * scale * scale,
    support: [0, Infinity],
  };
}

/** Log density with scale 1. */
function standardLogpdf(shape: number, x: number): number {
  if (isLargeShape(shape) && x > 0 && x < 2 * shape) {
    return ln(gammaPrefactor(shape, x)) + ln(shape / x);
  }
  return timesLog(shape - 1, x) - x - gammaln(shape);
}
