import { expect, test } from 'vitest';
import { expandedStates } from '../../../shared/model/check/states.ts';
import { tinyDocument } from '../../fixtures/tiny-document.ts';
import { issuesOf, said } from './codes.ts';

test('a timed state counts once a tunnel', () => {
  const [alive, dead] = tinyDocument().states;
  expect(expandedStates([{ ...alive!, type: 'timed', cycles: 12 }, dead!])).toBe(13);
});

test('a timed state says how many cycles, others do not', () => {
  expect(
    said(({ states }) => {
      states[0]!.type = 'timed';
    }),
  ).toEqual(['states.timedNeedsCycles states.0']);
  expect(
    issuesOf(({ states }) => {
      states[0]!.cycles = 3;
    }),
  ).toMatchObject([{ code: 'states.cyclesNotUsed', severity: 'warning' }]);
});

test('500 states after expansion pass, 501 do not', () => {
  const timed = (cycles: number) =>
    issuesOf(({ states }) => void Object.assign(states[0]!, { type: 'timed', cycles }));
  expect(timed(499)).toEqual([]);
  expect(timed(500)).toMatchObject([
    { code: 'states.tooMany', params: { count: 501, maximum: 500 } },
  ]);
});

test('the cohort starts in known states, each said once', () => {
  expect(
    said(({ start }) => {
      start.shares = [
        { id: 'a', state: 'dead', formula: '0.1' },
        { id: 'b', state: 'dead', formula: '0.1' },
        { id: 'c', state: 'alive', formula: '0.1' },
        { id: 'd', state: 'gone', formula: '0.1' },
      ];
    }),
  ).toEqual([
    'start.stateTwice start.shares.1.state',
    'start.stateTwice start.shares.2.state',
    'states.unknown start.shares.3.state',
  ]);
  expect(
    said(({ start }) => {
      start.remainder = 'gone';
    }),
  ).toEqual(['states.unknown start.remainder']);
});
