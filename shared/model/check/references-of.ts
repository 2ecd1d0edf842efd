import type { StrategyFormula } from '../document.ts';
import { error, type Issue, type Path } from '../issue.ts';
import type { Lookups } from './lookups.ts';

/** A state that a part of the document names: `states.unknown` where there is none. */
export function checkState(lookups: Lookups, state: string, path: Path): Issue[] {
  return lookups.states.has(state) ? [] : [error('states.unknown', path, { id: state })];
}

/** A strategy that a part of the document names: `strategies.unknown` where there is none. */
export function checkStrategy(lookups: Lookups, strategy: string, path: Path): Issue[] {
  if (lookups.strategies.has(strategy)) return [];
  return [error('strategies.unknown', path, { id: strategy })];
}

/** The strategies that a part is limited to: all known, none twice, at least one. */
export function checkStrategies(
  lookups: Lookups,
  strategies: readonly string[] | undefined,
  path: Path,
): Issue[] {
  if (!strategies) return [];
  if (strategies.length === 0) return [error('strategies.noneListed', path)];
  const seen = new Set<string>();
  return strategies.flatMap((id, index) => {
    if (seen.has(id)) return [error('strategies.listedTwice', [...path, index], { id })];
    seen.add(id);
    return checkStrategy(lookups, id, [...path, index]);
  });
}

/**
 * A formula by strategy names known strategies and leaves none of `needed` (all
 * where absent) without a formula: `formula.missingForStrategy`.
 */
export function checkStrategyFormula(
  lookups: Lookups,
  formula: StrategyFormula,
  path: Path,
  needed: Iterable<string> = lookups.strategies,
): Issue[] {
  if (typeof formula === 'string') return [];
  const issues = Object.keys(formula.byStrategy).flatMap((id) =>
    checkStrategy(lookups, id, [...path, 'byStrategy', id]),
  );
  if (formula.otherwise !== undefined) return issues;
  for (const id of needed) {
    if (Object.hasOwn(formula.byStrategy, id)) continue;
    issues.push(error('formula.missingForStrategy', path, { strategy: id }));
  }
  return issues;
}
