/**
 * Log-logistic distribution, S(x) = 1 / (1 + (x / scale)^shape) (Johnson, Kotz and
 * Balakrishnan 1995, chapter 23). The mean is infinite up to shape 1; the variance is
 * infinite up to shape 2 and does not exist up to shape 1.
 */
import exp from '@stdlib/math-base-special-exp';
import ln from '@stdlib/math-base-special-ln';
import log1p from '@stdlib/math-base-special-log1p';
import pow from '@stdlib/math-base-special-pow';
import sin from '@stdlib/math-base-special-sin';
import { timesLog } from './powers.ts';
import type { Univariate } from './univariate.ts';
import { isProbability } from './univariate.ts';

/** `shape` > 0, `scale` > 0: the median. */
export function loglogistic({ shape, scale }: { shape: number; scale: number }): Univariate {
  const power = (x: number) => pow(x / scale, shape);
  const logpdf = (x: number) =>
    x < 0 ? -Infinity : ln(shape / scale) + timesLog(shape - 1, x / scale) - 2 * log1p(power(x));
  const mean = shape > 1 ? scale * moment(1 / shape) : Infinity;
  return {
    quantile: (p) => (isProbability(p) ? scale * pow(p / (1 - p), 1 / shape) : Number.NaN),
    cdf: (x) => (x <= 0 ? 0 : 1 / (1 + pow(x / scale, -shape))),
    sf: (x) => (x <= 0 ? 1 : 1 / (1 + power(x))),
    pdf: (x) => exp(logpdf(x)),
    logpdf,
    mean,
    variance: variance(shape, scale, mean),
    support: [0, Infinity],
  };
}

/** E[(X / scale)^r] with t = r / shape < 1. */
function moment(t: number): number {
  return (Math.PI * t) / sin(Math.PI * t);
}

function variance(shape: number, scale: number, mean: number): number {
  if (shape > 2) return scale * scale * moment(2 / shape) - mean * mean;
  return shape > 1 ? Infinity : Number.NaN;
}
