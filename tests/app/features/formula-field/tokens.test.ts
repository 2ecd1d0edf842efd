import { expect, it } from 'vitest';
import { formulaNames } from '../../../../src/features/formula-field/formula-names.ts';
import { tokensOf } from '../../../../src/features/formula-field/tokens.ts';
import { tinyDocument } from '../../../fixtures/tiny-document.ts';

const names = formulaNames(tinyDocument());

it('tells names, functions, clocks, words and numbers apart', () => {
  const kinds = tokensOf('if(time > 2, chance(p_die, die_now), start_age)', names)
    .filter(({ kind }) => kind !== 'plain' && kind !== 'operator')
    .map(({ text, kind }) => `${text}: ${kind}`);
  expect(kinds).toEqual([
    'if: function',
    'time: clock',
    '2: number',
    'chance: function',
    'p_die: parameter',
    'die_now: variable',
    'start_age: covariate',
  ]);
});

it.each(['', ' p_die ', 'p_die; 1 = €', '1.2.3 + x', 'a\n+ b'])(
  'loses no character of %j',
  (text) => {
    const tokens = tokensOf(text, names);
    expect(tokens.map((token) => token.text).join('')).toBe(text);
  },
);
