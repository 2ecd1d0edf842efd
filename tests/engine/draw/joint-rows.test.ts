import { describe, expect, it } from 'vitest';
import { drawParameters } from '../../../shared/engine/draw/draw.ts';
import { drawRows } from '../../../shared/engine/draw/joint-rows.ts';
import type { Group } from '../../../shared/model/document.ts';
import { parameter } from './parameter.ts';

const rows = Array.from({ length: 20 }, (_, i) => [i, 100 - i]);
const group: Group = {
  id: 'g',
  label: 'Posterior',
  type: 'jointRows',
  members: ['a', 'b'],
  rows,
};

describe('drawRows', () => {
  it('takes row floor(u n) for all members', () => {
    const drawn = drawRows(rows, 2, Float64Array.of(2 ** -53, 0.05, 0.99, 1 - 2 ** -53));
    expect(drawn.map((column) => [...column])).toEqual([
      [0, 1, 19, 19],
      [100, 99, 81, 81],
    ]);
  });

  it('keeps rows together, each as often as chance has it', () => {
    const members = group.members.map((id) => parameter(id, { type: 'inGroup', group: 'g' }));
    const settings = { samples: 1000, seed: 2, plan: 'lhs' as const };
    const drawn = drawParameters(members, [group], settings, 0, 1000);
    const counts = new Map<number, number>();
    drawn.get('a')?.forEach((a, d) => {
      expect(drawn.get('b')?.[d]).toBe(100 - a);
      counts.set(a, (counts.get(a) ?? 0) + 1);
    });
    // A Latin hypercube takes each of 20 rows in exactly 1 of 20 draws.
    expect([...counts.values()]).toEqual(new Array(20).fill(50));
  });
});
