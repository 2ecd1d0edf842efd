import { expect, it } from 'vitest';
import { fixed } from '../../../shared/engine/distributions/fixed.ts';

it('holds all probability at one value', () => {
  const law = fixed(0.3);
  expect([0, 0.5, 1].map(law.quantile)).toEqual([0.3, 0.3, 0.3]);
  expect([0.2, 0.3, 0.4].map(law.cdf)).toEqual([0, 1, 1]);
  expect([0.2, 0.3, 0.4].map(law.sf)).toEqual([1, 0, 0]);
  expect([0.2, 0.3].map(law.pdf)).toEqual([0, 1]);
  expect([0.2, 0.3].map(law.logpdf)).toEqual([-Infinity, 0]);
  expect([law.mean, law.variance, law.support]).toEqual([0.3, 0, [0.3, 0.3]]);
  expect(law.quantile(2)).toBeNaN();
});
