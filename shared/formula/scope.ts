/** Every name that a document's formulas may use, and what it stands for. */
import type { ModelDocument } from '../model/document.ts';
import { error, type Issue, type Path } from '../model/issue.ts';
import type { Kind } from '../model/kinds.ts';
import { CLOCKS, START_AGE, WORDS } from '../model/names.ts';
import { closest } from './closest.ts';
import { CALLABLE } from './functions.ts';

export interface ScopeEntry {
  readonly what: 'parameter' | 'variable' | 'table' | 'covariate' | 'clock';
  /** Id in the document; a clock's is its name. */
  readonly id: string;
  /** As declared; `number` where nothing is. */
  readonly kind: Kind;
  readonly unit: string;
  /** Whether `kind` was declared; an undeclared variable's is inferred (kinds.ts). */
  readonly declared: boolean;
  /** Number of keys of a table. */
  readonly keys?: 1 | 2;
  /** Place of the definition; a clock has none. */
  readonly path?: Path;
}

export interface Scope {
  /** By symbol. */
  readonly names: ReadonlyMap<string, ScopeEntry>;
  /** Whether profiles have a start age, without which the clock `age` has no meaning. */
  readonly hasStartAge: boolean;
  /** The known name, or callable function, nearest to a mistyped one. */
  suggestName(name: string): string | undefined;
  suggestFunction(name: string): string | undefined;
}

const CLOCK_KIND: Record<(typeof CLOCKS)[number], { kind: Kind; unit: string }> = {
  cycle: { kind: 'number', unit: '' },
  time: { kind: 'time', unit: 'years' },
  age: { kind: 'time', unit: 'years' },
  time_in_state: { kind: 'time', unit: 'years' },
  cycle_length: { kind: 'time', unit: 'years' },
};

/** What a symbol may not be called, and why. */
const RESERVED: ReadonlyMap<string, 'word' | 'clock' | 'function'> = new Map([
  ...CALLABLE.map((name) => [name, 'function'] as const),
  ...CLOCKS.map((name) => [name, 'clock'] as const),
  ...WORDS.map((name) => [name, 'word'] as const),
]);

/** What the language keeps a symbol for, or undefined where it is free. */
export function reservedAs(symbol: string): 'word' | 'clock' | 'function' | undefined {
  return RESERVED.get(symbol);
}

/** Distinct names that are compared with all others, so that no document can ask for too many. */
const MOST_SUGGESTIONS = 200;

function suggester(candidates: Iterable<string>): (name: string) => string | undefined {
  const known = new Map<string, string | undefined>();
  return (name) => {
    if (!known.has(name) && known.size < MOST_SUGGESTIONS)
      known.set(name, closest(name, candidates));
    return known.get(name);
  };
}

type Definition = readonly [symbol: string, entry: ScopeEntry & { path: Path }];

function definitionsOf(document: ModelDocument): Definition[] {
  const { parameters, variables, tables, covariates } = document;
  return [
    ...parameters.map(({ symbol, id, kind, unit }, index): Definition => {
      const path = ['parameters', index, 'symbol'];
      return [symbol, { what: 'parameter', id, kind, unit, declared: true, path }];
    }),
    ...variables.map(({ symbol, id, kind, unit = '' }, index): Definition => {
      const path = ['variables', index, 'symbol'];
      const declared = kind !== undefined;
      return [symbol, { what: 'variable', id, kind: kind ?? 'number', unit, declared, path }];
    }),
    ...tables.map(({ symbol, id, kind, unit = '', keys }, index): Definition => {
      const path = ['tables', index, 'symbol'];
      const declared = kind !== undefined;
      const count = keys.length === 2 ? 2 : 1;
      const entry = { what: 'table', id, kind: kind ?? 'number', unit, declared, path } as const;
      return [symbol, { ...entry, keys: count }];
    }),
    ...covariates.map(({ symbol, id, unit = '' }, index): Definition => {
      const path = ['covariates', index, 'symbol'];
      const kind = symbol === START_AGE ? 'time' : 'number';
      return [symbol, { what: 'covariate', id, kind, unit, declared: false, path }];
    }),
  ];
}

/**
 * The names of a document, with its clocks. Issues, at the path of the symbol:
 * `names.duplicate` (params symbol, what: of the first) and `names.reserved`
 * (params symbol, what: word, clock or function); the first definition holds.
 */
export function buildScope(document: ModelDocument): { scope: Scope; issues: Issue[] } {
  const names = new Map<string, ScopeEntry>();
  for (const clock of CLOCKS) {
    names.set(clock, { what: 'clock', id: clock, ...CLOCK_KIND[clock], declared: true });
  }
  const issues: Issue[] = [];
  for (const [symbol, entry] of definitionsOf(document)) {
    const reserved = RESERVED.get(symbol);
    const first = names.get(symbol);
    if (reserved) issues.push(error('names.reserved', entry.path, { symbol, what: reserved }));
    else if (first) issues.push(error('names.duplicate', entry.path, { symbol, what: first.what }));
    else names.set(symbol, entry);
  }
  const hasStartAge = names.get(START_AGE)?.what === 'covariate';
  const suggestName = suggester([...names.keys()]);
  return {
    scope: { names, hasStartAge, suggestName, suggestFunction: suggester(CALLABLE) },
    issues,
  };
}
