/** Against tests/golden/distributions.json, dirichlet (closed forms; R's qbeta). */
import { describe, expect, it } from 'vitest';
import { drawDirichlet } from '../../../shared/engine/draw/dirichlet.ts';
import { streamOf, uniforms } from '../../../shared/engine/draw/stream.ts';
import { goldenDirichlets } from '../distributions/golden.ts';
import { covariance, mean, spread } from './moments.ts';

const n = 10_000;
const draw = (counts: number[]) =>
  drawDirichlet(
    counts,
    counts.map((_, i) => uniforms(streamOf(5, 'g', `${i}`), 0, n)),
  );

/** Monte Carlo error of a mean of products of deviations. */
function covarianceError(a: Float64Array, b: Float64Array): number {
  const [centreA, centreB] = [mean(a), mean(b)];
  return Math.sqrt(spread(a.map((x, d) => (x - centreA) * ((b[d] ?? 0) - centreB))) / n);
}

describe.each(goldenDirichlets)('$id', (golden) => {
  const drawn = draw(golden.alpha);

  it('sums to 1 in every draw, each share within [0, 1]', () => {
    const off = drawn[0]?.map((_, d) => {
      const row = drawn.map((column) => column[d] ?? Number.NaN);
      const inside = row.every((x) => x >= 0 && x <= 1);
      return inside ? Math.abs(row.reduce((sum, x) => sum + x, 0) - 1) : Number.NaN;
    });
    expect(Math.max(...(off ?? [Number.NaN]))).toBeLessThan(1e-14);
  });

  it('has the declared means and covariances within 4 Monte Carlo errors', () => {
    drawn.forEach((column, i) => {
      const error = (golden.sd[i] ?? 0) / Math.sqrt(n);
      expect(Math.abs(mean(column) - (golden.mean[i] ?? 0)), `mean ${i}`).toBeLessThan(4 * error);
      drawn.forEach((other, j) => {
        const off = Math.abs(covariance(column, other) - (golden.covariance[i]?.[j] ?? 0));
        expect(off, `covariance ${i} ${j}`).toBeLessThan(4 * covarianceError(column, other));
      });
    });
  });

  it('has beta margins: the quantiles of R hold their shares of draws', () => {
    golden.marginals.forEach(({ q025, q500, q975 }, i) => {
      for (const [p, q] of [
        [0.025, q025],
        [0.5, q500],
        [0.975, q975],
      ] as const) {
        const below = mean((drawn[i] ?? new Float64Array()).map((x) => Number(x <= q)));
        expect(Math.abs(below - p)).toBeLessThan(4 * Math.sqrt((p * (1 - p)) / n));
      }
    });
  });
});
