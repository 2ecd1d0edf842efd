import { expect, test } from 'vitest';
import { addParameter } from '../../../shared/formula/edit/add-parameter.ts';
import { KINDS } from '../../../shared/model/kinds.ts';
import { tinyDocument } from '../../fixtures/tiny-document.ts';
import { soundAfter } from '../../model/edit/after.ts';

const tiny = tinyDocument();

test.each(KINDS)('of the kind %s it has a value that the kind can be', (kind) => {
  soundAfter(tiny, addParameter(tiny, { label: 'Something', kind }).edits);
});

test('it has an id and a symbol of its own, and no source yet', () => {
  const { id, edits } = addParameter(tiny, { label: 'Rr die', unit: 'ratio', kind: 'ratio' });
  expect(soundAfter(tiny, edits).parameters.at(-1)).toEqual({
    id,
    symbol: 'rr_die_2',
    label: 'Rr die',
    unit: 'ratio',
    kind: 'ratio',
    value: 1,
    distribution: { type: 'fixed' },
    source: { citation: '' },
  });
});
