/**
 * Groups of correlated parameters after some of their members have been fixed. The
 * others keep the uncertainty they had (their marginal distribution together, not
 * conditional on the fixed values). The probabilities of a Dirichlet row cannot: they
 * sum to 1, so once one is fixed all are.
 */
import type { Distribution, Group } from './document.ts';

export interface Regrouped {
  readonly groups: Group[];
  /** Distributions of members whose group is gone, by parameter id. */
  readonly alone: ReadonlyMap<string, Distribution>;
}

/** Takes fixed members out of their groups; dissolves a group left with fewer than two. */
export function withoutFixed(groups: readonly Group[], fixed: ReadonlySet<string>): Regrouped {
  const kept: Group[] = [];
  const alone = new Map<string, Distribution>();
  for (const group of groups) {
    const free = group.members.flatMap((id, index) => (fixed.has(id) ? [] : [index]));
    if (free.length === group.members.length) kept.push(group);
    else if (group.type !== 'dirichlet' && free.length >= 2) kept.push(narrowed(group, free));
    else {
      for (const index of free) {
        const distribution = marginal(group, index);
        if (distribution) alone.set(group.members[index]!, distribution);
      }
    }
  }
  return { groups: kept, alone };
}

type Narrowable = Exclude<Group, { type: 'dirichlet' }>;

function narrowed(group: Narrowable, free: readonly number[]): Group {
  const members = pick(group.members, free);
  switch (group.type) {
    case 'multivariateNormal':
      return {
        ...group,
        members,
        means: pick(group.means, free),
        covariance: square(group.covariance, free),
      };
    case 'rankCorrelation':
      return { ...group, members, correlation: square(group.correlation, free) };
    case 'jointRows':
      return { ...group, members, rows: group.rows.map((row) => pick(row, free)) };
  }
}

/** The distribution of one member by itself, or null where it has its own already. */
export function marginal(group: Group, index: number): Distribution | null {
  switch (group.type) {
    case 'rankCorrelation':
      return null;
    case 'dirichlet':
      return { type: 'fixed' };
    case 'jointRows':
      return { type: 'empirical', values: group.rows.map((row) => row[index]!) };
    case 'multivariateNormal': {
      const mean = group.means[index]!;
      const sd = Math.sqrt(group.covariance[index]![index]!);
      if (sd === 0) return { type: 'fixed' };
      return group.scale === 'log'
        ? { type: 'lognormal', meanlog: mean, sdlog: sd }
        : { type: 'normal', mean, sd };
    }
  }
}

function pick<T>(list: readonly T[], indices: readonly number[]): T[] {
  return indices.map((index) => list[index]!);
}

function square(matrix: readonly (readonly number[])[], indices: readonly number[]): number[][] {
  return indices.map((row) => pick(matrix[row]!, indices));
}
