import fc from 'fast-check';
import { expect, it } from 'vitest';
import { FUNCTIONS } from '../../shared/formula/functions.ts';
import { MEANING } from '../../shared/formula/meaning.ts';

const call = (name: string, ...args: number[]) => MEANING.get(name)?.(...args);

it.each<[string, number[], number]>([
  ['min', [3, 1, 2], 1],
  ['max', [3, 1, 2], 3],
  ['if', [0, 1, 2], 2],
  ['abs', [-2], 2],
  ['exp', [0], 1],
  ['ln', [1], 0],
  ['log10', [1000], 3],
  ['sqrt', [9], 3],
  ['floor', [-1.5], -2],
  ['chance_of', [3], 0.75],
  ['standard_normal', [0], 0.5],
  ['times_risk', [0.2, 1.5], 0.30000000000000004],
  ['event_by', [0.5, 0.25], 0.5],
])('%s(%j) is %d', (name, args, want) => expect(call(name, ...args)).toBe(want));

it('gives a number for any numbers, and never throws', () => {
  const args = fc.array(fc.double(), { minLength: 4, maxLength: 4 });
  fc.assert(
    fc.property(args, (values) => {
      for (const [name, meaning] of MEANING) {
        const count = FUNCTIONS.get(name)?.min ?? 0;
        expect(typeof meaning(...values.slice(0, count))).toBe('number');
      }
    }),
    { numRuns: 1_000 },
  );
});
