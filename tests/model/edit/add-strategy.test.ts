import { expect, test } from 'vitest';
import { prepare } from '../../../shared/engine/engine.ts';
import { addStrategy } from '../../../shared/model/edit/add-strategy.ts';
import { DOCUMENTS, soundAfter } from './after.ts';

test.each(DOCUMENTS)('%s: a new strategy is the twin of each in turn', (_, document) => {
  for (const { id: like } of document.strategies) {
    const { id, edits } = addStrategy(document, { label: 'Another', like });
    const { strategies, problems } = prepare(soundAfter(document, edits)).base();
    expect(problems).toEqual([]);
    const twin = strategies.find((each) => each.id === like)!;
    const added = strategies.find((each) => each.id === id)!;
    expect([added.cost, added.outcome]).toEqual([twin.cost, twin.outcome]);
  }
});

test('it begins as the comparator, last, where nothing is said', () => {
  const [, document] = DOCUMENTS[0]!;
  const { id, edits } = addStrategy(document, { label: 'Usual care' });
  expect(id).toBe('usual-care');
  const { strategies, payoffs } = soundAfter(document, edits);
  expect(strategies.map((each) => each.id)).toEqual(['usual', 'treatment', 'usual-care']);
  expect(payoffs[0]?.strategies).toEqual(['treatment']);
});
