/**
 * A probability as a natural frequency, "65 of 100": easier to understand than a
 * percentage (Gigerenzer and Edwards 2003, BMJ 327:741-744; from memory).
 */
export interface Frequency {
  readonly count: number;
  readonly of: 100;
  /** `below`: fewer than `count`; `above`: more. Rounding must not make a chance certain. */
  readonly bound: 'about' | 'below' | 'above';
}

/** @param probability 0 to 1 */
export function naturalFrequency(probability: number): Frequency {
  const count = Math.round(100 * probability);
  if (count === 0 && probability > 0) return { count: 1, of: 100, bound: 'below' };
  if (count === 100 && probability < 1) return { count: 99, of: 100, bound: 'above' };
  return { count, of: 100, bound: 'about' };
}
