import { describe, expect, it } from 'vitest';
import { finding } from '../../shared/analysis/finding.ts';
import { incremental } from '../../shared/analysis/incremental.ts';

const rows = incremental([
  { id: 'a', cost: 0, health: 0 },
  { id: 'b', cost: 100, health: 1 },
  { id: 'twin', cost: 100, health: 1 },
  { id: 'c', cost: 400, health: 2 },
  { id: 'poor', cost: 500, health: 1 },
]);

describe('finding', () => {
  it.each([
    ['a', { code: 'worthBelow', params: { strategy: 'a', threshold: 100 }, tied: [] }],
    ['b', { code: 'worthBetween', params: { strategy: 'b', from: 100, to: 300 }, tied: ['twin'] }],
    [
      'twin',
      { code: 'worthBetween', params: { strategy: 'twin', from: 100, to: 300 }, tied: ['b'] },
    ],
    ['c', { code: 'worthAbove', params: { strategy: 'c', threshold: 300 }, tied: [] }],
    ['poor', { code: 'neverBest', params: { strategy: 'poor' }, tied: [] }],
  ])('of %s', (strategy, expected) => {
    expect(finding(rows, strategy)).toEqual(expected);
  });

  it('says where no threshold matters', () => {
    const two = incremental([
      { id: 'a', cost: 0, health: 1 },
      { id: 'b', cost: 1, health: 0 },
    ]);
    expect(finding(two, 'a')).toMatchObject({ code: 'bestEverywhere' });
    const one = incremental([{ id: 'a', cost: 0, health: 1 }]);
    expect(finding(one, 'a')).toMatchObject({ code: 'onlyStrategy' });
  });
});
