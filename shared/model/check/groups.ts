import type { Group, Parameter } from '../document.ts';
import { error, type Issue, type Path, warning } from '../issue.ts';
import type { Lookups } from './lookups.ts';

/** How far apart the two halves of a symmetric matrix may be. */
const SYMMETRY = 1e-9;
/** How far from 1 the values of a Dirichlet group may sum: values are often rounded. */
const VALUES_SUM = 1e-6;

/** Groups and their members name each other, and a group's numbers fit its members. */
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
    ...checkNumbers(group, path),
    ...checkValuesSum(lookups, group, path),
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

function checkNumbers(group: Group, path: Path): Issue[] {
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
      return checkCorrelation(group.correlation, size, [...path, 'correlation']);
    case 'jointRows':
      return group.rows.flatMap((row, at) => checkLength(row, size, [...path, 'rows', at]));
  }
}

function checkLength(list: readonly unknown[], expected: number, path: Path): Issue[] {
  if (list.length === expected) return [];
  return [error('groups.wrongLength', path, { expected, got: list.length })];
}

type Matrix = readonly (readonly number[])[];

function checkMatrix(matrix: Matrix, size: number, path: Path): Issue[] {
  const wrong = [
    ...checkLength(matrix, size, path),
    ...matrix.flatMap((row, at) => checkLength(row, size, [...path, at])),
  ];
  if (wrong.length > 0) return wrong;
  return matrix.flatMap((row, i) => {
    const j = row.findIndex((value, at) => !mirrors(value, matrix[at]![i]!));
    return j < 0
      ? []
      : [error('groups.notSymmetric', [...path, i, j], { row: i + 1, column: j + 1 })];
  });
}

function mirrors(a: number, b: number): boolean {
  return Math.abs(a - b) <= SYMMETRY * Math.max(1, Math.abs(a), Math.abs(b));
}

/** A correlation matrix: symmetric, 1 on the diagonal, all within [-1, 1]. */
function checkCorrelation(matrix: Matrix, size: number, path: Path): Issue[] {
  const wrong = checkMatrix(matrix, size, path);
  if (wrong.length > 0) return wrong;
  return matrix.flatMap((row, i) =>
    row.flatMap((value, j) => {
      if (i === j ? value === 1 : Math.abs(value) <= 1) return [];
      return [error('groups.notCorrelation', [...path, i, j], { value })];
    }),
  );
}

/** Probabilities of one row: their base values should sum to 1, as every draw does. */
function checkValuesSum({ parameters }: Lookups, group: Group, path: Path): Issue[] {
  if (group.type !== 'dirichlet') return [];
  const sum = group.members.reduce((total, id) => total + (parameters.get(id)?.value ?? 0), 0);
  if (Math.abs(sum - 1) <= VALUES_SUM) return [];
  return [warning('groups.valuesDoNotSum', [...path, 'members'], { group: group.id, sum })];
}
