import { describe, expect, it } from 'vitest';
import { planUniforms } from '../../../shared/engine/draw/plan.ts';
import { scrambledSobol } from '../../../shared/engine/draw/scrambled-sobol.ts';
import { streamOf } from '../../../shared/engine/draw/stream.ts';
import { correlation, mean } from './moments.ts';

const names = Array.from({ length: 30 }, (_, i) => ['parameter', `p${i}`]);

/** The columns of 30 parameters under a plan. */
function columns(plan: 'plain' | 'lhs' | 'sobol', seed: number, samples: number): Float64Array[] {
  const uniforms = planUniforms(names, { plan, seed, samples }, 0, samples);
  return names.map((name) => uniforms(name));
}

/** Root mean squared error of the mean of f over 30 parameters, for 20 seeds; the truth is 1. */
function rootMeanSquare(
  plan: 'plain' | 'lhs' | 'sobol',
  samples: number,
  f: (row: readonly number[]) => number,
): number {
  const errors = Array.from({ length: 20 }, (_, seed) => {
    const drawn = columns(plan, seed, samples);
    const values = Array.from({ length: samples }, (_, d) => f(drawn.map((c) => c[d] ?? 0)));
    return (mean(values) - 1) ** 2;
  });
  return Math.sqrt(mean(errors));
}

describe('scrambledSobol', () => {
  it('stays strictly inside (0, 1) and hits each of 2^k intervals once', () => {
    const column = scrambledSobol(streamOf(5, 'a'), 17, 0, 1024);
    expect(column.every((u) => u > 0 && u < 1)).toBe(true);
    expect(new Set(column.map((u) => Math.floor(u * 1024))).size).toBe(1024);
  });

  it('scrambles by the seed: a given point goes anywhere alike', () => {
    const points = Array.from({ length: 4000 }, (_, seed) => {
      return scrambledSobol(streamOf(seed, 'a'), 3, 5, 6)[0] ?? 0;
    });
    expect(Math.abs(mean(points) - 0.5)).toBeLessThan(4 / Math.sqrt(12 * 4000));
    const squares = points.map((u) => 12 * (u - 0.5) ** 2);
    expect(Math.abs(mean(squares) - 1)).toBeLessThan(4 * Math.sqrt(0.8 / 4000));
  });
});

describe('the Sobol plan for 30 parameters', () => {
  /** A sum of the first five and of products of two: smooth, mean 1, few inputs at a time. */
  const smooth = (u: readonly number[]) => {
    const [a = 0, b = 0, c = 0, d = 0, e = 0] = u;
    return 1 + (a + b + c + d + e - 2.5) + 4 * (a - 0.5) * (b - 0.5) + 4 * (c - 0.5) * (d - 0.5);
  };

  it('has a tenth of the error of plain draws, and less than Latin hypercube', () => {
    const sobol = rootMeanSquare('sobol', 1024, smooth);
    expect(sobol).toBeLessThan(rootMeanSquare('plain', 1024, smooth) / 10);
    expect(sobol).toBeLessThan(rootMeanSquare('lhs', 1024, smooth));
  });

  it.each([200, 512, 800, 1000, 1024])('correlates no two of them in %i draws', (samples) => {
    for (const seed of [1, 2, 3]) {
      const drawn = columns('sobol', seed, samples);
      let worst = 0;
      for (let i = 0; i < drawn.length; i++) {
        for (let j = 0; j < i; j++) {
          worst = Math.max(worst, Math.abs(correlation(drawn[i] ?? [], drawn[j] ?? [])));
        }
      }
      expect(worst, `seed ${seed}`).toBeLessThan(4.5 / Math.sqrt(samples));
    }
  });
});
