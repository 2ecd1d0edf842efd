/**
 * Spearman correlation by a Gaussian copula: rho_S = (6 / pi) asin(r / 2) for normals with
 * Pearson correlation r (Pearson 1907).
 */
import { describe, expect, it } from 'vitest';
import { distributionOf } from '../../../shared/engine/distributions/distribution.ts';
import { drawParameters } from '../../../shared/engine/draw/draw.ts';
import { pearsonOfSpearman } from '../../../shared/engine/draw/rank-correlation.ts';
import type { Group, Parameter } from '../../../shared/model/document.ts';
import { expectClose } from '../close.ts';
import { mean, spearman, spread } from './moments.ts';
import { parameter } from './parameter.ts';

const n = 10_000;
const parameters: Parameter[] = [
  parameter('cost', { type: 'gamma', shape: 4, scale: 100 }),
  parameter('share', { type: 'beta', alpha: 3, beta: 7 }),
  parameter('ratio', { type: 'lognormal', meanlog: -0.4, sdlog: 0.3 }),
];
const group: Group = {
  id: 'g',
  label: 'Together',
  type: 'rankCorrelation',
  members: ['cost', 'share', 'ratio'],
  correlation: [
    [1, 0.6, -0.3],
    [0.6, 1, 0.2],
    [-0.3, 0.2, 1],
  ],
};
const draw = (groups: Group[], plan: 'plain' | 'lhs' | 'sobol' = 'plain') =>
  drawParameters(parameters, groups, { samples: n, seed: 4, plan }, 0, n);

describe('pearsonOfSpearman', () => {
  it('undoes (6 / pi) asin(r / 2)', () => {
    for (const rho of [-1, -0.5, 0, 0.3, 0.9]) {
      const r =
        pearsonOfSpearman([
          [1, rho],
          [rho, 1],
        ])[0]?.[1] ?? 0;
      expectClose((6 / Math.PI) * Math.asin(r / 2), rho, 1e-14, `rho ${rho}`);
    }
  });
});

describe.each(['plain', 'lhs', 'sobol'] as const)('a rank correlation, %s plan', (plan) => {
  const drawn = draw([group], plan);
  const column = (id: string | undefined) => drawn.get(id ?? '') ?? new Float64Array();

  it('is found between the draws within 4 errors', () => {
    group.members.forEach((id, i) => {
      for (let j = 0; j < i; j++) {
        const rho = group.type === 'rankCorrelation' ? (group.correlation[i]?.[j] ?? 0) : 0;
        const got = spearman(column(id), column(group.members[j]));
        // Fieller, Hartley and Pearson 1957: 1.03 (1 - rho^2) / sqrt(n), about.
        expect(Math.abs(got - rho)).toBeLessThan((4 * 1.03 * (1 - rho * rho)) / Math.sqrt(n));
      }
    });
  });

  it('leaves the margins as they are', () => {
    for (const { id, distribution } of parameters) {
      if (distribution.type === 'inGroup') throw new Error(id);
      const law = distributionOf(distribution, 0);
      const uniform = column(id).map(law.cdf);
      expect(Math.abs(mean(uniform) - 0.5)).toBeLessThan(4 / Math.sqrt(12 * n));
      expect(Math.abs(spread(uniform) - 1 / 12)).toBeLessThan(4 / Math.sqrt(180 * n));
    }
  });
});

it('is none without the group', () => {
  const drawn = draw([]);
  const got = spearman(drawn.get('cost') ?? [], drawn.get('share') ?? []);
  expect(Math.abs(got)).toBeLessThan(4 / Math.sqrt(n));
});
