/** Plain square matrices as rows of numbers. */

export type Matrix = number[][];

export function zeros(size: number): Matrix {
  return Array.from({ length: size }, () => new Array<number>(size).fill(0));
}

/** A row vector times a matrix. */
function times(row: readonly number[], matrix: Matrix): number[] {
  const sums = new Array<number>(row.length).fill(0);
  row.forEach((factor, k) => {
    const other = matrix[k] as number[];
    for (let j = 0; j < sums.length; j++)
      sums[j] = (sums[j] as number) + factor * (other[j] as number);
  });
  return sums;
}

/** Enough terms of 1/n! for the last to vanish beside 1. */
const TERMS = 20;

/**
 * Row i of the matrix exponential: the unit vector i moved in steps so short that
 * Taylor's series of each converges at once.
 */
export function exponentialRow(matrix: Matrix, i: number): number[] {
  const norm = Math.max(...matrix.map((row) => row.reduce((sum, x) => sum + Math.abs(x), 0)));
  const steps = Math.max(1, Math.ceil(norm));
  const short = matrix.map((row) => row.map((x) => x / steps));
  let moved: number[] = matrix.map((_, j) => (i === j ? 1 : 0));
  for (let step = 0; step < steps; step++) {
    let term: number[] = moved;
    for (let n = 1; n <= TERMS; n++) {
      term = times(term, short).map((x) => x / n);
      moved = moved.map((x, j) => x + (term[j] as number));
    }
  }
  return moved;
}
