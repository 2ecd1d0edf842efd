/** Triangular distribution (Kotz and van Dorp 2004, Beyond Beta, chapter 1). */
import ln from '@stdlib/math-base-special-ln';
import type { Univariate } from './univariate.ts';
import { isProbability } from './univariate.ts';

/** `low` <= `mode` <= `high`, `low` < `high`. */
export function triangular(of: { low: number; mode: number; high: number }): Univariate {
  const { low, mode, high } = of;
  const width = high - low;
  const left = mode - low;
  const right = high - mode;
  const atMode = left / width;
  const quantile = (p: number) =>
    p < atMode ? low + Math.sqrt(p * width * left) : high - Math.sqrt((1 - p) * width * right);
  const pdf = (x: number) => {
    if (x < low || x > high) return 0;
    if (x < mode) return (2 * (x - low)) / (width * left);
    return x > mode ? (2 * (high - x)) / (width * right) : 2 / width;
  };
  return {
    quantile: (p) => (isProbability(p) ? (left === 0 ? fromLow(of, p) : quantile(p)) : Number.NaN),
    cdf: (x) => below(x, low, high, mode, width),
    sf: (x) => below(-x, -high, -low, -mode, width),
    pdf,
    logpdf: (x) => ln(pdf(x)),
    mean: (low + mode + high) / 3,
    variance: (left * left + right * right + left * right) / 18,
    support: [low, high],
  };
}

/** The quantile where the mode is the lower limit, without cancellation at small p. */
function fromLow({ low, high }: { low: number; high: number }, p: number): number {
  return low + ((high - low) * p) / (1 + Math.sqrt(1 - p));
}

/** P(X <= x); of the mirrored distribution it is P(X > x). */
function below(x: number, low: number, high: number, mode: number, width: number): number {
  if (x <= low) return 0;
  if (x >= high) return 1;
  if (x < mode) return ((x - low) / width) * ((x - low) / (mode - low));
  if (mode === low) return ((x - low) / width) * (2 - (x - low) / width);
  return 1 - ((high - x) / width) * ((high - x) / (high - mode));
}
