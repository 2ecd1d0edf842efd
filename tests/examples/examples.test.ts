/** What every worked example must be: sound, rich, sourced, and marked where it is invented. */
import { describe, expect, it } from 'vitest';
import { checkModel } from '../../shared/engine/check.ts';
import { EXAMPLE_SLUGS } from '../../shared/examples/slugs.ts';
import { exampleOf, textOf } from './load.ts';

const documents = EXAMPLE_SLUGS.map(exampleOf);
const invented = documents.filter(({ about }) => about.invented);
const isUncertain = ({ distribution }: { distribution: { type: string } }) =>
  distribution.type !== 'fixed';

describe.each(EXAMPLE_SLUGS)('%s', (slug) => {
  const document = exampleOf(slug);
  const { question, parameters, about } = document;

  it('has nothing to remark on', () => {
    expect(checkModel(document)).toEqual([]);
  });

  it('is written for people to read', () => {
    const text = textOf(slug);
    expect(text.startsWith('{\n  "format"')).toBe(true);
    expect(text.endsWith('}\n')).toBe(true);
  });

  it('has 15 to 35 parameters, most of them uncertain', () => {
    expect(parameters.length).toBeGreaterThanOrEqual(15);
    expect(parameters.length).toBeLessThanOrEqual(35);
    expect(parameters.filter(isUncertain).length).toBeGreaterThan(parameters.length / 2);
  });

  it('gives every parameter a source and a grade', () => {
    for (const { id, source, grade } of parameters) {
      expect(source.citation.length, id).toBeGreaterThan(20);
      expect(grade?.level, id).toBeDefined();
    }
  });

  it('says whom it is for, what it holds to and what it leaves out', () => {
    expect(about.summary?.length).toBeGreaterThan(100);
    expect(about.limits?.length).toBeGreaterThan(100);
    expect(question.referenceCase?.source).toBeDefined();
    expect(question.beneficiaries?.incidence).toBeGreaterThan(0);
    expect(question.thresholds.map(({ id }) => id)).toContain(question.thresholdInForce);
    expect(question.thresholds.every(({ source }) => source !== undefined)).toBe(true);
  });

  it('has scenarios', () => {
    expect(document.scenarios.length).toBeGreaterThanOrEqual(1);
  });

  it('has profiles whose shares sum to 1', () => {
    expect(document.profiles.reduce((sum, { share }) => sum + share, 0)).toBe(1);
  });
});

describe('invented examples', () => {
  it('are all but the published one', () => {
    expect(documents.filter(({ about }) => !about.invented).map(({ id }) => id)).toEqual([
      'hiv-combination-therapy',
    ]);
  });

  it.each(invented.map((document) => [document.id, document] as const))(
    '%s marks every source, and uses the test currency',
    (_, { parameters, tables, question, about }) => {
      const sources = [...parameters, ...tables].map(({ source }) => source);
      expect(sources.every((source) => source?.invented === true)).toBe(true);
      for (const { source } of question.thresholds) expect(source).toMatch(/^Invented/);
      for (const source of sources) expect(source?.citation).toMatch(/^Invented .*Kesanda/);
      expect(question.referenceCase?.source).toMatch(/^Invented/);
      expect(about.limits).toMatch(/invented/);
      expect(question.currency).toMatchObject({ code: 'XTS', symbol: 'KM' });
    },
  );
});

describe('the published example', () => {
  const { about, parameters } = exampleOf('hiv-combination-therapy');

  it('is cited, and says that its inputs are from memory', () => {
    expect(about.citation).toMatch(/Chancellor et al\. 1997/);
    for (const { source } of parameters) {
      expect(source.citation).toMatch(/Chancellor et al\. 1997/);
      expect(source.citation).toMatch(/from memory/);
      expect(source.invented).toBeUndefined();
    }
  });
});

describe('between them', () => {
  const rows = documents.flatMap(({ movements }) =>
    movements.type === 'rows' ? movements.rows : [],
  );
  const kinds = rows.map((row) => (row.basis === 'rates' ? row.method : row.basis));

  it('move the cohort in every way', () => {
    expect(new Set(kinds)).toEqual(new Set(['probabilities', 'logit', 'generator', 'byRow']));
    expect(documents.some(({ movements }) => movements.type === 'survival')).toBe(true);
  });

  it('have tunnels, a life table by two keys and a tree at the start', () => {
    expect(documents.some(({ states }) => states.some(({ type }) => type === 'timed'))).toBe(true);
    expect(documents.some(({ tables }) => tables.some(({ keys }) => keys.length === 2))).toBe(true);
    const tree = exampleOf('test-before-treating');
    expect(tree.start.shares).toHaveLength(4);
    expect(tree.payoffs.some(({ type }) => type === 'start')).toBe(true);
  });

  it('count QALYs, DALYs and life years, and pay in every way', () => {
    const measures = documents.map(({ question }) => question.outcome.measure);
    expect(new Set(measures)).toEqual(new Set(['qaly', 'daly', 'lifeYears']));
    const payoffs = documents.flatMap((document) => document.payoffs.map(({ type }) => type));
    expect(new Set(payoffs)).toEqual(new Set(['state', 'movement', 'once', 'start']));
  });

  it('hold parameters together in groups of three sorts', () => {
    const types = documents.flatMap(({ groups }) => groups.map(({ type }) => type));
    expect(new Set(types)).toEqual(new Set(['dirichlet', 'multivariateNormal', 'rankCorrelation']));
  });

  it('Keeping hearts well is the rich one', () => {
    const { strategies, profiles, states, parameters, question } = exampleOf('keeping-hearts-well');
    expect([strategies.length, profiles.length, states.length]).toEqual([4, 8, 5]);
    expect(question.horizon).toBe(40);
    expect(parameters.length).toBeGreaterThanOrEqual(28);
    expect(parameters.filter(isUncertain).length).toBeGreaterThanOrEqual(25);
  });
});
