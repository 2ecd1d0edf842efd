import { describe, expect, it } from 'vitest';
import { checkDistribution } from '../../../shared/engine/distributions/check.ts';
import type { Distribution, Parameter } from '../../../shared/model/document.ts';
import { parameter } from '../draw/parameter.ts';

const codes = (distribution: Distribution, value: number, kind: Parameter['kind'] = 'number') =>
  checkDistribution(parameter('p1', distribution, value, kind), ['parameters', 3]).map(
    ({ code, severity }) => `${severity} ${code}`,
  );

describe('checkDistribution', () => {
  it.each<[string, Distribution, number, Parameter['kind']]>([
    ['beta probability', { type: 'beta', alpha: 3, beta: 7 }, 0.3, 'probability'],
    ['gamma cost', { type: 'gamma', shape: 25, scale: 10 }, 250, 'costOnce'],
    ['lognormal ratio', { type: 'lognormal', meanlog: -0.5, sdlog: 0.2 }, 0.6, 'ratio'],
    ['normal log odds', { type: 'normal', mean: -1, sd: 0.5 }, -1, 'logOdds'],
    ['fixed', { type: 'fixed' }, 0.03, 'number'],
    [
      'pert with its mode at an end',
      { type: 'pert', low: 0, mode: 0, high: 1, weight: 4 },
      0.1,
      'probability',
    ],
    ['a list', { type: 'empirical', values: [0.1, 0.2, 0.3] }, 0.2, 'probability'],
    ['normal far from 0', { type: 'normal', mean: 0.5, sd: 0.01 }, 0.5, 'probability'],
    ['utility below 0', { type: 'uniform', low: -0.2, high: 0.4 }, 0.1, 'utility'],
    ['a member of a group', { type: 'inGroup', group: 'g' }, 9, 'probability'],
  ])('finds nothing in %s', (_, distribution, value, kind) => {
    expect(codes(distribution, value, kind)).toEqual([]);
  });

  it.each<[string, Distribution, string]>([
    ['low above high', { type: 'uniform', low: 2, high: 1 }, 'distribution.limits'],
    ['low equal to high', { type: 'triangular', low: 1, mode: 1, high: 1 }, 'distribution.limits'],
    ['mode above high', { type: 'triangular', low: 0, mode: 2, high: 1 }, 'distribution.limits'],
    [
      'mode below low',
      { type: 'pert', low: 0, mode: -1, high: 1, weight: 4 },
      'distribution.limits',
    ],
    ['sd 0', { type: 'normal', mean: 0, sd: 0 }, 'distribution.notPositive'],
    ['sdlog below 0', { type: 'lognormal', meanlog: 0, sdlog: -1 }, 'distribution.notPositive'],
    ['alpha 0', { type: 'beta', alpha: 0, beta: 1 }, 'distribution.notPositive'],
    ['scale 0', { type: 'gamma', shape: 1, scale: 0 }, 'distribution.notPositive'],
    ['shape 0', { type: 'weibull', shape: 0, scale: 1 }, 'distribution.notPositive'],
    ['rate 0', { type: 'exponential', rate: 0 }, 'distribution.notPositive'],
    ['scale below 0', { type: 'loglogistic', shape: 1, scale: -1 }, 'distribution.notPositive'],
    ['rate below 0', { type: 'gompertz', shape: 1, rate: -1 }, 'distribution.notPositive'],
    ['sigma 0', { type: 'generalisedGamma', mu: 0, sigma: 0, q: 1 }, 'distribution.notPositive'],
    ['mean NaN', { type: 'normal', mean: Number.NaN, sd: 1 }, 'distribution.notFinite'],
    ['no values', { type: 'empirical', values: [] }, 'distribution.empty'],
    ['NaN in a list', { type: 'empirical', values: [1, Number.NaN] }, 'distribution.notFinite'],
  ])('refuses %s, and names the parameter', (_, distribution, code) => {
    const issues = checkDistribution(parameter('p1', distribution, 1), ['parameters', 3]);
    expect(issues).toHaveLength(1);
    expect(issues[0]).toMatchObject({
      code,
      severity: 'error',
      path: ['parameters', 3, 'distribution'],
      params: { parameter: 'p1' },
    });
  });

  it('refuses draws that are infinite', () => {
    const dying: Distribution = { type: 'gompertz', shape: -0.15, rate: 0.2 };
    expect(codes(dying, 2)).toEqual(['error distribution.infinite']);
    const wide: Distribution = { type: 'lognormal', meanlog: 0, sdlog: 100 };
    expect(codes(wide, 1)).toEqual(['error distribution.infinite']);
  });

  it('refuses a base value that cannot be drawn, and warns of one far out', () => {
    const share: Distribution = { type: 'beta', alpha: 30, beta: 70 };
    expect(codes(share, 1.2)).toEqual(['error distribution.valueOutside']);
    expect(codes(share, 0.6)).toEqual(['warning distribution.valueFar']);
    expect(codes({ type: 'gamma', shape: 2, scale: 1 }, Number.NaN)).toEqual([
      'error distribution.valueOutside',
    ]);
  });

  it('warns where draws leave what the kind allows, and says how many', () => {
    const [issue] = checkDistribution(
      parameter('p1', { type: 'normal', mean: 0.1, sd: 0.1 }, 0.1, 'probability'),
      [],
    );
    // R: pnorm(-1) = 0.1586553.
    expect(issue).toMatchObject({ code: 'distribution.outsideKind', severity: 'warning' });
    expect(issue?.params.share).toBeCloseTo(0.1586553, 6);
    const gamma: Distribution = { type: 'gamma', shape: 2, scale: 0.3 };
    expect(codes(gamma, 0.6, 'probability')).toEqual(['warning distribution.outsideKind']);
    expect(codes(gamma, 0.6, 'utility')).toEqual(['warning distribution.outsideKind']);
    expect(codes(gamma, 0.6, 'rate')).toEqual([]);
    expect(codes({ type: 'fixed' }, 1.2, 'probability')).toEqual([
      'warning distribution.outsideKind',
    ]);
    const cost: Distribution = { type: 'normal', mean: 10, sd: 8 };
    expect(codes(cost, 10, 'costOnce')).toEqual(['warning distribution.outsideKind']);
    expect(codes(cost, -1, 'costOnce')).toEqual([]);
    expect(codes({ type: 'empirical', values: [0, 1] }, 1, 'probability')).toEqual([]);
  });

  it('warns of a beta for what is no share', () => {
    const share: Distribution = { type: 'beta', alpha: 30, beta: 70 };
    for (const kind of ['ratio', 'rate', 'costOnce', 'logOdds'] as const) {
      expect(codes(share, 0.3, kind)).toEqual(['warning distribution.unusualForKind']);
    }
    expect(codes(share, 0.3, 'disabilityWeight')).toEqual([]);
  });
});
