import { expect, test } from 'vitest';
import { asciiWords, firstFree, freshId } from '../../../shared/model/edit/fresh-id.ts';

test.each([
  [[], 'Usual care', 'usual-care'],
  [['usual-care'], 'Usual care', 'usual-care-2'],
  [['a', 'a-2', 'a-3'], 'A', 'a-4'],
  [[], 'Décès (après chirurgie)', 'deces-apres-chirurgie'],
  [[], '  ', 'item'],
  [['item'], '死亡', 'item-2'],
  [[], 'Constructor', 'constructor-2'],
])('beside %j, %s gets the id %s', (taken, label, id) => {
  expect(freshId(taken, label)).toBe(id);
});

test('a long label gives an id that the format takes', () => {
  expect(freshId([], 'a very long label '.repeat(30))).toMatch(/^[a-z0-9-]{1,60}[a-z0-9]$/);
});

test('words are joined by the mark given', () => {
  expect(asciiWords('Cost of a visit, 2024', '_')).toBe('cost_of_a_visit_2024');
  expect(firstFree(new Set(['x']), 'x', '_')).toBe('x_2');
});
