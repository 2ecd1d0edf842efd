import { expect, it } from 'vitest';
import { movePoise } from '../../../src/store/poise.ts';

const rest = { now: 1_500, was: null };

it('remembers the place that a movement began at, however many it passes', () => {
  const drag = [
    { to: 1_510, starts: true },
    { to: 1_600, starts: false },
    { to: 1_900, starts: false },
  ];
  expect(drag.reduce(movePoise, rest)).toEqual({ now: 1_900, was: 1_500 });
});

it('takes each press of a key for a movement', () => {
  const presses = [
    { to: 1_550, starts: true },
    { to: 1_600, starts: true },
  ];
  expect(presses.reduce(movePoise, rest)).toEqual({ now: 1_600, was: 1_550 });
});

it('knows where it was even when the beginning was missed', () => {
  expect(movePoise(rest, { to: 1_600, starts: false })).toEqual({ now: 1_600, was: 1_500 });
});
