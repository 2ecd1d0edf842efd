import { expect } from 'vitest';

/** |got - want| <= tolerance x |want|; exactly 0 where 0 is wanted. */
export function expectClose(got: unknown, want: number, tolerance: number): void {
  const apart = typeof got === 'number' ? Math.abs(got - want) : Number.NaN;
  expect(apart, `${got} against ${want}`).toBeLessThanOrEqual(tolerance * Math.abs(want));
}
