import { expect, it } from 'vitest';
import { labels, value } from '../../../shared/export/brief/sentence.ts';

it('tells gains from losses', () => {
  expect(value.health(2)).toEqual({ as: 'gain', value: 2 });
  expect(value.health(-2)).toEqual({ as: 'loss', value: 2 });
  expect(value.health(0)).toEqual({ as: 'gain', value: 0 });
});

it('names things by their labels, and what it does not know by its id', () => {
  const label = labels([{ id: 'a', label: 'Care as now' }]);
  expect([label('a'), label('constructor')]).toEqual(['Care as now', 'constructor']);
});
