/**
 *   addVariable(document, { label, symbol?, unit?, kind?, formula? }): Added
 *
 * A new variable; its formula is 0 where none is given.
 */
import type { ModelDocument, StrategyFormula, Variable } from '../../model/document.ts';
import { type Added, adding, newId } from '../../model/edit/add.ts';
import type { Kind } from '../../model/kinds.ts';
import { freshSymbol } from './symbols.ts';

export interface NewVariable {
  readonly label: string;
  readonly symbol?: string;
  readonly unit?: string;
  readonly kind?: Kind;
  readonly formula?: StrategyFormula;
}

export function addVariable(document: ModelDocument, fields: NewVariable): Added {
  const { label, symbol = freshSymbol(document, label), formula = '0', ...rest } = fields;
  const id = newId(document, 'variable', label);
  return { id, edits: [adding('variable', { id, symbol, label, ...rest, formula } as Variable)] };
}
