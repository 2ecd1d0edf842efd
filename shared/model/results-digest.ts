import { digestOf } from './digest.ts';

/** Digits that two runs have to share. */
const DIGITS = 10;
/** Below this a number is what a subtraction left over, and counts as 0. */
const NEGLIGIBLE = 1e-12;

/**
 * Digest of results: that of their canonical form with each number rounded to 10
 * significant digits, because `Math.exp` and its kin differ in the last bits between
 * browsers. Two digests that agree mean the same results to those digits; two that
 * differ can still come from one number that lies on the edge of rounding. Numbers
 * that are not finite take part by name, typed arrays as lists.
 */
export function digestOfResults(value: unknown): string {
  return digestOf(rounded(value));
}

function rounded(value: unknown): unknown {
  if (typeof value === 'number') return roundedNumber(value);
  if (typeof value !== 'object' || value === null) return value;
  if (ArrayBuffer.isView(value)) return Array.from(value as Float64Array, rounded);
  if (Array.isArray(value)) return value.map(rounded);
  return Object.fromEntries(Object.entries(value).map(([key, part]) => [key, rounded(part)]));
}

function roundedNumber(value: number): number | string {
  if (!Number.isFinite(value)) return String(value);
  if (Math.abs(value) < NEGLIGIBLE) return 0;
  return Number(value.toPrecision(DIGITS));
}
