/**
 * Against @stdlib's beta quantile (a port of the TOMS 708 and Boost methods) over random
 * shapes; beta.test.ts and distribution.test.ts compare both with R.
 */
import betaQuantile from '@stdlib/stats-base-dists-beta-quantile';
import fc from 'fast-check';
import { expect, it } from 'vitest';
import { betaInverse } from '../../../shared/engine/distributions/beta-inverse.ts';

const shape = fc.double({ min: 0, max: Math.log(1e5), noNaN: true }).map(Math.exp);
const tail = fc.double({ min: 0, max: 15, noNaN: true }).map((power) => 10 ** -power);
const probability = fc.oneof(
  fc.double({ min: 1e-6, max: 1 - 1e-6, noNaN: true }),
  tail,
  tail.map((p) => 1 - p),
);

it('agrees within 1e-11 for shapes from 1 to 100,000, into the tails', () => {
  const agrees = fc.property(shape, shape, probability, (alpha, beta, p) => {
    const want = betaQuantile(p, alpha, beta);
    return Math.abs(betaInverse(alpha, beta)(p) - want) <= 1e-11 * want;
  });
  fc.assert(agrees, { seed: 20261201, numRuns: 2000 });
});

it('hands other shapes over, and gives the ends', () => {
  expect(betaInverse(0.3, 2)(0.4)).toBe(betaQuantile(0.4, 0.3, 2));
  expect(betaInverse(2, 1e7)(0.4)).toBe(betaQuantile(0.4, 2, 1e7));
  expect([0, 1].map(betaInverse(3, 4))).toEqual([0, 1]);
  expect(betaInverse(3, 4)(Number.NaN)).toBeNaN();
});
