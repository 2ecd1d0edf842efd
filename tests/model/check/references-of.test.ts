import { expect, test } from 'vitest';
import { lookupsOf } from '../../../shared/model/check/lookups.ts';
import {
  checkState,
  checkStrategies,
  checkStrategyFormula,
} from '../../../shared/model/check/references-of.ts';
import { tinyDocument } from '../../fixtures/tiny-document.ts';

const lookups = lookupsOf(tinyDocument());

test('a state is known or not', () => {
  expect(checkState(lookups, 'alive', ['x'])).toEqual([]);
  expect(checkState(lookups, 'gone', ['x'])).toMatchObject([
    { code: 'states.unknown', path: ['x'], params: { id: 'gone' } },
  ]);
});

test('a list of strategies is known, without repeats, and not empty', () => {
  const codes = (list?: string[]) => checkStrategies(lookups, list, ['s']).map(({ code }) => code);
  expect(codes(undefined)).toEqual([]);
  expect(codes(['treatment'])).toEqual([]);
  expect(codes([])).toEqual(['strategies.noneListed']);
  expect(codes(['usual', 'usual', 'x'])).toEqual(['strategies.listedTwice', 'strategies.unknown']);
});

test('a formula by strategy covers every strategy that needs it', () => {
  const formula = { byStrategy: { treatment: '1' } };
  expect(checkStrategyFormula(lookups, formula, ['f'])).toMatchObject([
    { code: 'formula.missingForStrategy', path: ['f'], params: { strategy: 'usual' } },
  ]);
  expect(checkStrategyFormula(lookups, formula, ['f'], ['treatment'])).toEqual([]);
  expect(checkStrategyFormula(lookups, { ...formula, otherwise: '2' }, ['f'])).toEqual([]);
  expect(checkStrategyFormula(lookups, '1', ['f'])).toEqual([]);
});

test('a formula by strategy names strategies that exist', () => {
  const formula = { byStrategy: { nobody: '1' }, otherwise: '2' };
  expect(checkStrategyFormula(lookups, formula, ['f'])).toMatchObject([
    { code: 'strategies.unknown', path: ['f', 'byStrategy', 'nobody'] },
  ]);
});
