import { describe, expect, it } from 'vitest';
import { answerSentences } from '../../../shared/export/brief/answer.ts';
import { briefCase } from '../../../shared/export/brief/case.ts';
import { type Given, given, told } from './given.ts';

const answer = (results: Given, threshold: number) => {
  const { document, base } = given(results);
  return answerSentences(briefCase(document, base, threshold)).map(told);
};

describe('answerSentences', () => {
  it('says from which threshold the best is worth it, and what it brings to 1,000', () => {
    expect(answer({ a: [100, 10], b: [300, 11] }, 250)).toEqual([
      ['answer.worthAbove', { strategy: 'B', threshold: 200, inForce: 250 }],
      [
        'answer.against.moreCostlyMoreEffective',
        { strategy: 'B', comparator: 'A', people: 1000, years: 10, cost: 200_000, health: 1_000 },
      ],
    ]);
  });

  it('weighs the next best where the comparator is best', () => {
    const [first, second] = answer({ a: [100, 10], b: [300, 11], c: [900, 11.5] }, 150);
    expect(first).toEqual(['answer.worthBelow', { strategy: 'A', threshold: 200, inForce: 150 }]);
    expect(second?.[1]).toMatchObject({ strategy: 'B', comparator: 'A', cost: 200_000 });
  });

  it('says savings and losses by what they are', () => {
    const [saves, dominates] = answer({ a: [100, 10], b: [60, 11] }, 150);
    expect(saves?.[0]).toBe('answer.bestEverywhere');
    expect(dominates).toEqual([
      'answer.against.dominates',
      { strategy: 'B', comparator: 'A', people: 1000, years: 10, cost: 40_000, health: 1_000 },
    ]);
    const less = answer({ a: [300, 11], b: [100, 10] }, 150);
    expect(less[1]?.[0]).toBe('answer.against.lessCostlyLessEffective');
  });

  it('says ties, and a strategy that has no other', () => {
    const tied = answer({ a: [100, 10], b: [100, 10] }, 150);
    expect(tied[1]).toEqual(['answer.tied', { others: ['B'] }]);
    expect(tied[2]?.[0]).toBe('answer.against.noDifference');
    const alone = answer({ a: [100, 10] }, 150);
    expect(alone).toEqual([['answer.onlyStrategy', { strategy: 'A', inForce: 150 }]]);
  });
});
