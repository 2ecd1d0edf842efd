import { describe, expect, it } from 'vitest';
import { boundaryWeights, countingWeights } from '../../shared/engine/counting.ts';
import { tinyDocument } from '../fixtures/tiny-document.ts';
import golden from '../golden/cohort.json' with { type: 'json' };

const { question } = tinyDocument();

type Counting = typeof question.counting;
type At = typeof question.discounting.at;

function boundaries(counting: Counting, at: At, rate: number, cycles: number, cycleLength = 1) {
  const discounting = { ...question.discounting, at, wholeYears: false };
  return boundaryWeights(
    countingWeights({ ...question, counting, discounting, cycleLength }, rate, cycles),
  );
}

describe('countingWeights', () => {
  // tests/golden/cohort.json: geometric survival, closed forms (R 4.2.2).
  for (const { id, inputs, expected } of golden.closed_forms) {
    if (id !== 'two-state-geometric') continue;
    const { p, r, N } = inputs as { p: number; r: number; N: number };
    const want = expected as unknown as Record<string, number>;
    it(`agrees with the geometric sums, p = ${p}`, () => {
      for (const counting of ['start', 'end', 'trapezoid'] as const) {
        const total = (rate: number) =>
          boundaries(counting, 'counted', rate, N).reduce((sum, w, k) => sum + w * (1 - p) ** k, 0);
        expect(Math.abs(total(0) / want[`ly_${counting}`]! - 1)).toBeLessThan(1e-10);
        expect(Math.abs(total(r) / want[`ly_disc_${counting}`]! - 1)).toBeLessThan(1e-10);
      }
    });
  }

  // The same file: exponential survival under all seven conventions.
  const conventions: Record<string, [Counting, At]> = {
    start: ['start', 'counted'],
    end: ['end', 'counted'],
    trapezoid: ['trapezoid', 'counted'],
    trapezoid_dStart: ['trapezoid', 'cycleStart'],
    trapezoid_dMid: ['trapezoid', 'cycleMiddle'],
    trapezoid_dEnd: ['trapezoid', 'cycleEnd'],
    simpson: ['simpson', 'counted'],
  };
  for (const { id, inputs, expected } of golden.closed_forms) {
    if (id !== 'continuous-time-exponential-vs-cycle-corrections') continue;
    const { h, r, T, dt } = inputs as unknown as Record<'h' | 'r' | 'T' | 'dt', number>;
    const want = (expected as unknown as { by_method: Record<string, number> }).by_method;
    it(`agrees with the corrections of exponential survival, hazard ${h}`, () => {
      for (const [name, [counting, at]] of Object.entries(conventions)) {
        const weights = boundaries(counting, at, r, Math.round(T / dt), dt);
        const total = weights.reduce((sum, w, k) => sum + w * Math.exp(-h * k * dt) * dt, 0);
        expect(Math.abs(total / want[name]! - 1)).toBeLessThan(1e-10);
      }
    });
  }

  it('is the annuity for a unit stream (T34)', () => {
    const weights = boundaries('end', 'counted', 0.05, 30);
    const total = weights.reduce((sum, w) => sum + w, 0);
    expect(total).toBeCloseTo((1 - 1.05 ** -30) / 0.05, 12);
  });

  it('has the trapezoid midway between start and end (T37)', () => {
    const [start, end, both] = (['start', 'end', 'trapezoid'] as const).map((counting) =>
      boundaries(counting, 'counted', 0.03, 7),
    );
    both!.forEach((weight, k) => {
      expect(weight).toBeCloseTo((start![k]! + end![k]!) / 2, 15);
    });
  });

  it("shares out Simpson's rule so that each cycle weighs 1", () => {
    const { start, end } = countingWeights({ ...question, counting: 'simpson' }, 0, 4);
    start.forEach((weight, cycle) => {
      expect(weight + end[cycle]!).toBeCloseTo(1, 15);
    });
    const thirds = boundaries('simpson', 'counted', 0, 4).map((weight) => weight * 3);
    [1, 4, 2, 4, 1].forEach((want, k) => {
      expect(thirds[k]).toBeCloseTo(want, 14);
    });
  });
});
