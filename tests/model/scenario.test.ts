import { expect, test } from 'vitest';
import { hasErrors } from '../../shared/model/issue.ts';
import { checkReferences } from '../../shared/model/references.ts';
import { applyScenario } from '../../shared/model/scenario.ts';
import { tinyDocument } from '../fixtures/tiny-document.ts';

const document = tinyDocument({
  scenarios: [
    { id: 'nothing', label: 'Nothing changes', overrides: [] },
    {
      id: 'dear',
      label: 'Dear and weak',
      overrides: [
        { type: 'parameter', parameter: 'c_year', value: 400 },
        { type: 'variable', variable: 'v_die', formula: 'p_die' },
        { type: 'setting', setting: 'horizon', value: 20 },
        { type: 'setting', setting: 'discountOutcomes', value: 0 },
      ],
    },
  ],
});

test('parameters are set and no longer uncertain, with the scenario as the reason', () => {
  const { parameters } = applyScenario(document, 'dear');
  expect(parameters.find(({ id }) => id === 'c_year')).toMatchObject({
    value: 400,
    distribution: { type: 'fixed', reason: 'Dear and weak' },
  });
  expect(parameters.filter(({ id }) => id !== 'c_year')).toEqual(
    document.parameters.filter(({ id }) => id !== 'c_year'),
  );
});

test('variables and settings are replaced', () => {
  const { variables, question } = applyScenario(document, 'dear');
  expect(variables[0]?.formula).toBe('p_die');
  expect(question).toMatchObject({ horizon: 20, discounting: { costs: 0.03, outcomes: 0 } });
});

test('a scenario without overrides is the document', () => {
  expect(applyScenario(document, 'nothing')).toEqual(document);
});

test('the document itself is left alone and the result is sound', () => {
  const before = structuredClone(document);
  expect(hasErrors(checkReferences(applyScenario(document, 'dear')))).toBe(false);
  expect(document).toEqual(before);
});

test('an unknown scenario is an error that says which', () => {
  expect(() => applyScenario(document, 'other')).toThrow('scenarios.unknown');
});
