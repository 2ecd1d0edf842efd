/**
 *   leaveGroups(document, parameterId): Edit[]
 *   dissolveGroup(document, groupId): Edit[]
 *   marginalIn(group, index): Distribution | null
 *
 * Parameters that part from the others of a group each keep the uncertainty they had:
 * their marginal distribution.
 */
import type { Distribution, Group, ModelDocument } from '../document.ts';
import { marginal, withoutFixed } from '../scenario-groups.ts';
import type { Edit, Json } from './edit.ts';

/** Takes a parameter out of its groups; a group left with one member is dissolved. */
export function leaveGroups(document: ModelDocument, parameter: string): Edit[] {
  const fixed = new Set([parameter]);
  const own = document.groups.filter(({ members }) => members.includes(parameter));
  return own.flatMap((group): Edit[] => {
    const narrowed = withoutFixed([group], fixed).groups[0];
    if (!narrowed) return dissolution(group, fixed);
    return [{ type: 'set', at: ['groups', { id: group.id }], value: narrowed as unknown as Json }];
  });
}

export function dissolveGroup(document: ModelDocument, id: string): Edit[] {
  return document.groups.filter((group) => group.id === id).flatMap((group) => dissolution(group));
}

function dissolution(group: Group, except: ReadonlySet<string> = new Set()): Edit[] {
  const alone = group.members.flatMap((id, index): Edit[] => {
    const distribution = except.has(id) ? null : marginalIn(group, index);
    if (!distribution) return [];
    const at = ['parameters', { id }, 'distribution'];
    return [{ type: 'set', at, value: distribution as unknown as Json }];
  });
  return [...alone, { type: 'remove', at: ['groups'], id: group.id }];
}

/**
 * The distribution of a member by itself; null where it has its own already.
 * One probability of a Dirichlet row is beta, with the row's other counts for its second
 * (Johnson, Kotz and Balakrishnan, Continuous Multivariate Distributions; from memory).
 */
export function marginalIn(group: Group, index: number): Distribution | null {
  if (group.type !== 'dirichlet') return marginal(group, index);
  const alpha = group.counts[index] ?? 1;
  const total = group.counts.reduce((sum, count) => sum + count, 0);
  return { type: 'beta', alpha, beta: total - alpha };
}
