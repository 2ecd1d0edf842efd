/** Comparison of numbers with a stated tolerance. */
import { expect } from 'vitest';

/** |got - want| <= tolerance * |want|; equal where either is 0, infinite or NaN. */
export function expectRelative(got: number, want: number, tolerance: number, what: string): void {
  const same = Object.is(got, want) || got === want;
  const near = Math.abs(got - want) <= tolerance * Math.abs(want);
  expect(same || near, `${what}: got ${got}, want ${want}`).toBe(true);
}

/** |got - want| <= tolerance * max(1, |want|), the rule of tests/golden/README.md. */
export function expectClose(got: number, want: number, tolerance: number, what: string): void {
  const same = Object.is(got, want) || got === want;
  const near = Math.abs(got - want) <= tolerance * Math.max(1, Math.abs(want));
  expect(same || near, `${what}: got ${got}, want ${want}`).toBe(true);
}
