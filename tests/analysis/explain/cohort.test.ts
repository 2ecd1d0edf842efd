import { describe, expect, it } from 'vitest';
import { cohortsOf } from '../../../shared/analysis/explain/cohort.ts';
import { DocumentError } from '../../../shared/model/issue.ts';
import { tinyDocument } from '../../fixtures/tiny-document.ts';
import { CASES, off } from './examples.ts';

describe('cohortsOf', () => {
  it.each(CASES)('follows the cohorts of $name as the engine does', ({ document, base }) => {
    for (const run of base.strategies) {
      const cohorts = cohortsOf(document, run.id, null);
      run.trace!.forEach((row, boundary) => {
        const sums = document.states.map(() => 0);
        for (const { model, occupancy, share } of cohorts) {
          model.substates.all.forEach(({ state }, substate) => {
            sums[state]! += share * occupancy[boundary]![substate]!;
          });
        }
        sums.forEach((sum, state) => {
          expect(off(sum, row[state]!)).toBeLessThan(1e-12);
        });
      });
    }
  });

  it('gives one profile alone, and keeps what it followed', () => {
    const document = tinyDocument();
    const [alone] = cohortsOf(document, 'usual', 'all');
    expect(alone?.share).toBe(1);
    expect(cohortsOf(document, 'usual', 'all')[0]).toBe(alone);
  });

  it('refuses what it does not know, and a broken document', () => {
    expect(() => cohortsOf(tinyDocument(), 'nobody', null)).toThrow(RangeError);
    expect(() => cohortsOf(tinyDocument(), 'usual', 'nobody')).toThrow(RangeError);
    const broken = tinyDocument({ variables: [] });
    expect(() => cohortsOf(broken, 'usual', null)).toThrow(DocumentError);
  });
});
