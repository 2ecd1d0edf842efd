/** The answer: over which thresholds the best strategy is worth it, and what it brings. */
import { againstComparator } from '../../analysis/against-comparator.ts';
import { finding } from '../../analysis/finding.ts';
import type { BriefCase } from './case.ts';
import { type BriefValue, labels, type Sentence, value } from './sentence.ts';

/** People that costs and gains are told for: small numbers per person mean little. */
const PEOPLE = 1_000;

/**
 * Codes: `answer.onlyStrategy`, `answer.bestEverywhere`, `answer.worthAbove`,
 * `answer.worthBelow`, `answer.worthBetween` (`answer.neverBest` cannot be reached by a
 * best strategy but by rounding); `answer.tied`; `answer.against.` with the word of
 * `againstComparator`. Where the comparator is best, it is the next best that is
 * weighed against it.
 */
export function answerSentences(brief: BriefCase): Sentence[] {
  const sentences = [headline(brief)];
  const others = brief.benefits.tied.filter((id) => id !== brief.best);
  if (others.length > 0) {
    const label = labels(brief.document.strategies);
    sentences.push({ code: 'answer.tied', params: { others: value.list(others.map(label)) } });
  }
  const against = againstSentence(brief);
  return against ? [...sentences, against] : sentences;
}

function headline({ document, rows, best, threshold }: BriefCase): Sentence {
  const { code, params } = finding(rows, best);
  const thresholds: Record<string, BriefValue> = {};
  for (const [name, param] of Object.entries(params)) {
    if (typeof param === 'number') thresholds[name] = value.threshold(param);
  }
  const strategy = value.text(labels(document.strategies)(best));
  return {
    code: `answer.${code}`,
    params: { ...thresholds, strategy, inForce: value.threshold(threshold) },
  };
}

function againstSentence(brief: BriefCase): Sentence | null {
  const { document, options, threshold } = brief;
  const { comparator, horizon } = document.question;
  const strategy = brief.best === comparator ? nextBest(brief) : brief.best;
  const row = againstComparator(options, comparator, threshold).find(({ id }) => id === strategy);
  if (!row) return null;
  const label = labels(document.strategies);
  return {
    code: `answer.against.${row.word}`,
    params: {
      strategy: value.text(label(row.id)),
      comparator: value.text(label(comparator)),
      people: value.count(PEOPLE),
      years: value.years(horizon),
      cost: value.largeMoney(PEOPLE * Math.abs(row.incrementalCost)),
      health: value.health(PEOPLE * row.incrementalHealth),
    },
  };
}

/** Of the highest net benefit but for the best; undefined where there is no other. */
function nextBest({ benefits, best }: BriefCase): string | undefined {
  const others = benefits.rows.filter(({ id }) => id !== best);
  return others.sort((a, b) => b.nmb - a.nmb)[0]?.id;
}
