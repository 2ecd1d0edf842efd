import { describe, expect, it } from 'vitest';
import { byCategory, byProfile, byState } from '../../../shared/analysis/breakdown/breakdown.ts';
import { prepare } from '../../../shared/engine/engine.ts';
import { tinyDocument } from '../../fixtures/tiny-document.ts';
import { CASES, off } from '../explain/examples.ts';

const measures = ['cost', 'outcome'] as const;
const splits = [byCategory, byState, byProfile];

describe('breakdowns', () => {
  it.each(CASES)('sum to the totals of $name (T26)', ({ document, base }) => {
    for (const split of splits) {
      for (const measure of measures) {
        const { parts, strategies } = split(document, base, measure);
        strategies.forEach(({ id, values, rest, total }, index) => {
          expect(id).toBe(base.strategies[index]!.id);
          expect(total).toBe(base.strategies[index]![measure]);
          expect(values.length).toBe(parts.length);
          const sum = values.reduce((all, value) => all + value, rest);
          expect(off(sum, total), `${split.name} ${measure}`).toBeLessThan(1e-12);
          if (split !== byState) expect(rest).toBe(0);
        });
      }
    }
  });

  it('keep the document order, and what no state earned apart', () => {
    const tiny = tinyDocument();
    const payoffs = [
      ...tiny.payoffs,
      {
        id: 'screen',
        label: 'Screening',
        measure: 'cost' as const,
        category: 'Tests',
        type: 'start' as const,
        formula: '7',
      },
    ];
    const document = tinyDocument({ payoffs });
    const base = prepare(document).base();
    const categories = byCategory(document, base, 'cost');
    expect(categories.parts).toEqual(['Medicines', 'Tests']);
    expect(categories.strategies[0]!.values).toEqual([0, 7]);
    const states = byState(document, base, 'cost');
    expect(states.parts).toEqual(['alive']);
    expect(states.strategies[0]).toMatchObject({ values: [0], rest: 7, total: 7 });
  });
});
