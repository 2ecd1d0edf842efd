import { describe, expect, it } from 'vitest';
import { rangeOf } from '../../../../src/features/levers/range.ts';
import { tinyDocument } from '../../../fixtures/tiny-document.ts';

const document = tinyDocument();
const parameter = (id: string) => ({ type: 'parameter', parameter: id, value: 0 }) as const;
const setting = (name: 'horizon' | 'discountCosts' | 'counting') =>
  ({ type: 'setting', setting: name, value: 0 }) as const;

describe('a lever', () => {
  // Log-normal: exp(meanlog -+ 1.959964 sdlog), the normal's 97.5th percentile by any table.
  it('goes over the 95% interval of its parameter', () => {
    const range = rangeOf(document, parameter('rr_die'));
    expect(range?.low).toBeCloseTo(0.8 * Math.exp(-0.1959964), 3);
    expect(range?.high).toBeCloseTo(0.8 * Math.exp(0.1959964), 3);
    expect(range?.base).toBe(0.8);
  });

  it('is not offered for what is fixed, gone, or does not slide', () => {
    expect(rangeOf(document, parameter('u_alive'))).toBeNull();
    expect(rangeOf(document, parameter('gone'))).toBeNull();
    expect(rangeOf(document, setting('counting'))).toBeNull();
    const costs = { byYear: [0.03, 0.02] };
    const byYear = { ...document.question.discounting, costs };
    const question = { ...document.question, discounting: byYear };
    expect(rangeOf({ ...document, question }, setting('discountCosts'))).toBeNull();
  });

  it('moves a horizon by whole years, and a rate by half a percent', () => {
    expect(rangeOf(document, setting('horizon'))).toEqual({ low: 1, high: 15, step: 1, base: 10 });
    expect(rangeOf(document, setting('discountCosts'))).toMatchObject({ low: 0, step: 0.005 });
  });
});
