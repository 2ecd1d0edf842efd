/**
 * Generalised gamma distribution in Prentice's parametrisation (Prentice 1974, Biometrika
 * 61:539-544): with w = (ln x - mu) / sigma, exp(q w) / q^2 is a gamma variable of shape
 * 1 / q^2, in its upper tail where q < 0. q = 0 is the log-normal, q = 1 the Weibull,
 * q = sigma the gamma.
 */
import exp from '@stdlib/math-base-special-exp';
import gammaln from '@stdlib/math-base-special-gammaln';
import ln from '@stdlib/math-base-special-ln';
import { lognormal } from './lognormal.ts';
import { gammaInverse, gammaLower, gammaUpper } from './regularised-gamma.ts';
import type { Univariate } from './univariate.ts';
import { isProbability } from './univariate.ts';

interface GeneralisedGamma {
  mu: number;
  sigma: number;
  q: number;
}

/** `sigma` > 0; `mu` and `q` any; x > 0. */
export function generalisedGamma({ mu, sigma, q }: GeneralisedGamma): Univariate {
  if (q === 0) return lognormal({ meanlog: mu, sdlog: sigma });
  const shape = 1 / (q * q);
  const upper = q < 0;
  const standard = (x: number) => shape * exp((q * (ln(x) - mu)) / sigma);
  const below = upper ? gammaUpper : gammaLower;
  const above = upper ? gammaLower : gammaUpper;
  const quantile = (p: number) => exp(mu + (sigma * ln(gammaInverse(shape, p, upper) / shape)) / q);
  const logpdf = (x: number) => (x > 0 ? logDensity(shape, { mu, sigma, q }, ln(x)) : -Infinity);
  return {
    quantile: (p) => (isProbability(p) ? quantile(p) : Number.NaN),
    cdf: (x) => (x > 0 ? below(shape, standard(x)) : 0),
    sf: (x) => (x > 0 ? above(shape, standard(x)) : 1),
    pdf: (x) => exp(logpdf(x)),
    logpdf,
    ...moments(shape, { mu, sigma, q }),
    support: [0, Infinity],
  };
}

function logDensity(shape: number, of: GeneralisedGamma, logX: number): number {
  const v = (of.q * (logX - of.mu)) / of.sigma;
  const constant = ln(Math.abs(of.q)) + shape * ln(shape) - gammaln(shape) - ln(of.sigma);
  return constant - logX + shape * (v - exp(v));
}

function moments(shape: number, of: GeneralisedGamma): { mean: number; variance: number } {
  const mean = moment(shape, of, 1);
  const second = moment(shape, of, 2);
  return { mean, variance: second === Infinity ? Infinity : second - mean * mean };
}

/** E[X^r], infinite where the lower tail of the gamma variable is too heavy. */
function moment(shape: number, { mu, sigma, q }: GeneralisedGamma, r: number): number {
  const power = (r * sigma) / q;
  if (shape + power <= 0) return Infinity;
  return exp(r * mu + gammaln(shape + power) - gammaln(shape) - power * ln(shape));
}
