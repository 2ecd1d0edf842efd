import { describe, expect, it } from 'vitest';
import { appraise } from '../../shared/analysis/appraise.ts';
import { prepare } from '../../shared/engine/engine.ts';
import { ENGINE_VERSION } from '../../shared/engine/results.ts';
import { digestOf } from '../../shared/model/digest.ts';
import type { ModelDocument } from '../../shared/model/document.ts';
import { DocumentError } from '../../shared/model/issue.ts';
import { tinyDocument } from '../fixtures/tiny-document.ts';

const settings = { samples: 400, seed: 5, plan: 'plain', threshold: 1500 } as const;

function appraised(document: ModelDocument = tinyDocument(), more: object = {}) {
  return appraise(document, prepare(document), { ...settings, ...more });
}

describe('appraise', () => {
  it('says what it appraised and how', () => {
    const result = appraised();
    expect(result.document).toBe(digestOf(tinyDocument()));
    expect(result.engine).toBe(ENGINE_VERSION);
    expect(result.settings).toEqual({ ...settings, comparator: 'usual' });
  });

  it('places each strategy on the frontier and takes its net benefit', () => {
    const [usual, treatment] = appraised().strategies;
    expect(usual).toMatchObject({
      id: 'usual',
      name: 'Usual care',
      status: 'reference',
      icer: null,
    });
    const { cost, outcome, icer, against, nmb } = treatment!;
    expect(against).toBe('usual');
    expect(icer).toBeCloseTo(cost / (outcome - usual!.outcome), 8);
    expect(nmb).toBeCloseTo(1500 * outcome - cost, 9);
  });

  it('has probabilities that sum to 1, and standard errors that shrink with draws (T53)', () => {
    const few = appraised().psa!;
    const many = appraised(undefined, { samples: 6_400 }).psa!;
    const total = few.strategies.reduce((sum, { probabilityBest }) => sum + probabilityBest, 0);
    expect(total).toBeCloseTo(1, 12);
    const ratio = few.strategies[1]!.costSe! / many.strategies[1]!.costSe!;
    expect(ratio).toBeGreaterThan(3);
    expect(ratio).toBeLessThan(5.5);
    expect(few.evpi.perPerson).toBeGreaterThanOrEqual(0);
  });

  it('leaves the probabilistic part out where no draw is asked for', () => {
    expect(appraised(undefined, { samples: 0 }).psa).toBeUndefined();
  });

  it('has a digest that moves with the results and with nothing else', () => {
    const { digest } = appraised();
    expect(appraised().digest).toBe(digest);
    expect(appraised(undefined, { seed: 6 }).digest).not.toBe(digest);
    const renamed = { ...tinyDocument(), about: { invented: true, summary: 'Other words' } };
    expect(appraised(renamed).digest).toBe(digest);
  });

  it('turns an outcome of which fewer is better, in its ranking and not in its numbers', () => {
    const tiny = tinyDocument();
    const outcome = {
      ...tiny.question.outcome,
      measure: 'natural',
      direction: 'fewerIsBetter',
    } as const;
    const result = appraised({ ...tiny, question: { ...tiny.question, outcome } });
    const [usual, treatment] = result.strategies;
    expect(treatment!.outcome).toBeGreaterThan(usual!.outcome);
    expect(treatment!.status).toBe('dominated');
    for (const { outcome: mean, outcomeInterval } of result.psa!.strategies) {
      expect(outcomeInterval[0]).toBeLessThan(mean);
      expect(mean).toBeLessThan(outcomeInterval[1]);
    }
  });

  it('scales the value of perfect information to those whom it concerns', () => {
    const tiny = tinyDocument();
    const beneficiaries = {
      label: 'Adults',
      incidence: 100,
      prevalent: 50,
      years: 2,
      discountRate: 0,
    };
    const { evpi } = appraised({ ...tiny, question: { ...tiny.question, beneficiaries } }).psa!;
    expect(evpi.population).toBeCloseTo(evpi.perPerson * 250, 6);
    expect(appraised().psa!.evpi.population).toBeNull();
  });

  it('gives no result from a base case that is broken', () => {
    const tiny = tinyDocument();
    const variables = [{ ...tiny.variables[0]!, formula: 'times_risk(p_die, 20)' }];
    expect(() => appraised({ ...tiny, variables })).toThrow(DocumentError);
  });

  it('reports draws that are out of bounds, with their number', () => {
    const tiny = tinyDocument();
    const variables = [{ ...tiny.variables[0]!, formula: 'times_risk(p_die, 8)' }];
    const { problems } = appraised({ ...tiny, variables }).psa!;
    const outside = problems.find(({ code }) => code === 'run.probabilityOutside')!;
    expect(outside.severity).toBe('warning');
    expect(Number(outside.params.count)).toBeGreaterThan(0);
  });
});
