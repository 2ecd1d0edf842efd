import { describe, expect, it } from 'vitest';
import { INTERVAL, means, summarise } from '../../../shared/analysis/psa/means.ts';
import { expectClose } from '../close.ts';
import { golden } from '../golden.ts';
import { csvDraws } from './samples.ts';

interface AtThreshold {
  lambda: number;
  mean_nb: number[];
}
const { from_csv_by_lambda } = (
  golden('voi.json') as { nonlinear_model: { from_csv_by_lambda: AtThreshold[] } }
).nonlinear_model;

const INCREMENTAL_COST = [3675.36112156, 8.045101993881472, 2470.86232, 4696.066707499999];
const HEALTH = [6.739759610492, 0.009625814362121694, 5.3937416025000005, 8.02941460275];

describe('means', () => {
  // Source: tests/golden/voi.json `from_csv_by_lambda` (base R 4.2.2), to 1e-10.
  it.each(from_csv_by_lambda)('mean net benefit at $lambda', ({ lambda, mean_nb }) => {
    const rows = means(csvDraws(), '1', lambda);
    rows.forEach((row, s) => {
      expectClose(row.nmb.mean, mean_nb[s] as number, 1e-10);
      const inmb = (mean_nb[s] as number) - (mean_nb[0] as number);
      if (s === 0) expect(row.incremental).toBeNull();
      else expect(row.incremental?.nmb.mean).toBeCloseTo(inmb, 5);
    });
  });

  // Source: base R 4.2.2 on tests/golden/voi_psa.csv: mean(d), sd(d) / sqrt(5000) and
  // quantile(d, c(0.025, 0.975)) for d = cost2 - cost1, then for d = qaly3.
  it('gives intervals and standard errors as R does', () => {
    const rows = means(csvDraws(), '1', 0);
    const check = (got: object | undefined, want: number[]) => {
      const { mean, se, low, high } = got as ReturnType<typeof summarise>;
      [mean, se, low, high].forEach((value, i) => {
        expectClose(value, want[i] as number, 1e-12);
      });
    };
    check(rows[1]?.incremental?.cost, INCREMENTAL_COST);
    check(rows[2]?.health, HEALTH);
    expect(INTERVAL).toEqual([0.025, 0.975]);
  });

  it('summarises one draw without a standard error', () => {
    expect(summarise(Float64Array.of(4))).toEqual({ mean: 4, se: null, low: 4, high: 4 });
  });

  it('refuses a comparator that is not among the strategies', () => {
    expect(() => means(csvDraws(), 'x', 0)).toThrow(RangeError);
  });
});
