import { expect, test } from 'vitest';
import { prepare } from '../../../shared/engine/engine.ts';
import { addPayoff } from '../../../shared/model/edit/add-payoff.ts';
import { exampleOf } from '../../examples/load.ts';
import { soundAfter } from './after.ts';

const hearts = exampleOf('keeping-hearts-well');

test.each(['state', 'movement', 'once', 'start'] as const)('by %s: of nothing yet', (type) => {
  for (const measure of ['cost', 'outcome'] as const) {
    const fields = { label: 'Something more', category: 'More', measure, type };
    const { id, edits } = addPayoff(hearts, fields);
    const document = soundAfter(hearts, edits);
    expect(document.payoffs.at(-1)).toMatchObject({ id, ...fields });
    const totals = (each: typeof hearts) =>
      prepare(each)
        .base()
        .strategies.map(({ cost }) => cost);
    expect(totals(document)).toEqual(totals(hearts));
  }
});

test('by state, it has an amount for each state in which people live', () => {
  const fields = { label: 'Visits', category: 'Care', measure: 'cost', type: 'state' } as const;
  const { payoffs, states } = soundAfter(hearts, addPayoff(hearts, fields).edits);
  const living = states.filter(({ dead }) => !dead).map(({ id }) => id);
  expect(payoffs.at(-1)).toMatchObject({
    per: 'year',
    amounts: living.map((state) => ({ state, formula: '0' })),
  });
});
