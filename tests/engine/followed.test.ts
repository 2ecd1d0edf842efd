import { describe, expect, it } from 'vitest';
import type { StrategyAccounts } from '../../shared/engine/accounts.ts';
import type { CohortPlan } from '../../shared/engine/compile.ts';
import { followedSubstates } from '../../shared/engine/followed.ts';

function followed(moves: readonly (readonly [number, number])[], paid: readonly number[]) {
  const plan = { moves: moves.map(([from, to]) => ({ from, to, chance: 0 })) };
  const accounts: StrategyAccounts = {
    steady: paid.map((substate) => ({ tally: 0, set: 0, substate, value: 0 })),
    varying: [],
    atStart: [],
  };
  return [...followedSubstates(plan as unknown as CohortPlan, accounts)];
}

describe('followedSubstates', () => {
  it('follows what is paid and whatever leads there', () => {
    const chain = [
      [0, 1],
      [1, 2],
      [2, 3],
    ] as const;
    expect(followed(chain, [2])).toEqual([0, 1, 2]);
    expect(followed(chain, [0])).toEqual([0]);
  });

  it('leaves dead ends alone that earn nothing', () => {
    expect(
      followed(
        [
          [0, 1],
          [0, 2],
          [1, 2],
        ],
        [0, 1],
      ),
    ).toEqual([0, 1]);
  });

  it('follows circles', () => {
    expect(
      followed(
        [
          [0, 1],
          [1, 0],
          [1, 2],
        ],
        [0],
      ),
    ).toEqual([0, 1]);
  });

  it('follows nothing where nothing is paid', () => {
    expect(followed([[0, 1]], [])).toEqual([]);
  });
});
