import { describe, expect, it } from 'vitest';
import { distributionOf } from '../../../shared/engine/distributions/distribution.ts';
import { drawParameters } from '../../../shared/engine/draw/draw.ts';
import type { SamplingSettings } from '../../../shared/engine/results.ts';
import type { Group, Parameter } from '../../../shared/model/document.ts';
import { DocumentError } from '../../../shared/model/issue.ts';
import { goldenCases } from '../distributions/golden.ts';
import { mean, spread } from './moments.ts';
import { parameter } from './parameter.ts';

const PLANS = ['plain', 'lhs', 'sobol'] as const;

/** One parameter a reference distribution. */
const golden = goldenCases.map(({ id, distribution }) => parameter(id, distribution));

const dirichlet: Group = {
  id: 'moves',
  label: 'Moves',
  type: 'dirichlet',
  members: ['d1', 'd2', 'd3'],
  counts: [5, 3, 2],
};
const members = dirichlet.members.map((id) =>
  parameter(id, { type: 'inGroup', group: dirichlet.id }),
);

const settings = (more: Partial<SamplingSettings> = {}): SamplingSettings => ({
  samples: 400,
  seed: 11,
  plan: 'plain',
  ...more,
});

const draw = (
  parameters: Parameter[],
  more: Partial<SamplingSettings> = {},
  groups: Group[] = [],
) => drawParameters(parameters, groups, settings(more), 0, settings(more).samples);

describe.each(PLANS)('drawParameters, %s plan', (plan) => {
  it('gives the same block whichever block is asked', () => {
    const all = [...golden, ...members];
    const whole = drawParameters(all, [dirichlet], settings({ plan }), 0, 400);
    const block = drawParameters(all, [dirichlet], settings({ plan }), 150, 300);
    expect(whole.size).toBe(all.length);
    for (const [id, column] of block) expect(column).toEqual(whole.get(id)?.slice(150, 300));
  });

  it('gives the same draws for the same seed and others for a new one', () => {
    expect(draw(golden, { plan })).toEqual(draw(golden, { plan }));
    const [one, two] = [draw(golden, { plan }), draw(golden, { plan, seed: 12 })];
    for (const [id, column] of one) expect(column).not.toEqual(two.get(id));
  });

  it('stays inside the support and has the declared mean and variance', () => {
    const samples = 2000;
    for (const [id, column] of draw(golden, { plan, samples })) {
      const of = goldenCases.find((candidate) => candidate.id === id)?.distribution;
      if (!of) throw new Error(id);
      const law = distributionOf(of, 0);
      const [low, high] = law.support;
      expect(column.every((x) => x >= low && x <= high)).toBe(true);
      // 4 Monte Carlo standard errors; where the variance is finite.
      if (Number.isFinite(law.variance)) {
        const error = Math.sqrt(law.variance / samples);
        expect(Math.abs(mean(column) - law.mean), id).toBeLessThan(4 * error);
      }
      // A Gompertz with a falling hazard has exp(rate / shape) of its draws at Infinity.
      if (id === 'gompertz-30') {
        const never = Array.from(column, (x) => Number(x === Infinity));
        const share = Math.exp(-0.2 / 0.15);
        const error = Math.sqrt((share * (1 - share)) / samples);
        expect(Math.abs(mean(never) - share)).toBeLessThan(4 * error);
        continue;
      }
      const uniform = column.map(law.cdf);
      expect(Math.abs(mean(uniform) - 0.5), id).toBeLessThan(4 / Math.sqrt(12 * samples));
      // The variance of (u - 1/2)^2 is 1/180.
      const off = Math.abs(spread(uniform) - 1 / 12);
      expect(off, id).toBeLessThan(4 / Math.sqrt(180 * samples));
    }
  });

  it('gives a fixed parameter its value in every draw', () => {
    const column = draw([parameter('f', { type: 'fixed' }, 0.3)], { plan }).get('f');
    expect(column).toEqual(new Float64Array(400).fill(0.3));
  });
});

describe.each(['plain', 'lhs'] as const)('drawParameters, %s plan', (plan) => {
  it('draws a parameter alike whatever stands beside it, in any order', () => {
    const all = draw([...golden, ...members], { plan }, [dirichlet]);
    const turned = draw([...members, ...golden].reverse(), { plan }, [dirichlet]);
    const few = draw(golden.slice(3, 5), { plan });
    for (const [id, column] of all) expect(turned.get(id)).toEqual(column);
    for (const [id, column] of few) expect(all.get(id)).toEqual(column);
    expect(few.size).toBe(2);
  });
});

it('draws nothing for a parameter without its group, and says which', () => {
  const lost = parameter('p9', { type: 'inGroup', group: 'none' });
  expect(() => draw([lost])).toThrow(DocumentError);
  try {
    draw([lost]);
  } catch (thrown) {
    const [issue] = (thrown as DocumentError).issues;
    expect(issue).toMatchObject({
      code: 'distribution.noGroup',
      params: { parameter: 'p9', group: 'none' },
    });
  }
});
