/** The order in which a strategy's variables can be worked out, each after those it uses. */
import { error, type Issue } from '../model/issue.ts';
import { formulaFor } from '../model/strategy-formula.ts';
import { type Definition, formulaPath } from './definitions.ts';
import { namesIn, placeOf } from './names.ts';
import { parseFormula } from './parse.ts';

export interface Ordered {
  /** Every definition once; those of a cycle in no useful order. */
  readonly order: readonly Definition[];
  /** One `formula.cycle` a circle found. */
  readonly issues: readonly Issue[];
}

/** Circles reported, and names written out of a long one. */
const MOST_CYCLES = 20;
const MOST_NAMES = 12;

interface Visit {
  readonly definition: Definition;
  readonly uses: readonly Definition[];
  next: number;
}

/** Definitions that a definition's formula names, in the order of the text. */
function usesOf(definition: Definition, strategyId: string, all: ReadonlyMap<string, Definition>) {
  const text = formulaFor(definition.formula, strategyId);
  const expr = text === undefined ? undefined : parseFormula(text).expr;
  if (!expr) return [];
  return [...namesIn(expr)].flatMap((name) => all.get(name) ?? []);
}

/** The circle as an issue at its first definition, at the name that leads on. */
function cycleIssue(circle: readonly Definition[], strategyId: string): Issue {
  const first = circle[0]!;
  const next = circle[1] ?? first;
  const text = formulaFor(first.formula, strategyId);
  const expr = text === undefined ? undefined : parseFormula(text).expr;
  const symbols = [...circle.map(({ symbol }) => symbol), first.symbol];
  const shown = symbols.length > MOST_NAMES ? [...symbols.slice(0, MOST_NAMES), '…'] : symbols;
  const path = formulaPath(first.formula, first.path, strategyId);
  return error(
    'formula.cycle',
    path,
    { cycle: shown.join(' → '), length: circle.length },
    expr && placeOf(expr, next.symbol),
  );
}

/**
 * Depth first, without recursion, so that no chain of definitions is too long.
 * Issues: `formula.cycle`, params cycle (symbols joined by arrows, the first again
 * at the end) and length. A formula that does not parse counts as using nothing.
 */
export function orderVariables(definitions: readonly Definition[], strategyId: string): Ordered {
  const all = new Map(definitions.map((definition) => [definition.symbol, definition]));
  const done = new Set<Definition>();
  const issues: Issue[] = [];
  const trail: Visit[] = [];
  const onTrail = new Map<Definition, number>();

  const enter = (definition: Definition): void => {
    onTrail.set(definition, trail.length);
    trail.push({ definition, uses: usesOf(definition, strategyId, all), next: 0 });
  };
  const step = (visit: Visit): void => {
    const used = visit.uses[visit.next];
    visit.next += 1;
    if (!used) {
      trail.pop();
      onTrail.delete(visit.definition);
      done.add(visit.definition);
      return;
    }
    const from = onTrail.get(used);
    if (from === undefined) {
      if (!done.has(used)) enter(used);
    } else if (issues.length < MOST_CYCLES) {
      issues.push(
        cycleIssue(
          trail.slice(from).map((open) => open.definition),
          strategyId,
        ),
      );
    }
  };

  for (const definition of definitions) {
    if (!done.has(definition)) enter(definition);
    for (let visit = trail.at(-1); visit; visit = trail.at(-1)) step(visit);
  }
  return { order: [...done], issues };
}
