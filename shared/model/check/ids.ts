import type { ModelDocument } from '../document.ts';
import { error, type Issue, type Path } from '../issue.ts';

type Listed = readonly { readonly id: string }[];

/** Every list's ids are its own: `ids.duplicate`, at the later of the two. */
export function checkIds(document: ModelDocument): Issue[] {
  return listsOf(document).flatMap(([path, list]) => duplicates(list, path));
}

function duplicates(list: Listed, path: Path): Issue[] {
  const seen = new Set<string>();
  const issues: Issue[] = [];
  list.forEach(({ id }, index) => {
    if (seen.has(id)) issues.push(error('ids.duplicate', [...path, index, 'id'], { id }));
    seen.add(id);
  });
  return issues;
}

function listsOf(document: ModelDocument): [Path, Listed][] {
  const lists: [Path, Listed][] = [
    [['question', 'thresholds'], document.question.thresholds],
    [['strategies'], document.strategies],
    [['covariates'], document.covariates],
    [['profiles'], document.profiles],
    [['parameters'], document.parameters],
    [['groups'], document.groups],
    [['tables'], document.tables],
    [['variables'], document.variables],
    [['states'], document.states],
    [['start', 'shares'], document.start.shares],
    [['payoffs'], document.payoffs],
    [['scenarios'], document.scenarios],
    [['analysis', 'designs'], document.analysis.designs],
    ...movementLists(document.movements),
  ];
  document.payoffs.forEach((payoff, index) => {
    if (payoff.type === 'state') lists.push([['payoffs', index, 'amounts'], payoff.amounts]);
  });
  return lists;
}

function movementLists(movements: ModelDocument['movements']): [Path, Listed][] {
  if (movements.type === 'survival') return [[['movements', 'curves'], movements.curves]];
  const cells = movements.rows.map((row, index): [Path, Listed] => [
    ['movements', 'rows', index, 'cells'],
    row.cells,
  ]);
  return [[['movements', 'rows'], movements.rows], ...cells];
}
