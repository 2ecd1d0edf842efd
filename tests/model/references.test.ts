import { expect, test } from 'vitest';
import { checkReferences } from '../../shared/model/references.ts';
import { tinyDocument } from '../fixtures/tiny-document.ts';

test('a sound document has nothing said of it', () => {
  expect(checkReferences(tinyDocument())).toEqual([]);
});

test('every part is looked at', () => {
  const document = tinyDocument();
  document.question.comparator = 'x';
  document.profiles[0]!.share = 0.5;
  document.parameters[0]!.distribution = { type: 'inGroup', group: 'x' };
  document.tables = [
    {
      id: 't',
      symbol: 't',
      label: 'T',
      keys: [{ label: 'k', points: [1, 2] }],
      values: [1],
      interpolation: 'step',
    },
  ];
  document.variables[0]!.formula = { byStrategy: {} };
  document.states[0]!.type = 'timed';
  document.start.remainder = 'x';
  document.movements = { type: 'rows', rows: [] };
  document.payoffs[0]!.strategies = ['x'];
  document.scenarios = [
    { id: 's', label: 'S', overrides: [{ type: 'parameter', parameter: 'x', value: 1 }] },
  ];
  document.states.push({ ...document.states[1]! });
  const codes = new Set(checkReferences(document).map(({ code }) => code));
  expect([...codes]).toEqual([
    'ids.duplicate',
    'strategies.unknown',
    'profiles.sharesDoNotSum',
    'groups.unknown',
    'tables.wrongSize',
    'formula.missingForStrategy',
    'states.timedNeedsCycles',
    'states.unknown',
    'movements.missingRow',
    'parameters.unknown',
  ]);
});
