/** Moments and correlations of columns, for tests. */
type Column = ArrayLike<number>;

export function mean(column: Column): number {
  return Array.from(column).reduce((sum, x) => sum + x, 0) / column.length;
}

/** Mean squared distance from the mean. */
export function spread(column: Column): number {
  return covariance(column, column);
}

export function covariance(a: Column, b: Column): number {
  const [centreA, centreB] = [mean(a), mean(b)];
  return mean(Array.from(a, (x, i) => (x - centreA) * ((b[i] ?? Number.NaN) - centreB)));
}

export function correlation(a: Column, b: Column): number {
  return covariance(a, b) / Math.sqrt(spread(a) * spread(b));
}

/** Ranks from 1; for columns without ties. */
export function ranks(column: Column): number[] {
  const order = Array.from(column, (_, i) => i).sort((i, j) => (column[i] ?? 0) - (column[j] ?? 0));
  const result: number[] = new Array(column.length).fill(0);
  order.forEach((i, rank) => {
    result[i] = rank + 1;
  });
  return result;
}

/** Spearman's rank correlation. */
export function spearman(a: Column, b: Column): number {
  return correlation(ranks(a), ranks(b));
}
