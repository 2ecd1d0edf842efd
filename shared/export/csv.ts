/**
 * Tables as CSV (RFC 4180). Where the decimal mark is a comma, cells are parted by
 * semicolons, as spreadsheets of those countries write and expect them (common
 * practice, no source).
 */

export type CsvCell = string | number | null;

export interface CsvStyle {
  readonly decimal: 'point' | 'comma';
}

interface Marks {
  readonly separator: string;
  readonly decimal: string;
}

const MARKS: Record<CsvStyle['decimal'], Marks> = {
  point: { separator: ',', decimal: '.' },
  comma: { separator: ';', decimal: ',' },
};

/** Lines end in CR LF; numbers are written in full, null as an empty cell. */
export function toCsv(
  rows: readonly (readonly CsvCell[])[],
  style: CsvStyle = { decimal: 'point' },
): string {
  const marks = MARKS[style.decimal];
  const lines = rows.map((row) => row.map((value) => cell(value, marks)).join(marks.separator));
  return `${lines.join('\r\n')}\r\n`;
}

function cell(value: CsvCell, { separator, decimal }: Marks): string {
  if (value === null) return '';
  if (typeof value === 'number') return String(value).replace('.', decimal);
  // A label must not pass for a spreadsheet's formula.
  const safe = /^[=+\-@\t\r]/.test(value) ? `'${value}` : value;
  const quoted = /["\r\n]/.test(safe) || safe.includes(separator);
  return quoted ? `"${safe.replaceAll('"', '""')}"` : safe;
}
