/** Whether groups of parameters can be drawn together. */
import type { Group, ModelDocument, Parameter } from '../../model/document.ts';
import { error, hasErrors, type Issue, type Path, warning } from '../../model/issue.ts';
import { cholesky } from '../draw/cholesky.ts';
import { pearsonOfSpearman } from '../draw/rank-correlation.ts';
import { checkMember } from './check.ts';

type Matrix = readonly (readonly number[])[];

/** Relative difference of two mirrored entries that is rounding. */
const SYMMETRY = 1e-9;
/** How far the base values of a Dirichlet may be from summing to 1. */
const SUM_TOLERANCE = 0.005;

/**
 * Issues of all groups and of parameters that point to one. Errors: `group.unknownMember`,
 * `group.repeatedMember`, `group.memberInTwo`, `group.size`, `group.notPointing` (a member
 * does not say that it is in the group), `group.ownDistribution` (a member of a rank
 * correlation has none of its own), `group.memberFixed`, `group.notFinite`,
 * `group.notPositive`, `group.notSymmetric`, `group.notCorrelation`,
 * `group.notPositiveDefinite`, `distribution.noGroup`, and those of `checkDistribution` for the
 * member's marginal. Warnings: `group.kind`, `group.valuesSum`.
 */
export function checkGroups(document: ModelDocument): Issue[] {
  const { groups, parameters } = document;
  const byId = new Map(parameters.map((parameter) => [parameter.id, parameter]));
  const issues = [...checkPointers(parameters, groups), ...checkOverlap(groups, byId)];
  groups.forEach((group, i) => {
    const path = ['groups', i];
    const found = [
      ...checkMembers(group, byId, path),
      ...checkSizes(group, path),
      ...checkContent(group, path),
    ];
    issues.push(...found);
    if (!hasErrors(found)) issues.push(...checkMarginals(group, parameters, path));
  });
  return issues;
}

/** Every `inGroup` points to a group that lists it. */
function checkPointers(parameters: readonly Parameter[], groups: readonly Group[]): Issue[] {
  return parameters.flatMap(({ id, symbol, distribution }, i) => {
    if (distribution.type !== 'inGroup') return [];
    const group = groups.find((candidate) => candidate.id === distribution.group);
    if (group?.members.includes(id)) return [];
    const params = { parameter: symbol, group: distribution.group };
    return [error('distribution.noGroup', ['parameters', i, 'distribution'], params)];
  });
}

function checkOverlap(groups: readonly Group[], byId: ReadonlyMap<string, Parameter>): Issue[] {
  const first = new Map<string, Group>();
  return groups.flatMap((group, i) =>
    [...new Set(group.members)].flatMap((member) => {
      const other = first.get(member);
      if (!other) first.set(member, group);
      const parameter = byId.get(member)?.symbol ?? member;
      const params = { parameter, group: group.label, other: other?.label ?? '' };
      return other ? [error('group.memberInTwo', ['groups', i, 'members'], params)] : [];
    }),
  );
}

function checkMembers(group: Group, byId: ReadonlyMap<string, Parameter>, path: Path): Issue[] {
  return group.members.flatMap((member, i) => {
    const place = [...path, 'members', i];
    const params = { group: group.label, parameter: byId.get(member)?.symbol ?? member };
    if (group.members.indexOf(member) < i) return [error('group.repeatedMember', place, params)];
    const parameter = byId.get(member);
    return parameter
      ? checkMemberType(group, parameter, place, params)
      : [error('group.unknownMember', place, params)];
  });
}

function checkMemberType(
  group: Group,
  { distribution, kind }: Parameter,
  place: Path,
  params: Record<string, string>,
): Issue[] {
  if (group.type === 'rankCorrelation') {
    if (distribution.type === 'inGroup') return [error('group.ownDistribution', place, params)];
    return distribution.type === 'fixed' ? [error('group.memberFixed', place, params)] : [];
  }
  const points = distribution.type === 'inGroup' && distribution.group === group.id;
  if (!points) return [error('group.notPointing', place, params)];
  const suits = group.type !== 'dirichlet' || kind === 'probability';
  return suits ? [] : [warning('group.kind', place, { ...params, kind })];
}

