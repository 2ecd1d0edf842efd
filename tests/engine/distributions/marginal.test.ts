import { describe, expect, it } from 'vitest';
import { marginalOf } from '../../../shared/engine/distributions/marginal.ts';
import type { Group } from '../../../shared/model/document.ts';
import { expectClose } from '../close.ts';
import { parameter } from '../draw/parameter.ts';
import { goldenDirichlets, goldenNormals } from './golden.ts';

const member = (id: string) => parameter(id, { type: 'inGroup', group: 'g' });
const named = (count: number) => Array.from({ length: count }, (_, i) => `m${i}`);

describe('marginalOf', () => {
  it.each(goldenDirichlets)('$id: the beta margins of R', ({ alpha, marginals, variance }) => {
    const members = named(alpha.length);
    const group: Group = { id: 'g', label: 'g', type: 'dirichlet', members, counts: alpha };
    marginals.forEach(({ q025, q975 }, i) => {
      const law = marginalOf(member(`m${i}`), [group]);
      expectClose(law.quantile(0.025), q025, 1e-12, 'q025');
      expectClose(law.quantile(0.975), q975, 1e-12, 'q975');
      expectClose(law.variance, variance[i] ?? 0, 1e-14, 'variance');
    });
  });

  it.each(goldenNormals)('$id: normal margins', ({ mean, sd, covariance }) => {
    const members = named(mean.length);
    const base = { id: 'g', label: 'g', type: 'multivariateNormal', members, means: mean } as const;
    mean.forEach((want, i) => {
      const plain = marginalOf(member(`m${i}`), [{ ...base, covariance, scale: 'identity' }]);
      expectClose(plain.mean, want, 1e-14, 'mean');
      expectClose(Math.sqrt(plain.variance), sd[i] ?? 0, 1e-14, 'sd');
      const log = marginalOf(member(`m${i}`), [{ ...base, covariance, scale: 'log' }]);
      expectClose(Math.log(log.quantile(0.5)), want, 1e-12, 'median');
    });
  });

  it('is the column of joint rows, and a parameter its own distribution', () => {
    const rows = [
      [1, 5],
      [3, 6],
    ];
    const group: Group = { id: 'g', label: 'g', type: 'jointRows', members: ['a', 'b'], rows };
    expect(marginalOf(member('a'), [group]).mean).toBe(2);
    expect(marginalOf(member('b'), [group]).support).toEqual([5, 6]);
    expect(marginalOf(parameter('x', { type: 'fixed' }, 7), []).mean).toBe(7);
  });

  it('throws where there is no group', () => {
    expect(() => marginalOf(member('a'), [])).toThrow('distribution.noGroup');
  });
});
