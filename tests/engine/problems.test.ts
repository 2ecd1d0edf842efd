import { describe, expect, it } from 'vitest';
import type { Check } from '../../shared/engine/movement/row.ts';
import { mergeProblems, ProblemLog } from '../../shared/engine/problems.ts';
import { tinyDocument } from '../fixtures/tiny-document.ts';

const check: Check = {
  node: 0,
  low: 0,
  high: 1,
  code: 'run.probabilityOutside',
  path: ['movements', 'rows', 0],
  strategy: 'usual',
};

describe('ProblemLog', () => {
  it('counts, and keeps the place of the first', () => {
    const log = new ProblemLog(tinyDocument(), 500);
    const memory = Float64Array.of(0.5, 0.2, 1.5, -1);
    log.add(check, 2, 3, memory, 0, 4);
    log.add(check, 1, 4, Float64Array.of(7), 0, 1);
    expect(log.issues('warning')).toEqual([
      {
        code: 'run.probabilityOutside',
        severity: 'warning',
        path: ['movements', 'rows', 0],
        params: { count: 3, draw: 502, cycle: 3, value: 1.5, strategy: 'usual', profile: 'all' },
      },
    ]);
  });

  it('says what is no number in words', () => {
    const log = new ProblemLog(tinyDocument(), 0);
    log.add(check, 1, 0, Float64Array.of(Number.NaN), 0, 1);
    expect(log.issues('error')[0]!.params.value).toBe('NaN');
  });
});

describe('mergeProblems', () => {
  const block = (firstDraw: number, count: number) => {
    const log = new ProblemLog(tinyDocument(), firstDraw);
    log.add(check, count, 1, Float64Array.of(2), 0, 1);
    return log.issues('warning');
  };

  it('adds up counts and keeps the first draw, in whatever order blocks come', () => {
    for (const blocks of [
      [block(0, 2), block(125, 3)],
      [block(125, 3), block(0, 2)],
    ]) {
      expect(mergeProblems(blocks)).toMatchObject([{ params: { count: 5, draw: 0 } }]);
    }
  });

  it('keeps problems of other strategies apart', () => {
    const other = block(0, 1).map((issue) => ({
      ...issue,
      params: { ...issue.params, strategy: 'treatment' },
    }));
    expect(mergeProblems([block(0, 1), other])).toHaveLength(2);
  });
});
