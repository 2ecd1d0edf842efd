import { describe, expect, test } from 'vitest';
import { prepare } from '../../../shared/engine/engine.ts';
import { type Duplicable, duplicate } from '../../../shared/formula/edit/duplicate.ts';
import { itemsOf } from '../../../shared/model/edit/target.ts';
import { exampleOf } from '../../examples/load.ts';
import { tinyDocument } from '../../fixtures/tiny-document.ts';
import { DOCUMENTS, soundAfter } from '../../model/edit/after.ts';

const KINDS = [
  'strategy',
  'state',
  'profile',
  'covariate',
  'parameter',
  'table',
  'variable',
  'scenario',
  'threshold',
] as const;

describe.each(DOCUMENTS)('%s', (_, document) => {
  test.each(KINDS)('a copy of each %s is sound, right after the first', (what) => {
    for (const { id } of itemsOf(document, what)) {
      const { id: copy, edits } = duplicate(document, { what, id }, 'A copy');
      const items = itemsOf(soundAfter(document, edits), what);
      const index = items.findIndex((item) => item.id === id);
      expect(items[index + 1]).toMatchObject({ id: copy, label: 'A copy' });
    }
  });
});

const tiny = tinyDocument();

test('a payoff’s copy counts once more', () => {
  const document = soundAfter(
    tiny,
    duplicate(tiny, { what: 'payoff', id: 'qalys' }, 'Again').edits,
  );
  const outcome = (each: typeof tiny) => prepare(each).base().strategies[0]!.outcome;
  expect(outcome(document)).toBeCloseTo(2 * outcome(tiny), 9);
});

test('a symbol of its own, the same formula', () => {
  const { edits } = duplicate(tiny, { what: 'variable', id: 'v_die' }, 'Dying, again');
  expect(soundAfter(tiny, edits).variables[1]).toEqual({
    ...tiny.variables[0],
    id: 'dying-again',
    symbol: 'dying_again',
    label: 'Dying, again',
  });
});

test('a member of a group is copied by itself', () => {
  const document = exampleOf('hiv-combination-therapy');
  const group = document.groups.find(({ type }) => type === 'dirichlet')!;
  const target: Duplicable = { what: 'parameter', id: group.members[0]! };
  const copy = soundAfter(document, duplicate(document, target, 'By itself').edits).parameters[1];
  expect(copy?.distribution.type).toBe('beta');
});

test('there is no copy of nothing', () => {
  expect(() => duplicate(tiny, { what: 'state', id: 'x' }, 'X')).toThrowError('edit.noSuchItem');
});
