import { expect, test } from 'vitest';
import { issuesOf, said } from './codes.ts';

const split = (shares: number[]) =>
  issuesOf((document) => {
    const [profile] = document.profiles;
    document.profiles = shares.map((share, index) => ({ ...profile!, id: `p${index}`, share }));
  });

test('shares sum to 1 within 1e-9', () => {
  expect(split(Array(10).fill(0.1))).toEqual([]);
  expect(split([0.5, 0.5 + 5e-10])).toEqual([]);
  expect(split([0.5, 0.499_999_99])).toMatchObject([
    {
      code: 'profiles.sharesDoNotSum',
      path: ['profiles'],
      params: { sum: expect.closeTo(0.999_999_99, 12) },
    },
  ]);
});

test('every covariate has a value in every profile, and no other has', () => {
  expect(
    said(({ profiles }) => {
      profiles[0]!.covariates = { female: 1 };
    }),
  ).toEqual([
    'profiles.missingCovariate profiles.0.covariates',
    'profiles.unknownCovariate profiles.0.covariates.female',
  ]);
});
