/** The order in which variables can be worked out, each after those it uses. */
import { error, type Issue } from '../model/issue.ts';
import { formulaFor } from '../model/strategy-formula.ts';
import { type Definition, formulaPath, textsOf } from './definitions.ts';
import type { Expr } from './expr.ts';
import { namesIn, placeOf } from './names.ts';
import { parseFormula } from './parse.ts';

export interface Ordered {
  /** Every definition once; those of a circle in no useful order. */
  readonly order: readonly Definition[];
  /** One `formula.cycle` a circle found. */
  readonly issues: readonly Issue[];
}

/** Steps that a search may still take; shared by searches that should end together. */
export interface Budget {
  left: number;
}

/** Circles reported, and names written out of a long one. */
const MOST_CYCLES = 20;
const MOST_NAMES = 12;

interface Visit {
  readonly definition: Definition;
  readonly uses: readonly Definition[];
  next: number;
}

interface Sorted {
  readonly order: readonly Definition[];
  readonly circles: readonly (readonly Definition[])[];
}

/** Depth first, without recursion, so that no chain of definitions is too long. */
function sort(
  definitions: readonly Definition[],
  usesOf: (definition: Definition) => readonly Definition[],
  budget: Budget,
): Sorted {
  const done = new Set<Definition>();
  const circles: Definition[][] = [];
  const trail: Visit[] = [];
  const onTrail = new Map<Definition, number>();

  const enter = (definition: Definition): void => {
    const uses = usesOf(definition);
    budget.left -= 1 + uses.length;
    onTrail.set(definition, trail.length);
    trail.push({ definition, uses, next: 0 });
  };
  const leave = ({ definition }: Visit): void => {
    trail.pop();
    onTrail.delete(definition);
    done.add(definition);
  };
  const step = (visit: Visit): void => {
    const used = visit.uses[visit.next];
    visit.next += 1;
    if (!used) return leave(visit);
    const from = onTrail.get(used);
    if (from === undefined) return done.has(used) ? undefined : enter(used);
    if (circles.length < MOST_CYCLES) circles.push(trail.slice(from).map((v) => v.definition));
  };

  for (const definition of definitions) {
    if (budget.left < 0) break;
    if (!done.has(definition)) enter(definition);
    for (let visit = trail.at(-1); visit; visit = trail.at(-1)) step(visit);
  }
  return { order: [...done], circles };
}

const exprOf = (text: string | undefined): Expr | undefined =>
  text === undefined ? undefined : parseFormula(text).expr;

const named = (expr: Expr | undefined, all: ReadonlyMap<string, Definition>): Definition[] =>
  expr ? [...namesIn(expr)].flatMap((name) => all.get(name) ?? []) : [];

const bySymbol = (definitions: readonly Definition[]): ReadonlyMap<string, Definition> =>
  new Map(definitions.map((definition) => [definition.symbol, definition]));

/** The circle as an issue at its first definition, at the name that leads on. */
function cycleIssue(circle: readonly Definition[], strategyId: string): Issue {
  const first = circle[0]!;
  const next = circle[1] ?? first;
  const expr = exprOf(formulaFor(first.formula, strategyId));
  const symbols = [...circle.map(({ symbol }) => symbol), first.symbol];
  const shown = symbols.length > MOST_NAMES ? [...symbols.slice(0, MOST_NAMES), '…'] : symbols;
  return error(
    'formula.cycle',
    formulaPath(first.formula, first.path, strategyId),
    { cycle: shown.join(' → '), length: circle.length },
    expr && placeOf(expr, next.symbol),
  );
}

/**
 * The order for one strategy. Issues: `formula.cycle`, params cycle (symbols joined by
 * arrows, the first again at the end) and length. A formula that does not parse counts
 * as using nothing.
 */
export function orderVariables(
  definitions: readonly Definition[],
  strategyId: string,
  budget: Budget = { left: Number.POSITIVE_INFINITY },
): Ordered {
  const all = bySymbol(definitions);
  const usesOf = ({ formula }: Definition) => named(exprOf(formulaFor(formula, strategyId)), all);
  const { order, circles } = sort(definitions, usesOf, budget);
  return { order, issues: circles.map((circle) => cycleIssue(circle, strategyId)) };
}

/**
 * One order for all strategies: after whatever any strategy's formula uses. Where it
 * runs in a circle, single strategies may still not; `orderVariables` tells.
 */
export function orderForAll(
  definitions: readonly Definition[],
  budget: Budget = { left: Number.POSITIVE_INFINITY },
): { order: readonly Definition[]; isCircular: boolean } {
  const all = bySymbol(definitions);
  const usesOf = ({ formula, path }: Definition) => {
    const texts = textsOf(formula, path, []);
    return texts.flatMap(({ text }) => named(exprOf(text), all));
  };
  const { order, circles } = sort(definitions, usesOf, budget);
  return { order, isCircular: circles.length > 0 };
}
