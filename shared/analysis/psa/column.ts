/** Mean and standard error of a column of draws. */

/** Mean, with a second pass that takes back the rounding of the first. */
export function mean(column: Float64Array): number {
  const first = sum(column, 0) / column.length;
  return first + sum(column, first) / column.length;
}

/**
 * Monte Carlo standard error of the mean: the sample standard deviation (n - 1) over
 * the root of n; null for one draw. It takes draws for independent, so it is too large
 * for Latin hypercube and Sobol plans.
 */
export function standardError(column: Float64Array, centre: number): number | null {
  const n = column.length;
  if (n < 2) return null;
  let squares = 0;
  for (let i = 0; i < n; i++) squares += ((column[i] as number) - centre) ** 2;
  return Math.sqrt(squares / (n - 1) / n);
}

function sum(column: Float64Array, centre: number): number {
  let total = 0;
  for (let i = 0; i < column.length; i++) total += (column[i] as number) - centre;
  return total;
}
