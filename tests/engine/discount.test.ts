import { describe, expect, it } from 'vitest';
import { discountFactor } from '../../shared/engine/discount.ts';

// Expected values by hand from the definition (1 + r)^-t.
describe('discountFactor', () => {
  it('is (1 + r)^-t', () => {
    expect(discountFactor(0.03, 2.5, false)).toBeCloseTo(1.03 ** -2.5, 15);
    expect(discountFactor(0, 40, false)).toBe(1);
    expect(discountFactor(0.06, 0, false)).toBe(1);
  });

  it('steps at anniversaries, in spite of rounding', () => {
    expect(discountFactor(0.03, 0.99, true)).toBe(1);
    expect(discountFactor(0.03, 12 * (1 / 12), true)).toBeCloseTo(1 / 1.03, 15);
    expect(discountFactor(0.03, 36 * (1 / 12) - 1e-14, true)).toBeCloseTo(1.03 ** -3, 15);
  });

  it('takes each year at its own rate and holds the last', () => {
    const rate = { byYear: [0.05, 0.02] };
    expect(discountFactor(rate, 0.5, false)).toBeCloseTo(1.05 ** -0.5, 15);
    expect(discountFactor(rate, 1, false)).toBeCloseTo(1 / 1.05, 15);
    expect(discountFactor(rate, 3.5, false)).toBeCloseTo(1 / 1.05 / 1.02 ** 2.5, 15);
    expect(discountFactor(rate, 3.5, true)).toBeCloseTo(1 / 1.05 / 1.02 ** 2, 15);
  });

  it('equals the single rate where every year has it', () => {
    for (const time of [0, 0.3, 1, 2.7, 9]) {
      const listed = discountFactor({ byYear: [0.04, 0.04, 0.04] }, time, false);
      expect(listed).toBeCloseTo(discountFactor(0.04, time, false), 14);
    }
  });

  it('falls with time where the rate is above 0 (T31)', () => {
    const factors = [0, 0.5, 1, 5, 40].map((time) => discountFactor(0.03, time, false));
    expect(factors).toEqual([...factors].sort((a, b) => b - a));
  });
});
