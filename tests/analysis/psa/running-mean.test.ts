import { describe, expect, it } from 'vitest';
import { mean, standardError } from '../../../shared/analysis/psa/column.ts';
import { runningMean } from '../../../shared/analysis/psa/running-mean.ts';
import { expectClose } from '../close.ts';
import { csvDraws } from './samples.ts';

const X = Float64Array.from([3.2, -1.5, 8.75, 0, 4.4, 4.4, 12.125, -7.3, 2.0001, 5.5]);

describe('runningMean', () => {
  // Source: base R 4.2.2, mean(x[1:k]) and sd(x[1:k]) / sqrt(k) for k = 2, 5, 8, 10.
  it('agrees with R', () => {
    const want: Record<number, [number, number]> = {
      2: [0.8500000000000001, 2.35],
      5: [2.97, 1.7931536465122002],
      8: [3.0093750000000004, 2.1365334985964997],
      10: [3.1575100000000003, 1.7082474157549115],
    };
    const points = runningMean(X, 10);
    for (const [draws, [value, se]] of Object.entries(want)) {
      const point = points.find((each) => each.draws === Number(draws));
      expectClose(point?.mean, value, 1e-14);
      expectClose(point?.se, se, 1e-13);
    }
    expect(points[0]).toEqual({ draws: 1, mean: 3.2, se: null });
  });

  it('thins to so many points, the last over all draws', () => {
    expect(runningMean(X, 4).map(({ draws }) => draws)).toEqual([3, 5, 8, 10]);
    expect(runningMean(X, 1).map(({ draws }) => draws)).toEqual([10]);
    expect(runningMean(X, 99)).toHaveLength(10);
    expect(runningMean(new Float64Array(), 5)).toEqual([]);
  });

  it('ends at the mean and standard error of the whole', () => {
    const column = csvDraws().cost[2] as Float64Array;
    const last = runningMean(column, 200).at(-1);
    expectClose(last?.mean, mean(column), 1e-12);
    expectClose(last?.se, standardError(column, mean(column)) as number, 1e-10);
  });
});
