import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { type AgainstRow, againstComparator } from '../../shared/analysis/against-comparator.ts';
import type { Option } from '../../shared/analysis/option.ts';
import { options, RUNS } from './arbitrary.ts';
import { expectClose } from './close.ts';
import { optionsOf, tables } from './golden.ts';

// Source: tests/golden (base R 4.2.2) `icer_vs_first_named`, a plain ratio there, and `nmb`.
describe.each(tables)('golden table $id', ({ table }) => {
  it.each(table.nmb)('at $threshold', ({ threshold, nmb }) => {
    const first = table.strategies[0] as string;
    const rows = againstComparator(optionsOf(table), first, threshold);
    rows.forEach((row, i) => {
      const want = (nmb[i] as number) - (nmb[0] as number);
      expect(Math.abs(row.inmb - want)).toBeLessThanOrEqual(1e-9 * Math.max(1, Math.abs(want)));
      const ratio = row.icer ?? row.savingsPerUnitLost;
      if (ratio !== null) expectClose(ratio, table.icer_vs_first_named[i] as number, 1e-8);
      else expect(['comparator', 'noDifference', 'dominated', 'dominates']).toContain(row.word);
    });
  });
});

describe('againstComparator', () => {
  const word = (cost: number, health: number): AgainstRow =>
    againstComparator(
      [
        { id: 'base', cost: 100, health: 5 },
        { id: 'x', cost: 100 + cost, health: 5 + health },
      ],
      'base',
      1000,
    )[1] as AgainstRow;

  it.each([
    [0, 0, 'noDifference', null, null],
    [0, 1, 'dominates', null, null],
    [-50, 0, 'dominates', null, null],
    [-50, 1, 'dominates', null, null],
    [0, -1, 'dominated', null, null],
    [50, 0, 'dominated', null, null],
    [50, -1, 'dominated', null, null],
    [50, 2, 'moreCostlyMoreEffective', 25, null],
    [-50, -2, 'lessCostlyLessEffective', null, 25],
  ])('cost %d and health %d: %s', (cost, health, expected, icer, savingsPerUnitLost) => {
    expect(word(cost, health)).toMatchObject({ word: expected, icer, savingsPerUnitLost });
    expect(word(cost, health).inmb).toBe(1000 * health - cost);
  });

  it('refuses a comparator that is not among the strategies', () => {
    expect(() => againstComparator([], 'x', 1)).toThrow(RangeError);
  });

  it('T41: swapping the two arms reverses the signs', () => {
    const opposite: Record<string, string> = {
      dominates: 'dominated',
      dominated: 'dominates',
      moreCostlyMoreEffective: 'lessCostlyLessEffective',
      lessCostlyLessEffective: 'moreCostlyMoreEffective',
      noDifference: 'noDifference',
    };
    const pairs = options.filter((list) => list.length > 1);
    fc.assert(
      fc.property(pairs, fc.integer({ min: 0, max: 100_000 }), (list, threshold) => {
        const [a, b] = list as [Option, Option];
        const ahead = againstComparator([a, b], a.id, threshold)[1] as AgainstRow;
        const back = againstComparator([a, b], b.id, threshold)[0] as AgainstRow;
        expect(back.incrementalCost).toBe(0 - ahead.incrementalCost);
        expect(back.incrementalHealth).toBe(0 - ahead.incrementalHealth);
        expect(back.inmb + ahead.inmb).toBe(0);
        expect(back.word).toBe(opposite[ahead.word]);
        expect(back.savingsPerUnitLost).toBe(ahead.icer);
        expect(back.icer).toBe(ahead.savingsPerUnitLost);
      }),
      RUNS,
    );
  });
});
