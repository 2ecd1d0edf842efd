import { describe, expect, it } from 'vitest';
import { type Draws, joinBlocks, requireDraws } from '../../../shared/analysis/psa/draws.ts';
import type { DrawsBlock } from '../../../shared/engine/results.ts';
import { DocumentError } from '../../../shared/model/issue.ts';

const block = (from: number, values: number[]): DrawsBlock => ({
  from,
  to: from + values.length,
  cost: [Float64Array.from(values), Float64Array.from(values, (x) => 10 * x)],
  outcome: [Float64Array.from(values), Float64Array.from(values, (x) => 2 * x)],
  problems: [],
});

function issuesOf(run: () => unknown) {
  try {
    run();
  } catch (thrown) {
    if (thrown instanceof DocumentError) return thrown.issues;
  }
  return [];
}

describe('joinBlocks', () => {
  it('joins blocks in order of their draws and turns outcomes to health', () => {
    const joined = joinBlocks(['a', 'b'], [block(2, [3]), block(0, [1, 2])], 'fewerIsBetter');
    expect(joined.cost.map((column) => [...column])).toEqual([
      [1, 2, 3],
      [10, 20, 30],
    ]);
    expect(joined.health.map((column) => [...column])).toEqual([
      [-1, -2, -3],
      [-2, -4, -6],
    ]);
  });

  it.each([
    ['a gap', [block(0, [1]), block(2, [3])], 1],
    ['an overlap', [block(0, [1, 2]), block(1, [3])], 2],
    ['a missing start', [block(1, [3])], 0],
  ])('refuses %s', (_, blocks, draw) => {
    expect(issuesOf(() => joinBlocks(['a', 'b'], blocks, 'moreIsBetter'))).toMatchObject([
      { code: 'analysis.drawsMissing', params: { draw } },
    ]);
  });
});

describe('requireDraws', () => {
  const of = (cost: number[], health: number[]): Draws => ({
    strategies: ['a'],
    cost: [Float64Array.from(cost)],
    health: [Float64Array.from(health)],
  });

  it('counts the draws', () => {
    expect(requireDraws(of([1, 2], [3, 4]))).toBe(2);
  });

  it('refuses none, uneven columns, and draws that are not finite, naming the first', () => {
    expect(issuesOf(() => requireDraws(of([], [])))).toMatchObject([{ code: 'analysis.noDraws' }]);
    expect(issuesOf(() => requireDraws(of([1, 2], [1])))).toMatchObject([
      { code: 'analysis.drawsMissing', params: { draw: 1 } },
    ]);
    expect(issuesOf(() => requireDraws(of([1, 2], [1, Number.NaN])))).toMatchObject([
      { code: 'analysis.drawNotFinite', params: { strategy: 'a', quantity: 'health', draw: 1 } },
    ]);
  });
});
