/**
 * The symbols that formulas know things by.
 *
 *   symbolIssue(document, symbol, except?): Issue | null     may it be called so?
 *   freshSymbol(document, label): string
 */

import type { ModelDocument } from '../../model/document.ts';
import { asciiWords, firstFree } from '../../model/edit/fresh-id.ts';
import type { Target } from '../../model/edit/target.ts';
import { error, type Issue } from '../../model/issue.ts';
import { HOSTILE_KEYS } from '../../model/names.ts';
import { buildScope, reservedAs, type ScopeEntry } from '../scope.ts';

const SYMBOL = /^[A-Za-z][A-Za-z0-9_]{0,63}$/;

/** A symbol's owner. */
export type Named = Target & { readonly what: 'parameter' | 'variable' | 'table' | 'covariate' };

/**
 * What is wrong with a symbol for a new thing, or for the one given: `document.missing`,
 * `document.invalidFormat` (params got), `document.hostileName` (got), `names.reserved`
 * (symbol, what), `names.duplicate` (symbol, what: of the thing that has it).
 */
export function symbolIssue(document: ModelDocument, symbol: string, except?: Named): Issue | null {
  if (symbol === '') return error('document.missing', ['symbol'], { expected: 'string' });
  if (!SYMBOL.test(symbol)) return error('document.invalidFormat', ['symbol'], { got: symbol });
  if (HOSTILE_KEYS.has(symbol)) return error('document.hostileName', ['symbol'], { got: symbol });
  const reserved = reservedAs(symbol);
  if (reserved) return error('names.reserved', ['symbol'], { symbol, what: reserved });
  const owner = ownerOf(document, symbol);
  if (!owner || (except && owner.id === except.id && owner.what === except.what)) return null;
  return error('names.duplicate', ['symbol'], { symbol, what: owner.what });
}

/** What formulas mean by a symbol; the first where a broken document has several. */
export function ownerOf(document: ModelDocument, symbol: string): ScopeEntry | undefined {
  return buildScope(document).scope.names.get(symbol);
}

/** A symbol like the label that nothing has: `cost_of_visit`, then `cost_of_visit_2`. */
export function freshSymbol(document: ModelDocument, label: string): string {
  const words = asciiWords(label, '_') || 'x';
  const stem = /^[a-z]/.test(words) ? words : `x_${words}`;
  const taken = new Set(buildScope(document).scope.names.keys());
  return firstFree(reservedAs(stem) ? new Set([...taken, stem]) : taken, stem, '_');
}

/** The symbol of a thing, or undefined where there is no such thing. */
export function symbolOf(document: ModelDocument, { what, id }: Named): string | undefined {
  const lists = {
    parameter: document.parameters,
    variable: document.variables,
    table: document.tables,
    covariate: document.covariates,
  };
  return lists[what].find((item) => item.id === id)?.symbol;
}

const NAMED: readonly Target['what'][] = ['parameter', 'variable', 'table', 'covariate'];

/** Whether formulas know a thing by a symbol. */
export function isNamed(target: Target): target is Named {
  return NAMED.includes(target.what);
}
