/**
 *   setRest(document, rowId, to): Edit[]
 *   changeBasis(document, rowId, basis): Edit[]
 *
 * `setRest` makes another destination the remainder (or the reference) of a row, and
 * gives the old one a formula, so that the row means what it meant. Throws an EditError
 * where the basis has none (`edit.noSuchPlace`), and where the log odds of the new
 * reference are not given (`edit.badValue`).
 */
import type { ModelDocument, Row, StrategyFormula } from '../document.ts';
import type { Edit, Json } from './edit.ts';
import { EditError } from './edit-error.ts';
import { combined } from './formula-sites.ts';
import { freshId } from './fresh-id.ts';
import { restOf, rowOf, rowPlace } from './rows.ts';

type Cell = Row['cells'][number];

export function setRest(document: ModelDocument, rowId: string, to: string): Edit[] {
  const row = rowOf(document, rowId);
  const at = rowPlace(rowId);
  if (row.basis === 'rates') throw new EditError('edit.noSuchPlace', [...at, 'remainder']);
  if (restOf(row) === to) return [];
  const strategies = row.strategies ?? document.strategies.map(({ id }) => id);
  const cells =
    row.basis === 'logit' ? logitCells(row, to, strategies) : otherCells(row, to, strategies);
  const field = row.basis === 'logit' ? 'reference' : 'remainder';
  return [
    { type: 'set', at: [...at, field], value: to },
    { type: 'set', at: [...at, 'cells'], value: cells as Json },
  ];
}

/** What was the remainder gets 1 less all the formulas there were. */
function otherCells(row: Row, to: string, strategies: readonly string[]): Cell[] {
  const formulas = row.cells.map(({ formula }) => formula);
  const left = combined(formulas, strategies, (texts) =>
    ['1', ...texts.map((text) => `(${text})`)].join(' - '),
  );
  return [...row.cells.filter((cell) => cell.to !== to), restCell(row, left)];
}

/** Log odds against b are those against a, less the log odds of b against a. */
function logitCells(row: Row, to: string, strategies: readonly string[]): Cell[] {
  const own = row.cells.find((cell) => cell.to === to)?.formula;
  // Nobody goes there, so nothing can be told from it.
  if (own === undefined) throw new EditError('edit.badValue', rowPlace(row.id), { to });
  const against = (formula: StrategyFormula) =>
    combined([formula, own], strategies, ([text, base]) => `(${text}) - (${base})`);
  const turned = combined([own], strategies, ([base]) => `-(${base})`);
  const others = row.cells.filter((cell) => cell.to !== to);
  const kept = others.map((cell) => ({ ...cell, formula: against(cell.formula) }));
  return [...kept, restCell(row, turned)];
}

function restCell(row: Row, formula: StrategyFormula): Cell {
  const taken = row.cells.map(({ id }) => id);
  return { id: freshId(taken, restOf(row)), to: restOf(row), formula };
}

/**
 * The row on another basis. Formulas stay as they are written, for the author to turn
 * into what the basis asks; staying needs no formula on any.
 */
export function changeBasis(document: ModelDocument, rowId: string, basis: Row['basis']): Edit[] {
  const row = rowOf(document, rowId);
  if (row.basis === basis) return [];
  const { id, from, strategies } = row;
  const cells = row.cells.filter(({ to }) => to !== from);
  const kept = { id, from, ...(strategies ? { strategies } : {}), cells, basis };
  return [
    { type: 'set', at: rowPlace(rowId), value: { ...kept, ...restFields(basis, from) } as Json },
  ];
}

function restFields(basis: Row['basis'], from: string): Readonly<Record<string, string>> {
  if (basis === 'probabilities') return { remainder: from };
  return basis === 'logit' ? { reference: from } : { method: 'generator' };
}
