import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { digestOf } from '../../../shared/model/digest.ts';
import type { ModelDocument } from '../../../shared/model/document.ts';
import { applyEdits } from '../../../shared/model/edit/apply.ts';
import type { Edit, Json, Place } from '../../../shared/model/edit/edit.ts';
import { EditError } from '../../../shared/model/edit/edit-error.ts';
import { tinyDocument } from '../../fixtures/tiny-document.ts';
import { Dice, randomEdit } from './random-edits.ts';

const tiny = tinyDocument();
const rate: Place = ['parameters', { id: 'rr_die' }, 'value'];

function codeOf(...edits: Edit[]): string {
  try {
    applyEdits(tiny, edits);
  } catch (thrown) {
    if (thrown instanceof EditError) return thrown.code;
    throw thrown;
  }
  return 'none';
}

const ids = (list: readonly { id: string }[]): string[] => list.map(({ id }) => id);

describe('one edit', () => {
  test('set gives a field a value, and its inverse the old one', () => {
    const { document, inverse } = applyEdits(tiny, [{ type: 'set', at: rate, value: 0.5 }]);
    expect(document.parameters[1]?.value).toBe(0.5);
    expect(inverse).toEqual([{ type: 'set', at: rate, value: 0.8 }]);
  });

  test('set of a field that was not there is taken back by unset', () => {
    const at: Place = ['strategies', { id: 'usual' }, 'description'];
    const { document, inverse } = applyEdits(tiny, [{ type: 'set', at, value: 'As now' }]);
    expect(document.strategies[0]?.description).toBe('As now');
    expect(inverse).toEqual([{ type: 'unset', at }]);
    expect(
      Object.hasOwn(applyEdits(document, inverse).document.strategies[0]!, 'description'),
    ).toBe(false);
  });

  test('unset of what is not there changes nothing', () => {
    const at: Place = ['question', 'beneficiaries'];
    const { document, inverse } = applyEdits(tiny, [{ type: 'unset', at }]);
    expect(document).toBe(tiny);
    expect(applyEdits(document, inverse).document).toBe(tiny);
  });

  test('insert before an item, or last', () => {
    const item = { id: 'ill', label: 'Ill', type: 'ordinary', dead: false };
    const at = ['states'];
    const first = applyEdits(tiny, [{ type: 'insert', at, item, before: 'dead' }]);
    expect(ids(first.document.states)).toEqual(['alive', 'ill', 'dead']);
    const last = applyEdits(tiny, [{ type: 'insert', at, item, before: null }]);
    expect(ids(last.document.states)).toEqual(['alive', 'dead', 'ill']);
  });

  test('move before an item, last, or nowhere', () => {
    const move = (id: string, before: string | null) =>
      ids(applyEdits(tiny, [{ type: 'move', at: ['parameters'], id, before }]).document.parameters);
    expect(move('c_year', 'p_die')).toEqual(['c_year', 'p_die', 'rr_die', 'u_alive']);
    expect(move('p_die', null)).toEqual(['rr_die', 'c_year', 'u_alive', 'p_die']);
    expect(move('rr_die', 'rr_die')).toEqual(['p_die', 'rr_die', 'c_year', 'u_alive']);
  });

  test('an item may be replaced by one with its id, the document by another', () => {
    const item = { id: 'usual', label: 'Usual care, renamed' };
    const one = applyEdits(tiny, [
      { type: 'set', at: ['strategies', { id: 'usual' }], value: item },
    ]);
    expect(one.document.strategies[0]).toEqual(item);
    const other = { ...tiny, id: 'other' } as unknown as Json;
    const all = applyEdits(tiny, [{ type: 'set', at: [], value: other }]);
    expect(all.document.id).toBe('other');
    expect(applyEdits(all.document, all.inverse).document).toBe(tiny);
  });
});

test('what no edit reaches is shared, and the document given is not touched', () => {
  const before = digestOf(tiny);
  const { document } = applyEdits(tiny, [{ type: 'set', at: rate, value: 0.5 }]);
  expect(document.states).toBe(tiny.states);
  expect(document.parameters[0]).toBe(tiny.parameters[0]);
  expect(document.parameters[1]).not.toBe(tiny.parameters[1]);
  expect(digestOf(tiny)).toBe(before);
});

