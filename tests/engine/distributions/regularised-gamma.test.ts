/** Against tests/golden/tails.json (R's pgamma and qgamma), at shapes from 0.05 to 1,000,000. */
import { describe, expect, it } from 'vitest';
import {
  gammaInverse,
  gammaLower,
  gammaUpper,
} from '../../../shared/engine/distributions/regularised-gamma.ts';
import golden from '../../golden/tails.json' with { type: 'json' };
import { expectRelative } from '../close.ts';

describe.each(golden.gamma)('shape $shape', ({ shape, x, cdf, sf }) => {
  it('inverse within 1e-12', () => {
    golden.p.forEach((p, i) => {
      expectRelative(gammaInverse(shape, p), x[i] ?? 0, 1e-12, `p ${p}`);
    });
  });

  it('the upper inverse is the lower one of 1 - p', () => {
    // Only where 1 - p keeps enough digits.
    for (const p of [0.001, 0.1, 0.5, 0.9, 0.999]) {
      expectRelative(gammaInverse(shape, 1 - p, true), gammaInverse(shape, p), 1e-9, `p ${p}`);
    }
  });

  it('both tails within 1e-11', () => {
    x.forEach((value, i) => {
      expectRelative(gammaLower(shape, value), cdf[i] ?? 0, 1e-11, `lower at ${value}`);
      expectRelative(gammaUpper(shape, value), sf[i] ?? 0, 1e-11, `upper at ${value}`);
    });
  });

  it('ends', () => {
    expect([gammaLower(shape, 0), gammaUpper(shape, 0)]).toEqual([0, 1]);
    expect([gammaLower(shape, Infinity), gammaUpper(shape, Infinity)]).toEqual([1, 0]);
    expect([gammaInverse(shape, 0), gammaInverse(shape, 1)]).toEqual([0, Infinity]);
    expect([gammaInverse(shape, 0, true), gammaInverse(shape, 1, true)]).toEqual([Infinity, 0]);
    expect(gammaInverse(shape, 2 ** -53)).toBeGreaterThanOrEqual(0);
    expect(gammaInverse(shape, 1 - 2 ** -53)).toBeLessThan(Infinity);
  });
});
