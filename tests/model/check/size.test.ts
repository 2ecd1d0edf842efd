import { expect, test } from 'vitest';
import { issuesOf } from './codes.ts';

test('work is strategies x profiles x cycles x states, 50 million at most', () => {
  const cycles = (count: number) =>
    issuesOf((document) => {
      const [profile] = document.profiles;
      document.profiles = Array.from({ length: 250 }, (_, index) => ({
        ...profile!,
        id: `p${index}`,
        share: 1 / 250,
      }));
      Object.assign(document.states[0]!, { type: 'timed', cycles: 99 });
      document.question.horizon = count;
    });
  // 2 strategies x 250 profiles x 1,000 cycles x 100 states
  expect(cycles(1_000)).toEqual([]);
  expect(cycles(1_001)).toMatchObject([
    { code: 'document.tooMuchWork', params: { work: 50_050_000, maximum: 50_000_000 } },
  ]);
});
