import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { closest, editDistance } from '../../shared/formula/closest.ts';

describe('editDistance', () => {
  // Textbook pairs (from memory): kitten/sitting is 3; a swap of neighbours is one edit.
  it.each([
    ['kitten', 'sitting', 3],
    ['chance', 'chnace', 1],
    ['', 'abc', 3],
    ['same', 'same', 0],
    ['ca', 'abc', 3],
  ])('%s to %s is %d', (a, b, want) => expect(editDistance(a, b)).toBe(want));

  it('is the same both ways, and nothing only for equals', () => {
    const word = fc.string({ maxLength: 8, unit: fc.constantFrom('a', 'b', 'c') });
    fc.assert(
      fc.property(word, word, (a, b) => {
        expect(editDistance(a, b)).toBe(editDistance(b, a));
        expect(editDistance(a, b) === 0).toBe(a === b);
      }),
    );
  });
});

describe('closest', () => {
  const names = ['p_die', 'p_relapse', 'rescale', 'cost_clinic'];
  it.each([
    ['p_dei', 'p_die'],
    ['P_RELAPSE', 'p_relapse'],
    ['recsale', 'rescale'],
    ['costclinic', 'cost_clinic'],
    ['zzz', undefined],
    ['something_else_altogether', undefined],
  ])('%s: %s', (name, want) => expect(closest(name, names)).toBe(want));
});
