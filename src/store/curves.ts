/**
 * What the draws say at every threshold along the arm, worked out once for a document and
 * its draws: moving the poise reads it, and simulates nothing.
 */
import { affectedPopulation } from '../../shared/analysis/population.ts';
import { type AcceptabilityCurve, acceptability } from '../../shared/analysis/psa/acceptability.ts';
import {
  type AcceptabilityFrontierPoint,
  acceptabilityFrontier,
} from '../../shared/analysis/psa/acceptability-frontier.ts';
import type { Draws } from '../../shared/analysis/psa/draws.ts';
import { type EvpiPoint, evpi } from '../../shared/analysis/psa/evpi.ts';
import { type ExpectedLossCurve, expectedLoss } from '../../shared/analysis/psa/expected-loss.ts';
import { sweep } from '../../shared/analysis/psa/sweep.ts';
import type { Question } from '../../shared/model/document.ts';

export interface Curves {
  /** Money per unit of health, rising from 0. */
  readonly thresholds: readonly number[];
  readonly acceptability: readonly AcceptabilityCurve[];
  readonly frontier: readonly AcceptabilityFrontierPoint[];
  readonly losses: readonly ExpectedLossCurve[];
  readonly evpi: readonly EvpiPoint[];
}

const kept = new WeakMap<Draws, Map<string, Curves>>();

/** @param thresholds rising from 0, money per unit of health */
export function curvesOf(draws: Draws, thresholds: readonly number[]): Curves {
  const known = kept.get(draws) ?? new Map<string, Curves>();
  kept.set(draws, known);
  const key = thresholds.join();
  const found = known.get(key) ?? makeCurves(draws, thresholds);
  known.set(key, found);
  return found;
}

/** The same at one threshold. */
export function curvesAt(draws: Draws, threshold: number): Curves {
  return makeCurves(draws, [threshold]);
}

function makeCurves(draws: Draws, thresholds: readonly number[]): Curves {
  const swept = sweep(draws, thresholds);
  return {
    thresholds,
    acceptability: acceptability(swept),
    frontier: acceptabilityFrontier(swept),
    losses: expectedLoss(swept),
    evpi: evpi(swept),
  };
}

/** Persons whom the decision affects, discounted; null where the question does not say. */
export function personsAffected({ beneficiaries }: Question): number | null {
  return beneficiaries ? affectedPopulation(beneficiaries, 'startOfYear') : null;
}
