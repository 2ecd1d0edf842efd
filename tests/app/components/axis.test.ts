import fc from 'fast-check';
import { expect, it } from 'vitest';
import { axis } from '../../../src/components/axis.ts';

it('spans the data on round numbers with room at both ends', () => {
  expect(axis([412, 438, 561, 590], 6).ticks).toEqual([350, 400, 450, 500, 550, 600, 650]);
});

it('tells its ticks apart by their decimals', () => {
  const { ticks, decimals } = axis([18.07, 18.242], 6);
  expect(new Set(ticks.map((tick) => tick.toFixed(decimals))).size).toBe(ticks.length);
});

it('has a length for a single value, and for none but 0', () => {
  expect(axis([5], 5).high).toBeGreaterThan(5);
  expect(axis([0, 0], 5).high).toBeGreaterThan(0);
});

it('holds any data, with few ticks, told apart by their decimals', () => {
  const value = fc.double({ min: -1e6, max: 1e6, noNaN: true });
  fc.assert(
    fc.property(fc.array(value, { minLength: 2, maxLength: 8 }), (values) => {
      const span = Math.max(...values) - Math.min(...values);
      fc.pre(span > 1e-3);
      const { low, high, ticks, decimals } = axis(values, 6);
      expect(low).toBeLessThanOrEqual(Math.min(...values));
      expect(high).toBeGreaterThanOrEqual(Math.max(...values));
      expect(ticks.length).toBeLessThanOrEqual(8);
      expect(new Set(ticks.map((tick) => tick.toFixed(decimals))).size).toBe(ticks.length);
    }),
    { seed: 20_261_201 },
  );
});
