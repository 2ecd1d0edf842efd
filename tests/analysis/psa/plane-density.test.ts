import { describe, expect, it } from 'vitest';
import { type PlaneCloud, plane } from '../../../shared/analysis/psa/plane.ts';
import { planeDensity, planeExtent } from '../../../shared/analysis/psa/plane-density.ts';
import { csvDraws } from './samples.ts';

const clouds = plane(csvDraws(), '1');

describe('planeExtent', () => {
  it('holds every draw and the origin', () => {
    const { health, cost } = planeExtent(clouds);
    expect(health[0]).toBe(Math.min(0, ...clouds.flatMap((cloud) => [...cloud.health])));
    expect(cost).toEqual([0, Math.max(...clouds.flatMap((cloud) => [...cloud.cost]))]);
  });
});

describe('planeDensity', () => {
  it('counts every draw once', () => {
    for (const cloud of clouds) {
      const density = planeDensity(cloud, planeExtent(clouds), 40, 30);
      expect(density.counts.reduce((a, b) => a + b)).toBe(5_000);
      expect(density.outside).toBe(0);
      expect(density.highest).toBe(Math.max(...density.counts));
    }
  });

  it('fills cells from the south-west, edges to the cell above but the last', () => {
    const cloud = {
      strategy: 's',
      health: Float64Array.of(0, 1, 2, 2, 3),
      cost: Float64Array.of(0, 0, 4, 2, 1),
    } as unknown as PlaneCloud;
    const density = planeDensity(cloud, { health: [0, 2], cost: [0, 4] }, 2, 2);
    expect([...density.counts]).toEqual([1, 1, 0, 2]);
    expect(density).toMatchObject({ highest: 2, outside: 1 });
  });

  it('takes clouds that are one point', () => {
    const none = {
      strategy: 's',
      health: new Float64Array(3),
      cost: new Float64Array(3),
    } as unknown as PlaneCloud;
    const density = planeDensity(none, planeExtent([none]), 2, 2);
    expect([...density.counts]).toEqual([3, 0, 0, 0]);
  });
});
