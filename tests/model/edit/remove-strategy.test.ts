import { expect, test } from 'vitest';
import { addStrategy } from '../../../shared/model/edit/add-strategy.ts';
import { removeStrategy } from '../../../shared/model/edit/remove-strategy.ts';
import { splitRow } from '../../../shared/model/edit/rows.ts';
import { tinyDocument } from '../../fixtures/tiny-document.ts';
import { DOCUMENTS, soundAfter } from './after.ts';

test.each(DOCUMENTS)('%s: a strategy that came and went leaves nothing behind', (_, document) => {
  const { id, edits } = addStrategy(document, { label: 'Passing' });
  const added = soundAfter(document, edits);
  expect(soundAfter(added, removeStrategy(added, id)!)).toEqual(document);
});

test('rows for it alone go; those that it shares with others stay for them', () => {
  const tiny = tinyDocument();
  const split = soundAfter(tiny, splitRow(tiny, 'alive', ['treatment']).edits);
  expect(soundAfter(split, removeStrategy(split, 'treatment')!).movements).toMatchObject({
    rows: [{ id: 'from_alive', strategies: ['usual'] }],
  });
});

test('a scenario’s formula of its own goes too, and the last strategy stays', () => {
  const formula = { byStrategy: { treatment: '0.1' }, otherwise: '0.2' };
  const overrides = [{ type: 'variable' as const, variable: 'v_die', formula }];
  const document = tinyDocument({ scenarios: [{ id: 's', label: 'S', overrides }] });
  const left = soundAfter(document, removeStrategy(document, 'treatment')!);
  expect(left.scenarios[0]?.overrides[0]).toMatchObject({ formula: '0.2' });
  expect(removeStrategy(left, 'usual')).toBeNull();
});
