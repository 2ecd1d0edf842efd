import { expect, test } from 'vitest';
import { cycleCount, exactCycles, isWholeCycles } from '../../shared/model/cycles.ts';

test.each([
  [40, 1, 40],
  [10, 1 / 12, 120],
  [10, 1 / 4, 40],
  [2.5, 0.5, 5],
  [10, 7 / 365.25, 522],
  [0.1, 1, 1],
])('%s years of cycles of %s years are %s cycles', (horizon, cycleLength, expected) => {
  expect(cycleCount({ horizon, cycleLength })).toBe(expected);
});

test('twelfths are whole in spite of rounding, weeks in ten years are not', () => {
  expect(isWholeCycles({ horizon: 40, cycleLength: 1 / 12 })).toBe(true);
  expect(isWholeCycles({ horizon: 10, cycleLength: 0.083_333_333_333 })).toBe(true);
  expect(isWholeCycles({ horizon: 10, cycleLength: 0.0833 })).toBe(false);
  expect(isWholeCycles({ horizon: 10, cycleLength: 7 / 365.25 })).toBe(false);
  expect(isWholeCycles({ horizon: 0.1, cycleLength: 1 })).toBe(false);
});

test('the exact number is kept for saying so', () => {
  expect(exactCycles({ horizon: 10, cycleLength: 7 / 365.25 })).toBeCloseTo(521.785_714, 6);
});
