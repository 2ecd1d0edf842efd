import { expect, test } from 'vitest';
import { referencesTo } from '../../../shared/model/edit/references-to.ts';
import { exampleOf } from '../../examples/load.ts';
import { tinyDocument } from '../../fixtures/tiny-document.ts';

const tiny = tinyDocument();
const said = (
  document: typeof tiny,
  what: Parameters<typeof referencesTo>[1]['what'],
  id: string,
) => referencesTo(document, { what, id }).map(({ role, label }) => `${role}: ${label}`);

test('of a state', () => {
  expect(said(tiny, 'state', 'alive')).toEqual([
    'rest: ',
    'row: Alive',
    'amount: Treatment: Alive',
    'amount: QALYs lived: Alive',
  ]);
  expect(said(tiny, 'state', 'dead')).toEqual(['cell: Alive → Dead']);
});

test('of a strategy', () => {
  expect(said(tiny, 'strategy', 'usual')).toEqual(['comparator: ']);
  expect(said(tiny, 'strategy', 'treatment')).toEqual([
    'limitedTo: Treatment',
    'ownFormula: Probability of dying in a cycle',
  ]);
});

test('of a covariate, a threshold in force, and of what nothing names', () => {
  expect(said(tiny, 'covariate', 'start_age')).toEqual(['profile: Everybody']);
  const { question } = exampleOf('hiv-combination-therapy');
  expect(
    said(exampleOf('hiv-combination-therapy'), 'threshold', question.thresholdInForce!),
  ).toEqual(['thresholdInForce: ']);
  expect(said(tiny, 'payoff', 'drug')).toEqual([]);
});

test('of members of groups, and of groups', () => {
  const document = exampleOf('hiv-combination-therapy');
  const group = document.groups[0]!;
  expect(said(document, 'parameter', group.members[0]!)).toContain(`group: ${group.label}`);
  expect(said(document, 'group', group.id)).toHaveLength(group.members.length);
});

test('of survival curves', () => {
  const document = exampleOf('more-time-with-a-new-drug');
  const roles = document.states.map(
    ({ id }) => referencesTo(document, { what: 'state', id })[0]?.role,
  );
  expect(new Set(roles)).toEqual(new Set(['rest', 'curve']));
});
