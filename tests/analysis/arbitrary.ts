/** Random sets of strategies; small integers make ties, dominance and lines common. */
import fc from 'fast-check';
import type { Option } from '../../shared/analysis/option.ts';

const small = fc.record({
  cost: fc.integer({ min: -5, max: 12 }),
  health: fc.integer({ min: -3, max: 8 }),
});
/** Money to the hundredth and health to the millionth: sizes that occur. */
const decimal = (min: number, max: number, unit: number) =>
  fc.integer({ min: min / unit, max: max / unit }).map((steps) => steps * unit);
const real = fc.record({ cost: decimal(-1e4, 1e6, 0.01), health: decimal(-10, 40, 1e-6) });

export const options = fc
  .oneof(
    fc.array(small, { minLength: 1, maxLength: 9 }),
    fc.array(real, { minLength: 1, maxLength: 9 }),
  )
  .map((list): Option[] => list.map((option, i) => ({ id: `s${i}`, ...option })));

/** A fixed seed in the suite; a failing run prints its path. */
export const RUNS = { seed: 20_261_201, numRuns: 400 };
