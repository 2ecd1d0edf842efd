import type { Question } from './document.ts';

/** How far from a whole number of cycles a horizon may be, relative, without a word. */
const WHOLE = 1e-9;

type Span = Pick<Question, 'horizon' | 'cycleLength'>;

/** Horizon over cycle length, before it is made whole. */
export function exactCycles(question: Span): number {
  return question.horizon / question.cycleLength;
}

/**
 * Number of cycles that the model runs: the horizon in cycles, to the nearest whole
 * number and at least 1. A horizon that is no whole number of cycles (ten years of
 * weeks of 7/365.25 years are 521.79) is reported by `checkReferences`, not refused.
 */
export function cycleCount(question: Span): number {
  return Math.max(1, Math.round(exactCycles(question)));
}

/** Whether the horizon is a whole number of cycles, to 1e-9 relative. */
export function isWholeCycles(question: Span): boolean {
  const exact = exactCycles(question);
  return Math.abs(exact - cycleCount(question)) <= WHOLE * exact;
}
