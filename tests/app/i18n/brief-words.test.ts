/** Every code of the brief has words in both languages, with every value in its place. */
import { readdirSync, readFileSync } from 'node:fs';
import i18next, { type TFunction } from 'i18next';
import { beforeAll, describe, expect, it } from 'vitest';
import { naturalFrequency } from '../../../shared/export/brief/frequency.ts';
import { type BriefValue, type Sentence, value } from '../../../shared/export/brief/sentence.ts';
import { brief as english } from '../../../src/i18n/brief-en.ts';
import { type BriefReader, frequencyWords, sentenceWords } from '../../../src/i18n/brief-words.ts';
import { en } from '../../../src/i18n/en.ts';
import { fr } from '../../../src/i18n/fr.ts';
import type { Language } from '../../../src/store/settings.ts';

const OUTCOME = {
  en: { plural: 'QALYs', gained: 'QALYs gained', lost: 'QALYs given up', per: 'QALY' },
  fr: { plural: 'QALY', gained: 'QALY gagnés', lost: 'QALY perdus', per: 'QALY' },
};

const readers = new Map<Language, BriefReader>();
beforeAll(async () => {
  for (const [language, words] of [['en', en] as const, ['fr', fr] as const]) {
    const instance = i18next.createInstance();
    await instance.init({
      lng: language,
      resources: { [language]: { translation: words } },
      fallbackLng: false,
      interpolation: { escapeValue: false },
    });
    const t: TFunction = instance.t;
    readers.set(language, { t, language, symbol: 'KM', outcome: OUTCOME[language] });
  }
});

const said = (language: Language, code: string, params: Sentence['params'] = {}) =>
  sentenceWords({ code, params }, readers.get(language) as BriefReader);

/** As they stand in the sources, and those put together from words of the analysis. */
const folder = 'shared/export/brief';
const sources = readdirSync(folder).map((file) => readFileSync(`${folder}/${file}`, 'utf8'));
const literal = /'((?:answer|sure|research|change|rests)\.[a-z][a-zA-Z]+|caution)'/g;
const finding = readFileSync('shared/analysis/finding.ts', 'utf8').matchAll(/code: '(\w+)'/g);
const against = /export type AgainstWord =([^;]+);/.exec(
  readFileSync('shared/analysis/against-comparator.ts', 'utf8'),
)?.[1];
const codes = new Set([
  ...sources.flatMap((text) => [...text.matchAll(literal)].map((match) => match[1] as string)),
  ...[...finding].map((match) => `answer.${match[1]}`),
  // The comparator is never weighed against itself.
  ...[...(against ?? '').matchAll(/'(\w+)'/g)]
    .filter((match) => match[1] !== 'comparator')
    .map((match) => `answer.against.${match[1]}`),
]);

/** A value for each gap of a sentence in English; for another's gaps they are the same. */
function valuesFor(code: string): Record<string, BriefValue> {
  const kinds: Record<string, BriefValue> = {
    ...{ threshold: value.threshold(1500), inForce: value.threshold(1500) },
    ...{ from: value.threshold(500), to: value.threshold(3000) },
    ...{ cost: value.largeMoney(149_000), health: value.health(157) },
    ...{ population: value.largeMoney(1_900_000), perPerson: value.money(16.74) },
    ...{ years: value.years(40), year: value.calendarYear(2026), cycles: value.count(40) },
    ...{ count: value.count(31), of: value.count(8), people: value.count(1000) },
    ...{ samples: value.count(1000), frequency: value.frequency(naturalFrequency(0.71)) },
    ...{ costs: value.percent(0.03), outcomes: value.code('byYear'), method: value.code('start') },
    ...{ uncertain: value.count(28), weak: value.count(4), notGraded: value.count(0) },
    ...{ invented: value.count(1), more: value.count(2), profiles: value.list(['Girls', 'Boys']) },
    others: value.list(['A', 'B', 'C']),
  };
  const words = JSON.stringify(wordsOf(code));
  const gaps = [...words.matchAll(/\{\{(\w+)\}\}/g)].map((gap) => gap[1] as string);
  const inputs = code === 'rests.inputs' ? ['uncertain', 'weak', 'notGraded', 'invented'] : [];
  return Object.fromEntries(
    [...gaps, ...inputs, 'more'].map((gap) => [gap, kinds[gap] ?? value.text(`<${gap}>`)]),
  );
}

