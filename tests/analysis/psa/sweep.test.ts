import normalCdf from '@stdlib/stats-base-dists-normal-cdf';
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { acceptability } from '../../../shared/analysis/psa/acceptability.ts';
import type { Draws } from '../../../shared/analysis/psa/draws.ts';
import { evpi } from '../../../shared/analysis/psa/evpi.ts';
import { sweep } from '../../../shared/analysis/psa/sweep.ts';
import { RUNS } from '../arbitrary.ts';
import { expectClose } from '../close.ts';
import { golden } from '../golden.ts';
import { csvDraws, draws, reversed, twoNormal } from './samples.ts';

interface AtThreshold {
  lambda: number;
  mean_nb: number[];
  best: number;
  evpi: number;
  evpi_mc_se: number;
  prob_optimal: number[];
}
interface TwoNormal {
  inputs: { mean: number; sd: number };
  expected: { evpi: number; p_new_optimal: number };
}
const voi = golden('voi.json') as {
  two_strategy_normal: TwoNormal[];
  nonlinear_model: { from_csv_by_lambda: AtThreshold[] };
};

// Source: tests/golden/voi.json `from_csv_by_lambda` (base R 4.2.2 on voi_psa.csv);
// EVPI to 1e-9 as the README there says.
describe('golden draws', () => {
  const wanted = voi.nonlinear_model.from_csv_by_lambda;
  const swept = sweep(
    csvDraws(),
    wanted.map(({ lambda }) => lambda),
  );

  it.each(wanted.map((want, i) => ({ want, i })))('at $want.lambda', ({ want, i }) => {
    const point = swept.points[i] as (typeof swept.points)[number];
    expect(point.best).toBe(want.best - 1);
    expect(point.tiedShare).toBe(0);
    want.mean_nb.forEach((mean, s) => {
      expectClose(point.meanNmb[s], mean, 1e-10);
      expectClose(point.probability[s], want.prob_optimal[s] as number, 1e-12);
    });
    const value = evpi(swept)[i];
    expectClose(value?.perPerson, want.evpi, 1e-9);
    expectClose(value?.standardError, want.evpi_mc_se, 1e-9);
  });
});

// Source: tests/golden/voi.json `two_strategy_normal` (unit normal loss, Raiffa and
// Schlaifer 1961), within 4 Monte Carlo standard errors; these from the closed form
// E[min(0, X)^2] = (m^2 + s^2) P(-m/s) - m s p(m/s), as rare losses may not be drawn.
describe('two strategies, one of normal net benefit', () => {
  const COUNT = 200_000;
  it.each(voi.two_strategy_normal)('$inputs', ({ inputs: { mean, sd }, expected }) => {
    const point = sweep(twoNormal(mean, sd, COUNT, 7), [1]).points[0];
    const z = Math.abs(mean) / sd;
    const density = Math.exp((-z * z) / 2) / Math.sqrt(2 * Math.PI);
    const square = (mean ** 2 + sd ** 2) * normalCdf(-z, 0, 1) - Math.abs(mean) * sd * density;
    const se = Math.sqrt(Math.max(0, square - expected.evpi ** 2) / COUNT);
    const got = point?.expectedLoss[point.best] as number;
    expect(Math.abs(got - expected.evpi)).toBeLessThanOrEqual(4 * se);
    const p = expected.p_new_optimal;
    const probability = point?.probability[1] as number;
    expect(Math.abs(probability - p)).toBeLessThanOrEqual(4 * Math.sqrt((p * (1 - p)) / COUNT));
  });
});

const thresholds = fc.array(fc.integer({ min: 0, max: 8 }), { minLength: 1, maxLength: 4 });

/** Draw by draw, straight from the definitions, in integers so that ties are exact. */
function slow({ cost, health }: Draws, threshold: number) {
  const count = (cost[0] as Float64Array).length;
  const shares = cost.map(() => 0);
  const losses = cost.map(() => 0);
  for (let i = 0; i < count; i++) {
    const nmb = cost.map((c, s) => threshold * (health[s]?.[i] as number) - (c[i] as number));
    const highest = Math.max(...nmb);
    const winners = nmb.filter((each) => each === highest).length;
    nmb.forEach((each, s) => {
      (losses[s] as number) += (highest - each) / count;
      if (each === highest) (shares[s] as number) += 1 / winners / count;
    });
  }
  return { shares, losses };
}

