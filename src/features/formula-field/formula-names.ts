/**
 * What a formula may name, as the field offers and colours it. Made once a document; the
 * same names give the same object, so that fields need no new look after every keystroke.
 */
import { CALLABLE, FUNCTIONS } from '../../../shared/formula/functions.ts';
import { buildScope, type Scope, type ScopeEntry } from '../../../shared/formula/scope.ts';
import type { ModelDocument } from '../../../shared/model/document.ts';
import type { Kind } from '../../../shared/model/kinds.ts';
import { WORDS } from '../../../shared/model/names.ts';

export type NameKind = ScopeEntry['what'] | 'function' | 'word';

export interface KnownName {
  readonly symbol: string;
  readonly what: NameKind;
  /** In the document's own words; empty for what the language brings. */
  readonly label: string;
  readonly kind?: Kind;
  readonly unit: string;
  /** A function's arguments by name. */
  readonly params?: readonly string[];
}

export interface FormulaNames {
  readonly list: readonly KnownName[];
  readonly bySymbol: ReadonlyMap<string, KnownName>;
  readonly scope: Scope;
}

const FUNCTION_NAMES: readonly KnownName[] = CALLABLE.map((symbol) => {
  const params = FUNCTIONS.get(symbol)?.params.map(({ name }) => name) ?? [];
  return { symbol, what: 'function', label: '', unit: '', params };
});
const WORD_NAMES: readonly KnownName[] = WORDS.filter((word) => word !== 'if').map((symbol) => {
  return { symbol, what: 'word', label: '', unit: '' };
});

export function formulaNames(document: ModelDocument): FormulaNames {
  const { scope } = buildScope(document);
  const labels = labelsOf(document);
  const own = [...scope.names].map(([symbol, { what, id, kind, unit }]): KnownName => {
    return { symbol, what, label: labels.get(`${what} ${id}`) ?? '', kind, unit };
  });
  const list = [...own, ...FUNCTION_NAMES, ...WORD_NAMES];
  return { list, bySymbol: new Map(list.map((name) => [name.symbol, name])), scope };
}

function labelsOf(document: ModelDocument): ReadonlyMap<string, string> {
  const lists = {
    parameter: document.parameters,
    variable: document.variables,
    table: document.tables,
    covariate: document.covariates,
  };
  return new Map(
    Object.entries(lists).flatMap(([what, items]) =>
      items.map(({ id, label }) => [`${what} ${id}`, label] as const),
    ),
  );
}
