/** Log-normal distribution: ln X is normal (Johnson, Kotz and Balakrishnan 1994, chapter 14). */
import exp from '@stdlib/math-base-special-exp';
import expm1 from '@stdlib/math-base-special-expm1';
import ln from '@stdlib/math-base-special-ln';
import { normal } from './normal.ts';
import type { Univariate } from './univariate.ts';

/** `meanlog` and `sdlog` > 0 are the mean and standard deviation of ln X; x > 0. */
export function lognormal(of: { meanlog: number; sdlog: number }): Univariate {
  const { meanlog, sdlog } = of;
  const log = normal({ mean: meanlog, sd: sdlog });
  const squared = sdlog * sdlog;
  const logpdf = (x: number) => (x > 0 ? log.logpdf(ln(x)) - ln(x) : -Infinity);
  return {
    quantile: (p) => exp(log.quantile(p)),
    cdf: (x) => (x > 0 ? log.cdf(ln(x)) : 0),
    sf: (x) => (x > 0 ? log.sf(ln(x)) : 1),
    pdf: (x) => exp(logpdf(x)),
    logpdf,
    mean: exp(meanlog + squared / 2),
    variance: expm1(squared) * exp(2 * meanlog + squared),
    support: [0, Infinity],
  };
}
