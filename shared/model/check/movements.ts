import type { ModelDocument } from '../document.ts';
import { error, type Issue } from '../issue.ts';
import type { Lookups } from './lookups.ts';
import { checkState, checkStrategyFormula } from './references-of.ts';
import { checkRows } from './rows.ts';

type Survival = Extract<ModelDocument['movements'], { type: 'survival' }>;

/** Rows or survival curves, each by its own rules. */
export function checkMovements(lookups: Lookups): Issue[] {
  const { movements } = lookups.document;
  if (movements.type === 'rows') return checkRows(lookups, movements.rows);
  return checkCurves(lookups, movements);
}

/**
 * The curves' states in their order, then `last`, name every state once; none is
 * timed, since a curve says how many are in a state and not since when.
 */
function checkCurves(lookups: Lookups, { curves, last }: Survival): Issue[] {
  const path = ['movements', 'curves'];
  const issues = curves.flatMap(({ state, formula }, index) => [
    ...checkState(lookups, state, [...path, index, 'state']),
    ...checkStrategyFormula(lookups, formula, [...path, index, 'formula']),
  ]);
  issues.push(...checkState(lookups, last, ['movements', 'last']));
  const seen = new Set<string>();
  for (const id of [...curves.map(({ state }) => state), last]) {
    if (seen.has(id)) issues.push(error('movements.stateInTwoCurves', path, { state: id }));
    seen.add(id);
  }
  return [...issues, ...checkCovered(lookups, seen)];
}

function checkCovered({ document }: Lookups, covered: ReadonlySet<string>): Issue[] {
  return document.states.flatMap(({ id, type }, index) => {
    if (!covered.has(id)) {
      return [error('movements.stateWithoutCurve', ['movements', 'curves'], { state: id })];
    }
    if (type !== 'timed') return [];
    return [error('movements.timedUnderCurves', ['states', index, 'type'], { state: id })];
  });
}
