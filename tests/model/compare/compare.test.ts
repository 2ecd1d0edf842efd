import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { compareDocuments } from '../../../shared/model/compare/compare.ts';
import { digestOf } from '../../../shared/model/digest.ts';
import type { ModelDocument } from '../../../shared/model/document.ts';
import { applyEdits } from '../../../shared/model/edit/apply.ts';
import type { Edit } from '../../../shared/model/edit/edit.ts';
import { tinyDocument } from '../../fixtures/tiny-document.ts';
import { DOCUMENTS } from '../edit/after.ts';
import { Dice, randomEdit } from '../edit/random-edits.ts';

const tiny = tinyDocument();

function changes(...edits: Edit[]) {
  return compareDocuments(tiny, applyEdits(tiny, edits).document);
}

test.each(DOCUMENTS)('%s does not differ from a copy of itself', (_, document) => {
  expect(compareDocuments(document, structuredClone(document))).toEqual([]);
});

describe('one edit is one change', () => {
  test('a value', () => {
    const at = ['parameters', { id: 'rr_die' }, 'value'];
    expect(changes({ type: 'set', at, value: 0.5 })).toEqual([
      {
        kind: 'changed',
        place: at,
        label: 'Relative risk of dying on treatment',
        field: 'value',
        before: 0.8,
        after: 0.5,
        section: 'evidence',
        nature: 'input',
      },
    ]);
  });

  test('a formula of one strategy', () => {
    const at = ['variables', { id: 'v_die' }, 'formula', 'byStrategy', 'treatment'];
    expect(changes({ type: 'set', at, value: 'p_die / 2' })).toMatchObject([
      { place: at, nature: 'formula', section: 'model', before: 'p_die * rr_die' },
    ]);
  });

  test('a field that had no value', () => {
    const at = ['strategies', { id: 'usual' }, 'description'];
    expect(changes({ type: 'set', at, value: 'As now' })).toMatchObject([
      { kind: 'changed', label: 'Usual care', before: undefined, after: 'As now', nature: 'words' },
    ]);
  });

  test('another sort of distribution', () => {
    const at = ['parameters', { id: 'c_year' }, 'distribution'];
    expect(changes({ type: 'set', at, value: { type: 'fixed' } })).toMatchObject([
      { place: at, field: 'distribution', before: { type: 'gamma' }, after: { type: 'fixed' } },
    ]);
  });

  test('an item that came, one that went, one that moved', () => {
    const item = { id: 'ill', label: 'Ill', type: 'ordinary', dead: false };
    expect(changes({ type: 'insert', at: ['states'], item, before: 'dead' })).toMatchObject([
      { kind: 'added', label: 'Ill', after: item, nature: 'structure', field: 'states' },
    ]);
    const cells = ['movements', 'rows', { id: 'from_alive' }, 'cells'];
    expect(changes({ type: 'remove', at: cells, id: 'alive_dead' })).toMatchObject([
      { kind: 'removed', label: 'Alive → Dead', section: 'model', after: undefined },
    ]);
    const move: Edit = { type: 'move', at: ['parameters'], id: 'u_alive', before: 'p_die' };
    expect(changes(move)).toMatchObject([
      { kind: 'moved', place: ['parameters', { id: 'u_alive' }], before: 3, after: 0 },
    ]);
  });
});

/** Edits that put the changes into force, but for the order of lists. */
function replay(found: ReturnType<typeof compareDocuments>): Edit[] {
  return found.flatMap((change): Edit[] => {
    const { kind, place: at, after } = change;
    const last = at.at(-1);
    if (kind === 'moved') return [];
    if (after !== undefined && kind === 'changed') return [{ type: 'set', at, value: after }];
    if (typeof last !== 'object') return [{ type: 'unset', at }];
    const list = at.slice(0, -1);
    if (kind === 'removed') return [{ type: 'remove', at: list, id: last.id }];
    return [{ type: 'insert', at: list, item: after as never, before: null }];
  });
}

/** Lists of items in the order of their ids, so that their own order does not matter. */
function unordered(value: unknown): unknown {
  if (Array.isArray(value)) {
    const list: unknown[] = value.map(unordered);
    const idOf = (item: unknown) => (item as { id?: unknown } | null)?.id;
    if (list.some((item) => typeof idOf(item) !== 'string')) return list;
    return list.toSorted((a, b) => (String(idOf(a)) < String(idOf(b)) ? -1 : 1));
  }
  if (typeof value !== 'object' || value === null) return value;
  return Object.fromEntries(Object.entries(value).map(([key, part]) => [key, unordered(part)]));
}

const digestUnordered = (document: ModelDocument) => digestOf(unordered(document));

describe('properties', () => {
  test('one edit, one change at its place', () => {
    let seen = 0;
    fc.assert(
      fc.property(fc.nat(), (seed) => {
        const edit = randomEdit(tiny, new Dice(seed));
        const { document } = applyEdits(tiny, [edit]);
        const found = compareDocuments(tiny, document);
        if (digestOf(document) === digestOf(tiny)) return found.length === 0;
        seen += 1;
        const at = JSON.stringify(edit.at);
        const isThere = found.every(({ place }) =>
          JSON.stringify(place).startsWith(at.slice(0, -1)),
        );
        const isWhole = edit.type === 'set' && typeof edit.value === 'object';
        return isThere ? isWhole || found.length === 1 : isReplacement(edit);
      }),
      { seed: 20_261_201, numRuns: 1_000 },
    );
    expect(seen).toBeGreaterThan(500);
  });

  test('the changes are all there is: put into force, they give the later document', () => {
    fc.assert(
      fc.property(fc.nat(), fc.integer({ min: 1, max: 12 }), (seed, length) => {
        const dice = new Dice(seed);
        let document = tiny;
        for (let step = 0; step < length; step += 1) {
          document = applyEdits(document, [randomEdit(document, dice)]).document;
        }
        const replayed = applyEdits(tiny, replay(compareDocuments(tiny, document))).document;
        return digestUnordered(replayed) === digestUnordered(document);
      }),
      { seed: 20_261_202, numRuns: 200 },
    );
  });
});

/** A `type` or `basis` that changes makes another thing of the object around it. */
function isReplacement({ type, at }: Edit): boolean {
  return (type === 'set' || type === 'unset') && ['type', 'basis'].includes(String(at.at(-1)));
}
