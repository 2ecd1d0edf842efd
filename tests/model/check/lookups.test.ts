import { expect, test } from 'vitest';
import { lookupsOf } from '../../../shared/model/check/lookups.ts';
import { tinyDocument } from '../../fixtures/tiny-document.ts';

test('parts are found by id, strategies keep the order of the document', () => {
  const document = tinyDocument();
  const lookups = lookupsOf(document);
  expect([...lookups.strategies]).toEqual(['usual', 'treatment']);
  expect(lookups.states.get('dead')).toBe(document.states[1]);
  expect(lookups.parameters.get('rr_die')?.value).toBe(0.8);
  expect(lookups.groups.size).toBe(0);
});
