import { expect, it } from 'vitest';
import { gridFrom } from '../../../../../src/routes/appraisal/editing/pasted-grid.ts';

it('reads tabs, as spreadsheets copy, with decimal commas in French', () => {
  expect(gridFrom('40\t0.01\r\n50\t0.02\r\n', 'en')).toEqual({
    ok: true,
    rows: [
      [40, 0.01],
      [50, 0.02],
    ],
    head: [],
  });
  const french = gridFrom('40\t0,01\n50\t0,02', 'fr');
  expect(french.ok && french.rows[1]).toEqual([50, 0.02]);
});

it('reads CSV by semicolon or comma, in either language, and quotes', () => {
  expect(gridFrom('age;risk\n40;0,5', 'fr')).toEqual({
    ok: true,
    rows: [[40, 0.5]],
    head: ['age', 'risk'],
  });
  const plain = gridFrom('"age","risk"\n40,0.5', 'fr');
  expect(plain).toEqual({ ok: true, rows: [[40, 0.5]], head: ['age', 'risk'] });
});

it('takes a lone column of decimal commas for one column', () => {
  const column = gridFrom('0,5\n0,25', 'fr');
  expect(column.ok && column.rows).toEqual([[0.5], [0.25]]);
});

it('says where something is no number', () => {
  expect(gridFrom('1\t2\n3\tx', 'en')).toEqual({ ok: false, row: 2, column: 2, text: 'x' });
});
