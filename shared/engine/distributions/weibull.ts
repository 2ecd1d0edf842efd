/** Weibull distribution, S(x) = exp(-(x / scale)^shape) (Weibull 1951). */
import exp from '@stdlib/math-base-special-exp';
import expm1 from '@stdlib/math-base-special-expm1';
import gammaFunction from '@stdlib/math-base-special-gamma';
import ln from '@stdlib/math-base-special-ln';
import log1p from '@stdlib/math-base-special-log1p';
import pow from '@stdlib/math-base-special-pow';
import { timesLog } from './powers.ts';
import type { Univariate } from './univariate.ts';
import { isProbability } from './univariate.ts';

/** `shape` > 0, `scale` > 0 in the unit of x. */
export function weibull({ shape, scale }: { shape: number; scale: number }): Univariate {
  const power = (x: number) => pow(x / scale, shape);
  const first = gammaFunction(1 + 1 / shape);
  const logpdf = (x: number) =>
    x < 0 ? -Infinity : ln(shape / scale) + timesLog(shape - 1, x / scale) - power(x);
  return {
    quantile: (p) => (isProbability(p) ? scale * pow(-log1p(-p), 1 / shape) : Number.NaN),
    cdf: (x) => (x <= 0 ? 0 : -expm1(-power(x))),
    sf: (x) => (x <= 0 ? 1 : exp(-power(x))),
    pdf: (x) => exp(logpdf(x)),
    logpdf,
    mean: scale * first,
    variance: scale * scale * (gammaFunction(1 + 2 / shape) - first * first),
    support: [0, Infinity],
  };
}
