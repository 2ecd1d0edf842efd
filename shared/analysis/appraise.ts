/**
 * The whole appraisal of a document, as the command line prints it and the hub can
 * check it: base case, incremental analysis, probabilistic analysis.
 */
import type { Engine } from '../engine/engine.ts';
import { mergeProblems } from '../engine/problems.ts';
import {
  type BaseRun,
  BLOCK_DRAWS,
  type DrawsBlock,
  ENGINE_VERSION,
  type PayoffTotal,
  type ProfileTotals,
  type SamplingSettings,
} from '../engine/results.ts';
import { digestOf } from '../model/digest.ts';
import type { ModelDocument, Question } from '../model/document.ts';
import { DocumentError, hasErrors, type Issue } from '../model/issue.ts';
import { digestOfResults } from '../model/results-digest.ts';
import { optionsOf } from './breakdown/options-of.ts';
import { toHealth } from './direction.ts';
import { type IncrementalRow, incremental } from './incremental.ts';
import { netMonetaryBenefit } from './net-benefit.ts';
import { affectedPopulation } from './population.ts';
import { joinBlocks } from './psa/draws.ts';
import { evpi } from './psa/evpi.ts';
import { means } from './psa/means.ts';
import { sweep } from './psa/sweep.ts';

export interface AppraiseSettings extends SamplingSettings {
  /** Money per unit of outcome. */
  readonly threshold: number;
  readonly trace?: boolean;
}

export interface AppraisedStrategy {
  readonly id: string;
  readonly name: string;
  /** Money per person. */
  readonly cost: number;
  /** Primary outcome per person, in its own direction. */
  readonly outcome: number;
  /** Undiscounted. */
  readonly lifeYears: number;
  readonly status: IncrementalRow['status'];
  /** Money per unit of health gained against `against`; null where there is none. */
  readonly icer: number | null;
  readonly against: string | null;
  readonly tiedWith: string | null;
  /** Money per person at the threshold. */
  readonly nmb: number;
  readonly byProfile: readonly ProfileTotals[];
  readonly byPayoff: readonly PayoffTotal[];
  /** Occupancy by cycle, states in document order. */
  readonly trace?: readonly (readonly number[])[];
}

export interface AppraisedPsa {
  readonly samples: number;
  readonly strategies: readonly {
    readonly id: string;
    readonly cost: number;
    readonly outcome: number;
    readonly costSe: number | null;
    readonly outcomeSe: number | null;
    /** 95% interval of the draws. */
    readonly costInterval: readonly [number, number];
    readonly outcomeInterval: readonly [number, number];
    readonly probabilityBest: number;
    readonly expectedLoss: number;
  }[];
  readonly evpi: {
    readonly perPerson: number;
    readonly standardError: number | null;
    /** For all whom the decision affects; null where the question does not say who. */
    readonly population: number | null;
  };
  /** What went wrong in some draws, counted; such draws are kept as they came out. */
  readonly problems: readonly Issue[];
}

export interface Appraisal {
  readonly document: string;
  readonly engine: string;
  readonly settings: AppraiseSettings & { readonly comparator: string; readonly states?: string[] };
  readonly strategies: readonly AppraisedStrategy[];
  readonly psa?: AppraisedPsa;
  readonly digest: string;
}

/** @throws DocumentError where the base case is broken, as by a remainder below 0 */
export function appraise(
  document: ModelDocument,
  engine: Engine,
  settings: AppraiseSettings,
): Appraisal {
  const { samples, seed, plan, threshold, trace = false } = settings;
  const base = engine.base({ trace });
  if (hasErrors(base.problems)) throw new DocumentError(base.problems);
  const strategies = appraiseBase(document, base, threshold);
  const psa = samples > 0 ? appraiseDraws(document, engine, settings) : undefined;
  const results = { strategies, ...(psa ? { psa } : {}) };
  return {
    document: digestOf(document),
    engine: ENGINE_VERSION,
    settings: {
      samples,
      seed,
      plan,
      threshold,
      comparator: document.question.comparator,
      ...(trace ? { states: document.states.map(({ id }) => id) } : {}),
    },
    ...results,
    digest: digestOfResults(results),
  };
}

/** The base case by strategy, in document order, with its place on the frontier. */
export function appraiseBase(
  document: ModelDocument,
  base: BaseRun,
  threshold: number,
): AppraisedStrategy[] {
  const options = optionsOf(document, base.strategies);
  const rows = new Map(incremental(options).map((row) => [row.id, row]));
  return base.strategies.map((run, index) => {
    const { status, icer, against, tiedWith } = rows.get(run.id) as IncrementalRow;
    const option = options[index] as (typeof options)[number];
    const { id, cost, outcome, lifeYears, byProfile, byPayoff, trace } = run;
    return {
      id,
      name: document.strategies[index]?.label ?? id,
      ...{ cost, outcome, lifeYears, status, icer, against, tiedWith },
      nmb: netMonetaryBenefit(option, threshold),
      ...{ byProfile, byPayoff, ...(trace ? { trace } : {}) },
    };
  });
}

/** All draws, block by block. */
export function runDraws(engine: Engine, settings: SamplingSettings): DrawsBlock[] {
  const blocks: DrawsBlock[] = [];
  for (let from = 0; from < settings.samples; from += BLOCK_DRAWS) {
    blocks.push(engine.draws(settings, from, Math.min(from + BLOCK_DRAWS, settings.samples)));
  }
  return blocks;
}

function appraiseDraws(
  document: ModelDocument,
  engine: Engine,
  settings: AppraiseSettings,
): AppraisedPsa {
  const blocks = runDraws(engine, settings);
  const { question } = document;
  const { direction } = question.outcome;
  const ids = document.strategies.map(({ id }) => id);
  const draws = joinBlocks(ids, blocks, direction);
  const swept = sweep(draws, [settings.threshold]);
  const point = swept.points[0] as (typeof swept.points)[number];
  const [value] = evpi(swept);
  const perPerson = value?.perPerson ?? 0;
  return {
    samples: settings.samples,
    strategies: means(draws, question.comparator, settings.threshold).map((row, index) => ({
      id: row.strategy,
      cost: row.cost.mean,
      outcome: toHealth(row.health.mean, direction),
      costSe: row.cost.se,
      outcomeSe: row.health.se,
      costInterval: [row.cost.low, row.cost.high],
      outcomeInterval: outcomeInterval(row.health, question),
      probabilityBest: point.probability[index] as number,
      expectedLoss: point.expectedLoss[index] as number,
    })),
    evpi: {
      perPerson,
      standardError: value?.standardError ?? null,
      population: question.beneficiaries
        ? perPerson * affectedPopulation(question.beneficiaries, 'startOfYear')
        : null,
    },
    problems: mergeProblems(blocks.map(({ problems }) => problems)),
  };
}

/** Turned back into the outcome's own direction, lower end first. */
function outcomeInterval(
  { low, high }: { readonly low: number; readonly high: number },
  { outcome }: Question,
): readonly [number, number] {
  const ends = [toHealth(low, outcome.direction), toHealth(high, outcome.direction)];
  return [Math.min(...ends), Math.max(...ends)];
}
