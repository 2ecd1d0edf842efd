import { expect, test } from 'vitest';
import type { ModelDocument, Row } from '../../../shared/model/document.ts';
import { issuesOf, said } from './codes.ts';

const cells = [{ id: 'c', to: 'dead', formula: '0.1' }];
const probabilities: Row = {
  id: 'r',
  from: 'alive',
  basis: 'probabilities',
  remainder: 'alive',
  cells,
};
const rates: Row = { id: 'r', from: 'alive', basis: 'rates', method: 'generator', cells };
const logit: Row = { id: 'r', from: 'alive', basis: 'logit', reference: 'alive', cells };

const rows = (...list: Row[]) => {
  return (document: ModelDocument): void => {
    document.movements = { type: 'rows', rows: list };
  };
};

test.each<[string, Row]>([
  ['probabilities', probabilities],
  ['rates', rates],
  ['logit', logit],
])('a sound row of %s', (_, row) => {
  expect(said(rows(row))).toEqual([]);
});

test('one row a strategy may cover a state', () => {
  const mine = { ...rates, id: 'mine', strategies: ['treatment'] };
  expect(said(rows({ ...logit, strategies: ['usual'] }, mine))).toEqual([]);
});

test('a state and strategy without a row are named', () => {
  expect(issuesOf(rows({ ...rates, strategies: ['usual'] }))).toMatchObject([
    { code: 'movements.missingRow', params: { state: 'alive', strategy: 'treatment' } },
  ]);
});

test('a state and strategy with two rows are named', () => {
  const again = { ...rates, id: 'again', strategies: ['treatment'] };
  expect(issuesOf(rows(logit, again))).toMatchObject([
    {
      code: 'movements.overlappingRows',
      path: ['movements', 'rows', 1],
      params: { state: 'alive', strategy: 'treatment' },
    },
  ]);
});

test('an absorbing state has no row', () => {
  expect(said(rows(rates, { ...rates, id: 'back', from: 'dead', cells: [] }))).toEqual([
    'movements.absorbingHasRow movements.rows.1.from',
  ]);
});

test('states named are known', () => {
  const gone = [{ id: 'c', to: 'gone', formula: '0.1' }];
  expect(said(rows({ ...probabilities, cells: gone }))).toEqual([
    'states.unknown movements.rows.0.cells.0.to',
  ]);
  expect(said(rows({ ...probabilities, remainder: 'gone' }))).toEqual([
    'states.unknown movements.rows.0.remainder',
  ]);
  expect(said(rows({ ...logit, reference: 'gone' }))).toEqual([
    'states.unknown movements.rows.0.reference',
  ]);
  expect(said(rows(rates, { ...rates, id: 'more', from: 'gone' }))).toEqual([
    'states.unknown movements.rows.1.from',
  ]);
});

test('no destination twice', () => {
  expect(said(rows({ ...rates, cells: [...cells, { ...cells[0]!, id: 'd' }] }))).toEqual([
    'movements.destinationTwice movements.rows.0.cells.1.to',
  ]);
});

test('the destination that takes the rest has no formula of its own', () => {
  const stay = [...cells, { id: 'd', to: 'alive', formula: '0.9' }];
  expect(said(rows({ ...probabilities, cells: stay }))).toEqual([
    'movements.remainderIsCell movements.rows.0.cells.1.to',
  ]);
  expect(said(rows({ ...logit, cells: stay }))).toEqual([
    'movements.referenceIsCell movements.rows.0.cells.1.to',
  ]);
  expect(said(rows({ ...rates, cells: stay }))).toEqual([
    'movements.rateToSelf movements.rows.0.cells.1.to',
  ]);
});

test('a row’s formulas cover the strategies that the row holds for', () => {
  const mine = [{ id: 'c', to: 'dead', formula: { byStrategy: { usual: '0.1' } } }];
  const other = { ...rates, id: 'other', strategies: ['treatment'] };
  expect(said(rows({ ...rates, strategies: ['usual'], cells: mine }, other))).toEqual([]);
  expect(said(rows({ ...rates, cells: mine }))).toEqual([
    'formula.missingForStrategy movements.rows.0.cells.0.formula',
  ]);
});
