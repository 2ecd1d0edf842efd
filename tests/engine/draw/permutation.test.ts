import { describe, expect, it } from 'vitest';
import { permutationOf } from '../../../shared/engine/draw/permutation.ts';
import { streamOf } from '../../../shared/engine/draw/stream.ts';

const permute = (seed: number, n: number) => {
  const place = permutationOf(streamOf(seed, 'x'), n);
  return Array.from({ length: n }, (_, i) => place(i));
};

/** Chi-squared of equal counts. */
const chiSquared = (counts: readonly number[], each: number) =>
  counts.reduce((sum, count) => sum + (count - each) ** 2 / each, 0);

describe('permutationOf', () => {
  it.each([1, 2, 5, 64, 65, 1000])('puts 0..%i-1 in an order without loss', (n) => {
    expect(permute(1, n).sort((a, b) => a - b)).toEqual(Array.from({ length: n }, (_, i) => i));
  });

  it('sends a place anywhere alike: chi-squared over 6,000 seeds', () => {
    const counts = new Array<number>(20).fill(0);
    for (let seed = 0; seed < 6000; seed++) {
      const place = permutationOf(streamOf(seed, 'x'), 20)(7);
      counts[place] = (counts[place] ?? 0) + 1;
    }
    // 19 degrees of freedom: the 0.9999 quantile is 50.8 (R qchisq).
    expect(chiSquared(counts, 300)).toBeLessThan(50.8);
  });

  it('gives the 24 orders of 4 alike: chi-squared over 7,200 seeds', () => {
    const counts = new Map<string, number>();
    for (let seed = 0; seed < 7200; seed++) {
      const order = permute(seed, 4).join();
      counts.set(order, (counts.get(order) ?? 0) + 1);
    }
    expect(counts.size).toBe(24);
    // 23 degrees of freedom: the 0.9999 quantile is 57.1 (R qchisq).
    expect(chiSquared([...counts.values()], 300)).toBeLessThan(57.1);
  });
});
