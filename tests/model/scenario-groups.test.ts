import { expect, test } from 'vitest';
import type { Group } from '../../shared/model/document.ts';
import { withoutFixed } from '../../shared/model/scenario-groups.ts';

const normal: Group = {
  id: 'g',
  label: 'Three together',
  type: 'multivariateNormal',
  members: ['a', 'b', 'c'],
  means: [1, 2, 3],
  covariance: [
    [4, 1, 2],
    [1, 9, 3],
    [2, 3, 16],
  ],
  scale: 'identity',
};

test('a group with no fixed member is kept as it is', () => {
  expect(withoutFixed([normal], new Set(['x']))).toEqual({ groups: [normal], alone: new Map() });
});

test('the others keep their joint distribution', () => {
  expect(withoutFixed([normal], new Set(['b'])).groups).toEqual([
    {
      ...normal,
      members: ['a', 'c'],
      means: [1, 3],
      covariance: [
        [4, 2],
        [2, 16],
      ],
    },
  ]);
});

test('the last one left keeps its marginal distribution', () => {
  const fixed = new Set(['a', 'b']);
  const { groups, alone } = withoutFixed([normal], fixed);
  expect(groups).toEqual([]);
  expect(alone.get('c')).toEqual({ type: 'normal', mean: 3, sd: 4 });
  expect(withoutFixed([{ ...normal, scale: 'log' }], fixed).alone.get('c')).toEqual({
    type: 'lognormal',
    meanlog: 3,
    sdlog: 4,
  });
});

test('one member’s joint rows become its list of draws', () => {
  const rows: Group = {
    id: 'g',
    label: 'Posterior',
    type: 'jointRows',
    members: ['a', 'b', 'c'],
    rows: [
      [1, 2, 3],
      [4, 5, 6],
    ],
  };
  expect(withoutFixed([rows], new Set(['b'])).groups).toMatchObject([
    {
      members: ['a', 'c'],
      rows: [
        [1, 3],
        [4, 6],
      ],
    },
  ]);
  expect(withoutFixed([rows], new Set(['a', 'b'])).alone.get('c')).toEqual({
    type: 'empirical',
    values: [3, 6],
  });
});

test('a rank correlation is narrowed; a last member has its own distribution already', () => {
  const ranks: Group = {
    id: 'g',
    label: 'Ranks',
    type: 'rankCorrelation',
    members: ['a', 'b', 'c'],
    correlation: [
      [1, 0.2, 0.3],
      [0.2, 1, 0.4],
      [0.3, 0.4, 1],
    ],
  };
  expect(withoutFixed([ranks], new Set(['a'])).groups).toMatchObject([
    {
      members: ['b', 'c'],
      correlation: [
        [1, 0.4],
        [0.4, 1],
      ],
    },
  ]);
  expect(withoutFixed([ranks], new Set(['a', 'b']))).toEqual({ groups: [], alone: new Map() });
});

test('probabilities of one row sum to 1: with one fixed, all are', () => {
  const row: Group = {
    id: 'g',
    label: 'Row',
    type: 'dirichlet',
    members: ['a', 'b', 'c'],
    counts: [1, 2, 3],
  };
  const { groups, alone } = withoutFixed([row], new Set(['a']));
  expect(groups).toEqual([]);
  expect([...alone]).toEqual([
    ['b', { type: 'fixed' }],
    ['c', { type: 'fixed' }],
  ]);
});
