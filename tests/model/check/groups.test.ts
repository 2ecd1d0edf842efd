import { expect, test } from 'vitest';
import type { Group, ModelDocument } from '../../../shared/model/document.ts';
import { said } from './codes.ts';

const base = { id: 'g', label: 'Together', members: ['p_die', 'rr_die'] };
const normal: Group = {
  ...base,
  type: 'multivariateNormal',
  means: [0.1, 0.8],
  covariance: [
    [0.01, 0.001],
    [0.001, 0.04],
  ],
  scale: 'identity',
};
const ranks: Group = {
  ...base,
  type: 'rankCorrelation',
  correlation: [
    [1, 0.5],
    [0.5, 1],
  ],
};

/** Puts the group in, and its members into it. */
function grouped(group: Group, change: (document: ModelDocument) => void = () => {}) {
  return (document: ModelDocument): void => {
    document.groups = [group];
    if (group.type !== 'rankCorrelation') {
      for (const parameter of document.parameters.slice(0, 2)) {
        parameter.distribution = { type: 'inGroup', group: 'g' };
      }
    }
    change(document);
  };
}

test.each<[string, Group]>([
  ['multivariate normal', normal],
  ['rank correlation', ranks],
  ['joint rows', { ...base, type: 'jointRows', rows: [[0.1, 0.8]] }],
])('a sound %s group', (_, group) => {
  expect(said(grouped(group))).toEqual([]);
});

test('members are parameters, none twice', () => {
  expect(said(grouped({ ...normal, members: ['p_die', 'rr_die', 'x'] }))).toContain(
    'parameters.unknown groups.0.members.2',
  );
  expect(said(grouped({ ...ranks, members: ['p_die', 'p_die'] }))).toEqual([
    'groups.memberTwice groups.0.members.1',
  ]);
});

test('group and member name each other', () => {
  const alone = { type: 'fixed' } as const;
  expect(
    said(
      grouped(normal, ({ parameters }) => {
        parameters[0]!.distribution = alone;
      }),
    ),
  ).toEqual(['groups.memberNotInGroup groups.0.members.0']);
  const joins = { type: 'inGroup', group: 'g' } as const;
  expect(
    said(
      grouped(normal, ({ parameters }) => {
        parameters[2]!.distribution = joins;
      }),
    ),
  ).toEqual(['groups.doesNotListMember parameters.2.distribution.group']);
  const lost = { type: 'inGroup', group: 'h' } as const;
  expect(
    said(({ parameters }) => {
      parameters[2]!.distribution = lost;
    }),
  ).toEqual(['groups.unknown parameters.2.distribution.group']);
});

test('rank correlation joins parameters that have distributions of their own', () => {
  const joins = { type: 'inGroup', group: 'g' } as const;
  expect(
    said(
      grouped(ranks, ({ parameters }) => {
        parameters[0]!.distribution = joins;
      }),
    ),
  ).toEqual(['groups.memberNeedsOwnDistribution groups.0.members.0']);
});

test('numbers fit the members', () => {
  expect(said(grouped({ ...normal, means: [1] }))).toEqual(['groups.wrongLength groups.0.means']);
  expect(said(grouped({ ...normal, covariance: [[1, 0], [0]] }))).toEqual([
    'groups.wrongLength groups.0.covariance.1',
  ]);
  expect(said(grouped({ ...base, type: 'jointRows', rows: [[1, 2], [3]] }))).toEqual([
    'groups.wrongLength groups.0.rows.1',
  ]);
  expect(said(grouped({ ...base, type: 'dirichlet', counts: [1, 2, 3] }))).toContain(
    'groups.wrongLength groups.0.counts',
  );
});
