import { expect, test } from 'vitest';
import { longestRising } from '../../../shared/model/compare/longest-rising.ts';

test.each<[number[], number]>([
  [[], 0],
  [[7], 1],
  [[0, 1, 2, 3], 4],
  [[3, 2, 1, 0], 1],
  [[1, 2, 3, 0], 3],
  [[3, 0, 1, 2], 3],
  // The first 16 terms of the van der Corput sequence in base 2, whose longest is 6.
  [[0, 8, 4, 12, 2, 10, 6, 14, 1, 9, 5, 13, 3, 11, 7, 15], 6],
])('of %j has %i members', (numbers, length) => {
  const run = longestRising(numbers);
  expect(run).toHaveLength(length);
  expect(run).toEqual(run.toSorted((a, b) => a - b));
  const places = run.map((number) => numbers.indexOf(number));
  expect(places).toEqual(places.toSorted((a, b) => a - b));
});
