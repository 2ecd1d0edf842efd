/**
 * Rows of movements: which one holds, one for some strategies, one for all, and their
 * cells.
 *
 *   rowFor(document, from, strategy): Row | undefined
 *   rowPlace(rowId): Place
 *   splitRow(document, from, strategies): Added    a row of their own for some strategies
 *   uniteRows(document, rowId): Edit[]             this row for all strategies
 *   addCell(document, rowId, { to, formula? }): Added
 */
import type { ModelDocument, Row, StrategyFormula } from '../document.ts';
import { type Added, insertion } from './add.ts';
import type { Edit, Place } from './edit.ts';
import { EditError } from './edit-error.ts';
import { freshId } from './fresh-id.ts';

const ROWS: Place = ['movements', 'rows'];

export function rowPlace(id: string): Place {
  return [...ROWS, { id }];
}

function rowsOf({ movements }: ModelDocument): readonly Row[] {
  if (movements.type !== 'rows') throw new EditError('edit.noSuchPlace', ROWS);
  return movements.rows;
}

/** The row with this id. Throws an EditError where there is none. */
export function rowOf(document: ModelDocument, id: string): Row {
  const row = rowsOf(document).find((each) => each.id === id);
  if (!row) throw new EditError('edit.noSuchItem', ROWS, { id });
  return row;
}

/** The row that people leave a state by under a strategy. */
export function rowFor(document: ModelDocument, from: string, strategy: string): Row | undefined {
  return rowsOf(document).find(
    (row) => row.from === from && (row.strategies?.includes(strategy) ?? true),
  );
}

/**
 * A row of their own, out of this state, for `strategies`: a copy of the one that held
 * for the first of them, or one that keeps everybody where there was none.
 */
export function splitRow(
  document: ModelDocument,
  from: string,
  strategies: readonly string[],
): Added {
  const everyone = document.strategies.map(({ id }) => id);
  const model = strategies[0] === undefined ? undefined : rowFor(document, from, strategies[0]);
  const id = freshId(
    rowsOf(document).map((row) => row.id),
    `${from}-${strategies.join('-')}`,
  );
  const own = strategies.length < everyone.length ? { strategies: [...strategies] } : {};
  const staying = { basis: 'probabilities' as const, remainder: from, cells: [] };
  const { strategies: _, ...copied } = model ?? ({ id, from, ...staying } as Row);
  const after = model ? nextRow(document, model) : null;
  return {
    id,
    edits: [
      ...rowsOf(document).flatMap((row) => withoutStrategies(row, from, strategies, everyone)),
      insertion(ROWS, { ...copied, id, ...own }, after),
    ],
  };
}

/** The row after this one that `splitRow` is sure to keep. */
function nextRow(document: ModelDocument, row: Row): string | null {
  const rows = rowsOf(document);
  return rows.slice(rows.indexOf(row) + 1).find(({ from }) => from !== row.from)?.id ?? null;
}

function withoutStrategies(
  row: Row,
  from: string,
  strategies: readonly string[],
  everyone: readonly string[],
): Edit[] {
  if (row.from !== from) return [];
  const before = row.strategies ?? everyone;
  const left = before.filter((id) => !strategies.includes(id));
  if (left.length === before.length) return [];
  if (left.length === 0) return [{ type: 'remove', at: ROWS, id: row.id }];
  return [{ type: 'set', at: [...rowPlace(row.id), 'strategies'], value: left }];
}

/** One row for all strategies: the others out of the same state go. */
export function uniteRows(document: ModelDocument, id: string): Edit[] {
  const kept = rowOf(document, id);
  const others = rowsOf(document).filter((row) => row.from === kept.from && row.id !== id);
  return [
    ...others.map((row): Edit => ({ type: 'remove', at: ROWS, id: row.id })),
    ...(kept.strategies ? [{ type: 'unset', at: [...rowPlace(id), 'strategies'] } as Edit] : []),
  ];
}

/**
 * One more destination of a row. Throws an EditError (`edit.badValue`) where the row
 * goes there already, or where it is the destination that needs no formula.
 */
export function addCell(
  document: ModelDocument,
  rowId: string,
  { to, formula = '0' }: { readonly to: string; readonly formula?: StrategyFormula },
): Added {
  const row = rowOf(document, rowId);
  const at: Place = [...rowPlace(rowId), 'cells'];
  if (to === restOf(row) || row.cells.some((cell) => cell.to === to)) {
    throw new EditError('edit.badValue', at, { to });
  }
  const id = freshId(
    row.cells.map((cell) => cell.id),
    to,
  );
  return { id, edits: [insertion(at, { id, to, formula })] };
}

/** The destination of a row that needs no formula; staying, where rates compete. */
export function restOf(row: Row): string {
  switch (row.basis) {
    case 'probabilities':
      return row.remainder;
    case 'logit':
      return row.reference;
    case 'rates':
      return row.from;
  }
}
