/** Bounds on one formula, so that no text can exhaust the stack or the clock. */
export interface Limits {
  /** UTF-16 units. */
  readonly length: number;
  /**
   * Levels of the expression, and brackets open at once. Each operator of a chain
   * `a + b + c` is a level; `sum(a, b, c)` is one.
   */
  readonly depth: number;
  /** Numbers, names and calls. */
  readonly nodes: number;
}

export const LIMITS: Limits = { length: 4_000, depth: 200, nodes: 5_000 };
