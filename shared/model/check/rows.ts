import type { Row } from '../document.ts';
import { error, type Issue, type Path } from '../issue.ts';
import type { Lookups } from './lookups.ts';
import { checkState, checkStrategies, checkStrategyFormula } from './references-of.ts';

/** Every row is sound, and each living state has exactly one row under each strategy. */
export function checkRows(lookups: Lookups, rows: readonly Row[]): Issue[] {
  return [
    ...rows.flatMap((row, index) => checkRow(lookups, row, ['movements', 'rows', index])),
    ...checkCoverage(lookups, rows),
  ];
}

function checkRow(lookups: Lookups, row: Row, path: Path): Issue[] {
  const issues = [
    ...checkState(lookups, row.from, [...path, 'from']),
    ...checkStrategies(lookups, row.strategies, [...path, 'strategies']),
    ...checkRest(lookups, row, path),
    ...checkCells(lookups, row, path),
  ];
  if (lookups.states.get(row.from)?.type === 'absorbing') {
    issues.push(error('movements.absorbingHasRow', [...path, 'from'], { state: row.from }));
  }
  return issues;
}

/** The destination that needs no formula, by basis, is a state. */
function checkRest(lookups: Lookups, row: Row, path: Path): Issue[] {
  if (row.basis === 'probabilities') {
    return checkState(lookups, row.remainder, [...path, 'remainder']);
  }
  if (row.basis === 'logit') return checkState(lookups, row.reference, [...path, 'reference']);
  return [];
}

/** Destinations are states, none twice, none the one that needs no formula. */
function checkCells(lookups: Lookups, row: Row, path: Path): Issue[] {
  const seen = new Set<string>();
  const rest = restOf(row);
  return row.cells.flatMap(({ to, formula }, index) => {
    const at = [...path, 'cells', index];
    const issues = [
      ...checkState(lookups, to, [...at, 'to']),
      ...checkStrategyFormula(lookups, formula, [...at, 'formula'], row.strategies),
    ];
    if (to === rest.state) issues.push(error(rest.code, [...at, 'to'], { state: to }));
    if (seen.has(to))
      issues.push(error('movements.destinationTwice', [...at, 'to'], { state: to }));
    seen.add(to);
    return issues;
  });
}

function restOf(row: Row): { state: string; code: string } {
  switch (row.basis) {
    case 'probabilities':
      return { state: row.remainder, code: 'movements.remainderIsCell' };
    case 'logit':
      return { state: row.reference, code: 'movements.referenceIsCell' };
    case 'rates':
      // Staying takes what the rates leave; a rate to stay has no meaning.
      return { state: row.from, code: 'movements.rateToSelf' };
  }
}

function checkCoverage({ document, strategies }: Lookups, rows: readonly Row[]): Issue[] {
  const issues: Issue[] = [];
  /** By state, by strategy: index of the row that holds. */
  const taken = new Map<string, Map<string, number>>();
  rows.forEach((row, index) => {
    const mine = taken.get(row.from) ?? new Map<string, number>();
    taken.set(row.from, mine);
    for (const strategy of new Set(row.strategies ?? strategies)) {
      if (!mine.has(strategy)) mine.set(strategy, index);
      else issues.push(overlap(row, index, strategy));
    }
  });
  for (const state of document.states) {
    if (state.type === 'absorbing') continue;
    for (const strategy of strategies) {
      if (taken.get(state.id)?.has(strategy)) continue;
      const params = { state: state.id, strategy };
      issues.push(error('movements.missingRow', ['movements', 'rows'], params));
    }
  }
  return issues;
}

function overlap(row: Row, index: number, strategy: string): Issue {
  const params = { state: row.from, strategy };
  return error('movements.overlappingRows', ['movements', 'rows', index], params);
}
