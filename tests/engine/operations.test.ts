import { describe, expect, it } from 'vitest';
import { binaryMeaning, unaryMeaning } from '../../shared/engine/operations.ts';
import { MEANING } from '../../shared/formula/meaning.ts';

describe('operations', () => {
  const values = [-2.5, -1, -0.5, 0, 0.49999999999999994, 0.5, 1, 2, 2.5];

  it('mean what the formula language says they mean', () => {
    const named = (name: string) => MEANING.get(name);
    for (const [name, meaning] of Object.entries(unaryMeaning)) {
      const want = named(name);
      if (want) for (const a of values) expect([name, a, meaning(a)]).toEqual([name, a, want(a)]);
    }
    for (const [name, meaning] of Object.entries(binaryMeaning)) {
      const want = named(name);
      if (!want) continue;
      for (const a of values) {
        for (const b of values)
          expect([name, a, b, meaning(a, b)]).toEqual([name, a, b, want(a, b)]);
      }
    }
  });

  it('has the exposure of a rate of 0 as the whole time', () => {
    expect(binaryMeaning.exposure(0, 2)).toBe(2);
    expect(binaryMeaning.exposure(1e-12, 2)).toBeCloseTo(2, 11);
    // Closed form (1 - exp(-a b)) / a.
    expect(binaryMeaning.exposure(0.7, 2)).toBeCloseTo((1 - Math.exp(-1.4)) / 0.7, 15);
  });
});
