/**
 * Groups of parameters that are uncertain together.
 *
 *   newGroup(document, type, members, label): Edit[]
 *   withMember(document, group, parameter): Edit[]
 *   setMirrored(matrix, row, column, value): number[][]
 */
import { distributionOf } from '../../../../shared/engine/distributions/distribution.ts';
import type { Group, ModelDocument, Parameter } from '../../../../shared/model/document.ts';
import type { Edit, Json } from '../../../../shared/model/edit/edit.ts';
import { freshId } from '../../../../shared/model/edit/fresh-id.ts';

type GroupType = Group['type'];

/** Parameters that no group holds yet. */
export function ungrouped({ parameters, groups }: ModelDocument): Parameter[] {
  const held = new Set(groups.flatMap(({ members }) => members));
  return parameters.filter(({ id }) => !held.has(id));
}

export function newGroup(
  document: ModelDocument,
  type: GroupType,
  members: readonly Parameter[],
  label: string,
): Edit[] {
  const taken = document.groups.map((group) => group.id);
  const id = freshId(taken, label);
  const base = { id, label, members: members.map((member) => member.id) };
  const item = { ...base, ...numbersOf(type, members) };
  return [
    { type: 'insert', at: ['groups'], item: item as never, before: null },
    ...members.flatMap((member) => pointing(type, id, member)),
  ];
}

function numbersOf(type: GroupType, members: readonly Parameter[]): Record<string, Json> {
  const diagonal = (at: (member: Parameter) => number) =>
    members.map((member, row) => members.map((_, column) => (row === column ? at(member) : 0)));
  switch (type) {
    case 'dirichlet':
      return { type, counts: members.map(countOf) };
    case 'multivariateNormal':
      return {
        type,
        means: members.map(({ value }) => value),
        covariance: diagonal(varianceOf),
        scale: 'identity',
      };
    case 'rankCorrelation':
      return { type, correlation: diagonal(() => 1) };
    case 'jointRows':
      return { type, rows: [members.map(({ value }) => value)] };
  }
}

/** Members of a rank correlation keep their own distributions. */
function pointing(type: GroupType, group: string, { id }: Parameter): Edit[] {
  if (type === 'rankCorrelation') return [];
  const at = ['parameters', { id }, 'distribution'];
  return [{ type: 'set', at, value: { type: 'inGroup', group } }];
}

export function withMember(document: ModelDocument, group: Group, parameter: Parameter): Edit[] {
  const own = document.parameters.filter(({ id }) => group.members.includes(id));
  const value = { ...group, members: [...group.members, parameter.id], ...grown(group, parameter) };
  return [
    { type: 'set', at: ['groups', { id: group.id }], value: value as unknown as Json },
    ...(own.length === 0 ? [] : pointing(group.type, group.id, parameter)),
  ];
}

function grown(group: Group, parameter: Parameter): Partial<Record<string, unknown>> {
  switch (group.type) {
    case 'dirichlet':
      return { counts: [...group.counts, countOf(parameter)] };
    case 'multivariateNormal': {
      const log = group.scale === 'log';
      const mean = log ? Math.log(Math.max(parameter.value, Number.MIN_VALUE)) : parameter.value;
      return {
        means: [...group.means, mean],
        covariance: bordered(group.covariance, log ? 0.04 : varianceOf(parameter)),
      };
    }
    case 'rankCorrelation':
      return { correlation: bordered(group.correlation, 1) };
    case 'jointRows':
      return { rows: group.rows.map((row) => [...row, parameter.value]) };
  }
}

/** One more row and column, of 0 but for the corner. */
function bordered(matrix: readonly (readonly number[])[], corner: number): number[][] {
  return [...matrix.map((row) => [...row, 0]), [...matrix.map(() => 0), corner]];
}

const SURE = 100;

/** The events that a probability rests on, or as if it rested on a hundred persons. */
function countOf({ value, distribution }: Parameter): number {
  if (distribution.type === 'beta') return distribution.alpha;
  return value > 0 ? value * SURE : 1;
}

function varianceOf({ value, distribution }: Parameter): number {
  const assumed = (0.2 * (Math.abs(value) || 1)) ** 2;
  if (distribution.type === 'inGroup' || distribution.type === 'fixed') return assumed;
  const { variance } = distributionOf(distribution, value);
  return Number.isFinite(variance) && variance > 0 ? variance : assumed;
}

/** The matrix with one entry changed, and the one across the diagonal from it. */
export function setMirrored(
  matrix: readonly (readonly number[])[],
  row: number,
  column: number,
  value: number,
): number[][] {
  return matrix.map((line, r) =>
    line.map((old, c) =>
      (r === row && c === column) || (r === column && c === row) ? value : old,
    ),
  );
}
