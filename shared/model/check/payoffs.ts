import { cycleCount } from '../cycles.ts';
import type { Payoff } from '../document.ts';
import { error, type Issue, type Path, warning } from '../issue.ts';
import type { Lookups } from './lookups.ts';
import { checkState, checkStrategies, checkStrategyFormula } from './references-of.ts';

type Of<T extends Payoff['type']> = Extract<Payoff, { type: T }>;

/** Payoffs name known strategies and states, and can be earned by the model's movements. */
export function checkPayoffs(lookups: Lookups): Issue[] {
  return lookups.document.payoffs.flatMap((payoff, index) => {
    const path = ['payoffs', index];
    return [
      ...checkStrategies(lookups, payoff.strategies, [...path, 'strategies']),
      ...checkByType(lookups, payoff, path),
    ];
  });
}

function checkByType(lookups: Lookups, payoff: Payoff, path: Path): Issue[] {
  if (payoff.type === 'state') return checkAmounts(lookups, payoff, path);
  const formula = [...path, 'formula'];
  const issues = checkStrategyFormula(lookups, payoff.formula, formula, payoff.strategies);
  if (payoff.type === 'movement') issues.push(...checkMove(lookups, payoff, path));
  if (payoff.type === 'once') issues.push(...checkOnce(lookups, payoff, path));
  return issues;
}

function checkAmounts(lookups: Lookups, payoff: Of<'state'>, path: Path): Issue[] {
  const seen = new Set<string>();
  return payoff.amounts.flatMap(({ state, formula }, index) => {
    const at = [...path, 'amounts', index];
    const issues = [
      ...checkState(lookups, state, [...at, 'state']),
      ...checkStrategyFormula(lookups, formula, [...at, 'formula'], payoff.strategies),
    ];
    if (seen.has(state)) issues.push(error('payoffs.stateTwice', [...at, 'state'], { state }));
    seen.add(state);
    return issues;
  });
}

/** Survival curves say who is where, not who moved: nothing to pay a movement on. */
function checkMove(lookups: Lookups, { id, from, to }: Of<'movement'>, path: Path): Issue[] {
  const issues: Issue[] = [];
  if (from !== undefined) issues.push(...checkState(lookups, from, [...path, 'from']));
  if (to !== undefined) issues.push(...checkState(lookups, to, [...path, 'to']));
  if (from !== undefined && from === to) {
    issues.push(error('payoffs.movementToSelf', [...path, 'to'], { state: from }));
  }
  if (lookups.document.movements.type === 'survival') {
    issues.push(error('payoffs.movementNeedsRows', path, { payoff: id }));
  }
  return issues;
}

function checkOnce(lookups: Lookups, { cycle, states }: Of<'once'>, path: Path): Issue[] {
  const seen = new Set<string>();
  const issues = (states ?? []).flatMap((state, index) => {
    const at = [...path, 'states', index];
    if (seen.has(state)) return [error('payoffs.stateTwice', at, { state })];
    seen.add(state);
    return checkState(lookups, state, at);
  });
  const cycles = cycleCount(lookups.document.question);
  if (cycle >= cycles) {
    issues.push(warning('payoffs.afterHorizon', [...path, 'cycle'], { cycle, cycles }));
  }
  return issues;
}
