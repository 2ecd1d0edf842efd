import { expect, test } from 'vitest';
import { removeProfile } from '../../../shared/model/edit/remove-profile.ts';
import { tinyDocument } from '../../fixtures/tiny-document.ts';
import { soundAfter } from './after.ts';

const shared = (...shares: number[]) =>
  tinyDocument({
    profiles: shares.map((share, index) => {
      return { id: `p${index}`, label: 'P', share, covariates: { start_age: 40 } };
    }),
  });

test.each([
  [
    [0.5, 0.3, 0.2],
    [0.6, 0.4],
  ],
  [
    [1, 0, 0],
    [0.5, 0.5],
  ],
])('of shares %j the first goes: %j are left', (before, left) => {
  const document = shared(...before);
  const { profiles } = soundAfter(document, removeProfile(document, 'p0')!);
  profiles.forEach(({ share }, index) => {
    expect(share).toBeCloseTo(left[index]!, 12);
  });
});

test('the only one stays', () => {
  expect(removeProfile(shared(1), 'p0')).toBeNull();
});
