import { describe, expect, it } from 'vitest';
import { incrementalByProfile } from '../../../shared/analysis/breakdown/by-profile.ts';
import { prepare } from '../../../shared/engine/engine.ts';
import { tinyDocument } from '../../fixtures/tiny-document.ts';
import { CASES, off } from '../explain/examples.ts';

describe('incrementalByProfile', () => {
  it.each(CASES)('weighs up to the whole population in $name', ({ document, base }) => {
    const [whole, ...each] = incrementalByProfile(document, base, 1_500);
    expect(each.map(({ profile }) => profile)).toEqual(document.profiles.map(({ id }) => id));
    expect(whole?.profile).toBeNull();
    whole!.against.forEach(({ inmb }, s) => {
      const sum = each.reduce((all, { share, against }) => all + share * against[s]!.inmb, 0);
      expect(off(sum, inmb)).toBeLessThan(1e-9);
    });
  });

  it('is the analysis of a population of that profile alone', () => {
    const tiny = tinyDocument();
    const profiles = [
      { id: 'young', label: 'Young', share: 0.25, covariates: { start_age: 20 } },
      { id: 'old', label: 'Old', share: 0.75, covariates: { start_age: 60 } },
    ];
    const formula = { byStrategy: { treatment: 'p_die * rr_die * age / 100' }, otherwise: 'p_die' };
    const variables = [{ ...tiny.variables[0]!, formula }];
    const document = tinyDocument({ profiles, variables });
    const found = incrementalByProfile(document, prepare(document).base(), 1_500);
    profiles.forEach((profile, index) => {
      const alone = tinyDocument({ variables, profiles: [{ ...profile, share: 1 }] });
      const [want] = incrementalByProfile(alone, prepare(alone).base(), 1_500);
      expect(found[index + 1]).toEqual({ ...want, profile: profile.id, share: profile.share });
    });
  });
});
