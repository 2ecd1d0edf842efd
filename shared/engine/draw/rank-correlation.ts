/**
 * Draws with a given rank correlation and unchanged margins, by a Gaussian copula. A
 * Spearman correlation rho of the draws comes from a Pearson correlation 2 sin(pi rho / 6)
 * of the normals behind them (Pearson 1907; Kruskal 1958).
 */
import sin from '@stdlib/math-base-special-sin';
import type { Group } from '../../model/document.ts';
import { standardNormalCdf } from '../distributions/normal.ts';
import { cholesky } from './cholesky.ts';
import { correlatedNormals } from './correlated-normals.ts';
import { groupError } from './group-error.ts';

type RankCorrelation = Extract<Group, { type: 'rankCorrelation' }>;

/** The normals' correlation matrix behind a matrix of Spearman correlations. */
export function pearsonOfSpearman(matrix: readonly (readonly number[])[]): number[][] {
  return matrix.map((row, i) => row.map((rho, j) => (i === j ? 1 : 2 * sin((Math.PI * rho) / 6))));
}

/**
 * Correlated uniforms, a column a member, from independent ones; each goes through its
 * member's own quantile. Throws DocumentError `group.notPositiveDefinite`.
 */
export function correlateUniforms(
  group: RankCorrelation,
  uniforms: readonly Float64Array[],
): Float64Array[] {
  const lower = cholesky(pearsonOfSpearman(group.correlation));
  if (!lower) throw groupError('group.notPositiveDefinite', group);
  return correlatedNormals(lower, uniforms).map((column) => column.map(inside));
}

/** Keeps a probability strictly inside (0, 1), where every quantile is finite or known. */
function inside(z: number): number {
  return Math.min(Math.max(standardNormalCdf(z), 2 ** -53), 1 - 2 ** -53);
}
