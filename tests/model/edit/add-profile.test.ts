import { expect, test } from 'vitest';
import { addProfile, shareEdits } from '../../../shared/model/edit/add-profile.ts';
import { tinyDocument } from '../../fixtures/tiny-document.ts';
import { DOCUMENTS, soundAfter } from './after.ts';

test.each(DOCUMENTS)('%s: shares still sum to 1', (_, document) => {
  const everyLike = [undefined, ...document.profiles.map(({ id }) => id)];
  for (const like of everyLike)
    soundAfter(document, addProfile(document, { label: 'More', like }).edits);
});

test('it takes its share from all, or half of that of one, and begins like it', () => {
  const tiny = tinyDocument();
  const profiles = [
    { id: 'old', label: 'Old', share: 0.4, covariates: { start_age: 70 } },
    { id: 'young', label: 'Young', share: 0.6, covariates: { start_age: 20 } },
  ];
  const two = tinyDocument({ profiles });
  const shares = (fields: object) =>
    soundAfter(two, addProfile(two, { label: 'New', ...fields }).edits).profiles.map(
      ({ id, share, covariates }) => [id, Math.round(share * 1e12) / 1e12, covariates.start_age],
    );
  expect(shares({})).toEqual([
    ['old', 0.266666666667, 70],
    ['young', 0.4, 20],
    ['new', 0.333333333333, 70],
  ]);
  expect(shares({ like: 'young' })).toEqual([
    ['old', 0.4, 70],
    ['young', 0.3, 20],
    ['new', 0.3, 20],
  ]);
  expect(shareEdits(tiny.profiles, () => 1)).toEqual([]);
});
