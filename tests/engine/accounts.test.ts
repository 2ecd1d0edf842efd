import { describe, expect, it } from 'vitest';
import { openAccounts } from '../../shared/engine/accounts.ts';
import { compile } from '../../shared/engine/compile.ts';
import type { ModelDocument } from '../../shared/model/document.ts';
import { tinyDocument } from '../fixtures/tiny-document.ts';

function accountsOf(overrides: Partial<ModelDocument> = {}, lifeYears: number | null = null) {
  const model = compile(tinyDocument(overrides));
  const tallyOf = ({ measure }: { measure: string }) => (measure === 'cost' ? 0 : 1);
  return { model, accounts: openAccounts(model, { tallies: 3, tallyOf, lifeYears }) };
}

describe('openAccounts', () => {
  it('books what is the same in every cycle as steady, the rest as varying', () => {
    const { accounts } = accountsOf({
      payoffs: [
        tinyDocument().payoffs[1]!,
        {
          id: 'care',
          label: 'Care',
          measure: 'cost',
          category: 'Care',
          type: 'state',
          per: 'year',
          amounts: [{ id: 'a', state: 'alive', formula: '10 * time' }],
        },
      ],
    });
    expect(accounts.plans[0]!.steady.map(({ tally }) => tally)).toEqual([1]);
    expect(accounts.plans[0]!.varying.map(({ tally }) => tally)).toEqual([0]);
  });

  it('lets costs and outcomes of one discount rate share their weights', () => {
    expect(accountsOf().accounts.sets).toHaveLength(1);
    const tiny = tinyDocument();
    const discounting = { ...tiny.question.discounting, outcomes: 0 };
    const { accounts } = accountsOf({ question: { ...tiny.question, discounting } });
    expect(accounts.sets).toHaveLength(2);
  });

  it('sums the values of one state before they are simulated', () => {
    const drug = tinyDocument().payoffs[0]!;
    const { accounts } = accountsOf({ payoffs: [drug, { ...drug, id: 'again' }] });
    expect(accounts.plans[1]!.steady).toHaveLength(1);
  });

  it('counts undiscounted years of those not dead, where asked', () => {
    const { accounts, model } = accountsOf({ payoffs: [] }, 2);
    const [booking] = accounts.plans[0]!.steady;
    expect(booking).toMatchObject({ tally: 2, substate: 0 });
    expect(model.graph.valueOf(booking!.value)).toBe(1);
    const { boundary } = accounts.sets[booking!.set]!;
    // Trapezoid: ten cycles weigh ten years.
    expect(boundary.reduce((sum, weight) => sum + weight, 0)).toBeCloseTo(10, 12);
  });

  it('leaves out what pays nothing, and what lies beyond the horizon', () => {
    const none = { id: 'n', label: 'N', measure: 'cost', category: 'N' } as const;
    const { accounts } = accountsOf({
      payoffs: [
        { ...none, type: 'start', formula: '0' },
        { ...none, id: 'late', type: 'once', cycle: 99, formula: '5' },
      ],
    });
    expect(accounts.plans[0]).toEqual({ steady: [], varying: [], atStart: [] });
  });
});
