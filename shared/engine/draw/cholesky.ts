/** Cholesky factor of a covariance or correlation matrix. */

/**
 * Lower triangular L with L L' = `matrix`, row by row, or undefined where the matrix is not
 * positive definite. Reads the lower triangle only (Golub and Van Loan 2013, section 4.2).
 */
export function cholesky(matrix: readonly (readonly number[])[]): number[][] | undefined {
  const lower: number[][] = [];
  for (let i = 0; i < matrix.length; i++) {
    const row: number[] = [];
    for (let j = 0; j <= i; j++) {
      const other = j === i ? row : (lower[j] ?? []);
      const rest = (matrix[i]?.[j] ?? Number.NaN) - dot(row, other, j);
      if (j < i) row.push(rest / (other[j] ?? Number.NaN));
      else if (rest > (matrix[i]?.[i] ?? 0) * 1e-12) row.push(Math.sqrt(rest));
      else return undefined;
    }
    lower.push(row);
  }
  return lower;
}

function dot(a: readonly number[], b: readonly number[], length: number): number {
  let sum = 0;
  for (let k = 0; k < length; k++) sum += (a[k] ?? 0) * (b[k] ?? 0);
  return sum;
}
