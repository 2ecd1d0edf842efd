import { expect, test } from 'vitest';
import { addThreshold } from '../../../shared/model/edit/add-threshold.ts';
import { tinyDocument } from '../../fixtures/tiny-document.ts';
import { soundAfter } from './after.ts';

test('a threshold more', () => {
  const tiny = tinyDocument();
  const { id, edits } = addThreshold(tiny, { label: 'Half of GDP', value: 1500 });
  expect(soundAfter(tiny, edits).question.thresholds.at(-1)).toEqual({
    id,
    label: 'Half of GDP',
    value: 1500,
  });
});
