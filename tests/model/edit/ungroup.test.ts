import { expect, test } from 'vitest';
import type { Group } from '../../../shared/model/document.ts';
import { dissolveGroup, leaveGroups, marginalIn } from '../../../shared/model/edit/ungroup.ts';
import { exampleOf } from '../../examples/load.ts';
import { DOCUMENTS, soundAfter } from './after.ts';

const base = { id: 'g', label: 'G', members: ['a', 'b'] };

// Marginals of a Dirichlet are beta (Johnson, Kotz and Balakrishnan; from memory).
test.each<[Group, unknown]>([
  [
    { ...base, type: 'dirichlet', counts: [2, 8] },
    { type: 'beta', alpha: 8, beta: 2 },
  ],
  [
    {
      ...base,
      type: 'multivariateNormal',
      means: [1, 2],
      covariance: [
        [1, 0],
        [0, 9],
      ],
      scale: 'identity',
    },
    { type: 'normal', mean: 2, sd: 3 },
  ],
  [
    {
      ...base,
      type: 'jointRows',
      rows: [
        [1, 2],
        [3, 4],
      ],
    },
    { type: 'empirical', values: [2, 4] },
  ],
  [
    {
      ...base,
      type: 'rankCorrelation',
      correlation: [
        [1, 0],
        [0, 1],
      ],
    },
    null,
  ],
])('a member of %j is by itself %j', (group, distribution) => {
  expect(marginalIn(group, 1)).toEqual(distribution);
});

test.each(DOCUMENTS)('%s: groups dissolve and members leave soundly', (_, document) => {
  for (const { id, members } of document.groups) {
    expect(soundAfter(document, dissolveGroup(document, id)).groups).toHaveLength(
      document.groups.length - 1,
    );
    for (const member of members) {
      const groups = leaveGroups(document, member).filter(({ at }) => at[0] === 'groups');
      expect(groups).toHaveLength(1);
    }
  }
});

test('a parameter in no group leaves none', () => {
  const document = exampleOf('hiv-combination-therapy');
  expect(leaveGroups(document, 'rr')).toEqual([]);
  expect(dissolveGroup(document, 'none')).toEqual([]);
});
