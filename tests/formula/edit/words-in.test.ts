import { expect, test } from 'vitest';
import { substitute, wordsIn } from '../../../shared/formula/edit/words-in.ts';
import type { Expr } from '../../../shared/formula/expr.ts';
import { parseFormula } from '../../../shared/formula/parse.ts';
import { formulaPlaces, mapTexts } from '../../../shared/model/edit/formula-sites.ts';
import { DOCUMENTS } from '../../model/edit/after.ts';

/** Names of a parsed formula with their places, in the order of the text. */
function parsedNames(text: string) {
  const found: { name: string; at: { start: number; end: number } }[] = [];
  const visit = (expr: Expr): void => {
    if (expr.type === 'name') found.push({ name: expr.name, at: expr.at });
    if (expr.type === 'call') expr.args.forEach(visit);
  };
  const { expr } = parseFormula(text);
  if (expr) visit(expr);
  return found.toSorted((a, b) => a.at.start - b.at.start);
}

test.each(DOCUMENTS)('%s: the words are the names that the parser finds', (_, document) => {
  let count = 0;
  for (const { formula } of formulaPlaces(document)) {
    mapTexts(formula, (text) => {
      expect(wordsIn(text)).toEqual(parsedNames(text));
      count += 1;
      return text;
    });
  }
  expect(count).toBeGreaterThan(2);
});

test.each([
  ['a + b * a', 'X + b * X'],
  ['a(a) + max (a, b)', 'a(X) + max (X, b)'],
  ['lookup(a, age)', 'lookup(X, age)'],
  ['1e5 + 2a + ab + a_b + _a', '1e5 + 2a + ab + a_b + _a'],
  ['if(a > 1, not a, true)', 'if(X > 1, not X, true)'],
  ['a + (b', 'X + (b'],
  ['a $ b', 'X $ b'],
  ['', ''],
])('in %j a becomes X: %j', (text, result) => {
  expect(substitute(text, new Map([['a', 'X']]))).toBe(result);
});
