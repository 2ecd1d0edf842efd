/**
 *   addProfile(document, { label, like? }): Added
 *   shareEdits(profiles, shares): Edit[]
 *
 * A new profile takes its share evenly from all others, or half of `like`'s; its
 * covariates begin as those of `like`, or of the first profile.
 */
import type { ModelDocument, Profile } from '../document.ts';
import { type Added, adding, newId } from './add.ts';
import type { Edit } from './edit.ts';

export interface NewProfile {
  readonly label: string;
  /** Id of the profile that is split. */
  readonly like?: string;
}

export function addProfile(document: ModelDocument, { label, like }: NewProfile): Added {
  const { profiles } = document;
  const id = newId(document, 'profile', label);
  const twin = profiles.find((profile) => profile.id === like);
  const share = twin ? twin.share / 2 : 1 / (profiles.length + 1);
  const left = (profile: Profile) => {
    if (!twin) return profile.share * (1 - share);
    return profile === twin ? share : profile.share;
  };
  const { covariates } = twin ?? profiles[0] ?? { covariates: {} };
  const next = twin ? (profiles[profiles.indexOf(twin) + 1]?.id ?? null) : null;
  return {
    id,
    edits: [
      adding('profile', { id, label, share, covariates } as Profile, next),
      ...shareEdits(profiles, left),
    ],
  };
}

/** Gives profiles the shares that `shareOf` says. */
export function shareEdits(
  profiles: readonly Profile[],
  shareOf: (profile: Profile) => number,
): Edit[] {
  return profiles.flatMap((profile): Edit[] => {
    const value = shareOf(profile);
    if (value === profile.share) return [];
    return [{ type: 'set', at: ['profiles', { id: profile.id }, 'share'], value }];
  });
}
