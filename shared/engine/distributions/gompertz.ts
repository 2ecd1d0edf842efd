/**
 * Gompertz distribution, hazard rate e^(shape x) (Gompertz 1825). With a shape below 0
 * the hazard dies away and exp(rate / shape) of all never have the event: the quantile
 * beyond is Infinity, the mean Infinity and the variance does not exist.
 */
import exp from '@stdlib/math-base-special-exp';
import expm1 from '@stdlib/math-base-special-expm1';
import ln from '@stdlib/math-base-special-ln';
import log1p from '@stdlib/math-base-special-log1p';
import { exponential } from './exponential.ts';
import { expectExponential } from './quadrature.ts';
import type { Univariate } from './univariate.ts';
import { isProbability } from './univariate.ts';

/** `rate` > 0: the hazard at 0; `shape`: its growth per unit of x, any sign. */
export function gompertz({ shape, rate }: { shape: number; rate: number }): Univariate {
  if (shape === 0) return exponential({ rate });
  const hazardSum = (x: number) => (rate * expm1(shape * x)) / shape;
  const logpdf = (x: number) => (x < 0 ? -Infinity : ln(rate) + shape * x - hazardSum(x));
  return {
    quantile: (p) => (isProbability(p) ? whenHazard(shape, rate, -log1p(-p)) : Number.NaN),
    cdf: (x) => (x <= 0 ? 0 : -expm1(-hazardSum(x))),
    sf: (x) => (x <= 0 ? 1 : exp(-hazardSum(x))),
    pdf: (x) => exp(logpdf(x)),
    logpdf,
    ...moments(shape, rate),
    support: [0, Infinity],
  };
}

/** The x by which the cumulative hazard reaches `sum`. */
function whenHazard(shape: number, rate: number, sum: number): number {
  const z = (shape / rate) * sum;
  return z > -1 ? log1p(z) / shape : Infinity;
}

/** X is a function of an exponential variable (its cumulative hazard): integrate over that. */
function moments(shape: number, rate: number): { mean: number; variance: number } {
  if (shape < 0) return { mean: Infinity, variance: Number.NaN };
  const mean = expectExponential((sum) => whenHazard(shape, rate, sum));
  const variance = expectExponential((sum) => (whenHazard(shape, rate, sum) - mean) ** 2);
  return { mean, variance };
}
