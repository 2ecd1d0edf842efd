/** McKay, Beckman and Conover 1979: each of n strata is hit once. */
import { describe, expect, it } from 'vitest';
import { latinHypercube } from '../../../shared/engine/draw/latin-hypercube.ts';
import { streamOf } from '../../../shared/engine/draw/stream.ts';
import { correlation, mean } from './moments.ts';

const column = (name: string, n: number, seed = 1) =>
  latinHypercube(streamOf(seed, 'parameter', name), n, 0, n);

describe('latinHypercube', () => {
  it.each([1, 2, 3, 10, 100, 999, 1000, 4097])('hits each of %i strata once', (n) => {
    const strata = Array.from(column('a', n), (u) => Math.floor(u * n)).sort((a, b) => a - b);
    expect(strata).toEqual(Array.from({ length: n }, (_, i) => i));
  });

  it('gives a block as the slice of the whole', () => {
    const stream = streamOf(1, 'parameter', 'a');
    expect(latinHypercube(stream, 1000, 300, 400)).toEqual(column('a', 1000).slice(300, 400));
  });

  it('shuffles each stream apart: no pair of 20 correlates beyond 4 standard errors', () => {
    const columns = Array.from({ length: 20 }, (_, i) => column(`p${i}`, 1000));
    for (let i = 0; i < 20; i++) {
      for (let j = 0; j < i; j++) {
        const r = correlation(columns[i] ?? [], columns[j] ?? []);
        expect(Math.abs(r)).toBeLessThan(4 / Math.sqrt(1000));
      }
    }
  });

  it('finds the mean of a monotone function with far less error than plain draws', () => {
    // The mean of exp(u) is e - 1; its plain standard error at n = 100 is 0.0492.
    const errors = Array.from({ length: 50 }, (_, seed) => {
      return Math.abs(mean(column('a', 100, seed).map(Math.exp)) - (Math.E - 1));
    });
    expect(mean(errors)).toBeLessThan(0.0492 / 20);
  });
});
