import { expect, it } from 'vitest';
import type { Table } from '../../../../../shared/model/document.ts';
import { pastedTable } from '../../../../../src/routes/appraisal/model/pasted-table.ts';

const table: Table = {
  id: 't',
  symbol: 't',
  label: 'Table',
  keys: [{ label: 'Age', points: [0, 1] }],
  values: [0, 0],
  interpolation: 'step',
};

it('makes one key of two columns, named by the heading', () => {
  expect(pastedTable('Age in years\tRisk\n0\t0.1\n5\t0.2\n', 'en', table)).toEqual({
    ok: true,
    keys: [{ label: 'Age in years', points: [0, 5] }],
    values: [0.1, 0.2],
  });
});

it.each([
  ['a corner of words', 'Age\t0\t1\n40\t0.01\t0.02\n50\t0.03\t0.04'],
  ['an empty corner', '\t0\t1\n40\t0.01\t0.02\n50\t0.03\t0.04'],
  ['a corner with a number', '0\t0\t1\n40\t0.01\t0.02\n50\t0.03\t0.04'],
])('makes two keys of more columns, with %s', (_, text) => {
  const read = pastedTable(text, 'en', table);
  if (!read.ok) throw new Error(read.why);
  expect(read.keys.map(({ points }) => points)).toEqual([
    [40, 50],
    [0, 1],
  ]);
  // Row by row: the second key varies fastest.
  expect(read.values).toEqual([0.01, 0.02, 0.03, 0.04]);
});

it.each([
  ['1\t2\n2', 'ragged', 2],
  ['1\n2', 'oneColumn', 1],
  ['1\t2\n1\t3', 'notRising', 2],
  ['a\tb\n2\t1\n1\tq', 'notANumber', 3],
])('refuses %j', (text, why, row) => {
  expect(pastedTable(text, 'en', table)).toMatchObject({ ok: false, why, row });
});
