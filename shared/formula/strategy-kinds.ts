/**
 * What is known of a document's variables under one strategy, worked out in their
 * order: the kinds of those that declare none, and which of them hang on
 * `time_in_state`.
 */
import type { Issue } from '../model/issue.ts';
import { formulaFor } from '../model/strategy-formula.ts';
import type { Definition } from './definitions.ts';
import type { Inferred } from './kind-algebra.ts';
import { inferKind, type VariableKinds } from './kinds.ts';
import { namesIn } from './names.ts';
import { orderVariables } from './order.ts';
import { parseFormula } from './parse.ts';
import type { Scope } from './scope.ts';

export interface StrategyKinds {
  /** By symbol. */
  readonly kinds: VariableKinds;
  /** Symbols of variables that name `time_in_state`, themselves or through others. */
  readonly timed: ReadonlySet<string>;
  /** Circles of definitions. */
  readonly issues: readonly Issue[];
}

export function strategyKinds(
  definitions: readonly Definition[],
  strategyId: string,
  scope: Scope,
): StrategyKinds {
  const { order, issues } = orderVariables(definitions, strategyId);
  const kinds = new Map<string, Inferred>();
  const timed = new Set<string>();
  for (const { symbol, formula } of order) {
    const text = formulaFor(formula, strategyId);
    const expr = text === undefined ? undefined : parseFormula(text).expr;
    if (!expr) continue;
    kinds.set(symbol, inferKind(expr, scope, kinds).kind);
    const isTimed = [...namesIn(expr)].some((name) => name === 'time_in_state' || timed.has(name));
    if (isTimed) timed.add(symbol);
  }
  return { kinds, timed, issues };
}
