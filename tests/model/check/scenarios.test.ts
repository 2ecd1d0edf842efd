import { expect, test } from 'vitest';
import type { ModelDocument, Scenario } from '../../../shared/model/document.ts';
import { said } from './codes.ts';

const scenario = (...overrides: Scenario['overrides']) => {
  return (document: ModelDocument): void => {
    document.scenarios = [{ id: 's', label: 'S', overrides }];
  };
};

test('a sound scenario', () => {
  expect(
    said(
      scenario(
        { type: 'parameter', parameter: 'c_year', value: 1 },
        { type: 'variable', variable: 'v_die', formula: 'p_die' },
        { type: 'setting', setting: 'counting', value: 'simpson' },
      ),
    ),
  ).toEqual([]);
});

test('targets exist', () => {
  expect(
    said(
      scenario(
        { type: 'parameter', parameter: 'x', value: 1 },
        { type: 'variable', variable: 'x', formula: { byStrategy: { usual: '1' } } },
      ),
    ),
  ).toEqual([
    'parameters.unknown scenarios.0.overrides.0.parameter',
    'variables.unknown scenarios.0.overrides.1.variable',
    'formula.missingForStrategy scenarios.0.overrides.1.formula',
  ]);
});

test('settings take values of their domain', () => {
  expect(
    said(
      scenario(
        { type: 'setting', setting: 'horizon', value: -1 },
        { type: 'setting', setting: 'counting', value: 'middle' },
        { type: 'setting', setting: 'discountCosts', value: '3%' },
      ),
    ),
  ).toEqual([
    'scenarios.badSetting scenarios.0.overrides.0.value',
    'scenarios.badSetting scenarios.0.overrides.1.value',
    'scenarios.badSetting scenarios.0.overrides.2.value',
  ]);
});

test('nothing is overridden twice', () => {
  const twice = { type: 'parameter', parameter: 'c_year', value: 1 } as const;
  expect(said(scenario(twice, twice))).toEqual([
    'scenarios.overriddenTwice scenarios.0.overrides.1',
  ]);
});

test('the clock of a scenario can be run', () => {
  const horizon = (value: number) => ({ type: 'setting', setting: 'horizon', value }) as const;
  expect(said(scenario(horizon(20_000)))).toEqual(['question.tooManyCycles scenarios.0.overrides']);
  expect(
    said(scenario(horizon(11), { type: 'setting', setting: 'counting', value: 'simpson' })),
  ).toEqual(['question.simpsonNeedsEvenCycles scenarios.0.overrides']);
});
