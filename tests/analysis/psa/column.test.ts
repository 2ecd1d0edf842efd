import { describe, expect, it } from 'vitest';
import { mean, standardError } from '../../../shared/analysis/psa/column.ts';
import { expectClose } from '../close.ts';

const X = Float64Array.from([3.2, -1.5, 8.75, 0, 4.4, 4.4, 12.125, -7.3, 2.0001, 5.5]);

describe('column', () => {
  // Source: base R 4.2.2, mean(x) and sd(x) / sqrt(length(x)).
  it('agrees with R', () => {
    expectClose(mean(X), 3.1575100000000003, 1e-15);
    expectClose(standardError(X, mean(X)), 1.7082474157549115, 1e-14);
  });

  it('keeps its digits far from 0', () => {
    const far = X.map((x) => x + 1e9);
    expectClose(standardError(far, mean(far)), 1.7082474157549115, 1e-6);
    expectClose(mean(new Float64Array(100_000).fill(0.1)), 0.1, 0);
  });

  it('has no standard error for one draw', () => {
    expect(standardError(Float64Array.of(1), 1)).toBeNull();
  });
});
