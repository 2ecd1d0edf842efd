import { describe, expect, it } from 'vitest';
import { compile } from '../../shared/engine/compile.ts';
import { detailTallies } from '../../shared/engine/detail.ts';
import { prepare } from '../../shared/engine/engine.ts';
import type { ModelDocument } from '../../shared/model/document.ts';
import { tinyDocument } from '../fixtures/tiny-document.ts';

const funeral: ModelDocument['payoffs'][number] = {
  id: 'funeral',
  label: 'Funeral',
  measure: 'cost',
  category: 'Funerals',
  type: 'movement',
  to: 'dead',
  formula: '20',
};

describe('detailTallies', () => {
  it('has one tally for each payoff and state, and one for life years', () => {
    const document = tinyDocument({ payoffs: [...tinyDocument().payoffs, funeral] });
    const { keys, plan } = detailTallies(compile(document));
    expect(keys).toEqual(
      expect.arrayContaining([
        { payoff: 0, state: 0 },
        { payoff: 1, state: 0 },
        { payoff: 2, state: null },
      ]),
    );
    expect(plan.tallies).toBe(keys.length + 1);
    expect(plan.lifeYears).toBe(keys.length);
  });
});

describe('readDetail', () => {
  it('names payoffs, categories and states', () => {
    const document = tinyDocument({ payoffs: [...tinyDocument().payoffs, funeral] });
    const { byPayoff } = prepare(document).base().strategies[1]!;
    expect(byPayoff.map(({ payoff, category, state }) => [payoff, category, state])).toEqual(
      expect.arrayContaining([
        ['drug', 'Medicines', 'alive'],
        ['qalys', 'QALYs', 'alive'],
        ['funeral', 'Funerals', null],
      ]),
    );
  });

  it('traces whole states, profiles weighted by their shares (T1)', () => {
    const profiles = [0.3, 0.7].map((share, k) => ({
      id: `p${k}`,
      label: `P${k}`,
      share,
      covariates: { start_age: 40 },
    }));
    const { strategies } = prepare(tinyDocument({ profiles })).base({ trace: true });
    for (const row of strategies[0]!.trace!) {
      expect(row.reduce((sum, share) => sum + share, 0)).toBeCloseTo(1, 12);
    }
    expect(strategies[0]!.trace![2]![0]).toBeCloseTo(0.81, 12);
    expect(prepare(tinyDocument()).base().strategies[0]!.trace).toBeUndefined();
  });
});