/** Lists and matrices have a place for each member. */
function checkSizes(group: Group, path: Path): Issue[] {
  const want = group.members.length;
  return sizesOf(group).flatMap(([name, sizes]) => {
    const got = sizes.find((size) => size !== want);
    const params = { group: group.label, name, want, got: got ?? want };
    return got === undefined ? [] : [error('group.size', [...path, name], params)];
  });
}

function sizesOf(group: Group): [string, number[]][] {
  const square = (matrix: Matrix) => [matrix.length, ...matrix.map((row) => row.length)];
  switch (group.type) {
    case 'dirichlet':
      return [['counts', [group.counts.length]]];
    case 'multivariateNormal':
      return [
        ['means', [group.means.length]],
        ['covariance', square(group.covariance)],
      ];
    case 'rankCorrelation':
      return [['correlation', square(group.correlation)]];
    case 'jointRows':
      return [['rows', group.rows.map((row) => row.length)]];
  }
}

function checkContent(group: Group, path: Path): Issue[] {
  const label = { group: group.label };
  const finite = numbersOf(group).every(Number.isFinite);
  if (!finite) return [error('group.notFinite', path, label)];
  if (group.type === 'dirichlet' && group.counts.some((count) => count <= 0)) {
    return [error('group.notPositive', [...path, 'counts'], label)];
  }
  if (group.type === 'multivariateNormal') {
    return checkMatrix(group.covariance, group.covariance, [...path, 'covariance'], label);
  }
  if (group.type !== 'rankCorrelation') return [];
  const place = [...path, 'correlation'];
  const isCorrelation = group.correlation.every((row, i) =>
    row.every((rho, j) => (i === j ? rho === 1 : Math.abs(rho) <= 1)),
  );
  if (!isCorrelation) return [error('group.notCorrelation', place, label)];
  return checkMatrix(group.correlation, pearsonOfSpearman(group.correlation), place, label);
}

function numbersOf(group: Group): readonly number[] {
  switch (group.type) {
    case 'dirichlet':
      return group.counts;
    case 'multivariateNormal':
      return [...group.means, ...group.covariance.flat()];
    case 'rankCorrelation':
      return group.correlation.flat();
    case 'jointRows':
      return group.rows.flat();
  }
}

/** `factored` is what the draws take the root of. */
function checkMatrix(
  matrix: Matrix,
  factored: Matrix,
  path: Path,
  label: { group: string },
): Issue[] {
  const symmetric = matrix.every((row, i) =>
    row.every((value, j) => {
      const other = matrix[j]?.[i] ?? Number.NaN;
      return Math.abs(value - other) <= SYMMETRY * Math.max(Math.abs(value), Math.abs(other));
    }),
  );
  if (!symmetric) return [error('group.notSymmetric', path, label)];
  return cholesky(factored) ? [] : [error('group.notPositiveDefinite', path, label)];
}

/** What each member is by itself, and what the base values of a Dirichlet sum to. */
function checkMarginals(group: Group, parameters: readonly Parameter[], path: Path): Issue[] {
  if (group.type === 'rankCorrelation') return [];
  const issues = parameters.flatMap((parameter, i) =>
    group.members.includes(parameter.id) ? checkMember(parameter, [group], ['parameters', i]) : [],
  );
  if (group.type !== 'dirichlet') return issues;
  const values = parameters.filter(({ id }) => group.members.includes(id));
  const sum = values.reduce((total, { value }) => total + value, 0);
  if (Math.abs(sum - 1) <= SUM_TOLERANCE) return issues;
  return [...issues, warning('group.valuesSum', path, { group: group.label, sum })];
}
