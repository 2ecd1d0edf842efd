/** Beta distribution on [0, 1] (Johnson, Kotz and Balakrishnan 1995, chapter 25). */
import betainc from '@stdlib/math-base-special-betainc';
import betaln from '@stdlib/math-base-special-betaln';
import exp from '@stdlib/math-base-special-exp';
import { betaInverse } from './beta-inverse.ts';
import { timesLog, timesLog1p } from './powers.ts';
import type { Univariate } from './univariate.ts';

/** `alpha` > 0 and `beta` > 0 as counts of events and of the rest. */
export function beta({ alpha, beta: other }: { alpha: number; beta: number }): Univariate {
  const constant = betaln(alpha, other);
  const total = alpha + other;
  const logpdf = (x: number) =>
    x < 0 || x > 1 ? -Infinity : timesLog(alpha - 1, x) + timesLog1p(other - 1, -x) - constant;
  return {
    quantile: betaInverse(alpha, other),
    cdf: (x) => (x <= 0 ? 0 : x >= 1 ? 1 : betainc(x, alpha, other)),
    sf: (x) => (x <= 0 ? 1 : x >= 1 ? 0 : betainc(x, alpha, other, true, true)),
    pdf: (x) => exp(logpdf(x)),
    logpdf,
    mean: alpha / total,
    variance: ((alpha / total) * (other / total)) / (total + 1),
    support: [0, 1],
  };
}
