/** Draws for the tests of the probabilistic analyses. */
import { readFileSync } from 'node:fs';
import normalQuantile from '@stdlib/stats-base-dists-normal-quantile';
import fc from 'fast-check';
import type { Draws } from '../../../shared/analysis/psa/draws.ts';

/** tests/golden/voi_psa.csv: 5,000 draws of three strategies, from base R 4.2.2. */
export function csvDraws(): Draws {
  const file = new URL('../../golden/voi_psa.csv', import.meta.url);
  const [head = '', ...lines] = readFileSync(file, 'utf8').trim().split('\n');
  const names = head.split(',');
  const cells = lines.map((line) => line.split(',').map(Number));
  const column = (name: string) =>
    Float64Array.from(cells, (row) => row[names.indexOf(name)] ?? NaN);
  const strategies = ['1', '2', '3'];
  return {
    strategies,
    cost: strategies.map((s) => column(`cost${s}`)),
    health: strategies.map((s) => column(`qaly${s}`)),
  };
}

/** Uniform numbers in (0, 1): the mulberry32 generator (public domain, from memory). */
export function uniforms(seed: number): () => number {
  let state = seed >>> 0;
  return () => {
    state = (state + 0x6d2b79f5) >>> 0;
    let mixed = Math.imul(state ^ (state >>> 15), state | 1);
    mixed ^= mixed + Math.imul(mixed ^ (mixed >>> 7), mixed | 61);
    return (((mixed ^ (mixed >>> 14)) >>> 0) + 0.5) / 4_294_967_296;
  };
}

/** Two strategies of which the second has net benefits N(mean, sd), the first none. */
export function twoNormal(mean: number, sd: number, count: number, seed: number): Draws {
  const uniform = uniforms(seed);
  const none = () => new Float64Array(count);
  const health = none().map(() => normalQuantile(uniform(), mean, sd));
  return { strategies: ['old', 'new'], cost: [none(), none()], health: [none(), health] };
}

/** Small integers, so that draws tie often. */
export const draws = fc
  .record({ count: fc.integer({ min: 1, max: 12 }), arms: fc.integer({ min: 1, max: 5 }) })
  .chain(({ count, arms }) => {
    const column = fc.array(fc.integer({ min: -4, max: 6 }), {
      minLength: count,
      maxLength: count,
    });
    const columns = fc.array(column, { minLength: arms, maxLength: arms });
    return fc.record({ cost: columns, health: columns });
  })
  .map(
    ({ cost, health }): Draws => ({
      strategies: cost.map((_, s) => `s${s}`),
      cost: cost.map((column) => Float64Array.from(column)),
      health: health.map((column) => Float64Array.from(column)),
    }),
  );

/** The same draws with the strategies in the opposite order. */
export function reversed({ strategies, cost, health }: Draws): Draws {
  return {
    strategies: [...strategies].reverse(),
    cost: [...cost].reverse(),
    health: [...health].reverse(),
  };
}
