import { describe, expect, it } from 'vitest';
import { empirical } from '../../../shared/engine/distributions/empirical.ts';

describe('empirical', () => {
  const law = empirical({ values: [5, 1, 3, 3] });

  it('has the type 1 quantile (R: quantile(c(5,1,3,3), p, type = 1))', () => {
    const p = [0, 0.1, 0.25, 0.26, 0.5, 0.75, 0.76, 1];
    expect(p.map(law.quantile)).toEqual([1, 1, 1, 3, 3, 3, 5, 5]);
  });

  it('counts values, ties too', () => {
    expect([0, 1, 2, 3, 5].map(law.cdf)).toEqual([0, 0.25, 0.25, 0.75, 1]);
    expect([0, 1, 2, 3, 5].map(law.sf)).toEqual([1, 0.75, 0.75, 0.25, 0]);
    expect([0, 1, 3].map(law.pdf)).toEqual([0, 0.25, 0.5]);
    expect(law.logpdf(2)).toBe(-Infinity);
  });

  it('has the mean and variance of its draws', () => {
    expect([law.mean, law.variance]).toEqual([3, 2]);
    expect(law.support).toEqual([1, 5]);
  });
});
