/**
 * Dirichlet draws: independent gammas of the counts' shapes, each over their sum (Devroye
 * 1986, Non-uniform random variate generation, chapter 11).
 */
import { gammaInverse } from '../distributions/regularised-gamma.ts';

/** Below this count a gamma draw can be too small for a number; logs would be needed. */
const SMALLEST = 1e-300;

/** A column a member (rows sum to 1) from a column of uniforms a member. */
export function drawDirichlet(
  counts: readonly number[],
  uniforms: readonly Float64Array[],
): Float64Array[] {
  const gammas = counts.map(
    (count, i) =>
      uniforms[i]?.map((u) => Math.max(gammaInverse(count, u), SMALLEST)) ?? new Float64Array(),
  );
  return gammas.map((column) => column.map((value, d) => value / rowSum(gammas, d)));
}

function rowSum(columns: readonly Float64Array[], d: number): number {
  let sum = 0;
  for (const column of columns) sum += column[d] ?? 0;
  return sum;
}
