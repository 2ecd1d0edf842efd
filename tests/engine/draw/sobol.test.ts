/** Sobol points against tests/golden/sobol.json (scipy 1.17.1, the table of Joe and Kuo 2008). */
import { describe, expect, it } from 'vitest';
import {
  SOBOL_DIMENSIONS,
  sobolDirections,
  sobolPoint,
} from '../../../shared/engine/draw/sobol.ts';
import golden from '../../golden/sobol.json' with { type: 'json' };

describe('sobolPoint', () => {
  it.each(golden.positions.map((position, column) => ({ position, column })))(
    'dimension $position: the points of scipy, exactly',
    ({ position, column }) => {
      const directions = sobolDirections(position);
      golden.indices.forEach((index, row) => {
        const point = sobolPoint(directions, index ^ (index >>> 1)) / 2 ** 32;
        expect(point).toBe(golden.points[row]?.[column]);
      });
    },
  );

  it('hits each of 2^k intervals once in every dimension', () => {
    for (let dimension = 0; dimension < SOBOL_DIMENSIONS; dimension++) {
      const directions = sobolDirections(dimension);
      const hit = new Set<number>();
      for (let i = 0; i < 256; i++) hit.add(sobolPoint(directions, 512 + i) >>> 24);
      expect(hit.size, `dimension ${dimension}`).toBe(256);
    }
  });
});
