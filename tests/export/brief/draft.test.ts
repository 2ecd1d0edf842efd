import { describe, expect, it } from 'vitest';
import { appraise } from '../../../shared/analysis/appraise.ts';
import { prepare } from '../../../shared/engine/engine.ts';
import { EXAMPLE_SLUGS } from '../../../shared/examples/slugs.ts';
import { draftBrief } from '../../../shared/export/brief/draft.ts';
import { digestOf } from '../../../shared/model/digest.ts';
import { DocumentError, error } from '../../../shared/model/issue.ts';
import { thresholdInForce } from '../../../shared/model/threshold.ts';
import { exampleOf } from '../../examples/load.ts';
import { given } from './given.ts';

describe('draftBrief', () => {
  it.each(EXAMPLE_SLUGS)('has the numbers of the command line: %s', (slug) => {
    const document = exampleOf(slug);
    const engine = prepare(document);
    const threshold = thresholdInForce(document.question);
    const sampling = { seed: 1, plan: 'plain' } as const;
    const appraisal = appraise(document, engine, { ...sampling, samples: 125, threshold });
    const base = engine.base({ trace: true });
    const brief = draftBrief(document, base, appraisal.psa!, threshold);
    expect(brief.options.length).toBe(document.strategies.length);
    for (const option of brief.options) {
      const want = appraisal.strategies.find(({ id }) => id === option.id)!;
      expect([option.cost, option.outcome, option.icer, option.label]).toEqual([
        ...[want.cost, want.outcome, want.icer, want.name],
      ]);
    }
    expect(brief.options.filter(({ isBest }) => isBest).length).toBe(1);
    expect(brief.options.filter(({ isComparator }) => isComparator).length).toBe(1);
    const nmb = (id: string) => appraisal.strategies.find((each) => each.id === id)!.nmb;
    const best = brief.options.find(({ isBest }) => isBest)!.id;
    expect(nmb(best)).toBe(Math.max(...appraisal.strategies.map((each) => each.nmb)));
    expect(brief.weighed?.strategy).toBe(best);
    const plain = appraise(document, engine, { ...sampling, samples: 0, threshold });
    expect(brief.digests).toEqual({
      document: digestOf(document),
      engine: plain.engine,
      results: plain.digest,
    });
    expect(brief.invented).toBe(document.about.invented);
    expect(brief.threshold.label).not.toBeNull();
    expect(brief.caution.code).toBe('caution');
    for (const part of [brief.answer, brief.howSure, brief.whatWouldChange, brief.restsOn]) {
      expect(part.length).toBeGreaterThan(0);
    }
  });

  it('gives each sentence a code of its own but for what several strategies have', () => {
    const document = exampleOf('keeping-hearts-well');
    const base = prepare(document).base({ trace: true });
    const brief = draftBrief(document, base, null, 1_500);
    const codes = [...brief.answer, ...brief.howSure, ...brief.research, ...brief.restsOn].map(
      ({ code }) => code,
    );
    expect(new Set(codes).size).toBe(codes.length);
  });

  it('says a threshold of no name, and refuses a broken base case', () => {
    const { document, base } = given({ a: [100, 10], b: [300, 11] });
    expect(draftBrief(document, base, null, 77).threshold).toEqual({
      ...{ value: 77, label: null, source: null },
    });
    const broken = { ...base, problems: [error('run.remainderOutside')] };
    expect(() => draftBrief(document, broken, null, 77)).toThrow(DocumentError);
  });
});
