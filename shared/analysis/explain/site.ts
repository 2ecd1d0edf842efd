/** Where a formula stands that a number came from, so that one can go there. */
import { formulaPath } from '../../formula/definitions.ts';
import type { ModelDocument, Row, StrategyFormula } from '../../model/document.ts';
import type { Path } from '../../model/issue.ts';
import { formulaFor } from '../../model/strategy-formula.ts';

export interface FormulaSite {
  /** Place of the text in the document. */
  readonly path: Path;
  /** The formula as it holds for the strategy. */
  readonly text: string;
}

/** The site of a strategy's own formula; null where there is none for it. */
export function siteOf(formula: StrategyFormula, path: Path, strategy: string): FormulaSite | null {
  const text = formulaFor(formula, strategy);
  return text === undefined ? null : { path: formulaPath(formula, path, strategy), text };
}

/** The row by which a strategy leaves a state, with its index; null where nobody leaves. */
function rowOf(
  document: ModelDocument,
  strategy: string,
  from: string,
): { readonly row: Row; readonly index: number } | null {
  const { movements } = document;
  if (movements.type !== 'rows') return null;
  const index = movements.rows.findIndex(
    (row) => row.from === from && (row.strategies?.includes(strategy) ?? true),
  );
  const row = movements.rows[index];
  return row ? { row, index } : null;
}

/** The formula of a move; null for what takes the rest and for what follows from others. */
export function moveSite(
  document: ModelDocument,
  strategy: string,
  from: string,
  to: string,
): FormulaSite | null {
  const found = rowOf(document, strategy, from);
  const cell = found?.row.cells.findIndex((each) => each.to === to) ?? -1;
  const formula = found?.row.cells[cell]?.formula;
  if (!found || formula === undefined) return null;
  const path = ['movements', 'rows', found.index, 'cells', cell, 'formula'];
  return siteOf(formula, path, strategy);
}
