import { describe, expect, it } from 'vitest';
import { OPERATORS, PREFIX_OPERATORS } from '../../shared/formula/expr.ts';
import { CALLABLE, FUNCTIONS, paramAt } from '../../shared/formula/functions.ts';
import { MEANING } from '../../shared/formula/meaning.ts';
import { CLOCKS } from '../../shared/model/names.ts';

it('has a meaning for every function but lookup, and no meaning without a function', () => {
  const named = [...FUNCTIONS.keys()].filter((name) => name !== 'lookup').sort();
  expect([...MEANING.keys()].sort()).toEqual(named);
});

it('holds every operator under its word, and lets nobody call one', () => {
  for (const word of [...Object.values(OPERATORS), ...Object.values(PREFIX_OPERATORS)]) {
    expect(FUNCTIONS.get(word)?.isOperator).toBe(true);
    expect(CALLABLE).not.toContain(word);
  }
});

it('shares no name with a clock', () => {
  for (const clock of CLOCKS) expect(FUNCTIONS.has(clock)).toBe(false);
});

it.each(['__proto__', 'constructor', 'toString', 'hasOwnProperty'])('knows no %s', (name) => {
  expect(FUNCTIONS.get(name)).toBeUndefined();
  expect(MEANING.get(name)).toBeUndefined();
});

describe('arguments', () => {
  it.each([
    ['if', 3, 3],
    ['min', 2, Number.POSITIVE_INFINITY],
    ['sum', 1, Number.POSITIVE_INFINITY],
    ['lookup', 2, 3],
    ['rescale', 3, 3],
    ['alive_generalised_gamma', 4, 4],
    ['negate', 1, 1],
  ])('%s takes %d to %d', (name, min, max) => {
    expect(FUNCTIONS.get(name)).toMatchObject({ min, max });
  });

  it('are named and have kinds, the last one repeating where many are allowed', () => {
    const [chance, sum] = [FUNCTIONS.get('chance'), FUNCTIONS.get('sum')];
    if (!chance || !sum) throw new Error('missing');
    expect(paramAt(chance, 0)).toEqual({ name: 'rate', kind: 'rate' });
    expect(paramAt(chance, 2)).toBeUndefined();
    expect(paramAt(sum, 40)).toEqual({ name: 'b', kind: 'number' });
  });
});
