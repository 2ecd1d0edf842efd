import { expect, test } from 'vitest';
import { said } from './codes.ts';

test('a variable has a formula under every strategy', () => {
  expect(
    said(({ variables }) => {
      variables[0]!.formula = { byStrategy: { treatment: '1', other: '2' } };
    }),
  ).toEqual([
    'strategies.unknown variables.0.formula.byStrategy.other',
    'formula.missingForStrategy variables.0.formula',
  ]);
});
