/** A known value: all probability at one point. */
import type { Univariate } from './univariate.ts';
import { isProbability } from './univariate.ts';

/** `value` finite. */
export function fixed(value: number): Univariate {
  return {
    quantile: (p) => (isProbability(p) ? value : Number.NaN),
    cdf: (x) => (x >= value ? 1 : 0),
    sf: (x) => (x >= value ? 0 : 1),
    pdf: (x) => (x === value ? 1 : 0),
    logpdf: (x) => (x === value ? 0 : -Infinity),
    mean: value,
    variance: 0,
    support: [value, value],
    discrete: true,
  };
}
