import { expect, test } from 'vitest';
import { addTable } from '../../../shared/formula/edit/add-table.ts';
import { tinyDocument } from '../../fixtures/tiny-document.ts';
import { soundAfter } from '../../model/edit/after.ts';

test('it has a value for each combination of keys', () => {
  const tiny = tinyDocument();
  const keys = [
    { label: 'Age', points: [0, 10, 20] },
    { label: 'Sex', points: [0, 1] },
  ];
  const bare = addTable(tiny, { label: 'Life table', keys });
  expect(soundAfter(tiny, bare.edits).tables).toEqual([
    {
      id: 'life-table',
      symbol: 'life_table',
      label: 'Life table',
      keys,
      values: [0, 0, 0, 0, 0, 0],
      interpolation: 'step',
    },
  ]);
  const given = addTable(tiny, {
    label: 'L',
    keys: [keys[1]!],
    values: [1, 2],
    interpolation: 'linear',
  });
  expect(soundAfter(tiny, given.edits).tables[0]).toMatchObject({
    values: [1, 2],
    interpolation: 'linear',
  });
});
