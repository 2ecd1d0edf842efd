import { expect, test } from 'vitest';
import { duplicateState } from '../../../shared/model/edit/duplicate-state.ts';
import { tinyDocument } from '../../fixtures/tiny-document.ts';
import { soundAfter } from './after.ts';

const tiny = tinyDocument();

test('the same way out and the same amounts; who stays, stays in the copy', () => {
  const { id, edits } = duplicateState(tiny, 'alive', 'Alive and well');
  const document = soundAfter(tiny, edits);
  expect(document.states.map((state) => state.id)).toEqual(['alive', id, 'dead']);
  expect(document.movements).toMatchObject({
    rows: [{}, { from: id, remainder: id, cells: [{ to: 'dead', formula: 'die_now' }] }],
  });
  expect(document.payoffs).toMatchObject([
    { amounts: [{ state: 'alive' }, { state: id, formula: 'c_year' }] },
    { amounts: [{ state: 'alive' }, { state: id, formula: 'u_alive' }] },
  ]);
});

test('there is no copy of nothing', () => {
  expect(() => duplicateState(tiny, 'nowhere', 'X')).toThrowError('edit.noSuchItem');
});
