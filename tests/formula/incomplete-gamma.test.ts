import { expect, it } from 'vitest';
import { gammaTails } from '../../shared/formula/incomplete-gamma.ts';
import reference from './r-pgamma.json' with { type: 'json' };

// R 4.2.2 stats::pgamma; the script is in the file.
it.each(reference.cases)(
  'agrees with pgamma at shape $shape, y $y',
  ({ shape, y, lower, upper }) => {
    const tails = gammaTails(shape, y);
    expect(Math.abs(tails.lower - lower)).toBeLessThanOrEqual(1e-11 * lower);
    expect(Math.abs(tails.upper - upper)).toBeLessThanOrEqual(1e-11 * upper);
  },
);

it('holds at the ends of the line', () => {
  for (const shape of [0.5, 151, 2e6]) {
    expect(gammaTails(shape, Number.NEGATIVE_INFINITY)).toEqual({ lower: 0, upper: 1 });
    expect(gammaTails(shape, Number.POSITIVE_INFINITY)).toEqual({ lower: 1, upper: 0 });
    expect(gammaTails(shape, Number.NaN).lower).toBeNaN();
  }
  expect(gammaTails(0, 1).upper).toBeNaN();
});
