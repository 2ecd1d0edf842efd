import { expect, test } from 'vitest';
import { formulaSites } from '../../../shared/formula/sites.ts';
import {
  combined,
  formulaEdits,
  formulaPlaces,
  mapTexts,
} from '../../../shared/model/edit/formula-sites.ts';
import { applied, DOCUMENTS } from './after.ts';

test.each(DOCUMENTS)('%s: the formulas are those that are checked', (_, document) => {
  const checked = formulaSites(document).filter(({ path }) => path[0] !== 'scenarios');
  expect(formulaPlaces(document).map(({ formula }) => formula)).toEqual(
    checked.map(({ formula }) => formula),
  );
});

test.each(DOCUMENTS)('%s: every text can be changed, in scenarios too', (_, document) => {
  const edits = formulaEdits(document, (formula) => mapTexts(formula, (text) => `(${text})`));
  const changed = applied(document, edits);
  const texts: string[] = [];
  const read = (text: string) => {
    texts.push(text);
    return text;
  };
  formulaEdits(changed, (formula) => mapTexts(formula, read));
  expect(texts.length).toBeGreaterThan(2);
  expect(texts.filter((text) => !/^\(.*\)$/s.test(text))).toEqual([]);
  expect(formulaEdits(document, (formula) => structuredClone(formula))).toEqual([]);
});

test('formulas are combined strategy by strategy', () => {
  const sum = (texts: readonly string[]) => texts.join(' + ');
  expect(combined(['a', 'b'], ['x', 'y'], sum)).toBe('a + b');
  const own = { byStrategy: { x: 'c' }, otherwise: 'd' };
  expect(combined(['a', own], ['x', 'y'], sum)).toEqual({ byStrategy: { x: 'a + c', y: 'a + d' } });
  expect(combined([{ byStrategy: { x: 'c' } }, 'a'], ['x', 'y'], sum)).toEqual({
    byStrategy: { x: 'c + a' },
  });
});
