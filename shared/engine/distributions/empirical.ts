/**
 * A list drawn with equal chance: a bootstrap or a posterior sample. The quantile is the
 * inverse of the empirical distribution function (type 1 of Hyndman and Fan 1996), so a
 * draw is always one of the values, and the order of the list does not matter.
 */
import ln from '@stdlib/math-base-special-ln';
import type { Univariate } from './univariate.ts';
import { isProbability } from './univariate.ts';

/** `values`: 1 or more, finite. The variance divides by n: it is that of the draws. */
export function empirical({ values }: { values: readonly number[] }): Univariate {
  const sorted = Float64Array.from(values).sort();
  const n = sorted.length;
  const at = (i: number) => sorted[Math.min(Math.max(i, 0), n - 1)] ?? Number.NaN;
  const pdf = (x: number) => (countUpTo(sorted, x) - countBelow(sorted, x)) / n;
  const mean = average(sorted);
  return {
    quantile: (p) => (isProbability(p) ? at(Math.ceil(p * n) - 1) : Number.NaN),
    cdf: (x) => countUpTo(sorted, x) / n,
    sf: (x) => (n - countUpTo(sorted, x)) / n,
    pdf,
    logpdf: (x) => ln(pdf(x)),
    mean,
    variance: average(sorted.map((x) => (x - mean) ** 2)),
    support: [at(0), at(n - 1)],
    discrete: true,
  };
}

function average(values: Float64Array): number {
  let sum = 0;
  for (const value of values) sum += value;
  return sum / values.length;
}

/** How many of the sorted values satisfy a test that holds up to some place and not after. */
function countWhile(sorted: Float64Array, holds: (value: number) => boolean): number {
  let low = 0;
  let high = sorted.length;
  while (low < high) {
    const middle = (low + high) >>> 1;
    if (holds(sorted[middle] ?? Number.NaN)) low = middle + 1;
    else high = middle;
  }
  return low;
}

function countUpTo(sorted: Float64Array, x: number): number {
  return countWhile(sorted, (value) => value <= x);
}

function countBelow(sorted: Float64Array, x: number): number {
  return countWhile(sorted, (value) => value < x);
}
