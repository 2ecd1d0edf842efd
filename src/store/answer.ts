/**
 * The answer at one threshold: what the strip, the beam and the table show. Costs and
 * health are the base case's or the means of the draws; the chances are the draws' own.
 */

import { againstComparator } from '../../shared/analysis/against-comparator.ts';
import { optionsOf } from '../../shared/analysis/breakdown/options-of.ts';
import { type IncrementalRow, incremental } from '../../shared/analysis/incremental.ts';
import { netBenefit } from '../../shared/analysis/net-benefit.ts';
import type { Option } from '../../shared/analysis/option.ts';
import { affectedPopulation, forPopulation } from '../../shared/analysis/population.ts';
import type { Draws } from '../../shared/analysis/psa/draws.ts';
import { evpi } from '../../shared/analysis/psa/evpi.ts';
import { summarise } from '../../shared/analysis/psa/means.ts';
import { sweep } from '../../shared/analysis/psa/sweep.ts';
import type { BaseRun } from '../../shared/engine/results.ts';
import type { ModelDocument } from '../../shared/model/document.ts';

export interface Comparison {
  /** In document order. */
  readonly options: readonly Option[];
  /** In order of cost. */
  readonly rows: readonly IncrementalRow[];
  /** Monte Carlo standard errors by strategy; null in the base case, which has none. */
  readonly errors: ReadonlyMap<string, Errors> | null;
}

export interface Errors {
  readonly cost: number | null;
  readonly health: number | null;
}

export interface Estimate {
  readonly value: number;
  /** Monte Carlo standard error; null for one draw. */
  readonly standardError: number | null;
}

export interface Chances {
  /** Share of the draws in which the strategy named in the answer is best. */
  readonly probabilityBest: Estimate;
  /** Money per person. */
  readonly evpi: Estimate;
  /** Money for all who are affected; null where the question does not say how many. */
  readonly populationEvpi: Estimate | null;
  /** Strategy best on the mean of the draws, where it is not the one named. */
  readonly bestOnMean: string | null;
}

export interface Answer {
  readonly threshold: number;
  readonly best: string;
  /** Others as good as the best, up to rounding. */
  readonly tied: readonly string[];
  /** Incremental net monetary benefit of the best against the comparator, money per person. */
  readonly netBenefit: number;
  /** Net monetary benefit of each strategy, money per person. */
  readonly nmb: ReadonlyMap<string, number>;
  /** Null until the draws are there. */
  readonly chances: Chances | null;
}

/** @throws DocumentError `analysis.notFinite` */
export function compare(document: ModelDocument, base: BaseRun): Comparison {
  const options = optionsOf(document, base.strategies);
  return { options, rows: incremental(options), errors: null };
}

/** The same comparison on the means over the draws, as many reference cases ask for. */
export function compareMeans(draws: Draws): Comparison {
  const options = draws.strategies.map((id, s) => {
    const cost = summarise(draws.cost[s] ?? new Float64Array());
    const health = summarise(draws.health[s] ?? new Float64Array());
    return {
      id,
      cost: cost.mean,
      health: health.mean,
      errors: { cost: cost.se, health: health.se },
    };
  });
  const errors = new Map(options.map((option) => [option.id, option.errors]));
  return { options, rows: incremental(options), errors };
}

/** @param threshold money per unit of health, 0 or more. */
export function answerAt(
  document: ModelDocument,
  { options }: Comparison,
  draws: Draws | null,
  threshold: number,
): Answer {
  const { rows, best, tied } = netBenefit(options, threshold);
  const chosen = best ?? document.question.comparator;
  const against = againstComparator(options, document.question.comparator, threshold);
  return {
    threshold,
    best: chosen,
    tied: tied.filter((id) => id !== chosen),
    netBenefit: against.find(({ id }) => id === chosen)?.inmb ?? 0,
    nmb: new Map(rows.map((row) => [row.id, row.nmb])),
    chances: draws && chancesAt(document, draws, threshold, chosen),
  };
}

function chancesAt(
  document: ModelDocument,
  draws: Draws,
  threshold: number,
  chosen: string,
): Chances {
  const swept = sweep(draws, [threshold]);
  const point = swept.points[0];
  const value = evpi(swept)[0];
  if (!point || !value) throw new RangeError('one threshold gives one point');
  const probability = point.probability[draws.strategies.indexOf(chosen)] ?? 0;
  const perPerson = { value: value.perPerson, standardError: value.standardError };
  const { beneficiaries } = document.question;
  const onMean = draws.strategies[point.best] ?? chosen;
  return {
    probabilityBest: { value: probability, standardError: shareError(probability, swept.draws) },
    evpi: perPerson,
    populationEvpi: beneficiaries
      ? forPopulation(perPerson, affectedPopulation(beneficiaries, 'startOfYear'))
      : null,
    bestOnMean: onMean === chosen ? null : onMean,
  };
}

/** Standard error of a share of n independent draws. */
function shareError(share: number, draws: number): number | null {
  return draws < 2 ? null : Math.sqrt((share * (1 - share)) / draws);
}
