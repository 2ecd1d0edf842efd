/**
 * What follows for each variable from its formulas: its kind where it declares none,
 * and the strategies under which it hangs on `time_in_state`.
 */
import { type Definition, type FormulaText, textsOf } from './definitions.ts';
import { type Inferred, NUMBER } from './kind-algebra.ts';
import { inferKind } from './kinds.ts';
import { namesIn } from './names.ts';
import { parseFormula } from './parse.ts';
import type { Scope } from './scope.ts';

export interface VariableFacts {
  /** By symbol; `number` where strategies' formulas are of different kinds. */
  readonly kinds: ReadonlyMap<string, Inferred>;
  /** By symbol: strategies under which it names `time_in_state`, itself or through others. */
  readonly timed: ReadonlyMap<string, ReadonlySet<string>>;
}

/** The one kind of all, or number. */
function commonKind(kinds: readonly Inferred[]): Inferred {
  const [first = NUMBER] = kinds;
  const same = kinds.every(({ kind, scaled }) => kind === first.kind && scaled === first.scaled);
  return same ? first : NUMBER;
}

function timedStrategies(
  names: ReadonlySet<string>,
  { strategies }: FormulaText,
  timed: VariableFacts['timed'],
): readonly string[] {
  if (names.has('time_in_state')) return strategies;
  const through = [...names].flatMap((name) => timed.get(name) ?? []);
  return strategies.filter((id) => through.some((set) => set.has(id)));
}

/** @param order definitions, each after those it uses (see order.ts) */
export function variableFacts(
  order: readonly Definition[],
  strategies: readonly string[],
  scope: Scope,
): VariableFacts {
  const kinds = new Map<string, Inferred>();
  const timed = new Map<string, Set<string>>();
  for (const { symbol, formula, path } of order) {
    const found: Inferred[] = [];
    for (const text of textsOf(formula, path, strategies)) {
      const { expr } = parseFormula(text.text);
      if (!expr) continue;
      found.push(inferKind(expr, scope, kinds).kind);
      const when = timedStrategies(namesIn(expr), text, timed);
      if (when.length > 0) timed.set(symbol, new Set([...(timed.get(symbol) ?? []), ...when]));
    }
    kinds.set(symbol, commonKind(found));
  }
  return { kinds, timed };
}