describe('properties', () => {
  it('agrees with the definitions, worked draw by draw', () => {
    fc.assert(
      fc.property(draws, thresholds, (sample, at) => {
        for (const point of sweep(sample, at).points) {
          const { shares, losses } = slow(sample, point.threshold);
          shares.forEach((share, s) => {
            expect(point.probability[s]).toBeCloseTo(share, 12);
            expect(point.expectedLoss[s]).toBeCloseTo(losses[s] as number, 10);
          });
          expect(point.expectedLoss[point.best]).toBeCloseTo(Math.min(...losses), 10);
        }
      }),
      RUNS,
    );
  });

  it('T53: probabilities sum to 1 at each threshold', () => {
    fc.assert(
      fc.property(draws, thresholds, (sample, at) => {
        for (const { probability } of sweep(sample, at).points) {
          expect(probability.reduce((a, b) => a + b)).toBeCloseTo(1, 12);
        }
      }),
      RUNS,
    );
  });

  it('T53: at a threshold of 0 it is the probability of being cheapest', () => {
    const distinct = fc.uniqueArray(fc.integer({ min: 0, max: 99 }), {
      minLength: 3,
      maxLength: 3,
    });
    const rows = fc.array(distinct, { minLength: 1, maxLength: 20 });
    fc.assert(
      fc.property(rows, (costs) => {
        const column = (s: number) => Float64Array.from(costs, (row) => row[s] as number);
        const strategies = ['a', 'b', 'c'];
        const cost = strategies.map((_, s) => column(s));
        const health = strategies.map((_, s) => column(2 - s));
        const curves = acceptability(sweep({ strategies, cost, health }, [0]));
        curves.forEach(({ probabilities: [probability] }, s) => {
          const cheapest = costs.filter((row) => row[s] === Math.min(...row)).length;
          expect(probability).toBeCloseTo(cheapest / costs.length, 12);
        });
      }),
      RUNS,
    );
  });

  it('T43: the order of strategies changes nothing, ties or not', () => {
    fc.assert(
      fc.property(draws, thresholds, (sample, at) => {
        const points = sweep(sample, at).points;
        sweep(reversed(sample), at).points.forEach((point, i) => {
          expect([...point.probability].reverse()).toEqual(points[i]?.probability);
          expect([...point.expectedLoss].reverse()).toEqual(points[i]?.expectedLoss);
          expect(point.tiedShare).toBe(points[i]?.tiedShare);
        });
      }),
      RUNS,
    );
  });

  it('T42: a duplicate takes half of its twin and nothing of the others', () => {
    const sample = csvDraws();
    const twice = {
      strategies: [...sample.strategies, 'twin'],
      cost: [...sample.cost, sample.cost[1] as Float64Array],
      health: [...sample.health, sample.health[1] as Float64Array],
    };
    const [before] = sweep(sample, [30_000]).points;
    const [after] = sweep(twice, [30_000]).points;
    const half = (before?.probability[1] as number) / 2;
    expect(after?.probability).toEqual([
      before?.probability[0],
      half,
      before?.probability[2],
      half,
    ]);
    expect(after?.expectedLoss.slice(0, 3)).toEqual(before?.expectedLoss);
    expect(after?.tiedShare).toBeCloseTo(2 * half, 12);
    expect(after?.best).toBe(before?.best);
  });

  it('gives perfect information no value where one strategy is best in every draw', () => {
    const column = (...values: number[]) => Float64Array.from(values);
    const sample = {
      strategies: ['a', 'b'],
      cost: [column(1, 2, 3), column(2, 3, 4)],
      health: [column(5, 5, 5), column(5, 5, 5)],
    };
    expect(evpi(sweep(sample, [0, 1e5]))).toEqual([
      { threshold: 0, perPerson: 0, standardError: 0 },
      { threshold: 1e5, perPerson: 0, standardError: 0 },
    ]);
  });

  it('takes for a tie what only rounding parts, whichever of the two comes out higher', () => {
    const cost = [Float64Array.of(0, 0), Float64Array.of(0.1 + 0.2, 0.3)];
    const health = [Float64Array.of(0, 0), Float64Array.of(0.3, 0.1 + 0.2)];
    const [point] = sweep({ strategies: ['a', 'b'], cost, health }, [1]).points;
    expect(point).toMatchObject({ probability: [0.5, 0.5], expectedLoss: [0, 0], tiedShare: 1 });
  });

  it('has no standard error for one draw', () => {
    expect(sweep(twoNormal(1, 1, 1, 1), [1]).points[0]?.lossSe).toBeNull();
  });
});
