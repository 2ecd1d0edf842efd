import { describe, expect, it } from 'vitest';
import { Graph } from '../../shared/engine/graph.ts';
import { LOWER } from '../../shared/engine/lower-functions.ts';
import { MEANING } from '../../shared/formula/meaning.ts';

/** Arguments inside every function's domain, by number of arguments. */
const ARGUMENTS: readonly (readonly number[])[] = [[0.3], [0.3, 0.7], [0.3, 0.7, 1.9]];

describe('LOWER', () => {
  it('means what the plain meaning says, for every function that has its own', () => {
    let compared = 0;
    for (const [name, lower] of LOWER) {
      const meaning = MEANING.get(name);
      if (!meaning) continue;
      for (const values of ARGUMENTS) {
        const graph = new Graph();
        const nodes = values.map((value) => graph.constant(value));
        let got: number | undefined;
        try {
          got = graph.valueOf(lower(graph, nodes));
        } catch {
          continue; // takes more arguments than these
        }
        const want = meaning(...values);
        if (got === undefined || Number.isNaN(want) || Number.isNaN(got)) continue;
        compared++;
        expect(Math.abs(got - want), `${name}(${values})`).toBeLessThanOrEqual(
          4e-16 * Math.max(1, Math.abs(want)),
        );
      }
    }
    expect(compared).toBeGreaterThan(60);
  });
});