describe('what does not fit is refused with a code', () => {
  const set = (at: Place, value: unknown): Edit => ({ type: 'set', at, value: value as Json });
  const hostile = JSON.parse('{"a": [{"__proto__": 1}]}') as Json;

  test.each<[string, string, Edit]>([
    ['a field of nothing', 'edit.noSuchPlace', set(['nowhere', 'at', 'all'], 1)],
    ['a position', 'edit.noSuchPlace', set(['strategies', '0', 'label'], 'x')],
    ['a field of a text', 'edit.noSuchPlace', set(['id', 'length'], 1)],
    ['an item of no list', 'edit.noSuchPlace', set(['question', { id: 'x' }, 'y'], 1)],
    ['an unknown item', 'edit.noSuchItem', set(['states', { id: 'ill' }, 'label'], 'x')],
    ['an id of an item', 'edit.idFixed', set(['states', { id: 'dead' }, 'id'], 'x')],
    ['an item with another id', 'edit.idFixed', set(['states', { id: 'dead' }], { id: 'x' })],
    ['an item that is none', 'edit.badValue', set(['states', { id: 'dead' }], 7)],
    ['a document that is none', 'edit.badValue', set([], 'x')],
    ['not a number', 'edit.badValue', set(rate, Number.NaN)],
    ['a function', 'edit.badValue', set(rate, () => 1)],
    ['undefined', 'edit.badValue', set(rate, undefined)],
    ['a hostile value', 'edit.hostileKey', set(['about', 'later'], hostile)],
    ['a hostile key', 'edit.hostileKey', set(['__proto__', 'polluted'], 1)],
    ['a hostile record', 'edit.hostileKey', set(['constructor', 'prototype'], 1)],
    ['unset of an item', 'edit.notAField', { type: 'unset', at: ['states', { id: 'dead' }] }],
    ['unset of all', 'edit.notAField', { type: 'unset', at: [] }],
    ['unset of an id', 'edit.idFixed', { type: 'unset', at: ['states', { id: 'dead' }, 'id'] }],
    [
      'a taken id',
      'edit.idTaken',
      { type: 'insert', at: ['states'], item: { id: 'dead' }, before: null },
    ],
    [
      'no list',
      'edit.noSuchPlace',
      { type: 'insert', at: ['question'], item: { id: 'x' }, before: null },
    ],
    [
      'an unknown neighbour',
      'edit.noSuchItem',
      { type: 'move', at: ['states'], id: 'dead', before: 'x' },
    ],
    ['removal of nothing', 'edit.noSuchItem', { type: 'remove', at: ['states'], id: 'x' }],
    [
      'an item without id',
      'edit.badValue',
      { type: 'insert', at: ['states'], item: {} as never, before: null },
    ],
  ])('%s: %s', (_, code, edit) => {
    expect(codeOf(edit)).toBe(code);
    expect(({} as { polluted?: number }).polluted).toBeUndefined();
  });

  test('an edit that does not fit leaves the ones before it out of force', () => {
    const digest = digestOf(tiny);
    const fine: Edit = { type: 'set', at: rate, value: 0.5 };
    expect(codeOf(fine, { type: 'remove', at: ['states'], id: 'x' })).toBe('edit.noSuchItem');
    expect(digestOf(tiny)).toBe(digest);
  });

  test('an error says where and what', () => {
    const edit: Edit = { type: 'set', at: ['states', { id: 'ill' }, 'label'], value: 'x' };
    expect(() => applyEdits(tiny, [edit])).toThrowError(
      expect.objectContaining({ path: ['states', 'ill', 'label'], params: { id: 'ill' } }),
    );
  });
});

describe('a broken list, where two items have one id', () => {
  const state = { id: 'twin', label: 'Twin', type: 'ordinary', dead: false } as const;
  const broken = tinyDocument({ states: [{ ...state, id: 'a' }, state, state] });

  test('refuses edits to either', () => {
    const edit: Edit = { type: 'remove', at: ['states'], id: 'twin' };
    expect(() => applyEdits(broken, [edit])).toThrowError('edit.idNotUnique');
  });

  test.each<Edit>([
    { type: 'remove', at: ['states'], id: 'a' },
    { type: 'move', at: ['states'], id: 'a', before: null },
  ])('is restored after $type of a neighbour', (edit) => {
    const { document, inverse } = applyEdits(broken, [edit]);
    expect(applyEdits(document, inverse).document.states).toEqual(broken.states);
  });
});

/** Edits that fit one after another. */
function walk(start: ModelDocument, seed: number, length: number): Edit[] {
  const dice = new Dice(seed);
  let document = start;
  return Array.from({ length }, () => {
    const edit = randomEdit(document, dice);
    document = applyEdits(document, [edit]).document;
    return edit;
  });
}

describe('properties', () => {
  const cases = { seed: 20_261_201, numRuns: 300 };

  test('edits then their inverse give the first digest', () => {
    const first = digestOf(tiny);
    let moved = 0;
    fc.assert(
      fc.property(fc.nat(), fc.integer({ min: 1, max: 30 }), (seed, length) => {
        const { document, inverse } = applyEdits(tiny, walk(tiny, seed, length));
        if (digestOf(document) !== first) moved += 1;
        return digestOf(applyEdits(document, inverse).document) === first;
      }),
      cases,
    );
    // Work happened.
    expect(moved).toBeGreaterThan(250);
  });

  test('the inverse of the inverse is the edits again', () => {
    fc.assert(
      fc.property(fc.nat(), fc.integer({ min: 1, max: 10 }), (seed, length) => {
        const there = applyEdits(tiny, walk(tiny, seed, length));
        const back = applyEdits(there.document, there.inverse);
        const again = applyEdits(back.document, back.inverse);
        return digestOf(again.document) === digestOf(there.document);
      }),
      cases,
    );
  });

  test('edits and inverses survive JSON', () => {
    fc.assert(
      fc.property(fc.nat(), (seed) => {
        const edits = walk(tiny, seed, 5);
        const there = applyEdits(tiny, JSON.parse(JSON.stringify(edits)) as Edit[]);
        const inverse = JSON.parse(JSON.stringify(there.inverse)) as Edit[];
        return digestOf(applyEdits(there.document, inverse).document) === digestOf(tiny);
      }),
      { ...cases, numRuns: 100 },
    );
  });
});
