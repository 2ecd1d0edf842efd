/** Normal distribution (Johnson, Kotz and Balakrishnan 1994, chapter 13). */
import erfc from '@stdlib/math-base-special-erfc';
import exp from '@stdlib/math-base-special-exp';
import ln from '@stdlib/math-base-special-ln';
import normalQuantile from '@stdlib/stats-base-dists-normal-quantile';
import type { Univariate } from './univariate.ts';

const SQRT_HALF = Math.SQRT1_2;
/** ln(sqrt(2 pi)) */
const LN_SQRT_TWO_PI = 0.9189385332046728;

/** Standard normal quantile, for `p` in [0, 1]. */
export function standardNormalQuantile(p: number): number {
  return normalQuantile(p, 0, 1);
}

/** P(Z <= z) of a standard normal. */
export function standardNormalCdf(z: number): number {
  return 0.5 * erfc(-z * SQRT_HALF);
}

/** `mean` finite, `sd` > 0; any real x. */
export function normal({ mean, sd }: { mean: number; sd: number }): Univariate {
  const logpdf = (x: number) => {
    const z = (x - mean) / sd;
    return -0.5 * z * z - LN_SQRT_TWO_PI - ln(sd);
  };
  return {
    quantile: (p) => mean + sd * standardNormalQuantile(p),
    cdf: (x) => standardNormalCdf((x - mean) / sd),
    sf: (x) => standardNormalCdf((mean - x) / sd),
    pdf: (x) => exp(logpdf(x)),
    logpdf,
    mean,
    variance: sd * sd,
    support: [-Infinity, Infinity],
  };
}
