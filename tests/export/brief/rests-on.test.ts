import { describe, expect, it } from 'vitest';
import { prepare } from '../../../shared/engine/engine.ts';
import { briefCase } from '../../../shared/export/brief/case.ts';
import { restsOnSentences } from '../../../shared/export/brief/rests-on.ts';
import type { ModelDocument } from '../../../shared/model/document.ts';
import { tinyDocument } from '../../fixtures/tiny-document.ts';
import { told } from './given.ts';

const rests = (document: ModelDocument, trace = true) => {
  const base = prepare(document).base({ trace });
  return new Map(restsOnSentences(briefCase(document, base, 1_500)).map(told));
};

describe('restsOnSentences', () => {
  it('says what the small document rests on', () => {
    const found = rests(tinyDocument());
    expect(found.get('rests.inputs')).toEqual({
      ...{ count: 4, uncertain: 3, weak: 0, notGraded: 4, invented: 4 },
    });
    expect(found.get('rests.discounting')).toEqual({ costs: 0.03, outcomes: 0.03 });
    expect(found.get('rests.counting')).toEqual({ method: 'trapezoid' });
    expect(found.get('rests.horizon')).toEqual({ years: 10, cycles: 10 });
    // 0.92^10 = 0.43 are alive at the end under treatment, which is best (by hand).
    expect(found.get('rests.survivors')).toEqual({
      frequency: { count: 43, of: 100, bound: 'about' },
    });
    expect(found.get('rests.perspective')).toEqual({ perspective: 'Health service' });
    expect(found.get('rests.prices')).toEqual({ currency: 'XTS', year: 2026 });
    expect(found.has('rests.referenceCase')).toBe(false);
  });

  it('says other choices', () => {
    const tiny = tinyDocument();
    const asking = (change: Partial<ModelDocument['question']>) =>
      rests(tinyDocument({ question: { ...tiny.question, ...change } }), false);
    const none = { ...tiny.question.discounting, costs: 0, outcomes: 0 };
    const found = asking({ discounting: none, referenceCase: { label: 'Kesanda (invented)' } });
    expect(found.get('rests.noDiscounting')).toEqual({});
    expect(found.get('rests.referenceCase')).toEqual({ label: 'Kesanda (invented)' });
    expect(found.has('rests.survivors')).toBe(false);
    const byYear = { ...tiny.question.discounting, costs: { byYear: [0.05, 0.03] } };
    expect(asking({ discounting: byYear }).get('rests.discounting')).toEqual({
      ...{ costs: 'byYear', outcomes: 0.03 },
    });
  });
});
