import { describe, expect, it } from 'vitest';
import { transitionMatrix } from '../../../shared/engine/expm.ts';
import type { Row } from '../../../shared/model/document.ts';
import golden from '../../golden/rates.json' with { type: 'json' };
import { afterOneCycle } from './one-cycle.ts';

function row(
  from: string,
  rates: Record<string, number | string>,
  method: 'generator' | 'byRow' = 'generator',
): Row {
  const cells = Object.entries(rates).map(([to, rate]) => ({
    id: `${from}_${to}`,
    to,
    formula: `${rate}`,
  }));
  return { id: `row_${from}`, from, basis: 'rates', method, cells };
}

describe('chancesByRow', () => {
  // tests/golden/rates.json: the competing-risks formula, by R.
  for (const { inputs, expected } of golden.conversions.competing) {
    it(`agrees with competing risks of ${inputs.rates.join(', ')} over ${inputs.t}`, () => {
      const states = ['a', 'b', 'c', 'd'].slice(0, inputs.rates.length + 1);
      const rates = Object.fromEntries(inputs.rates.map((rate, k) => [states[k + 1]!, rate]));
      for (const method of ['byRow', 'generator'] as const) {
        const rows = [row('a', rates, method)];
        const { shares } = afterOneCycle({ rows, states, cycleLength: inputs.t });
        [expected.stay, ...expected.p].forEach((want, k) => {
          expect(Math.abs(shares[k]! - want)).toBeLessThanOrEqual(1e-12);
        });
      }
    });
  }

  it('stays where all rates are 0', () => {
    const rows = [row('a', { b: 'hazard(p_die, 1) - hazard(p_die, 1)' }, 'byRow')];
    const { shares, problems } = afterOneCycle({ rows, states: ['a', 'b'] });
    expect(shares).toEqual([1, 0]);
    expect(problems).toEqual([]);
  });
});

describe('chancesByGenerator', () => {
  // tests/golden/rates.json: R 4.2.2 with expm::expm(method = "Higham08.b").
  for (const { id, generator, at } of golden.matrix_exponential) {
    it(`gives the rows of R's matrix exponential, ${id}`, () => {
      const states = generator.map((_, k) => `s${k}`);
      const rows = generator.flatMap((line, from) => {
        const rates = line
          .map((rate, to) => [states[to]!, rate] as const)
          .filter(([, rate], to) => to !== from && rate !== 0);
        return rates.length > 0 ? [row(states[from]!, Object.fromEntries(rates))] : [];
      });
      for (const { t, P } of at) {
        P.forEach((want, from) => {
          const start = from === 0 ? {} : { [states[from]!]: 1 };
          const { shares } = afterOneCycle({ rows, states, cycleLength: t, start });
          want.forEach((p, to) => {
            expect(Math.abs(shares[to]! - p)).toBeLessThanOrEqual(1e-12);
          });
        });
      }
    });
  }

  it('holds those who come to a state of another basis until the cycle ends', () => {
    const other: Row = {
      id: 'row_b',
      from: 'b',
      basis: 'probabilities',
      remainder: 'b',
      cells: [{ id: 'b_c', to: 'c', formula: '0.9' }],
    };
    const { shares } = afterOneCycle({
      rows: [row('a', { b: 0.4 }), other],
      states: ['a', 'b', 'c'],
    });
    expect(shares[1]).toBeCloseTo(-Math.expm1(-0.4), 14);
    expect(shares[2]).toBe(0);
  });

  it('counts two moves within a cycle', () => {
    const rows = [row('a', { b: 1 }), row('b', { c: 2 })];
    const { shares } = afterOneCycle({ rows, states: ['a', 'b', 'c'] });
    const [want] = transitionMatrix(
      [
        [0, 1, 0],
        [0, 0, 2],
        [0, 0, 0],
      ],
      1,
    );
    want!.forEach((p, k) => {
      expect(shares[k]).toBeCloseTo(p, 14);
    });
  });

  it('reports a rate below 0', () => {
    const { problems } = afterOneCycle({
      rows: [row('a', { b: '0 - hazard(p_die, 1)' })],
      states: ['a', 'b'],
    });
    expect(problems[0]).toMatchObject({
      code: 'run.rateOutside',
      params: { value: expect.closeTo(Math.log(0.9), 14) },
    });
  });
});
