import { expect, it } from 'vitest';
import { definitionsIn, formulaPath, textsOf } from '../../shared/formula/definitions.ts';
import { documentWith, variables } from './documents.ts';

it('puts a scenario’s formulas in place of the document’s', () => {
  const document = documentWith({
    variables: variables({ a: '1', b: '2' }),
    scenarios: [
      {
        id: 's',
        label: 's',
        overrides: [
          { type: 'setting', setting: 'horizon', value: 5 },
          { type: 'variable', variable: 'b', formula: 'a' },
        ],
      },
    ],
  });
  expect(definitionsIn(document).map(({ formula }) => formula)).toEqual(['1', '2']);
  expect(definitionsIn(document, document.scenarios[0])).toMatchObject([
    { symbol: 'a', formula: '1', path: ['variables', 0, 'formula'] },
    { symbol: 'b', formula: 'a', path: ['scenarios', 0, 'overrides', 1, 'formula'] },
  ]);
});

it('gives each text of a formula its place and its strategies', () => {
  const formula = { byStrategy: { a: '1' }, otherwise: '2' };
  expect(textsOf(formula, ['f'], ['a', 'b', 'c'])).toEqual([
    { text: '1', path: ['f', 'byStrategy', 'a'], strategies: ['a'] },
    { text: '2', path: ['f', 'otherwise'], strategies: ['b', 'c'] },
  ]);
  expect(textsOf('3', ['f'], ['a'])).toEqual([{ text: '3', path: ['f'], strategies: ['a'] }]);
  expect(formulaPath(formula, ['f'], 'a')).toEqual(['f', 'byStrategy', 'a']);
  expect(formulaPath(formula, ['f'], 'toString')).toEqual(['f', 'otherwise']);
});
