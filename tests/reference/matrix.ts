/** Plain square matrices as rows of numbers. */

export type Matrix = number[][];

export function zeros(size: number): Matrix {
  return Array.from({ length: size }, () => new Array<number>(size).fill(0));
}

export function identity(size: number): Matrix {
  return Array.from({ length: size }, (_, i) =>
    Array.from({ length: size }, (_, j) => (i === j ? 1 : 0)),
  );
}

export function multiply(a: Matrix, b: Matrix): Matrix {
  return a.map((row) => {
    const sums = new Array<number>(row.length).fill(0);
    for (let k = 0; k < row.length; k++) {
      const factor = row[k] as number;
      const other = b[k] as number[];
      if (factor === 0) continue;
      for (let j = 0; j < row.length; j++) {
        sums[j] = (sums[j] as number) + factor * (other[j] as number);
      }
    }
    return sums;
  });
}

/**
 * Matrix exponential: Taylor's series of the matrix halved until its entries are
 * small, then squared as often (scaling and squaring; Moler and Van Loan 2003,
 * SIAM Review 45, method 3, from memory).
 */
export function exponential(matrix: Matrix): Matrix {
  const norm = Math.max(...matrix.map((row) => row.reduce((sum, x) => sum + Math.abs(x), 0)));
  let halvings = 0;
  while (norm / 2 ** halvings > 0.25) halvings++;
  const small = matrix.map((row) => row.map((x) => x / 2 ** halvings));
  let term = identity(matrix.length);
  let sum = term;
  for (let n = 1; n <= 14; n++) {
    term = multiply(term, small).map((row) => row.map((x) => x / n));
    sum = sum.map((row, i) => row.map((x, j) => x + ((term[i] as number[])[j] as number)));
  }
  for (; halvings > 0; halvings--) sum = multiply(sum, sum);
  return sum;
}
