/**
 * The fits themselves are tested in tests/engine/fit; here, that each way reaches the right
 * one, by the method of moments worked by hand (Briggs, Claxton and Sculpher 2006).
 */
import { describe, expect, it } from 'vitest';
import {
  fitBy,
  fitMethods,
  statedValue,
} from '../../../../../src/routes/appraisal/evidence/fit-methods.ts';

describe('fitBy', () => {
  it('counts: 10 events among 100 are beta (10, 90)', () => {
    const fit = fitBy('beta', 'counts', { events: 10, n: 100 });
    expect(fit?.ok && fit.distribution).toEqual({ type: 'beta', alpha: 10, beta: 90 });
    expect(statedValue('counts', { events: 10, n: 100 })).toBe(0.1);
  });

  it('mean 100 and SE 20 are gamma (25, 4)', () => {
    const fit = fitBy('gamma', 'meanSe', { mean: 100, se: 20 });
    expect(fit?.ok && fit.distribution).toEqual({ type: 'gamma', shape: 25, scale: 4 });
  });

  it('a ratio of 1 from 0.5 to 2 is log-normal about a log of 0', () => {
    const fit = fitBy('lognormal', 'pointInterval', { point: 1, lower: 0.5, upper: 2 });
    if (!fit?.ok || fit.distribution.type !== 'lognormal') throw new Error('no fit');
    expect(fit.distribution.meanlog).toBeCloseTo(0, 12);
    // ln 4 over twice the normal quantile of 97.5% (1.959964).
    expect(fit.distribution.sdlog).toBeCloseTo(Math.log(4) / (2 * 1.959963984540054), 12);
  });

  it('waits for every number, and refuses what cannot be', () => {
    expect(fitBy('beta', 'meanSe', { mean: 0.5 })).toBeNull();
    const wide = fitBy('beta', 'meanSe', { mean: 0.5, se: 0.6 });
    expect(wide && !wide.ok && wide.issue.code).toBe('fit.tooWide');
  });

  it('offers ways only for families that have them', () => {
    expect(fitMethods('beta')).toContain('counts');
    expect(fitMethods('uniform')).toEqual([]);
  });
});
