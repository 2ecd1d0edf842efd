/** How sure one can be of the answer, and what more knowledge could be worth. */
import type { BriefCase } from './case.ts';
import { naturalFrequency } from './frequency.ts';
import type { BriefPsa } from './psa.ts';
import { labels, type Sentence, value } from './sentence.ts';

/**
 * Codes: `sure.noDraws`; `sure.best` (how often the answer is best), then `sure.next`
 * (what most often is best where the answer is not) and `sure.onMean` (the mean of the
 * draws favours another).
 */
export function sureSentences(brief: BriefCase, psa: BriefPsa | null): Sentence[] {
  if (psa === null) return [{ code: 'sure.noDraws', params: {} }];
  const label = labels(brief.document.strategies);
  const said = (id: string, chance: number) => ({
    strategy: value.text(label(id)),
    frequency: value.frequency(naturalFrequency(chance)),
    threshold: value.threshold(brief.threshold),
    samples: value.count(psa.samples),
  });
  const own = psa.strategies.find(({ id }) => id === brief.best);
  const sentences: Sentence[] = [
    { code: 'sure.best', params: said(brief.best, own?.probabilityBest ?? 0) },
  ];
  const next = top(psa, brief.best);
  if (next && next.probabilityBest > 0) {
    sentences.push({ code: 'sure.next', params: said(next.id, next.probabilityBest) });
  }
  const onMean = bestOnMean(psa);
  if (onMean && own && onMean.id !== own.id && onMean.expectedLoss < own.expectedLoss) {
    sentences.push({ code: 'sure.onMean', params: said(onMean.id, onMean.probabilityBest) });
  }
  return sentences;
}

/**
 * The EVPI: what it would be worth, at most, to know everything before deciding. Codes:
 * `research.none` (no draw would change the answer), `research.perPerson`, and
 * `research.population` where the question says for whom. None without draws.
 */
export function researchSentences(brief: BriefCase, psa: BriefPsa | null): Sentence[] {
  if (psa === null) return [];
  const { perPerson, population } = psa.evpi;
  if (perPerson === 0) return [{ code: 'research.none', params: {} }];
  const params = {
    perPerson: value.money(perPerson),
    threshold: value.threshold(brief.threshold),
  };
  const { beneficiaries } = brief.document.question;
  if (population === null || !beneficiaries) return [{ code: 'research.perPerson', params }];
  const all = {
    population: value.largeMoney(population),
    years: value.years(beneficiaries.years),
    people: value.text(beneficiaries.label),
  };
  return [{ code: 'research.population', params: { ...params, ...all } }];
}

type Chance = BriefPsa['strategies'][number];

function top({ strategies }: BriefPsa, except: string): Chance | undefined {
  const others = strategies.filter(({ id }) => id !== except);
  return others.sort((a, b) => b.probabilityBest - a.probabilityBest)[0];
}

function bestOnMean({ strategies }: BriefPsa): Chance | undefined {
  return [...strategies].sort((a, b) => a.expectedLoss - b.expectedLoss)[0];
}
