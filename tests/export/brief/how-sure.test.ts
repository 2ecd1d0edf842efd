import { describe, expect, it } from 'vitest';
import { briefCase } from '../../../shared/export/brief/case.ts';
import { researchSentences, sureSentences } from '../../../shared/export/brief/how-sure.ts';
import type { BriefPsa } from '../../../shared/export/brief/psa.ts';
import { chances, given, told } from './given.ts';

const { document, base } = given({ a: [100, 10], b: [300, 11], c: [500, 11.1] });
const brief = briefCase(document, base, 250);
const sure = (psa: BriefPsa | null) => sureSentences(brief, psa).map(told);

describe('sureSentences', () => {
  it('says how often the answer is best, and what is where it is not', () => {
    const [best, next, ...more] = sure(chances({ a: 0.35, b: 0.64, c: 0.01 }));
    expect(best?.[0]).toBe('sure.best');
    expect(best?.[1]).toMatchObject({ strategy: 'B', threshold: 250, samples: 1_000 });
    expect(best?.[1].frequency).toEqual({ count: 64, of: 100, bound: 'about' });
    expect(next).toEqual([
      'sure.next',
      expect.objectContaining({ strategy: 'A', frequency: expect.objectContaining({ count: 35 }) }),
    ]);
    expect(more).toEqual([]);
  });

  it('says where the mean of the draws favours another', () => {
    const codes = sure(chances({ a: 0.4, b: 0.5, c: 0.1 }, { a: 1, b: 2, c: 3 }));
    expect(codes.map(([code]) => code)).toEqual(['sure.best', 'sure.next', 'sure.onMean']);
    expect(codes[2]?.[1].strategy).toBe('A');
  });

  it('names no other where none is ever best, and says that there are no draws', () => {
    expect(sure(chances({ a: 0, b: 1, c: 0 })).map(([code]) => code)).toEqual(['sure.best']);
    expect(sure(null)).toEqual([['sure.noDraws', {}]]);
  });
});

describe('researchSentences', () => {
  it('says what perfect knowledge is worth a person, and for whom', () => {
    const research = (psa: BriefPsa | null, asked = brief) =>
      researchSentences(asked, psa).map(told);
    const psa = chances({ a: 1, b: 0, c: 0 });
    expect(research(psa)).toEqual([['research.perPerson', { perPerson: 2, threshold: 250 }]]);
    const beneficiaries = {
      ...{ label: 'Children', incidence: 10, prevalent: 0, years: 5, discountRate: 0 },
    };
    const asked = {
      ...brief,
      document: { ...document, question: { ...document.question, beneficiaries } },
    };
    const many = chances({ a: 1, b: 0, c: 0 }, {}, { perPerson: 2, population: 100 });
    expect(research(many, asked)).toEqual([
      [
        'research.population',
        { perPerson: 2, threshold: 250, population: 100, years: 5, people: 'Children' },
      ],
    ]);
    const none = chances({ a: 1, b: 0, c: 0 }, {}, { perPerson: 0, population: 0 });
    expect(research(none)).toEqual([['research.none', {}]]);
    expect(research(null)).toEqual([]);
  });
});
