import type { Group, Parameter } from '../document.ts';
import { error, type Issue, type Path } from '../issue.ts';
import type { Lookups } from './lookups.ts';

/**
 * Groups and their members name each other, and a group has a number for each member.
 * Whether the numbers can be drawn from is for the engine to say (its distributions).
 */
export function checkGroups(lookups: Lookups): Issue[] {
  const { document } = lookups;
  return [
    ...document.groups.flatMap((group, index) => checkGroup(lookups, group, ['groups', index])),
    ...document.parameters.flatMap((parameter, index) =>
      checkMembership(lookups, parameter, ['parameters', index, 'distribution', 'group']),
    ),
  ];
}

/** A parameter drawn in a group points to one that draws, and that lists it. */
function checkMembership(
  { groups }: Lookups,
  { id, distribution }: Parameter,
  path: Path,
): Issue[] {
  if (distribution.type !== 'inGroup') return [];
  const group = groups.get(distribution.group);
  if (!group) return [error('groups.unknown', path, { id: distribution.group })];
  if (group.members.includes(id)) return [];
  return [error('groups.doesNotListMember', path, { parameter: id, group: group.id })];
}

function checkGroup(lookups: Lookups, group: Group, path: Path): Issue[] {
  return [
    ...group.members.flatMap((id, index) =>
      checkMember(lookups, group, id, index, [...path, 'members', index]),
    ),
    ...checkSizes(group, path),
  ];
}

function checkMember(
  { parameters }: Lookups,
  group: Group,
  id: string,
  index: number,
  path: Path,
): Issue[] {
  const parameter = parameters.get(id);
  if (!parameter) return [error('parameters.unknown', path, { id })];
  if (group.members.indexOf(id) < index) return [error('groups.memberTwice', path, { id })];
  const { distribution } = parameter;
  const params = { parameter: id, group: group.id };
  if (group.type === 'rankCorrelation') {
    // Correlated ranks need a distribution of the member's own to be ranks of.
    if (distribution.type !== 'inGroup') return [];
    return [error('groups.memberNeedsOwnDistribution', path, params)];
  }
  if (distribution.type === 'inGroup' && distribution.group === group.id) return [];
  return [error('groups.memberNotInGroup', path, params)];
}

function checkSizes(group: Group, path: Path): Issue[] {
  const size = group.members.length;
  switch (group.type) {
    case 'dirichlet':
      return checkLength(group.counts, size, [...path, 'counts']);
    case 'multivariateNormal':
      return [
        ...checkLength(group.means, size, [...path, 'means']),
        ...checkMatrix(group.covariance, size, [...path, 'covariance']),
      ];
    case 'rankCorrelation':
      return checkMatrix(group.correlation, size, [...path, 'correlation']);
    case 'jointRows':
      return checkRows(group.rows, size, [...path, 'rows']);
  }
}

function checkLength(list: readonly unknown[], expected: number, path: Path): Issue[] {
  if (list.length === expected) return [];
  return [error('groups.wrongLength', path, { expected, got: list.length })];
}

function checkMatrix(matrix: readonly (readonly number[])[], size: number, path: Path): Issue[] {
  return [
    ...checkLength(matrix, size, path),
    ...matrix.flatMap((row, at) => checkLength(row, size, [...path, at])),
  ];
}

/** The first row that does not fit: a sample has up to 100,000. */
function checkRows(rows: readonly (readonly number[])[], size: number, path: Path): Issue[] {
  const at = rows.findIndex((row) => row.length !== size);
  return at < 0 ? [] : checkLength(rows[at]!, size, [...path, at]);
}
