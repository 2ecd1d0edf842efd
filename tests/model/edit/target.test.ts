import { expect, test } from 'vitest';
import { itemsOf, listOf } from '../../../shared/model/edit/target.ts';
import { tinyDocument } from '../../fixtures/tiny-document.ts';

test('things stand in the list of their kind', () => {
  const tiny = tinyDocument();
  expect(listOf('strategy')).toEqual(['strategies']);
  expect(itemsOf(tiny, 'strategy')).toBe(tiny.strategies);
  expect(listOf('threshold')).toEqual(['question', 'thresholds']);
  expect(itemsOf(tiny, 'threshold')).toBe(tiny.question.thresholds);
});
