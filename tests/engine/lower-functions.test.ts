import { describe, expect, it } from 'vitest';
import { Graph } from '../../shared/engine/graph.ts';
import { LOWER } from '../../shared/engine/lower-functions.ts';
import { FUNCTIONS } from '../../shared/formula/functions.ts';
import { MEANING } from '../../shared/formula/meaning.ts';

/** Arguments inside every function's domain. */
const ARGUMENTS = [0.3, 0.7, 1.9];

describe('LOWER', () => {
  it('means what the plain meaning says, for every function that has its own', () => {
    let compared = 0;
    for (const [name, lower] of LOWER) {
      const meaning = MEANING.get(name);
      const known = FUNCTIONS.get(name);
      if (!meaning || !known) continue;
      const values = ARGUMENTS.slice(0, Math.min(known.max, ARGUMENTS.length));
      const graph = new Graph();
      const got = graph.valueOf(
        lower(
          graph,
          values.map((value) => graph.constant(value)),
        ),
      );
      const want = meaning(...values);
      compared++;
      expect(got, `${name}(${values})`).toBeDefined();
      expect(Math.abs(got! - want), `${name}(${values})`).toBeLessThanOrEqual(
        4e-16 * Math.max(1, Math.abs(want)),
      );
    }
    expect(compared).toBeGreaterThanOrEqual(40);
  });
});
