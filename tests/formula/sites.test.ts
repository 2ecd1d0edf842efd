import { expect, it } from 'vitest';
import { formulaSites } from '../../shared/formula/sites.ts';
import type { ModelDocument } from '../../shared/model/document.ts';
import { documentWith, variables } from './documents.ts';

const states: ModelDocument['states'] = [
  { id: 'well', label: 'Well', type: 'ordinary', dead: false },
  { id: 'ill', label: 'Ill', type: 'timed', cycles: 3, dead: false },
  { id: 'dead', label: 'Dead', type: 'absorbing', dead: true },
];
const payoff = { label: 'x', category: 'x' };

const briefly = (document: ModelDocument) =>
  formulaSites(document).map(({ path, place, timeInState, strategies }) => {
    const wanted = place.type === 'kind' ? place.kind : `outcome per ${place.per}`;
    return [path.join('.'), wanted, timeInState, strategies.join(' ')];
  });

it('finds every formula, what it should be, whom it holds for and whether time in state counts', () => {
  const document = documentWith({
    states,
    variables: variables({ a: '1', b: '2' }, { b: 'rate' }),
    start: { remainder: 'well', shares: [{ id: 's', state: 'ill', formula: '0.1' }] },
    movements: {
      type: 'rows',
      rows: [
        {
          id: 'r1',
          from: 'well',
          basis: 'rates',
          method: 'generator',
          strategies: ['usual'],
          cells: [{ id: 'c1', to: 'ill', formula: '0.1' }],
        },
        {
          id: 'r2',
          from: 'ill',
          basis: 'logit',
          reference: 'ill',
          cells: [{ id: 'c2', to: 'dead', formula: '0.1' }],
        },
      ],
    },
    payoffs: [
      {
        ...payoff,
        id: 'p1',
        type: 'state',
        measure: 'outcome',
        per: 'cycle',
        amounts: [
          { id: 'a1', state: 'well', formula: '1' },
          { id: 'a2', state: 'ill', formula: '1' },
        ],
      },
      { ...payoff, id: 'p2', type: 'movement', measure: 'cost', from: 'ill', formula: '1' },
      { ...payoff, id: 'p3', type: 'movement', measure: 'cost', to: 'ill', formula: '1' },
      {
        ...payoff,
        id: 'p4',
        type: 'once',
        measure: 'cost',
        cycle: 0,
        strategies: ['treatment'],
        formula: '1',
      },
    ],
    scenarios: [
      {
        id: 'sc',
        label: 'sc',
        overrides: [
          { type: 'variable', variable: 'b', formula: { byStrategy: {}, otherwise: '3' } },
        ],
      },
    ],
  });
  expect(briefly(document)).toEqual([
    ['variables.0.formula', 'number', true, 'usual treatment'],
    ['variables.1.formula', 'rate', true, 'usual treatment'],
    ['start.shares.0.formula', 'probability', false, 'usual treatment'],
    ['movements.rows.0.cells.0.formula', 'rate', false, 'usual'],
    ['movements.rows.1.cells.0.formula', 'logOdds', true, 'usual treatment'],
    ['payoffs.0.amounts.0.formula', 'outcome per cycle', false, 'usual treatment'],
    ['payoffs.0.amounts.1.formula', 'outcome per cycle', true, 'usual treatment'],
    ['payoffs.1.formula', 'costOnce', true, 'usual treatment'],
    ['payoffs.2.formula', 'costOnce', false, 'usual treatment'],
    ['payoffs.3.formula', 'costOnce', false, 'treatment'],
    ['scenarios.0.overrides.0.formula', 'rate', true, 'usual treatment'],
  ]);
});

it('finds survival curves', () => {
  const document = documentWith({
    variables: [],
    payoffs: [],
    movements: {
      type: 'survival',
      curves: [{ id: 'c', state: 'alive', formula: 'alive_exponential(time, 0.1)' }],
      last: 'dead',
    },
  });
  expect(briefly(document)).toEqual([
    ['movements.curves.0.formula', 'probability', false, 'usual treatment'],
  ]);
});
