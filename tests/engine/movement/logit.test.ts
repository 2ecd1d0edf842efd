import { describe, expect, it } from 'vitest';
import type { Row } from '../../../shared/model/document.ts';
import golden from '../../golden/rates.json' with { type: 'json' };
import { afterOneCycle } from './one-cycle.ts';

const STATES = ['a', 'b', 'c', 'd'];

function row(predictors: readonly number[]): Row {
  return {
    id: 'row',
    from: 'a',
    basis: 'logit',
    reference: 'a',
    cells: predictors.map((eta, k) => ({ id: `cell${k}`, to: STATES[k + 1]!, formula: `${eta}` })),
  };
}

describe('logitChances', () => {
  // tests/golden/rates.json, closed form by R; the last case overflows exp().
  for (const [index, { expected }] of golden.conversions.multinomial_logit.entries()) {
    it(`agrees with the multinomial logit, case ${index + 1}`, () => {
      const predictors = expected.linear_predictor;
      const states = STATES.slice(0, predictors.length + 1);
      const { shares, problems } = afterOneCycle({ rows: [row(predictors)], states });
      expect(problems).toEqual([]);
      expected.p_reference_first.forEach((want, k) => {
        expect(Math.abs(shares[k]! - want)).toBeLessThanOrEqual(1e-12);
      });
    });
  }

  it('reports a predictor that is no number', () => {
    const bad: Row = {
      ...row([0]),
      cells: [{ id: 'x', to: 'b', formula: 'ln(p_die - 1)' }],
    } as Row;
    const { problems } = afterOneCycle({ rows: [bad], states: ['a', 'b'] });
    expect(problems[0]).toMatchObject({ code: 'run.logOddsOutside', params: { value: 'NaN' } });
  });
});
