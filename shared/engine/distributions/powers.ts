/** Powers and logs that do not fail where a factor is 0. */
import ln from '@stdlib/math-base-special-ln';
import log1p from '@stdlib/math-base-special-log1p';

/** y ln(x), 0 where y is 0 (the limit). */
export function timesLog(y: number, x: number): number {
  return y === 0 ? 0 : y * ln(x);
}

/** y ln(1 + x), 0 where y is 0. */
export function timesLog1p(y: number, x: number): number {
  return y === 0 ? 0 : y * log1p(x);
}
