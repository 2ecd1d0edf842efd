import { describe, expect, test } from 'vitest';
import { prepare } from '../../../shared/engine/engine.ts';
import type { ModelDocument } from '../../../shared/model/document.ts';
import {
  addCell,
  restOf,
  rowFor,
  rowOf,
  splitRow,
  uniteRows,
} from '../../../shared/model/edit/rows.ts';
import { tinyDocument } from '../../fixtures/tiny-document.ts';
import { DOCUMENTS, expectNear, soundAfter } from './after.ts';

const tiny = tinyDocument();
const withRows = DOCUMENTS.filter(([, { movements }]) => movements.type === 'rows');
const rowsIn = ({ movements }: ModelDocument) => (movements.type === 'rows' ? movements.rows : []);

test.each(withRows)('%s: a row of its own for any strategy changes no answer', (_, document) => {
  const totals = (each: ModelDocument) =>
    prepare(each)
      .base()
      .strategies.map(({ cost }) => cost);
  const before = totals(document);
  for (const { from } of rowsIn(document)) {
    const strategy = document.strategies.at(-1)!.id;
    const split = soundAfter(document, splitRow(document, from, [strategy]).edits);
    expect(rowFor(split, from, strategy)?.strategies).toEqual([strategy]);
    expectNear(totals(split), before);
  }
});

describe('rows of the tiny document', () => {
  const { id, edits } = splitRow(tiny, 'alive', ['treatment']);
  const split = soundAfter(tiny, edits);

  test('the first is left for the others', () => {
    expect(rowsIn(split).map(({ strategies }) => strategies)).toEqual([['usual'], ['treatment']]);
    expect(rowFor(split, 'alive', 'usual')?.id).toBe('from_alive');
  });

  test('one row holds for all again', () => {
    const united = soundAfter(split, uniteRows(split, id));
    expect(rowsIn(united).map((row) => [row.id, row.strategies])).toEqual([[id, undefined]]);
    expect(uniteRows(united, id)).toEqual([]);
  });

  test('a state without a row gets one that keeps everybody', () => {
    const states = tiny.states.map((state) => ({ ...state, type: 'ordinary' as const }));
    const document = tinyDocument({ states });
    const made = soundAfter(document, splitRow(document, 'dead', ['usual', 'treatment']).edits);
    expect(rowFor(made, 'dead', 'usual')).toMatchObject({ remainder: 'dead', cells: [] });
    expect(Object.hasOwn(rowFor(made, 'dead', 'usual')!, 'strategies')).toBe(false);
  });

  test('a destination is added once, and not where the rest goes', () => {
    const added = soundAfter(tiny, [
      ...[
        {
          type: 'insert',
          at: ['states'],
          item: { ...tiny.states[1]!, id: 'gone' },
          before: null,
        } as const,
      ],
      ...addCell(tiny, 'from_alive', { to: 'gone' }).edits,
    ] as Parameters<typeof soundAfter>[1]);
    expect(rowOf(added, 'from_alive').cells.map(({ to }) => to)).toEqual(['dead', 'gone']);
    expect(() => addCell(tiny, 'from_alive', { to: 'dead' })).toThrowError('edit.badValue');
    expect(() => addCell(tiny, 'from_alive', { to: 'alive' })).toThrowError('edit.badValue');
    expect(() => addCell(tiny, 'nowhere', { to: 'dead' })).toThrowError('edit.noSuchItem');
  });
});

test('the rest goes to the remainder, to the reference, or stays', () => {
  const base = { id: 'r', from: 'a', cells: [] };
  expect(restOf({ ...base, basis: 'probabilities', remainder: 'b' })).toBe('b');
  expect(restOf({ ...base, basis: 'logit', reference: 'c' })).toBe('c');
  expect(restOf({ ...base, basis: 'rates', method: 'byRow' })).toBe('a');
});
