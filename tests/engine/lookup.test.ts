import { describe, expect, it } from 'vitest';
import { lookupOf } from '../../shared/engine/lookup.ts';
import type { Table } from '../../shared/model/document.ts';

function table(interpolation: 'step' | 'linear', second = false): Table {
  return {
    id: 't',
    symbol: 't',
    label: 'Table',
    interpolation,
    keys: [
      { label: 'age', points: [0, 10, 30] },
      ...(second ? [{ label: 'sex', points: [0, 1] }] : []),
    ],
    values: second ? [1, 2, 3, 6, 5, 10] : [1, 3, 5],
  };
}

// Expected values by hand.
describe('lookupOf', () => {
  it('takes the last point not above the key, and holds at the ends', () => {
    const lookup = lookupOf(table('step'));
    expect([-5, 0, 9.99, 10, 29, 30, 99].map((key) => lookup(key))).toEqual([1, 1, 1, 3, 3, 5, 5]);
  });

  it('draws straight lines, and holds at the ends', () => {
    const lookup = lookupOf(table('linear'));
    expect([-5, 0, 5, 10, 20, 30, 99].map((key) => lookup(key))).toEqual([1, 1, 2, 3, 4, 5, 5]);
  });

  it('reads two keys, the second varying fastest', () => {
    const lookup = lookupOf(table('step', true));
    expect(lookup(12, 0)).toBe(3);
    expect(lookup(12, 1)).toBe(6);
    expect(lookup(12, 0.9)).toBe(3);
  });

  it('is linear in both keys', () => {
    const lookup = lookupOf(table('linear', true));
    expect(lookup(5, 0.5)).toBeCloseTo((2 + 4) / 2, 15);
    expect(lookup(20, 1)).toBeCloseTo(8, 15);
  });

  it('passes on what is no number', () => {
    for (const interpolation of ['step', 'linear'] as const) {
      expect(lookupOf(table(interpolation, true))(Number.NaN, 1)).toBeNaN();
      expect(lookupOf(table(interpolation, true))(5, Number.NaN)).toBeNaN();
    }
  });
});
