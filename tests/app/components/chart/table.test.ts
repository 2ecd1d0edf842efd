import { expect, it } from 'vitest';
import { cellWords, tableCsv } from '../../../../src/components/chart/table.ts';

const table = {
  columns: [
    { head: 'Threshold', write: (value: number) => value.toFixed(0) },
    { head: 'Probability', write: (value: number) => value.toFixed(2) },
    { head: 'Best' },
  ],
  rows: [
    [500, 0.123456789, 'Care, as now'],
    [1_000, null, 'Nurses'],
  ],
} as const;

it('saves numbers in full', () => {
  expect(tableCsv(table, 'en')).toBe(
    'Threshold,Probability,Best\r\n500,0.123456789,"Care, as now"\r\n1000,,Nurses\r\n',
  );
});

// Common practice, no source: see shared/export/csv.ts.
it('writes decimal commas, and parts cells by semicolons, in French', () => {
  expect(tableCsv(table, 'fr')).toContain('500;0,123456789;Care, as now\r\n');
});

it('shows numbers as the column writes them, and nothing for none', () => {
  const [threshold, probability, best] = table.columns;
  expect(cellWords(500, threshold)).toBe('500');
  expect(cellWords(0.123456789, probability)).toBe('0.12');
  expect(cellWords(null, probability)).toBe('');
  expect(cellWords('Nurses', best)).toBe('Nurses');
});
