/**
 * The one-page brief as data: everything on it but the words. Codes are worded by the
 * interface; what a person wrote instead of a sentence is kept by the sentence's code.
 */
import { appraiseBase } from '../../analysis/appraise.ts';
import { type FrontierSegment, frontierSegments } from '../../analysis/frontier-segments.ts';
import { defaultPair, type WeighedPair } from '../../analysis/lever.ts';
import { type BaseRun, ENGINE_VERSION } from '../../engine/results.ts';
import { digestOf } from '../../model/digest.ts';
import type { ModelDocument, Question } from '../../model/document.ts';
import { DocumentError, hasErrors } from '../../model/issue.ts';
import { digestOfResults } from '../../model/results-digest.ts';
import { answerSentences } from './answer.ts';
import { type BriefCase, briefCase } from './case.ts';
import { researchSentences, sureSentences } from './how-sure.ts';
import { type BriefOption, optionsTable } from './options-table.ts';
import type { BriefPsa } from './psa.ts';
import { restsOnSentences } from './rests-on.ts';
import { labels, type Sentence } from './sentence.ts';
import { changeSentences } from './what-changes.ts';

export interface Brief {
  readonly question: {
    readonly title: string;
    readonly decision: string | null;
    readonly population: string;
    readonly setting: string;
    /** Label of the strategy that others are weighed against. */
    readonly comparator: string;
  };
  readonly currency: Question['currency'];
  readonly outcome: Question['outcome'];
  /** The threshold of the answer; label and source where it is one of the question's. */
  readonly threshold: {
    readonly value: number;
    readonly label: string | null;
    readonly source: string | null;
  };
  readonly answer: readonly Sentence[];
  /** In order of cost. */
  readonly options: readonly BriefOption[];
  /** What the beam weighs; null where there is one strategy only. */
  readonly weighed: WeighedPair | null;
  /** Which strategy is best at which threshold; the last ends at Infinity. */
  readonly segments: readonly FrontierSegment[];
  readonly howSure: readonly Sentence[];
  readonly whatWouldChange: readonly Sentence[];
  readonly research: readonly Sentence[];
  readonly restsOn: readonly Sentence[];
  /** Always shown. */
  readonly caution: Sentence;
  /** Said wherever the page goes. */
  readonly invented: boolean;
  readonly digests: {
    readonly document: string;
    readonly engine: string;
    /** Of the base case, as the command line gives it without draws. */
    readonly results: string;
  };
}

/**
 * @param base with its trace, where survivors at the horizon are to be told
 * @param psa null where there are no draws
 * @param threshold money per unit of health, 0 or more
 * @throws DocumentError where the base case is broken: there is no brief of it
 */
export function draftBrief(
  document: ModelDocument,
  base: BaseRun,
  psa: BriefPsa | null,
  threshold: number,
): Brief {
  if (hasErrors(base.problems)) throw new DocumentError(base.problems);
  const brief = briefCase(document, base, threshold);
  const { currency, outcome } = document.question;
  return {
    question: questionOf(document),
    ...{ currency, outcome },
    threshold: thresholdOf(document.question, threshold),
    answer: answerSentences(brief),
    options: optionsTable(brief, psa),
    weighed: defaultPair(brief.rows, brief.best),
    segments: frontierSegments(brief.rows, Number.POSITIVE_INFINITY),
    howSure: sureSentences(brief, psa),
    whatWouldChange: changeSentences(brief),
    research: researchSentences(brief, psa),
    restsOn: restsOnSentences(brief),
    caution: { code: 'caution', params: {} },
    invented: document.about.invented || document.parameters.some((each) => each.source.invented),
    digests: digests(brief),
  };
}

function questionOf({ question, strategies }: ModelDocument): Brief['question'] {
  const { title, decision = null, population, setting } = question;
  const comparator = labels(strategies)(question.comparator);
  return { title, decision, population, setting, comparator };
}

function thresholdOf({ thresholds }: Question, value: number): Brief['threshold'] {
  const named = thresholds.find((each) => each.value === value);
  return { value, label: named?.label ?? null, source: named?.source ?? null };
}

/** The trace is left out, so that the digest is that of a run without one. */
function digests({ document, base, threshold }: BriefCase): Brief['digests'] {
  const strategies = base.strategies.map(({ trace: _, ...run }) => run);
  const results = { strategies: appraiseBase(document, { ...base, strategies }, threshold) };
  return {
    document: digestOf(document),
    engine: ENGINE_VERSION,
    results: digestOfResults(results),
  };
}
