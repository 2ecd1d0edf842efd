/**
 * PERT distribution: a beta stretched over [low, high] whose mean is
 * (low + weight mode + high) / (weight + 2) (Malcolm et al. 1959, weight 4; the
 * weighted form: Vose 2008, Risk Analysis).
 */
import ln from '@stdlib/math-base-special-ln';
import { beta } from './beta.ts';
import type { Univariate } from './univariate.ts';

interface Pert {
  low: number;
  mode: number;
  high: number;
  weight: number;
}

/** `low` <= `mode` <= `high`, `low` < `high`, `weight` > 0. */
export function pert({ low, mode, high, weight }: Pert): Univariate {
  const width = high - low;
  const base = beta({
    alpha: 1 + (weight * (mode - low)) / width,
    beta: 1 + (weight * (high - mode)) / width,
  });
  const share = (x: number) => (x - low) / width;
  return {
    quantile: (p) => Math.min(low + width * base.quantile(p), high),
    cdf: (x) => base.cdf(share(x)),
    sf: (x) => base.sf(share(x)),
    pdf: (x) => base.pdf(share(x)) / width,
    logpdf: (x) => base.logpdf(share(x)) - ln(width),
    mean: (low + weight * mode + high) / (weight + 2),
    variance: width * width * base.variance,
    support: [low, high],
  };
}
