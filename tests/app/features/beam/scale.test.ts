import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import {
  beamScale,
  majorStep,
  settle,
  stepFrom,
  ticks,
} from '../../../../src/features/beam/scale.ts';

describe('the arm', () => {
  it('holds the policy thresholds and the corners within reach, with room beyond', () => {
    expect(beamScale([500, 1_500, 3_000], [507, 1_046])).toEqual({ max: 3_500, step: 50 });
  });

  it('reaches out for a corner beyond the thresholds', () => {
    expect(beamScale([1_000], [2_400]).max).toBeGreaterThan(2_400);
  });

  it('is not stretched by a corner far off', () => {
    expect(beamScale([1_000], [90_000]).max).toBeLessThan(2_000);
  });

  it('has a length where there is neither', () => {
    expect(beamScale([0], [])).toEqual({ max: 1, step: 0.01 });
  });

  it('has 60 steps or more, and not so many that a key seems dead', () => {
    const amount = fc.double({ min: 1e-3, max: 1e7, noNaN: true });
    fc.assert(
      fc.property(fc.array(amount, { minLength: 1, maxLength: 5 }), (thresholds) => {
        const { max, step } = beamScale(thresholds, []);
        expect(max).toBeGreaterThan(Math.max(...thresholds));
        expect(max / step).toBeGreaterThanOrEqual(59.9);
        expect(max / step).toBeLessThanOrEqual(160);
      }),
      { seed: 20_261_201 },
    );
  });
});

describe('a step', () => {
  const scale = { max: 3_500, step: 50 };

  it.each([
    ['goes to the next graduation', 1_500, 1, 1_550],
    ['goes back', 1_500, -1, 1_450],
    ['first comes onto a graduation, upwards', 1_046, 1, 1_050],
    ['first comes onto a graduation, downwards', 1_046, -1, 1_000],
    ['stops at the end', 3_480, 10, 3_500],
    ['stops at the stand', 20, -10, 0],
  ])('%s', (_, from, steps, to) => {
    expect(stepFrom(from, steps, scale)).toBe(to);
  });

  it('does not gather what binary fractions leave behind', () => {
    const fine = { max: 1, step: 0.1 };
    expect(stepFrom(stepFrom(stepFrom(0, 1, fine), 1, fine), 1, fine)).toBe(0.3);
  });
});

describe('a drag', () => {
  const scale = { max: 3_500, step: 50 };

  it('rests on a fifth of a step', () => {
    expect(settle(1_234.4, [], 15, scale)).toBe(1_230);
  });

  it('is caught by a notch close by', () => {
    expect(settle(1_488, [500, 1_500], 15, scale)).toBe(1_500);
    expect(settle(1_480, [500, 1_500], 15, scale)).toBe(1_480);
  });

  it('stays on the arm', () => {
    expect(settle(-40, [], 15, scale)).toBe(0);
    expect(settle(9_999, [], 15, scale)).toBe(3_500);
  });
});

describe('ticks', () => {
  it('run from the stand to the end', () => {
    expect(ticks(3_500, 500)).toEqual([0, 500, 1_000, 1_500, 2_000, 2_500, 3_000, 3_500]);
  });

  it('stand apart by more than the width of their numbers', () => {
    for (const room of [240, 600, 1_000]) {
      const step = majorStep(3_500, room, 40);
      expect((step / 3_500) * room).toBeGreaterThan(40);
    }
  });
});
