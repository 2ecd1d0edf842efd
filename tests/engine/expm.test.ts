import { describe, expect, it } from 'vitest';
import { Exponential, transitionMatrix } from '../../shared/engine/expm.ts';
import golden from '../golden/rates.json' with { type: 'json' };

describe('transitionMatrix', () => {
  // R 4.2.2 with expm::expm(method = "Higham08.b"); tolerance of tests/golden/README.md.
  for (const { id, generator, at } of golden.matrix_exponential) {
    it(`agrees with R's expm, ${id}`, () => {
      for (const { t, P } of at) {
        const got = transitionMatrix(generator, t);
        P.forEach((row, i) => {
          row.forEach((want, j) => {
            expect(Math.abs(got[i]![j]! - want)).toBeLessThanOrEqual(1e-12);
          });
        });
      }
    });
  }

  it('sums every row to 1 and never falls below 0, at any speed', () => {
    for (const speed of [1e-9, 0.1, 19, 21, 400, 1e6]) {
      const rates = [
        [0, speed, speed / 3],
        [speed / 7, 0, speed / 2],
        [0, 0, 0],
      ];
      for (const row of transitionMatrix(rates, 1)) {
        expect(Math.min(...row)).toBeGreaterThanOrEqual(0);
        expect(row.reduce((sum, p) => sum + p, 0)).toBeCloseTo(1, 11);
      }
    }
  });

  it('is the competing-risks formula where destinations are final', () => {
    // Closed form: p_i = r_i / R (1 - exp(-R t)).
    const [row] = transitionMatrix(
      [
        [0, 0.1, 0.25],
        [0, 0, 0],
        [0, 0, 0],
      ],
      1,
    );
    expect(row![1]).toBeCloseTo((0.1 / 0.35) * -Math.expm1(-0.35), 15);
    expect(row![0]).toBeCloseTo(Math.exp(-0.35), 15);
  });

  it('is the identity where nothing moves', () => {
    expect(
      transitionMatrix(
        [
          [0, 0],
          [0, 0],
        ],
        5,
      ),
    ).toEqual([
      [1, 0],
      [0, 1],
    ]);
  });

  it('gives NaN for a rate that is no number', () => {
    expect(
      transitionMatrix(
        [
          [0, Number.NaN],
          [0, 0],
        ],
        1,
      )[0],
    ).toEqual([Number.NaN, Number.NaN]);
  });
});

describe('Exponential', () => {
  it('gives one row as it gives all', () => {
    const places = [
      [0, 1],
      [1, 2],
      [2, 0],
    ] as const;
    const rates = Float64Array.of(0.4, 1.3, 0.2);
    const all = Float64Array.from(new Exponential(3, places).compute(rates, 2));
    const one = new Exponential(3, places).compute(rates, 2, 1);
    expect([...one.subarray(3, 6)]).toEqual([...all.subarray(3, 6)]);
  });
});
