import { describe, expect, it } from 'vitest';
import type { Edit } from '../../../shared/model/edit/edit.ts';
import { overlap } from '../../../src/store/overlap.ts';
import { setTitle, setValue } from './support.ts';

const list = ['parameters'];
const remove = (id: string): Edit => ({ type: 'remove', at: list, id });
const move = (id: string): Edit => ({ type: 'move', at: list, id, before: null });
const insert = (id: string): Edit => ({ type: 'insert', at: list, item: { id }, before: null });

describe('edits that touch the same thing', () => {
  it.each([
    ['one field', setValue('a', 1), setValue('a', 2)],
    ['an item and a field of it', [remove('a')], setValue('a', 1)],
    ['a whole list and an item of it', setValue('a', 1), [{ type: 'unset', at: list } as Edit]],
    ['one new item', [insert('a')], [insert('a')]],
    ['the last of several', [...setTitle('x'), ...setValue('a', 1)], setValue('a', 1)],
  ])('%s', (_, ours, theirs) => {
    expect(overlap(ours, theirs)).toBe(true);
    expect(overlap(theirs, ours)).toBe(true);
  });

  it.each([
    ['fields apart', setTitle('x'), setValue('a', 1)],
    ['two items', setValue('a', 1), [remove('b')]],
    ['two new items', [insert('a')], [insert('b')]],
    ['two moves', [move('a')], [move('a')]],
    [
      'a field and an item of one name',
      [{ type: 'unset', at: ['list', 'a'] } as Edit],
      [{ type: 'unset', at: ['list', { id: 'a' }, 'x'] } as Edit],
    ],
    ['nothing', [], setValue('a', 1)],
  ])('but not %s', (_, ours, theirs) => {
    expect(overlap(ours, theirs)).toBe(false);
    expect(overlap(theirs, ours)).toBe(false);
  });
});
