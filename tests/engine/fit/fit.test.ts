/**
 * Every case of tests/golden/fit.json (closed forms; roots by R's uniroot on qgamma and
 * qbeta): 1e-10 for closed forms, 1e-6 for fitted roots.
 */
import { describe, expect, it } from 'vitest';
import { betaFromCounts } from '../../../shared/engine/fit/beta-counts.ts';
import { betaFromMoments } from '../../../shared/engine/fit/beta-moments.ts';
import { betaFromQuantiles } from '../../../shared/engine/fit/beta-quantiles.ts';
import type { Fitted } from '../../../shared/engine/fit/fitted.ts';
import { gammaFromInterval } from '../../../shared/engine/fit/gamma-interval.ts';
import { gammaFromMeanAndWidth } from '../../../shared/engine/fit/gamma-mean-width.ts';
import { gammaFromMoments } from '../../../shared/engine/fit/gamma-moments.ts';
import { gammaFromQuantiles } from '../../../shared/engine/fit/gamma-quantiles.ts';
import { lognormalFromMoments } from '../../../shared/engine/fit/lognormal-moments.ts';
import { lognormalFromQuantiles } from '../../../shared/engine/fit/lognormal-quantiles.ts';
import { lognormalFromRatio } from '../../../shared/engine/fit/lognormal-ratio.ts';
import { normalFromInterval } from '../../../shared/engine/fit/normal-interval.ts';
import type { Distribution } from '../../../shared/model/document.ts';
import golden from '../../golden/fit.json' with { type: 'json' };
import { expectRelative } from '../close.ts';

type Case = { id: string; inputs: Record<string, number>; expected: Record<string, unknown> };
const cases = golden.cases as unknown as Case[];
const named = (prefix: string) => cases.filter(({ id }) => id.startsWith(prefix));

/** The numbers of the fitted distribution against those of the file. */
function compare<T extends Distribution['type']>(
  result: Fitted<T>,
  expected: Record<string, unknown>,
  names: Record<string, string>,
  tolerance: number,
): void {
  if (!result.ok) throw new Error(result.issue.code);
  for (const [ours, theirs] of Object.entries(names)) {
    const got = (result.distribution as Record<string, unknown>)[ours];
    expectRelative(Number(got), Number(expected[theirs]), tolerance, ours);
  }
}

const GAMMA = { shape: 'shape', scale: 'scale' };
const LOGNORMAL = { meanlog: 'meanlog', sdlog: 'sdlog' };
/** The file gives the rate where it does not give the scale. */
const withScale = (expected: Record<string, unknown>) => ({
  ...expected,
  scale: 1 / Number(expected.rate),
});
const moments = ({ inputs }: Case) => ({ mean: inputs.mean ?? 0, se: inputs.se ?? 0 });
const interval = ({ inputs }: Case) => ({
  lower: inputs.lower ?? 0,
  upper: inputs.upper ?? 0,
  mean: inputs.mean ?? 0,
  ...(inputs.level === undefined ? {} : { level: inputs.level }),
});

describe('moments', () => {
  it.each(named('beta-mom').filter(({ expected }) => expected.alpha))('$id', (of) => {
    compare(betaFromMoments(moments(of)), of.expected, { alpha: 'alpha', beta: 'beta' }, 1e-10);
  });

  it.each(named('gamma-mom'))('$id', (of) => {
    compare(gammaFromMoments(moments(of)), of.expected, GAMMA, 1e-10);
  });

  it.each(named('lognormal-mom'))('$id', (of) => {
    compare(lognormalFromMoments(moments(of)), of.expected, LOGNORMAL, 1e-10);
  });

  it('refuses a beta wider than its mean allows, and says the limit', () => {
    const [infeasible] = cases.filter(({ expected }) => expected.feasible === false);
    if (!infeasible) throw new Error('no infeasible case');
    const result = betaFromMoments(moments(infeasible));
    if (result.ok) throw new Error('fitted');
    expect(result.issue.code).toBe('fit.tooWide');
    const limit = Number(infeasible.expected.limit_se);
    expectRelative(Number(result.issue.params.limit), limit, 1e-10, 'limit');
  });
});

describe('intervals and counts', () => {
  it.each(named('lognormal-ratio'))('$id', (of) => {
    const ratio = { ...interval(of), point: of.inputs.point ?? 0 };
    compare(lognormalFromRatio(ratio), of.expected, LOGNORMAL, 1e-10);
    const asMean = lognormalFromRatio({ ...ratio, pointIs: 'mean' });
    compare(asMean, of.expected, { meanlog: 'meanlog_meanpoint', sdlog: 'sdlog' }, 1e-10);
  });

  it.each(named('beta-counts'))('$id', ({ inputs, expected }) => {
    const priors = { none: 'direct', uniform: 'uniform_prior', jeffreys: 'jeffreys' } as const;
    for (const [prior, key] of Object.entries(priors)) {
      const of = { events: inputs.events ?? 0, n: inputs.n ?? 0, prior: prior as 'none' };
      const want = expected[key] as Record<string, unknown>;
      const result = betaFromCounts(of);
      if (want.proper === false) expect(result).toMatchObject({ issue: { code: 'fit.improper' } });
      else compare(result, want, { alpha: 'alpha', beta: 'beta' }, 1e-10);
    }
  });

  it.each(named('normal-ci'))('$id', (of) => {
    compare(normalFromInterval(interval(of)), of.expected, { mean: 'mean', sd: 'sd' }, 1e-10);
  });

  it.each(named('gamma-mean-ci'))('$id', (of) => {
    compare(gammaFromInterval(interval(of)), withScale(of.expected), GAMMA, 1e-10);
  });
});

