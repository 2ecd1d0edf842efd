import { describe, expect, it } from 'vitest';
import { percentile } from '../../../shared/analysis/psa/percentile.ts';
import { expectClose } from '../close.ts';

const X = [3.2, -1.5, 8.75, 0, 4.4, 4.4, 12.125, -7.3, 2.0001, 5.5];
const P = [0, 0.025, 0.1, 0.25, 0.5, 0.9, 0.975, 1];
const rising = (values: number[]) => [...values].sort((a, b) => a - b);

describe('percentile', () => {
  // Source: base R 4.2.2, quantile(x, p, type = 7).
  it.each([
    [
      X,
      [
        -7.3, -5.994999999999999, -2.0800000000000005, 0.500025, 3.8000000000000003,
        9.087499999999999, 11.365625000000001, 12.125,
      ],
    ],
    [
      X.slice(0, 7),
      [
        -1.5, -1.2750000000000001, -0.5999999999999999, 1.6, 4.4, 10.100000000000001,
        11.618749999999999, 12.125,
      ],
    ],
  ])('agrees with R', (values, want) => {
    P.forEach((p, i) => {
      expectClose(percentile(rising(values), p), want[i] as number, 1e-14);
    });
  });

  it('of one value is that value', () => {
    expect(percentile([3], 0.975)).toBe(3);
  });
});
