import { expect, test } from 'vitest';
import { type Nature, natureOf, natureOfMove } from '../../../shared/model/compare/nature.ts';
import type { Place } from '../../../shared/model/edit/edit.ts';

const a = { id: 'a' };

test.each<[Nature, Place]>([
  ['input', ['parameters', a, 'value']],
  ['input', ['parameters', a, 'distribution', 'alpha']],
  ['input', ['question', 'discounting', 'costs']],
  ['input', ['question', 'thresholds', a, 'value']],
  ['input', ['states', a, 'cycles']],
  ['input', ['scenarios', a, 'overrides']],
  ['formula', ['variables', a, 'formula', 'byStrategy', 'usual']],
  ['formula', ['movements', 'rows', a, 'cells', a, 'formula']],
  ['structure', ['movements', 'rows', a, 'remainder']],
  ['structure', ['payoffs', a, 'per']],
  ['structure', ['question', 'comparator']],
  ['structure', ['question', 'outcome', 'direction']],
  ['words', ['parameters', a, 'source', 'citation']],
  ['words', ['parameters', a, 'distribution', 'reason']],
  ['words', ['question', 'setting']],
  ['words', ['variables', a, 'symbol']],
])('%s: %j', (nature, place) => {
  expect(natureOf(place, 1, 2)).toBe(nature);
});

test('an item more is what its list is', () => {
  expect(natureOf(['variables', a], undefined, { id: 'a' })).toBe('formula');
  expect(natureOf(['parameters', a], { id: 'a' }, undefined)).toBe('input');
  expect(natureOf(['states', a], undefined, { id: 'a' })).toBe('structure');
});

test('only the order of survival curves means anything', () => {
  expect(natureOfMove(['movements', 'curves', a])).toBe('structure');
  expect(natureOfMove(['parameters', a])).toBe('words');
});
