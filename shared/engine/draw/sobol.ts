/**
 * Sobol sequences (Sobol 1967) with the direction numbers of Joe and Kuo 2008, found point
 * by point: point i is the exclusive or of the directions of the bits of i (Bratley and Fox
 * 1988, ACM TOMS 14:88-100).
 */
import { SOBOL_DIRECTIONS } from './sobol-directions.ts';

const BITS = 32;
const ROWS = SOBOL_DIRECTIONS.trim().split('\n');

/** Number of dimensions of the table. */
export const SOBOL_DIMENSIONS = ROWS.length;

/** The 32 directions of dimension `dimension` (from 0), the first digit in the highest bit. */
export function sobolDirections(dimension: number): Uint32Array {
  const [polynomial = 1, ...initial] = (ROWS[dimension] ?? '').split(' ').map(Number);
  const degree = initial.length;
  const directions = new Uint32Array(BITS);
  for (let k = 0; k < BITS; k++) {
    const given = degree === 0 ? 1 : initial[k];
    directions[k] =
      given === undefined ? recur(directions, k, degree, polynomial) : given << (BITS - 1 - k);
  }
  return directions;
}

/** v_k from the `degree` directions before it and the bits of the primitive polynomial. */
function recur(directions: Uint32Array, k: number, degree: number, polynomial: number): number {
  const oldest = directions[k - degree] ?? 0;
  let value = oldest ^ (oldest >>> degree);
  for (let j = 1; j < degree; j++) {
    if ((polynomial >>> (degree - j)) & 1) value ^= directions[k - j] ?? 0;
  }
  return value;
}

/** Point `index` as a 32-bit word: the coordinate times 2^32. */
export function sobolPoint(directions: Uint32Array, index: number): number {
  let word = 0;
  for (let k = 0, rest = index; rest > 0; k++, rest >>>= 1) {
    if (rest & 1) word ^= directions[k] ?? 0;
  }
  return word >>> 0;
}
