/** Against tests/golden/distributions.json, multivariate_normal (R 4.2.2 base::chol). */
import { describe, expect, it } from 'vitest';
import { standardNormalCdf } from '../../../shared/engine/distributions/normal.ts';
import { drawMultivariateNormal } from '../../../shared/engine/draw/multivariate-normal.ts';
import { streamOf, uniforms } from '../../../shared/engine/draw/stream.ts';
import type { Group } from '../../../shared/model/document.ts';
import { DocumentError } from '../../../shared/model/issue.ts';
import { expectClose } from '../close.ts';
import { goldenNormals } from '../distributions/golden.ts';
import { correlation, mean, spread } from './moments.ts';

type MultivariateNormal = Extract<Group, { type: 'multivariateNormal' }>;

const group = (means: number[], covariance: number[][], scale: 'identity' | 'log') =>
  ({
    id: 'g',
    label: 'Coefficients',
    type: 'multivariateNormal',
    members: means.map((_, i) => `m${i}`),
    means,
    covariance,
    scale,
  }) satisfies MultivariateNormal;

describe('drawMultivariateNormal', () => {
  it.each(goldenNormals)('$id: the worked draw', (golden) => {
    const columns = golden.z_example.map((z) => Float64Array.of(standardNormalCdf(z)));
    const drawn = drawMultivariateNormal(
      group(golden.mean, golden.covariance, 'identity'),
      columns,
    );
    golden.x_example.forEach((x, i) => {
      expectClose(drawn[i]?.[0] ?? 0, x, 1e-12, `x[${i}]`);
    });
  });

  it.each(goldenNormals)('$id: means, variances and correlations within 4 errors', (golden) => {
    const n = 10_000;
    const columns = golden.mean.map((_, i) => uniforms(streamOf(3, 'g', `${i}`), 0, n));
    const drawn = drawMultivariateNormal(
      group(golden.mean, golden.covariance, 'identity'),
      columns,
    );
    golden.mean.forEach((want, i) => {
      const sd = golden.sd[i] ?? 0;
      const column = drawn[i] ?? new Float64Array();
      expect(Math.abs(mean(column) - want)).toBeLessThan((4 * sd) / Math.sqrt(n));
      expect(Math.abs(spread(column) / sd ** 2 - 1)).toBeLessThan(4 * Math.sqrt(2 / n));
      for (let j = 0; j < i; j++) {
        const rho = golden.correlation[i]?.[j] ?? 0;
        const error = (1 - rho * rho) / Math.sqrt(n);
        expect(Math.abs(correlation(column, drawn[j] ?? []) - rho)).toBeLessThan(4 * error);
      }
    });
  });

  it('exponentiates on the log scale', () => {
    const columns = [Float64Array.of(0.5, 0.975)];
    const [drawn] = drawMultivariateNormal(group([0.3], [[0.04]], 'log'), columns);
    expectClose(drawn?.[0] ?? 0, Math.exp(0.3), 1e-14, 'median');
    expectClose(drawn?.[1] ?? 0, Math.exp(0.3 + 0.2 * 1.959963984540054), 1e-14, '97.5%');
  });

  it('refuses a matrix that is no covariance, by the name of the group', () => {
    const bad = group(
      [0, 0],
      [
        [1, 2],
        [2, 1],
      ],
      'identity',
    );
    const columns = [Float64Array.of(0.5), Float64Array.of(0.5)];
    expect(() => drawMultivariateNormal(bad, columns)).toThrow(DocumentError);
    expect(() => drawMultivariateNormal(bad, columns)).toThrow('group.notPositiveDefinite');
  });
});
