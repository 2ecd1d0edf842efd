import { describe, expect, it } from 'vitest';
import { prepare } from '../../../shared/engine/engine.ts';
import { briefCase } from '../../../shared/export/brief/case.ts';
import { changeSentences } from '../../../shared/export/brief/what-changes.ts';
import { tinyDocument } from '../../fixtures/tiny-document.ts';
import { type Given, given, told } from './given.ts';

const changes = (results: Given, threshold: number) => {
  const { document, base } = given(results);
  return changeSentences(briefCase(document, base, threshold)).map(told);
};

describe('changeSentences', () => {
  it('gives the thresholds at which others take over', () => {
    expect(changes({ a: [100, 10], b: [300, 11], c: [900, 12] }, 250)).toEqual([
      ['change.below', { threshold: 200, strategy: 'A' }],
      ['change.above', { threshold: 600, strategy: 'C' }],
    ]);
    expect(changes({ a: [100, 10], b: [300, 11] }, 250)).toEqual([
      ['change.below', { threshold: 200, strategy: 'A' }],
    ]);
    expect(changes({ a: [100, 10], b: [60, 11] }, 250)).toEqual([['change.noThreshold', {}]]);
    expect(changes({ a: [100, 10] }, 250)).toEqual([]);
  });

  it('says for whom another strategy is best', () => {
    const tiny = tinyDocument();
    // Treatment does nothing for the old, and costs the same.
    const formula = {
      byStrategy: { treatment: 'if(start_age > 50, p_die, p_die * rr_die)' },
      otherwise: 'p_die',
    };
    const profiles = [
      { id: 'young', label: 'Young', share: 0.75, covariates: { start_age: 20 } },
      { id: 'old', label: 'Old', share: 0.25, covariates: { start_age: 60 } },
    ];
    const variables = [{ ...tiny.variables[0]!, formula }];
    const document = tinyDocument({ profiles, variables });
    const brief = briefCase(document, prepare(document).base(), 3_000);
    const found = changeSentences(brief).map(told);
    expect(found.at(-1)).toEqual([
      'change.profiles',
      { strategy: 'Usual care', profiles: ['Old'], more: 0, count: 1, of: 2 },
    ]);
    const alike = tinyDocument({ profiles });
    const same = changeSentences(briefCase(alike, prepare(alike).base(), 3_000)).map(told);
    expect(same.at(-1)).toEqual(['change.sameForAll', { count: 2 }]);
  });
});
