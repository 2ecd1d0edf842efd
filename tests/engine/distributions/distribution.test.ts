/**
 * Every family against tests/golden/distributions.json (R 4.2.2 and closed forms, second
 * route mpmath), within the tolerances of tests/golden/README.md, all of them relative.
 */
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { distributionOf } from '../../../shared/engine/distributions/distribution.ts';
import { expectRelative } from '../close.ts';
import { goldenCases } from './golden.ts';

describe('distributionOf against R', () => {
  it.each(goldenCases)('$id: quantile within 1e-9', ({ distribution, quantiles }) => {
    const { quantile } = distributionOf(distribution, 0);
    quantiles.p.forEach((p, i) => {
      expectRelative(quantile(p), quantiles.x[i] ?? 0, 1e-9, `quantile(${p})`);
    });
  });

  it.each(goldenCases)('$id: cdf and sf within 1e-11', ({ distribution, points }) => {
    const { cdf, sf } = distributionOf(distribution, 0);
    points.x.forEach((x, i) => {
      expectRelative(cdf(x), points.cdf[i] ?? 0, 1e-11, `cdf(${x})`);
      expectRelative(sf(x), points.sf[i] ?? 0, 1e-11, `sf(${x})`);
    });
  });

  it.each(goldenCases)('$id: pdf and logpdf within 1e-10', ({ distribution, points }) => {
    const { pdf, logpdf } = distributionOf(distribution, 0);
    points.x.forEach((x, i) => {
      expectRelative(pdf(x), points.pdf[i] ?? 0, 1e-10, `pdf(${x})`);
      expectRelative(logpdf(x), points.logpdf[i] ?? 0, 1e-10, `logpdf(${x})`);
    });
  });

  it.each(goldenCases)('$id: mean and variance within 1e-10', (golden) => {
    const { mean, variance } = distributionOf(golden.distribution, 0);
    expectRelative(mean, golden.mean, 1e-10, 'mean');
    expectRelative(variance, golden.variance, 1e-10, 'variance');
  });
});

describe('distributionOf as a law', () => {
  it('covers 37 reference cases of 13 families', () => {
    expect(goldenCases.length).toBe(37);
    expect(new Set(goldenCases.map(({ distribution }) => distribution.type)).size).toBe(12);
  });

  it.each(goldenCases)('$id: the quantile never falls as p rises', ({ distribution }) => {
    const { quantile, support } = distributionOf(distribution, 0);
    const probability = fc.double({ min: 1e-15, max: 1 - 1e-15, noNaN: true });
    const rises = fc.property(probability, probability, (a, b) => {
      const [low, high] = [quantile(Math.min(a, b)), quantile(Math.max(a, b))];
      return low <= high * (1 + 1e-14 * Math.sign(high)) && low >= support[0] && high <= support[1];
    });
    fc.assert(rises, { seed: 20261201, numRuns: 200 });
  });

  it.each(goldenCases)('$id: ends, and no answer outside [0, 1]', ({ distribution }) => {
    const { quantile, support } = distributionOf(distribution, 0);
    expect(quantile(0)).toBe(support[0]);
    expect(quantile(1)).toBe(support[1]);
    for (const p of [-0.1, 1.1, Number.NaN]) expect(quantile(p)).toBeNaN();
  });

  it.each(goldenCases)('$id: nothing below or above the support', ({ distribution }) => {
    const { cdf, sf, pdf, support } = distributionOf(distribution, 0);
    const [low, high] = support;
    if (Number.isFinite(low)) expect([cdf(low - 1), sf(low - 1), pdf(low - 1)]).toEqual([0, 1, 0]);
    if (Number.isFinite(high))
      expect([cdf(high + 1), sf(high + 1), pdf(high + 1)]).toEqual([1, 0, 0]);
  });
});
