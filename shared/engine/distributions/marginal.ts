/** The distribution of one parameter by itself, whatever it is uncertain together with. */
import type { Group, Parameter } from '../../model/document.ts';
import { DocumentError, error } from '../../model/issue.ts';
import { beta } from './beta.ts';
import { distributionOf } from './distribution.ts';
import { empirical } from './empirical.ts';
import { lognormal } from './lognormal.ts';
import { normal } from './normal.ts';
import type { Univariate } from './univariate.ts';

/**
 * The marginal of `parameter`: its own distribution, or what its group gives it alone
 * (Dirichlet: beta; multivariate normal: normal or log-normal; rows: their column).
 * Throws DocumentError `distribution.noGroup` where it points to no fitting group.
 */
export function marginalOf(parameter: Parameter, groups: readonly Group[]): Univariate {
  const { distribution } = parameter;
  if (distribution.type !== 'inGroup') return distributionOf(distribution, parameter.value);
  const group = groups.find((candidate) => candidate.id === distribution.group);
  const index = group?.members.indexOf(parameter.id) ?? -1;
  const marginal = group && index >= 0 ? marginalIn(group, index) : undefined;
  if (marginal) return marginal;
  throw new DocumentError([
    error('distribution.noGroup', ['parameters', parameter.id], {
      parameter: parameter.symbol,
      group: distribution.group,
    }),
  ]);
}

function marginalIn(group: Group, index: number): Univariate | undefined {
  if (group.type === 'dirichlet') {
    const total = group.counts.reduce((sum, count) => sum + count, 0);
    const count = group.counts[index] ?? Number.NaN;
    return beta({ alpha: count, beta: total - count });
  }
  if (group.type === 'multivariateNormal') {
    const mean = group.means[index] ?? Number.NaN;
    const sd = Math.sqrt(group.covariance[index]?.[index] ?? Number.NaN);
    return group.scale === 'log' ? lognormal({ meanlog: mean, sdlog: sd }) : normal({ mean, sd });
  }
  if (group.type === 'jointRows') {
    return empirical({ values: group.rows.map((row) => row[index] ?? Number.NaN) });
  }
  return undefined;
}
