/** Joint normal draws: mean + L z with L the Cholesky factor of the covariance. */
import exp from '@stdlib/math-base-special-exp';
import type { Group } from '../../model/document.ts';
import { cholesky } from './cholesky.ts';
import { correlatedNormals } from './correlated-normals.ts';
import { groupError } from './group-error.ts';

type MultivariateNormal = Extract<Group, { type: 'multivariateNormal' }>;

/**
 * A column a member from a column of uniforms a member. Where the group's scale is `log`
 * each draw is exponentiated. Throws DocumentError `group.notPositiveDefinite`.
 */
export function drawMultivariateNormal(
  group: MultivariateNormal,
  uniforms: readonly Float64Array[],
): Float64Array[] {
  const lower = cholesky(group.covariance);
  if (!lower) throw groupError('group.notPositiveDefinite', group);
  return correlatedNormals(lower, uniforms).map((column, i) => {
    const mean = group.means[i] ?? Number.NaN;
    return column.map((z) => (group.scale === 'log' ? exp(mean + z) : mean + z));
  });
}
