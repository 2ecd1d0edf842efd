import { describe, expect, it } from 'vitest';
import {
  distinctDimensions,
  sobolDimensions,
} from '../../../shared/engine/draw/sobol-dimensions.ts';

const names = (count: number, from = 0) =>
  Array.from({ length: count }, (_, i) => ['parameter', `p${from + i}`]);

describe('sobolDimensions', () => {
  it('gives each name a dimension of its own, whatever their order', () => {
    const given = sobolDimensions(names(100), 1024);
    expect(new Set(given.values()).size).toBe(100);
    expect(sobolDimensions(names(100).reverse(), 1024)).toEqual(given);
  });

  it('gives none to names beyond the dimensions that can be told apart', () => {
    expect(sobolDimensions(names(300), 1024).size).toBe(189);
    expect(sobolDimensions(names(300), 256).size).toBe(35);
    expect(sobolDimensions([], 1024).size).toBe(0);
  });

  it('seldom moves another parameter when one is added to 30 (docs/decisions/004: 12%)', () => {
    let moved = 0;
    const trials = 300;
    for (let trial = 0; trial < trials; trial++) {
      const some = names(31, 1000 * trial);
      const before = sobolDimensions(some.slice(1), 1000);
      const after = sobolDimensions(some, 1000);
      if ([...before].some(([name, dimension]) => after.get(name) !== dimension)) moved++;
    }
    expect(moved / trials).toBeLessThan(0.2);
  });
});

describe('distinctDimensions', () => {
  it.each([
    [1, 1],
    [100, 10],
    [200, 18],
    [512, 68],
    [900, 68],
    [1000, 189],
    [1024, 189],
    [100_000, 189],
  ])('%i points tell %i dimensions apart', (samples, count) => {
    expect(distinctDimensions(samples)).toHaveLength(count);
  });
});
