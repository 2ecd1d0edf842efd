import { expect, test } from 'vitest';
import type { Table } from '../../../shared/model/document.ts';
import { issuesOf, said } from './codes.ts';

const table: Table = {
  id: 'mortality',
  symbol: 'mortality',
  label: 'Mortality by age and sex',
  keys: [
    { label: 'age', points: [0, 40, 80] },
    { label: 'sex', points: [0, 1] },
  ],
  values: [0.01, 0.01, 0.02, 0.01, 0.2, 0.1],
  interpolation: 'step',
};

test('a value for every combination of keys', () => {
  expect(
    said((document) => {
      document.tables = [table];
    }),
  ).toEqual([]);
  expect(
    issuesOf((document) => {
      document.tables = [{ ...table, values: [1, 2, 3] }];
    }),
  ).toMatchObject([
    { code: 'tables.wrongSize', path: ['tables', 0, 'values'], params: { expected: 6, got: 3 } },
  ]);
});

test('keys rise strictly', () => {
  const keys = [{ label: 'age', points: [0, 40, 40, 20] }];
  expect(
    issuesOf((document) => {
      document.tables = [{ ...table, keys, values: [1, 2, 3, 4] }];
    }),
  ).toMatchObject([
    {
      code: 'tables.keysNotRising',
      path: ['tables', 0, 'keys', 0, 'points', 2],
      params: { got: 40, before: 40 },
    },
  ]);
});
