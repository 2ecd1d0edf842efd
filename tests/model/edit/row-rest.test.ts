import { describe, expect, test } from 'vitest';
import { prepare } from '../../../shared/engine/engine.ts';
import type { ModelDocument, Row } from '../../../shared/model/document.ts';
import { changeBasis, setRest } from '../../../shared/model/edit/row-rest.ts';
import { tinyDocument } from '../../fixtures/tiny-document.ts';
import { applied, DOCUMENTS, expectNear, soundAfter } from './after.ts';

const rowsIn = ({ movements }: ModelDocument) => (movements.type === 'rows' ? movements.rows : []);
const totals = (each: ModelDocument) =>
  prepare(each)
    .base()
    .strategies.flatMap(({ cost, outcome }) => [cost, outcome]);

/** Rows of each example and the destinations that could take the rest. */
const cases = DOCUMENTS.flatMap(([name, document]) =>
  rowsIn(document)
    .filter(({ basis }) => basis !== 'rates')
    .flatMap(({ id, cells }) => cells.map(({ to }) => [name, id, to, document] as const)),
);

test('there are rows of probabilities and of log odds to turn', () => {
  expect(cases.length).toBeGreaterThan(10);
  const bases = DOCUMENTS.flatMap(([, document]) => rowsIn(document).map(({ basis }) => basis));
  expect(new Set(bases)).toEqual(new Set(['probabilities', 'logit', 'rates']));
});

test.each(cases)('%s, %s: the rest goes to %s, and the answer stays', (_, row, to, document) => {
  const turned = soundAfter(document, setRest(document, row, to));
  expectNear(totals(turned), totals(document));
});

describe('the tiny row', () => {
  const tiny = tinyDocument();
  const rowAfter = (edits: Parameters<typeof soundAfter>[1]): Row =>
    rowsIn(soundAfter(tiny, edits))[0]!;

  test('has what is left as a formula', () => {
    expect(rowAfter(setRest(tiny, 'from_alive', 'dead'))).toMatchObject({
      remainder: 'dead',
      cells: [{ to: 'alive', formula: '1 - (die_now)' }],
    });
    expect(setRest(tiny, 'from_alive', 'alive')).toEqual([]);
  });

  test('goes from one basis to another with its formulas', () => {
    const rates = changeBasis(tiny, 'from_alive', 'rates');
    const row = rowIn(tiny, rates);
    expect(row).toMatchObject({
      basis: 'rates',
      method: 'generator',
      cells: [{ formula: 'die_now' }],
    });
    expect(Object.hasOwn(row, 'remainder')).toBe(false);
    expect(rowIn(tiny, changeBasis(tiny, 'from_alive', 'logit'))).toMatchObject({
      reference: 'alive',
    });
    expect(changeBasis(tiny, 'from_alive', 'probabilities')).toEqual([]);
  });
});

function rowIn(document: ModelDocument, edits: Parameters<typeof soundAfter>[1]): Row {
  return rowsIn(applied(document, edits))[0]!;
}
