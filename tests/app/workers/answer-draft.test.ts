import { describe, expect, it } from 'vitest';
import { answerDraft } from '../../../src/workers/answer-draft.ts';
import { tinyDocument } from '../../fixtures/tiny-document.ts';

describe('a draft', () => {
  it('that is whole gives its base case', () => {
    const { base, issues } = answerDraft(tinyDocument());
    expect(issues).toEqual([]);
    // Usual care: 0.8 QALYs a year of a life with a chance of 0.9 to live on, 10 yearly
    // cycles by the trapezoid, discounted by 1.03 a year: the sum written out.
    const alive = (year: number) => (0.9 / 1.03) ** year;
    let qalys = 0;
    for (let year = 0; year < 10; year++) qalys += (0.8 * (alive(year) + alive(year + 1))) / 2;
    expect(base?.strategies[0]?.outcome).toBeCloseTo(qalys, 10);
  });

  it('that leaves out what has a default gets it', () => {
    const { groups: _, ...bare } = tinyDocument();
    const { document, base } = answerDraft(bare as never);
    expect(document?.groups).toEqual([]);
    expect(base).not.toBeNull();
  });

  it('with a fault has issues, and no base case', () => {
    const faults = [
      { question: { ...tinyDocument().question, comparator: 'nobody' } },
      { variables: [{ ...tinyDocument().variables[0]!, formula: 'p_die +' }] },
      { strategies: [] },
      // Only running shows it: the chance of dying rises past 1.
      { parameters: tinyDocument().parameters.map((p) => ({ ...p, value: p.value * 9.99 })) },
      { variables: [{ ...tinyDocument().variables[0]!, formula: 'p_die * 20' }] },
    ];
    for (const fault of faults) {
      const { base, issues } = answerDraft(tinyDocument(fault as never));
      expect(base).toBeNull();
      expect(issues.some(({ severity }) => severity === 'error')).toBe(true);
    }
  });
});
