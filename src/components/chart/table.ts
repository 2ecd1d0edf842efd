/** The numbers behind a chart: shown as a table, and saved as CSV in full. */
import { type CsvCell, toCsv } from '../../../shared/export/csv.ts';
import type { Language } from '../../store/settings.ts';

export interface ChartColumn {
  readonly head: string;
  /** How its numbers are written on screen; CSV has them in full. */
  readonly write?: (value: number) => string;
}

export interface ChartTable {
  /** The first column heads its row. */
  readonly columns: readonly ChartColumn[];
  readonly rows: readonly (readonly CsvCell[])[];
}

export function tableCsv({ columns, rows }: ChartTable, language: Language): string {
  const style = { decimal: language === 'fr' ? 'comma' : 'point' } as const;
  return toCsv([columns.map(({ head }) => head), ...rows], style);
}

/** A cell as the reader's language writes it; nothing where there is no number. */
export function cellWords(cell: CsvCell, { write }: ChartColumn): string {
  if (cell === null) return '';
  return typeof cell === 'number' && write ? write(cell) : String(cell);
}
