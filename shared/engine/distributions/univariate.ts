/**
 * What every family of distributions gives. All functions are made of IEEE
 * arithmetic, `Math.sqrt` and @stdlib's plain-JavaScript functions, never of
 * `Math.exp` and its kin, so that a draw is the same to the last bit on every device.
 */
export interface Univariate {
  /** Smallest x with cdf(x) >= p; `p` in [0, 1], else NaN. */
  readonly quantile: (p: number) => number;
  /** P(X <= x). */
  readonly cdf: (x: number) => number;
  /** P(X > x), accurate where cdf(x) is close to 1. */
  readonly sf: (x: number) => number;
  /** Density; for `discrete` families the probability of exactly x. */
  readonly pdf: (x: number) => number;
  readonly logpdf: (x: number) => number;
  /** May be Infinity, or NaN where it does not exist. */
  readonly mean: number;
  readonly variance: number;
  /** Smallest and largest value, limits included. */
  readonly support: readonly [number, number];
  /** Holds probability at single values, so that sf(x) is not P(X >= x). */
  readonly discrete?: boolean;
}

/** True where `p` is a probability; NaN is not. */
export function isProbability(p: number): boolean {
  return p >= 0 && p <= 1;
}
