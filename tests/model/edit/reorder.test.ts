import { expect, test } from 'vitest';
import { stepEdits } from '../../../shared/model/edit/reorder.ts';
import { tinyDocument } from '../../fixtures/tiny-document.ts';
import { soundAfter } from './after.ts';

const tiny = tinyDocument();

function stepped(id: string, by: -1 | 1): string[] {
  const edits = stepEdits(tiny.parameters, ['parameters'], id, by);
  return soundAfter(tiny, edits).parameters.map((each) => each.id);
}

test('an item goes up or down by one, and stops at the ends', () => {
  expect(stepped('rr_die', -1)).toEqual(['rr_die', 'p_die', 'c_year', 'u_alive']);
  expect(stepped('rr_die', 1)).toEqual(['p_die', 'c_year', 'rr_die', 'u_alive']);
  expect(stepped('c_year', 1)).toEqual(['p_die', 'rr_die', 'u_alive', 'c_year']);
  expect(stepEdits(tiny.parameters, ['parameters'], 'p_die', -1)).toEqual([]);
  expect(stepEdits(tiny.parameters, ['parameters'], 'u_alive', 1)).toEqual([]);
  expect(stepEdits(tiny.parameters, ['parameters'], 'nobody', 1)).toEqual([]);
});
