import { expect, test } from 'vitest';
import { prepare } from '../../../shared/engine/engine.ts';
import { addState } from '../../../shared/model/edit/add-state.ts';
import { tinyDocument } from '../../fixtures/tiny-document.ts';
import { DOCUMENTS, expectNear, soundAfter } from './after.ts';

test.each(DOCUMENTS)('%s: nobody is in a new state, and the answer stays', (_, document) => {
  const { edits } = addState(document, { label: 'Somewhere new' });
  const answer = (each: typeof document) =>
    prepare(each)
      .base()
      .strategies.map(({ cost, outcome }) => [cost, outcome]);
  expectNear(answer(soundAfter(document, edits)).flat(), answer(document).flat());
});

const tiny = tinyDocument();

test('it goes before the absorbing ones, or where it is put', () => {
  const ids = (fields: object) =>
    soundAfter(tiny, addState(tiny, { label: 'Ill', ...fields }).edits).states.map(({ id }) => id);
  expect(ids({})).toEqual(['alive', 'ill', 'dead']);
  expect(ids({ before: 'alive' })).toEqual(['ill', 'alive', 'dead']);
  expect(ids({ before: null })).toEqual(['alive', 'dead', 'ill']);
});

test('an absorbing state has no row, a timed one has tunnels', () => {
  const dead = soundAfter(
    tiny,
    addState(tiny, { label: 'Dead of it', type: 'absorbing', dead: true }).edits,
  );
  expect(dead.movements).toEqual(tiny.movements);
  const timed = soundAfter(tiny, addState(tiny, { label: 'Recent', type: 'timed' }).edits);
  expect(timed.states[1]).toEqual({
    id: 'recent',
    label: 'Recent',
    type: 'timed',
    dead: false,
    cycles: 2,
  });
});
