/**
 * When two results count as equal: rounding in the order of a sum must neither make
 * a frontier step of two equal strategies nor hide that they are equal.
 */

/** Relative difference up to which two values are the same. */
export const TIE = 1e-12;

export function tied(a: number, b: number): boolean {
  return Math.abs(a - b) <= TIE * Math.max(Math.abs(a), Math.abs(b));
}

/** Difference a - b, exactly 0 where the two are tied. */
export function difference(a: number, b: number): number {
  return tied(a, b) ? 0 : a - b;
}

/**
 * The values with those that are tied made equal (to the smallest of them), so that
 * what follows can compare exactly and stay transitive.
 */
export function snap(values: readonly number[]): number[] {
  const snapped = [...values];
  const order = values.map((_, index) => index).sort((i, j) => at(values, i) - at(values, j));
  let first = Number.NaN;
  for (const index of order) {
    if (!tied(at(values, index), first)) first = at(values, index);
    snapped[index] = first;
  }
  return snapped;
}

function at(values: readonly number[], index: number): number {
  return values[index] as number;
}
