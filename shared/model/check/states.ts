import type { State } from '../document.ts';
import { error, type Issue, type Path, warning } from '../issue.ts';
import { MAX_EXPANDED_STATES } from '../limits.ts';
import type { Lookups } from './lookups.ts';
import { checkState, checkStrategyFormula } from './references-of.ts';

/** Number of states that the engine runs: a timed state counts once a tunnel. */
export function expandedStates(states: readonly State[]): number {
  return states.reduce((sum, state) => sum + (state.type === 'timed' ? (state.cycles ?? 1) : 1), 0);
}

/** Timed states say how many tunnels; all together stay within MAX_EXPANDED_STATES. */
export function checkStates({ document }: Lookups): Issue[] {
  const issues = document.states.flatMap((state, index) => checkTunnels(state, ['states', index]));
  const count = expandedStates(document.states);
  if (count > MAX_EXPANDED_STATES) {
    issues.push(error('states.tooMany', ['states'], { count, maximum: MAX_EXPANDED_STATES }));
  }
  return issues;
}

function checkTunnels({ id, type, cycles }: State, path: Path): Issue[] {
  if (type === 'timed' && cycles === undefined) {
    return [error('states.timedNeedsCycles', path, { state: id })];
  }
  if (type !== 'timed' && cycles !== undefined) {
    return [warning('states.cyclesNotUsed', [...path, 'cycles'], { state: id })];
  }
  return [];
}

/** Where the cohort starts: known states, none twice, the remainder not also given a share. */
export function checkStart(lookups: Lookups): Issue[] {
  const { remainder, shares } = lookups.document.start;
  const seen = new Set([remainder]);
  const issues = checkState(lookups, remainder, ['start', 'remainder']);
  shares.forEach(({ state, formula }, index) => {
    const path = ['start', 'shares', index];
    issues.push(...checkState(lookups, state, [...path, 'state']));
    issues.push(...checkStrategyFormula(lookups, formula, [...path, 'formula']));
    if (seen.has(state)) issues.push(error('start.stateTwice', [...path, 'state'], { state }));
    seen.add(state);
  });
  return issues;
}
