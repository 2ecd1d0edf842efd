import { expect, test } from 'vitest';
import type { ModelDocument, Payoff } from '../../../shared/model/document.ts';
import { issuesOf, said } from './codes.ts';

const base = { id: 'extra', label: 'Extra', measure: 'cost', category: 'Other' } as const;
const added = (...payoffs: Payoff[]) => {
  return (document: ModelDocument): void => void document.payoffs.push(...payoffs);
};

test('sound payoffs of every type', () => {
  expect(
    said(
      added(
        { ...base, id: 'a', type: 'movement', from: 'alive', to: 'dead', formula: '1' },
        { ...base, id: 'b', type: 'movement', formula: '1' },
        { ...base, id: 'c', type: 'once', cycle: 9, states: ['alive'], formula: '1' },
        { ...base, id: 'd', type: 'start', strategies: ['usual'], formula: '1' },
      ),
    ),
  ).toEqual([]);
});

test('states and strategies named are known, none twice', () => {
  expect(
    said(
      added(
        { ...base, id: 'a', type: 'movement', from: 'x', to: 'y', formula: '1' },
        { ...base, id: 'b', type: 'once', cycle: 0, states: ['x', 'dead', 'dead'], formula: '1' },
        { ...base, id: 'c', type: 'start', strategies: ['x'], formula: '1' },
        {
          ...base,
          id: 'd',
          type: 'state',
          per: 'year',
          amounts: ['x', 'dead', 'dead'].map((state, index) => ({
            id: `a${index}`,
            state,
            formula: '1',
          })),
        },
      ),
    ),
  ).toEqual([
    'states.unknown payoffs.2.from',
    'states.unknown payoffs.2.to',
    'states.unknown payoffs.3.states.0',
    'payoffs.stateTwice payoffs.3.states.2',
    'strategies.unknown payoffs.4.strategies.0',
    'states.unknown payoffs.5.amounts.0.state',
    'payoffs.stateTwice payoffs.5.amounts.2.state',
  ]);
});

test('formulas cover the strategies that the payoff applies to', () => {
  const formula = { byStrategy: { usual: '1' } };
  expect(said(added({ ...base, type: 'start', formula }))).toEqual([
    'formula.missingForStrategy payoffs.2.formula',
  ]);
  expect(said(added({ ...base, type: 'start', strategies: ['usual'], formula }))).toEqual([]);
});

test('staying is no movement', () => {
  expect(
    said(added({ ...base, type: 'movement', from: 'alive', to: 'alive', formula: '1' })),
  ).toEqual(['payoffs.movementToSelf payoffs.2.to']);
});

test('survival curves have no movements to pay for', () => {
  const survival = (document: ModelDocument): void => {
    const curves = [{ id: 'c', state: 'alive', formula: '1' }];
    document.movements = { type: 'survival', curves, last: 'dead' };
    added({ ...base, type: 'movement', to: 'dead', formula: '1' })(document);
  };
  expect(said(survival)).toEqual(['payoffs.movementNeedsRows payoffs.2']);
});

test('what falls after the horizon is warned of', () => {
  expect(issuesOf(added({ ...base, type: 'once', cycle: 10, formula: '1' }))).toMatchObject([
    { code: 'payoffs.afterHorizon', severity: 'warning', params: { cycle: 10, cycles: 10 } },
  ]);
});
