import { expect, test } from 'vitest';
import { applyEdits } from '../../../shared/model/edit/apply.ts';
import type { Edit } from '../../../shared/model/edit/edit.ts';
import { inTurn } from '../../../shared/model/edit/in-turn.ts';
import { tinyDocument } from '../../fixtures/tiny-document.ts';

test('each step goes on from where the one before it leaves the document', () => {
  const tiny = tinyDocument();
  const at = ['parameters', { id: 'rr_die' }, 'value'];
  const halved = ({ parameters }: typeof tiny): Edit[] => [
    { type: 'set', at, value: parameters[1]!.value / 2 },
  ];
  const edits = inTurn(tiny, halved, halved, () => []);
  expect(edits).toHaveLength(2);
  expect(applyEdits(tiny, edits).document.parameters[1]?.value).toBe(0.2);
  expect(tiny.parameters[1]?.value).toBe(0.8);
});
