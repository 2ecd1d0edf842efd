import { describe, expect, it } from 'vitest';
import type { BaseRun } from '../../../shared/engine/results.ts';
import { answerAt, compare } from '../../../src/store/answer.ts';
import { tinyDocument } from '../../fixtures/tiny-document.ts';

/** Totals by hand: treatment costs 100 more and gains 0.1, so it is worth it above 1,000. */
function run(direction: 1 | -1 = 1): BaseRun {
  const totals = (id: string, cost: number, outcome: number) => ({
    id,
    cost,
    outcome,
    lifeYears: 5,
    byProfile: [],
    byPayoff: [],
  });
  return {
    strategies: [totals('usual', 200, 4), totals('treatment', 300, 4 + direction * 0.1)],
    cycleLength: 1,
    cycles: 10,
    problems: [],
  };
}

const document = tinyDocument();
const comparison = compare(document, run());

describe('the answer', () => {
  it('names the best at a threshold and its net benefit against the comparator', () => {
    const above = answerAt(document, comparison, null, 1_500);
    expect(above.best).toBe('treatment');
    expect(above.netBenefit).toBeCloseTo(1_500 * 0.1 - 100, 9);
    const below = answerAt(document, comparison, null, 500);
    expect(below).toMatchObject({ best: 'usual', netBenefit: 0 });
  });

  it('has no chances until there are draws', () => {
    expect(answerAt(document, comparison, null, 1_500).chances).toBeNull();
  });

  it('says who is as good where strategies tie', () => {
    const { best, tied } = answerAt(document, comparison, null, 1_000);
    expect([best, ...tied].sort()).toEqual(['treatment', 'usual']);
  });

  it('turns outcomes of which fewer is better', () => {
    const { question } = document;
    const outcome = { ...question.outcome, measure: 'daly', direction: 'fewerIsBetter' } as const;
    const dalys = tinyDocument({ question: { ...question, outcome } });
    const answer = answerAt(dalys, compare(dalys, run(-1)), null, 1_500);
    expect(answer.best).toBe('treatment');
    expect(answer.netBenefit).toBeCloseTo(50, 9);
  });
});

describe('its chances', () => {
  // Four draws by hand. At 1,500 treatment gains 50, 50, 50 and loses 250: its mean is -25.
  const draws = {
    strategies: ['usual', 'treatment'],
    cost: [new Float64Array([200, 200, 200, 200]), new Float64Array([300, 300, 300, 300])],
    health: [new Float64Array([4, 4, 4, 4]), new Float64Array([4.1, 4.1, 4.1, 3.9])],
  };
  const { chances } = answerAt(document, comparison, draws, 1_500);

  it('are the share of draws in which the strategy named is best', () => {
    expect(chances?.probabilityBest.value).toBe(0.75);
    // Of a share of 0.75 in 4 draws: the root of 0.75 x 0.25 / 4.
    expect(chances?.probabilityBest.standardError).toBeCloseTo(Math.sqrt(0.1875 / 4), 12);
  });

  it('value perfect information by the draws alone', () => {
    // Mean of the best of each draw (50, 50, 50, 0) less the best mean (0, of usual care).
    expect(chances?.evpi.value).toBeCloseTo(37.5, 9);
    expect(chances?.populationEvpi).toBeNull();
  });

  it('say where the means point to another strategy', () => {
    expect(chances?.bestOnMean).toBe('usual');
  });

  it('count all who are concerned, where the question says how many', () => {
    const beneficiaries = { label: 'All', incidence: 10, prevalent: 5, years: 2, discountRate: 0 };
    const counted = tinyDocument({ question: { ...document.question, beneficiaries } });
    const answer = answerAt(counted, comparison, draws, 1_500);
    expect(answer.chances?.populationEvpi?.value).toBeCloseTo(25 * 37.5, 9);
  });
});
