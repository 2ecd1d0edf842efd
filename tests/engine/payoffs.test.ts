import { describe, expect, it } from 'vitest';
import { prepare } from '../../shared/engine/engine.ts';
import type { ModelDocument, Payoff } from '../../shared/model/document.ts';
import { tinyDocument } from '../fixtures/tiny-document.ts';

/** Cost of usual care with the one payoff, undiscounted unless a rate is given. */
function costOf(
  payoff: Partial<Payoff> & { type: Payoff['type'] },
  question: Partial<ModelDocument['question']> = {},
) {
  const tiny = tinyDocument();
  const discounting = { costs: 0, outcomes: 0, at: 'counted' as const, wholeYears: false };
  const whole = { id: 'x', label: 'X', measure: 'cost', category: 'X', ...payoff } as Payoff;
  const document = {
    ...tiny,
    question: { ...tiny.question, counting: 'end' as const, discounting, ...question },
    payoffs: [whole],
  };
  return prepare(document).base().strategies[0]!.cost;
}

// A tenth dies each year for 10 years; expected values by hand.
const alive = (k: number) => 0.9 ** k;
const years = (from: number, to: number) => {
  let sum = 0;
  for (let k = from; k <= to; k++) sum += alive(k);
  return sum;
};

describe('payoffTerms', () => {
  it('pays for time in states by the year or by the cycle', () => {
    const amounts = [{ id: 'a', state: 'alive', formula: '7' }];
    expect(costOf({ type: 'state', per: 'year', amounts })).toBeCloseTo(7 * years(1, 10), 12);
    const half = { cycleLength: 0.5 };
    const twenty = Array.from({ length: 20 }, (_, k) => alive(k + 1)).reduce((a, b) => a + b);
    expect(costOf({ type: 'state', per: 'year', amounts }, half)).toBeCloseTo(3.5 * twenty, 12);
    expect(costOf({ type: 'state', per: 'cycle', amounts }, half)).toBeCloseTo(7 * twenty, 12);
  });

  it('pays on moving, in the cycle of the move', () => {
    const move = { type: 'movement', from: 'alive', to: 'dead', formula: '100' } as const;
    expect(costOf(move)).toBeCloseTo(100 * (1 - alive(10)), 12);
    expect(costOf({ ...move, from: undefined })).toBeCloseTo(100 * (1 - alive(10)), 12);
    expect(costOf({ ...move, to: undefined })).toBeCloseTo(100 * (1 - alive(10)), 12);
    const first = { ...move, formula: 'if(cycle == 0, 100, 0)' };
    expect(costOf(first)).toBeCloseTo(10, 12);
  });

  it('does not count staying as a move', () => {
    expect(costOf({ type: 'movement', to: 'alive', formula: '1' })).toBe(0);
  });

  it('pays once, to those then alive or in the states named', () => {
    expect(costOf({ type: 'once', cycle: 3, formula: '50' })).toBeCloseTo(50 * alive(3), 12);
    expect(costOf({ type: 'once', cycle: 3, states: ['dead'], formula: '50' })).toBeCloseTo(
      50 * (1 - alive(3)),
      12,
    );
    expect(costOf({ type: 'once', cycle: 3, formula: 'cycle' })).toBeCloseTo(3 * alive(3), 12);
    expect(costOf({ type: 'once', cycle: 10, formula: '1' })).toBeCloseTo(alive(10), 12);
    expect(costOf({ type: 'once', cycle: 11, formula: '1' })).toBe(0);
  });

  it('discounts a one-off at its boundary', () => {
    const discounting = { costs: 0.05, outcomes: 0, at: 'counted' as const, wholeYears: false };
    const cost = costOf({ type: 'once', cycle: 3, formula: '50' }, { discounting });
    expect(cost).toBeCloseTo((50 * alive(3)) / 1.05 ** 3, 12);
  });

  it('pays at the start for the whole cohort, undiscounted', () => {
    const discounting = { costs: 0.05, outcomes: 0, at: 'counted' as const, wholeYears: false };
    expect(costOf({ type: 'start', formula: 'c_year + cycle' }, { discounting })).toBe(100);
  });

  it('pays only in the strategies named', () => {
    expect(costOf({ type: 'start', strategies: ['treatment'], formula: '5' })).toBe(0);
  });
});
