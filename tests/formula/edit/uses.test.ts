import { expect, test } from 'vitest';
import { formulaUses, mentions, namesOf, usesOf } from '../../../shared/formula/edit/uses.ts';
import { exampleOf } from '../../examples/load.ts';
import { tinyDocument } from '../../fixtures/tiny-document.ts';

const tiny = tinyDocument();

test('a symbol is used in formulas, by place and label', () => {
  expect(usesOf(tiny, { what: 'parameter', id: 'p_die' })).toEqual([
    {
      role: 'variable',
      place: ['variables', { id: 'v_die' }, 'formula'],
      label: 'Probability of dying in a cycle',
    },
  ]);
  expect(usesOf(tiny, { what: 'variable', id: 'v_die' })).toMatchObject([
    { role: 'cell', label: 'Alive → Dead' },
  ]);
  expect(usesOf(tiny, { what: 'state', id: 'dead' })).toMatchObject([{ role: 'cell' }]);
});

test('age is a use of the start age', () => {
  const named = { what: 'covariate', id: 'start_age' } as const;
  expect([...namesOf(tiny, named)]).toEqual(['start_age', 'age']);
  const hearts = exampleOf('keeping-hearts-well');
  const covariate = hearts.covariates.find(({ symbol }) => symbol === 'start_age')!;
  expect(formulaUses(hearts, { what: 'covariate', id: covariate.id }).length).toBeGreaterThan(0);
});

test('a scenario uses what its formulas name', () => {
  const overrides = [{ type: 'variable' as const, variable: 'v_die', formula: 'u_alive / 10' }];
  const document = tinyDocument({ scenarios: [{ id: 's', label: 'Other', overrides }] });
  expect(formulaUses(document, { what: 'parameter', id: 'u_alive' })).toMatchObject([
    { role: 'amount', label: 'QALYs lived: Alive' },
    { role: 'scenario', label: 'Other', place: ['scenarios', { id: 's' }, 'overrides'] },
  ]);
});

test('a name is mentioned by any text of a formula', () => {
  const names = new Set(['b']);
  expect(mentions({ byStrategy: { x: 'a' }, otherwise: 'b' }, names)).toBe(true);
  expect(mentions('b(a)', names)).toBe(false);
});
