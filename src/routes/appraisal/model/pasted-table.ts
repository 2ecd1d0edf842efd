/**
 *   pastedTable(text, language, table): PastedTable
 *
 * A table from what was copied out of a spreadsheet. Two columns: points and values. More:
 * the first row holds the points of the second key, the first column those of the first.
 * Headings of words become the keys' names.
 */
import type { Table } from '../../../../shared/model/document.ts';
import { parseNumber } from '../../../i18n/parse-number.ts';
import type { Language } from '../../../store/settings.ts';
import { gridFrom } from '../editing/pasted-grid.ts';

export type PastedTable =
  | { readonly ok: true; readonly keys: Table['keys']; readonly values: number[] }
  | {
      readonly ok: false;
      readonly why: 'notANumber' | 'ragged' | 'oneColumn' | 'notRising';
      /** From 1, as a spreadsheet counts. */
      readonly row: number;
      readonly column: number;
      readonly text: string;
    };

export function pastedTable(text: string, language: Language, table: Table): PastedTable {
  const grid = gridFrom(text, language);
  if (!grid.ok) return { ...grid, why: 'notANumber' };
  const width = grid.rows[0]?.length ?? 0;
  const offset = grid.head.length > 0 ? 2 : 1;
  const ragged = grid.rows.findIndex((row) => row.length !== width);
  if (ragged >= 0) return refused('ragged', ragged + offset);
  if (width < 2) return refused('oneColumn', offset);
  return width === 2 ? byOneKey(grid, table, offset) : byTwoKeys(grid, table, language);
}

type Grid = Extract<ReturnType<typeof gridFrom>, { ok: true }>;

function byOneKey({ rows, head }: Grid, table: Table, offset: number): PastedTable {
  const points = rows.map(([point = 0]) => point);
  const fall = fallsAt(points);
  if (fall >= 0) return refused('notRising', fall + offset);
  const label = head[0] || table.keys[0]?.label || 'x';
  return { ok: true, keys: [{ label, points }], values: rows.map(([, value = 0]) => value) };
}

/** The heads of the columns are numbers, whether the corner is empty, a word or a number. */
function byTwoKeys({ rows, head }: Grid, table: Table, language: Language): PastedTable {
  const above = head.length > 0 ? head.slice(1).map((cell) => parseNumber(cell, language)) : null;
  const columns = above ?? rows[0]?.slice(1) ?? [];
  const word = columns.indexOf(null);
  if (word >= 0) {
    return { ok: false, why: 'notANumber', row: 1, column: word + 2, text: head[word + 1] ?? '' };
  }
  const body = above ? rows : rows.slice(1);
  const points = body.map(([point = 0]) => point);
  const fall = fallsAt(points);
  if (fall >= 0 || points.length === 0) return refused('notRising', fall + 2);
  const across = columns as number[];
  if (fallsAt(across) >= 0) return refused('notRising', 1);
  const [first, second] = table.keys;
  const keys = [
    { label: head[0] || first?.label || 'x', points },
    { label: second?.label ?? 'y', points: across },
  ];
  return { ok: true, keys, values: body.flatMap((row) => row.slice(1)) };
}

/** Where the points do not rise; -1 where they do. */
function fallsAt(points: readonly number[]): number {
  return points.findIndex((point, index) => index > 0 && point <= (points[index - 1] ?? 0));
}

function refused(why: 'ragged' | 'oneColumn' | 'notRising', row: number): PastedTable {
  return { ok: false, why, row, column: 1, text: '' };
}
