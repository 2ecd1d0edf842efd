/** Uniform distribution: every value between two limits alike. */
import ln from '@stdlib/math-base-special-ln';
import type { Univariate } from './univariate.ts';
import { isProbability } from './univariate.ts';

/** `low` < `high`, both finite. */
export function uniform({ low, high }: { low: number; high: number }): Univariate {
  const width = high - low;
  const inside = (x: number) => x >= low && x <= high;
  return {
    quantile: (p) => (isProbability(p) ? Math.min(low + width * p, high) : Number.NaN),
    cdf: (x) => (x <= low ? 0 : x >= high ? 1 : (x - low) / width),
    sf: (x) => (x <= low ? 1 : x >= high ? 0 : (high - x) / width),
    pdf: (x) => (inside(x) ? 1 / width : 0),
    logpdf: (x) => (inside(x) ? -ln(width) : -Infinity),
    mean: low + width / 2,
    variance: (width * width) / 12,
    support: [low, high],
  };
}
