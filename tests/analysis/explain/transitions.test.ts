import { describe, expect, it } from 'vitest';
import { transitionMatrixAt } from '../../../shared/analysis/explain/transitions.ts';
import { exampleOf } from '../../examples/load.ts';
import { golden } from '../golden.ts';
import { CASES } from './examples.ts';

interface Published {
  published_example: {
    transition_monotherapy: number[][];
    transition_combination: number[][];
  };
}

describe('transitionMatrixAt', () => {
  const hiv = exampleOf('hiv-combination-therapy');
  const { published_example: published } = golden('cohort.json') as Published;
  const [mono, combination] = hiv.strategies.map(({ id }) => id) as [string, string];

  // tests/golden/cohort.json: base R 4.2.2, checked by matrix powers in Python.
  it('gives the matrices of the HIV example', () => {
    const expectMatrix = (strategy: string, cycle: number, want: number[][]) => {
      transitionMatrixAt(hiv, strategy, null, cycle)!.forEach((row, from) => {
        row.forEach((chance, to) => {
          expect(chance).toBeCloseTo(want[from]![to]!, 12);
        });
      });
    };
    expectMatrix(mono, 0, published.transition_monotherapy);
    expectMatrix(mono, 19, published.transition_monotherapy);
    expectMatrix(combination, 1, published.transition_combination);
    expectMatrix(combination, 2, published.transition_monotherapy);
  });

  it.each(CASES)('has rows that sum to 1 in $name', ({ document, base }) => {
    const survival = document.movements.type === 'survival';
    for (const { id } of document.strategies) {
      for (const profile of [null, document.profiles[0]!.id]) {
        const matrix = transitionMatrixAt(document, id, profile, base.cycles - 1);
        expect(matrix === null).toBe(survival);
        for (const row of matrix ?? []) {
          expect(row.reduce((sum, chance) => sum + chance, 0)).toBeCloseTo(1, 12);
        }
      }
    }
  });

  it('refuses a cycle beyond the horizon', () => {
    expect(() => transitionMatrixAt(hiv, mono, null, 20)).toThrow(RangeError);
    expect(() => transitionMatrixAt(hiv, mono, null, -1)).toThrow(RangeError);
  });
});
