import { describe, expect, it } from 'vitest';
import { plane } from '../../../shared/analysis/psa/plane.ts';
import { csvDraws } from './samples.ts';

describe('plane', () => {
  // Source: base R 4.2.2 on tests/golden/voi_psa.csv: mean(dx > 0 & dy > 0) and so on
  // for dx = qaly - qaly1, dy = cost - cost1.
  it('counts the quadrants as R does', () => {
    const clouds = plane(csvDraws(), '1');
    expect(clouds.map(({ strategy }) => strategy)).toEqual(['2', '3']);
    expect(clouds.map(({ shares }) => shares)).toEqual([
      { northEast: 0.9726, southEast: 0, southWest: 0, northWest: 0.0274, onAxis: 0 },
      { northEast: 0.9574, southEast: 0, southWest: 0, northWest: 0.0426, onAxis: 0 },
    ]);
  });

  it('sets draws without a difference apart, rounding aside', () => {
    const [cloud] = plane(
      {
        strategies: ['a', 'b'],
        cost: [Float64Array.of(1, 1, 0.3, 1, 1, 1), Float64Array.of(2, 0, 0.1 + 0.2, 2, 0, 2)],
        health: [Float64Array.of(1, 1, 1, 1, 1, 1), Float64Array.of(2, 2, 2, 0, 0, 1)],
      },
      'a',
    );
    const sixth = 1 / 6;
    expect(cloud?.shares).toEqual({
      northEast: sixth,
      southEast: sixth,
      southWest: sixth,
      northWest: sixth,
      onAxis: 2 / 6,
    });
    expect([...(cloud?.cost ?? [])]).toEqual([1, -1, 0, 1, -1, 1]);
  });

  it('refuses a comparator that is not among the strategies', () => {
    expect(() => plane(csvDraws(), 'x')).toThrow(RangeError);
  });
});