describe('fitted roots', () => {
  it.each(named('lognormal-2q'))('$id', (of) => {
    compare(lognormalFromQuantiles(interval(of)), of.expected, LOGNORMAL, 1e-10);
  });

  it.each(named('gamma-2q'))('$id', (of) => {
    compare(gammaFromQuantiles(interval(of)), withScale(of.expected), GAMMA, 1e-6);
  });

  it.each(named('beta-2q'))('$id', (of) => {
    compare(betaFromQuantiles(interval(of)), of.expected, { alpha: 'alpha', beta: 'beta' }, 1e-6);
  });

  it.each(named('gamma-mean-width'))('$id', (of) => {
    compare(gammaFromMeanAndWidth(interval(of)), withScale(of.expected), GAMMA, 1e-6);
  });
});

describe('what cannot be fitted', () => {
  const code = (
    result: Fitted<'beta'> | Fitted<'gamma'> | Fitted<'lognormal'> | Fitted<'normal'>,
  ) => (result.ok ? 'fitted' : result.issue.code);

  it.each([
    ['mean 0', betaFromMoments({ mean: 0, se: 0.1 }), 'fit.meanOutside'],
    ['mean 1', betaFromMoments({ mean: 1, se: 0.1 }), 'fit.meanOutside'],
    ['mean NaN', betaFromMoments({ mean: Number.NaN, se: 0.1 }), 'fit.meanOutside'],
    ['se 0', betaFromMoments({ mean: 0.2, se: 0 }), 'fit.standardError'],
    ['gamma mean below 0', gammaFromMoments({ mean: -1, se: 1 }), 'fit.meanOutside'],
    ['gamma se NaN', gammaFromMoments({ mean: 1, se: Number.NaN }), 'fit.standardError'],
    ['lognormal mean 0', lognormalFromMoments({ mean: 0, se: 1 }), 'fit.meanOutside'],
    ['lognormal se 0', lognormalFromMoments({ mean: 1, se: 0 }), 'fit.standardError'],
    ['limits turned', normalFromInterval({ lower: 2, upper: 1 }), 'fit.interval'],
    ['limits alike', normalFromInterval({ lower: 1, upper: 1 }), 'fit.interval'],
    ['level 1', normalFromInterval({ lower: 1, upper: 2, level: 1 }), 'fit.level'],
    ['ratio at 0', lognormalFromRatio({ point: 1, lower: 0, upper: 2 }), 'fit.interval'],
    ['point outside', lognormalFromRatio({ point: 3, lower: 1, upper: 2 }), 'fit.pointOutside'],
    ['more events than n', betaFromCounts({ events: 5, n: 4, prior: 'uniform' }), 'fit.counts'],
    ['n 0', betaFromCounts({ events: 0, n: 0, prior: 'uniform' }), 'fit.counts'],
    ['beta limit 1', betaFromQuantiles({ lower: 0.1, upper: 1 }), 'fit.interval'],
    ['too close', betaFromQuantiles({ lower: 0.5, upper: 0.5 + 1e-9 }), 'fit.noSolution'],
    ['gamma limit 0', gammaFromQuantiles({ lower: 0, upper: 1 }), 'fit.interval'],
    ['gamma too close', gammaFromQuantiles({ lower: 1, upper: 1 + 1e-9 }), 'fit.noSolution'],
    ['gamma too far', gammaFromQuantiles({ lower: 1e-200, upper: 1 }), 'fit.noSolution'],
    ['too wide', gammaFromMeanAndWidth({ mean: 1, lower: 0, upper: 50 }), 'fit.noSolution'],
    ['width, mean 0', gammaFromMeanAndWidth({ mean: 0, lower: 1, upper: 2 }), 'fit.meanOutside'],
    ['ci, mean 0', gammaFromInterval({ mean: 0, lower: 1, upper: 2 }), 'fit.meanOutside'],
    ['lognormal limit', lognormalFromQuantiles({ lower: -1, upper: 2 }), 'fit.interval'],
  ])('%s', (_, result, want) => {
    expect(code(result)).toBe(want);
  });

  it('covers all of the file', () => {
    const tested =
      /^(beta-(mom|counts|2q)|gamma-(mom|2q|mean-width|mean-ci)|lognormal-(mom|ratio|2q)|normal-ci)-/;
    expect(cases.every(({ id }) => tested.test(id))).toBe(true);
    expect(cases).toHaveLength(42);
  });
});
