/**
 * Sample percentile of type 7 (R's default): linear between the order statistics, the
 * p-th at position 1 + (n - 1) p.
 * Source: Hyndman and Fan 1996, The American Statistician 50:361-365 (from memory).
 * @param sorted rising, 1 value or more.
 * @param p 0 to 1.
 */
export function percentile(sorted: ArrayLike<number>, p: number): number {
  const position = (sorted.length - 1) * p;
  const below = Math.floor(position);
  const low = sorted[below] as number;
  const high = sorted[Math.min(below + 1, sorted.length - 1)] as number;
  return low + (position - below) * (high - low);
}
