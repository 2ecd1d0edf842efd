/** What the answer rests on: evidence, and the choices that the question makes. */
import type { DiscountRate, Parameter } from '../../model/document.ts';
import type { BriefCase } from './case.ts';
import { naturalFrequency } from './frequency.ts';
import { type BriefValue, type Sentence, value } from './sentence.ts';

/**
 * Codes: `rests.inputs`, `rests.discounting` or `rests.noDiscounting`, `rests.counting`,
 * `rests.horizon`, `rests.survivors` (with a trace, where some are alive at the end),
 * `rests.perspective`, `rests.prices`, `rests.referenceCase`.
 */
export function restsOnSentences(brief: BriefCase): Sentence[] {
  const { question, parameters } = brief.document;
  const { referenceCase, currency, counting, perspective } = question;
  return [
    inputs(parameters),
    discounting(question.discounting),
    { code: 'rests.counting', params: { method: value.code(counting) } },
    horizon(brief),
    ...left(brief),
    { code: 'rests.perspective', params: { perspective: value.text(perspective) } },
    {
      code: 'rests.prices',
      params: { currency: value.text(currency.code), year: value.calendarYear(currency.priceYear) },
    },
    ...(referenceCase
      ? [{ code: 'rests.referenceCase', params: { label: value.text(referenceCase.label) } }]
      : []),
  ];
}

function inputs(parameters: readonly Parameter[]): Sentence {
  const count = (holds: (parameter: Parameter) => boolean) =>
    value.count(parameters.filter(holds).length);
  return {
    code: 'rests.inputs',
    params: {
      count: value.count(parameters.length),
      uncertain: count(({ distribution }) => distribution.type !== 'fixed'),
      weak: count(({ grade }) => grade?.level === 'low' || grade?.level === 'veryLow'),
      notGraded: count(({ grade }) => !grade || grade.level === 'notGraded'),
      invented: count(({ source }) => source.invented === true),
    },
  };
}

function discounting(rates: { costs: DiscountRate; outcomes: DiscountRate }): Sentence {
  const rate = (given: DiscountRate): BriefValue =>
    typeof given === 'number' ? value.percent(given) : value.code('byYear');
  if (rates.costs === 0 && rates.outcomes === 0) {
    return { code: 'rests.noDiscounting', params: {} };
  }
  const params = { costs: rate(rates.costs), outcomes: rate(rates.outcomes) };
  return { code: 'rests.discounting', params };
}

function horizon({ base }: BriefCase): Sentence {
  const params = {
    years: value.years(base.cycles * base.cycleLength),
    cycles: value.count(base.cycles),
  };
  return { code: 'rests.horizon', params };
}

/** Those whom the best strategy leaves alive at the end: what follows is not counted. */
function left({ base, best, document }: BriefCase): Sentence[] {
  const end = base.strategies.find(({ id }) => id === best)?.trace?.at(-1);
  const alive = end?.reduce((sum, part, state) => {
    return document.states[state]?.dead ? sum : sum + part;
  }, 0);
  // What only rounding leaves is nobody.
  if (alive === undefined || alive < 1e-9) return [];
  const frequency = value.frequency(naturalFrequency(Math.min(1, alive)));
  return [{ code: 'rests.survivors', params: { frequency } }];
}
