import { describe, expect, it } from 'vitest';
import type { Row } from '../../../shared/model/document.ts';
import golden from '../../golden/rates.json' with { type: 'json' };
import { afterOneCycle } from './one-cycle.ts';

const STATES = ['a', 'b', 'c', 'd'];

function row(formulas: readonly string[]): Row {
  return {
    id: 'row',
    from: 'a',
    basis: 'probabilities',
    remainder: 'a',
    cells: formulas.map((formula, k) => ({ id: `cell${k}`, to: STATES[k + 1]!, formula })),
  };
}

describe('probabilityChances', () => {
  // tests/golden/rates.json, closed form: counts over their sum, and a relative risk on every exit.
  it('takes count fractions and leaves the remainder', () => {
    const { inputs, expected } = golden.conversions.row_normalise_counts[0]!;
    const { counts } = inputs;
    const total = counts.reduce((sum, n) => sum + n, 0);
    const formulas = counts.slice(1).map((n) => `${n} / ${total}`);
    const { shares } = afterOneCycle({ rows: [row(formulas)], states: STATES });
    expected.p.forEach((want, k) => {
      expect(shares[k]).toBeCloseTo(want, 14);
    });
  });

  it('applies a relative risk to every exit', () => {
    for (const { inputs, expected } of golden.conversions.row_relative_risk) {
      const exits = inputs.row.filter((_, k) => k + 1 !== inputs.stay_index_1based);
      const formulas = exits.map((p) => `times_risk(${p}, ${inputs.rr})`);
      const states = STATES.slice(0, exits.length + 1);
      const { shares } = afterOneCycle({ rows: [row(formulas)], states });
      expect(shares[0]).toBeCloseTo(expected.row[inputs.stay_index_1based - 1]!, 14);
    }
  });

  it('reports a remainder below 0 and does not clip it', () => {
    const { shares, problems } = afterOneCycle({ rows: [row(['0.7', '0.6'])], states: STATES });
    expect(shares[0]).toBeCloseTo(-0.3, 14);
    expect(problems).toEqual([
      {
        code: 'run.remainderOutside',
        severity: 'error',
        path: ['movements', 'rows', 0, 'remainder'],
        params: {
          count: 1,
          draw: 0,
          cycle: 0,
          strategy: 'usual',
          profile: 'all',
          value: expect.closeTo(-0.3, 14),
        },
      },
    ]);
  });

  it('reports a probability outside [0, 1]', () => {
    const { problems } = afterOneCycle({ rows: [row(['p_die - 0.2', '0.3'])], states: STATES });
    expect(problems.map(({ code, path }) => [code, path.join('.')])).toEqual([
      ['run.probabilityOutside', 'movements.rows.0.cells.0.formula'],
    ]);
  });
});