function wordsOf(code: string): unknown {
  const steps = code.split('.');
  const last = steps.pop() as string;
  let here: Record<string, unknown> = english.brief.sentences;
  for (const step of steps) here = here[step] as Record<string, unknown>;
  return here[last] ?? here[`${last}_other`];
}

describe.each(['en', 'fr'] as const)('in %s', (language) => {
  it.each([...codes].sort())('%s has words', (code) => {
    const words = said(language, code, valuesFor(code));
    expect(words).not.toContain('brief.');
    expect(words).not.toContain('{{');
    expect(words.length).toBeGreaterThan(10);
  });

  it.each([...codesOfStanding()])('%s has words', (code) => {
    const { t } = readers.get(language) as BriefReader;
    const look = t as unknown as (key: string, values: object) => string;
    expect(look(`brief.${code}`, { count: 2 })).not.toContain('brief.');
  });
});

function codesOfStanding(): Set<string> {
  const found = sources.flatMap((text) => [...text.matchAll(/'(standing\.[a-zA-Z]+)'/g)]);
  return new Set(found.map((match) => match[1] as string));
}

it('were found', () => {
  expect(codes.size).toBeGreaterThanOrEqual(30);
  expect(codesOfStanding().size).toBe(7);
});

describe('values', () => {
  const cost = 'answer.against.moreCostlyMoreEffective';
  const params = {
    strategy: value.text('Nurses at school'),
    comparator: value.text('Care as now'),
    people: value.count(1000),
    years: value.years(40),
    cost: value.largeMoney(148_963),
    health: value.health(156.7),
  };

  it('are written as each language writes them', () => {
    expect(said('en', cost, params)).toBe(
      'For 1,000 people followed for 40 years, “Nurses at school” costs KM\u00A0149,000 more than “Care as now”, for 157 QALYs gained.',
    );
    expect(said('fr', cost, params)).toBe(
      'Pour 1\u202F000 personnes suivies pendant 40 ans, «\u00A0Nurses at school\u00A0» coûte 149\u202F000\u00A0KM de plus que «\u00A0Care as now\u00A0», pour 157\u00A0QALY gagnés.',
    );
  });

  it('of health lost say so', () => {
    const lost = { ...params, health: value.health(-4.25) };
    expect(said('en', 'answer.against.dominated', lost)).toContain('with 4.25 QALYs given up');
  });

  it('name the groups and count the rest', () => {
    const profiles = {
      strategy: value.text('A'),
      profiles: value.list(['Girls', 'Boys']),
      more: value.count(2),
      count: value.count(4),
      of: value.count(8),
    };
    expect(said('en', 'change.profiles', profiles)).toBe(
      'For 4 of the 8 groups of people (Girls, Boys and 2 others), “A” would be the best choice.',
    );
  });

  it('that are 0 are left out of the inputs', () => {
    const inputs = valuesFor('rests.inputs');
    expect(said('en', 'rests.inputs', inputs)).toBe(
      '31 inputs, of which 28 uncertain, 4 from weak evidence and 1 invented',
    );
    expect(said('fr', 'rests.inputs', inputs)).toBe(
      '31 données, dont 28 incertaines, 4 de faible qualité et 1 inventée',
    );
  });

  it.each([
    [0.004, 'fewer than 1 of 100', 'moins de 1 sur 100'],
    [0.71, '71 of 100', '71 sur 100'],
    [0.999, 'more than 99 of 100', 'plus de 99 sur 100'],
  ])('a chance of %d is a frequency', (chance, inEnglish, inFrench) => {
    const words = (language: Language) =>
      frequencyWords(naturalFrequency(chance), readers.get(language) as BriefReader);
    expect([words('en'), words('fr')]).toEqual([inEnglish, inFrench]);
  });
});
