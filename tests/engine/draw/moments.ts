/** Moments and correlations of columns, for tests. */
type Column = ArrayLike<number>;

export function mean(column: Column): number {
  let sum = 0;
  for (let i = 0; i < column.length; i++) sum += column[i] ?? Number.NaN;
  return sum / column.length;
}

/** Mean squared distance from the mean. */
export function spread(column: Column): number {
  return covariance(column, column);
}

export function covariance(a: Column, b: Column): number {
  const [centreA, centreB] = [mean(a), mean(b)];
  let sum = 0;
  for (let i = 0; i < a.length; i++) {
    sum += ((a[i] ?? Number.NaN) - centreA) * ((b[i] ?? Number.NaN) - centreB);
  }
  return sum / a.length;
}

export function correlation(a: Column, b: Column): number {
  return covariance(a, b) / Math.sqrt(spread(a) * spread(b));
}

/** Ranks from 1; for columns without ties. */
function ranks(column: Column): Float64Array {
  const order = Array.from(column, (_, i) => i).sort((i, j) => (column[i] ?? 0) - (column[j] ?? 0));
  const result = new Float64Array(column.length);
  order.forEach((i, rank) => {
    result[i] = rank + 1;
  });
  return result;
}

/** Spearman's rank correlation. */
export function spearman(a: Column, b: Column): number {
  return correlation(ranks(a), ranks(b));
}
