/**
 *   gridFrom(text, language): PastedGrid
 *
 * Numbers pasted from a spreadsheet, or written as CSV: rows by line; columns by tab, else
 * by semicolon, else by comma where the comma is no decimal sign. A first row, or column,
 * of words is taken as headings.
 */
import { parseNumber } from '../../../i18n/parse-number.ts';
import type { Language } from '../../../store/settings.ts';

export type PastedGrid =
  | {
      readonly ok: true;
      readonly rows: readonly (readonly number[])[];
      /** Words above the columns; none where the first row held numbers. */
      readonly head: readonly string[];
    }
  /** Row and column from 1, as a spreadsheet counts. */
  | { readonly ok: false; readonly row: number; readonly column: number; readonly text: string };

export function gridFrom(text: string, language: Language): PastedGrid {
  const lines = text.split(/\r\n|\r|\n/).filter((line) => line.trim() !== '');
  const mark = markOf(lines, language);
  const cells = lines.map((line) => line.split(mark).map((cell) => unquoted(cell.trim())));
  const [first = []] = cells;
  const hasHead = first.some((cell) => parseNumber(cell, language) === null);
  const rows: number[][] = [];
  for (const [index, line] of (hasHead ? cells.slice(1) : cells).entries()) {
    const numbers: number[] = [];
    for (const [column, cell] of line.entries()) {
      const number = parseNumber(cell, language) ?? parseNumber(cell, 'en');
      if (number === null) {
        return { ok: false, row: index + (hasHead ? 2 : 1), column: column + 1, text: cell };
      }
      numbers.push(number);
    }
    rows.push(numbers);
  }
  if (rows.length === 0) return { ok: false, row: 1, column: 1, text: first[0] ?? '' };
  return { ok: true, rows, head: hasHead ? first : [] };
}

function markOf(lines: readonly string[], language: Language): string {
  if (lines.some((line) => line.includes('\t'))) return '\t';
  if (lines.some((line) => line.includes(';'))) return ';';
  // One column of numbers whose comma is the decimal sign.
  const isOneColumn = lines.slice(1).every((line) => parseNumber(line, language) !== null);
  return language === 'fr' && isOneColumn ? '\n' : ',';
}

function unquoted(cell: string): string {
  return /^".*"$/.test(cell) ? cell.slice(1, -1).replaceAll('""', '"') : cell;
}
