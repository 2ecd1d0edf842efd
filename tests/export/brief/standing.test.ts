import { describe, expect, it } from 'vitest';
import { ENGINE_VERSION } from '../../../shared/engine/results.ts';
import { type BriefState, briefStanding } from '../../../shared/export/brief/standing.ts';
import { error, warning } from '../../../shared/model/issue.ts';

const now = { document: 'now', engine: ENGINE_VERSION };
const then = { document: 'then', engine: ENGINE_VERSION };
const ready: BriefState = { document: 'now', issues: [], base: now, draws: now, written: [] };

const standing = (change: Partial<BriefState>) => {
  const { standing, reasons } = briefStanding({ ...ready, ...change });
  return [standing, ...reasons.map(({ code }) => code)];
};

describe('briefStanding', () => {
  it('is ready where all is made from the document as it stands', () => {
    expect(standing({})).toEqual(['ready']);
    expect(standing({ draws: 'notAsked', written: ['now'] })).toEqual(['ready']);
    expect(standing({ issues: [warning('names.unused')] })).toEqual(['ready']);
  });

  it('is stale where a part is missing or made from another', () => {
    expect(standing({ base: then })).toEqual(['stale', 'standing.baseOfOther']);
    expect(standing({ draws: then })).toEqual(['stale', 'standing.drawsOfOther']);
    expect(standing({ draws: null })).toEqual(['stale', 'standing.noDraws']);
    const old = { ...now, engine: '0.0.1' };
    expect(standing({ draws: old })).toEqual(['stale', 'standing.otherEngine']);
    expect(standing({ written: ['now', 'then'] })).toEqual(['stale', 'standing.writtenForOther']);
  });

  it('is broken where the model gives no answer, and says why first', () => {
    const issues = [warning('names.unused'), error('formula.unknownName'), error('formula.empty')];
    const found = briefStanding({ ...ready, issues, draws: then });
    expect(found.standing).toBe('broken');
    expect(found.reasons).toEqual([
      { code: 'standing.errors', params: { count: 2, first: 'formula.unknownName' } },
      { code: 'standing.drawsOfOther', params: {} },
    ]);
    expect(standing({ base: null })).toEqual(['broken', 'standing.noBase']);
  });
});
