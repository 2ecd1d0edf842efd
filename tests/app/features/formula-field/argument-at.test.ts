import { expect, it } from 'vitest';
import { argumentAt } from '../../../../src/features/formula-field/argument-at.ts';

it('finds the call that the caret is in, and the argument', () => {
  expect(argumentAt('chance(r, ', 10)).toEqual({ fn: 'chance', index: 1 });
  expect(argumentAt('max(1, (2 + 3), min(4, 5), 6', 28)).toEqual({ fn: 'max', index: 3 });
  expect(argumentAt('min(1, (2 + ', 12)).toEqual({ fn: 'min', index: 1 });
});

it('finds none outside', () => {
  expect(argumentAt('chance(1, 2) + 3', 16)).toBeNull();
  expect(argumentAt('(1 + 2', 6)).toBeNull();
});
