import { expect, test } from 'vitest';
import { addVariable } from '../../../shared/formula/edit/add-variable.ts';
import { tinyDocument } from '../../fixtures/tiny-document.ts';
import { soundAfter } from '../../model/edit/after.ts';

test('it has a fresh symbol, and the formula given or 0', () => {
  const tiny = tinyDocument();
  const bare = addVariable(tiny, { label: 'Visits a year' });
  expect(soundAfter(tiny, bare.edits).variables.at(-1)).toEqual({
    id: 'visits-a-year',
    symbol: 'visits_a_year',
    label: 'Visits a year',
    formula: '0',
  });
  const given = addVariable(tiny, {
    label: 'Twice',
    symbol: 'two_p',
    kind: 'probability',
    formula: '2 * p_die',
  });
  expect(soundAfter(tiny, given.edits).variables.at(-1)).toMatchObject({
    symbol: 'two_p',
    kind: 'probability',
    formula: '2 * p_die',
  });
});
