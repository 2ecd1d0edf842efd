import { expect, test } from 'vitest';
import { formulaFor } from '../../shared/model/strategy-formula.ts';

test('one formula holds for every strategy', () => {
  expect(formulaFor('a + b', 'usual')).toBe('a + b');
});

test('a strategy’s own formula comes before the fallback', () => {
  const formula = { byStrategy: { usual: 'a' }, otherwise: 'b' };
  expect(formulaFor(formula, 'usual')).toBe('a');
  expect(formulaFor(formula, 'other')).toBe('b');
});

test('none where neither is given, whatever an object inherits', () => {
  const formula = { byStrategy: { usual: 'a' } };
  expect(formulaFor(formula, 'other')).toBeUndefined();
  expect(formulaFor(formula, 'toString')).toBeUndefined();
});
