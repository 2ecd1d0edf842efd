import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import {
  exactAxis,
  keyRows,
  spreadLabels,
  valueAxis,
} from '../../../../src/components/chart/layout.ts';

describe('names beside line ends', () => {
  const names = (ys: readonly number[]) => ys.map((y, i) => ({ id: `${i}`, name: `${i}`, y }));

  it('stay where they are when nothing is near', () => {
    expect(spreadLabels(names([10, 50, 90]), 17, 200).map(({ y }) => y)).toEqual([10, 50, 90]);
  });

  it('never cover one another, nor pass the end, while there is room', () => {
    const ys = fc.array(fc.double({ min: 0, max: 280, noNaN: true }), {
      minLength: 1,
      maxLength: 12,
    });
    fc.assert(
      fc.property(ys, (wanted) => {
        const placed = spreadLabels(names(wanted), 17, 280).map(({ y }) => y);
        expect(placed).toHaveLength(wanted.length);
        expect(Math.max(...placed)).toBeLessThanOrEqual(280);
        placed.slice(1).forEach((y, i) => {
          expect(y - (placed[i] ?? 0)).toBeGreaterThanOrEqual(17 - 1e-9);
        });
      }),
    );
  });
});

describe('a key', () => {
  it('goes on to the next row where its names do not fit', () => {
    const items = [{ name: 'Care as now' }, { name: 'Nurses at school' }, { name: 'Register' }];
    const { places, height } = keyRows(items, 290);
    expect(places.map(({ y }) => y)).toEqual([0, 24, 24]);
    expect(places.map(({ x }) => x > 0)).toEqual([false, false, true]);
    expect(height).toBe(48);
  });

  it('takes no room where there is nothing to say', () => {
    expect(keyRows([], 320).height).toBe(0);
  });
});

describe('axes', () => {
  it('of time end where time ends', () => {
    expect(exactAxis(0, 40, 6)).toMatchObject({ low: 0, high: 40 });
    expect(exactAxis(0, 1, 6).ticks).toEqual([0, 0.2, 0.4, 0.6, 0.8, 1]);
  });

  it('of losses stand on 0; those of net benefits hold what is below it', () => {
    expect(valueAxis([3, 80], true).low).toBe(0);
    expect(valueAxis([-30, 80], false).low).toBeLessThanOrEqual(-30);
  });
});
