/** The incremental analysis of each profile on its own: for whom is which strategy best? */
import type { BaseRun } from '../../engine/results.ts';
import type { ModelDocument } from '../../model/document.ts';
import { type AgainstRow, againstComparator } from '../against-comparator.ts';
import { type IncrementalRow, incremental } from '../incremental.ts';
import { netBenefit } from '../net-benefit.ts';
import { optionsOf } from './options-of.ts';

export interface ProfileResult {
  /** Profile's id, or null for the whole population. */
  readonly profile: string | null;
  /** Share of the population, 0 to 1. */
  readonly share: number;
  /** In order of cost. */
  readonly rows: readonly IncrementalRow[];
  /** In document order. */
  readonly against: readonly AgainstRow[];
  /** Best at the threshold. */
  readonly best: string | null;
  readonly tied: readonly string[];
}

/**
 * The whole population first, then each profile in document order.
 * @param threshold money per unit of health, 0 or more
 * @throws DocumentError `analysis.notFinite`
 */
export function incrementalByProfile(
  document: ModelDocument,
  base: BaseRun,
  threshold: number,
): ProfileResult[] {
  const whole = resultOf(document, null, 1, base.strategies, threshold);
  const each = document.profiles.map(({ id, share }, index) => {
    const own = base.strategies.map((run) => {
      const { cost, outcome } = run.byProfile[index] as (typeof run.byProfile)[number];
      return { id: run.id, cost, outcome };
    });
    return resultOf(document, id, share, own, threshold);
  });
  return [whole, ...each];
}

function resultOf(
  document: ModelDocument,
  profile: string | null,
  share: number,
  results: Parameters<typeof optionsOf>[1],
  threshold: number,
): ProfileResult {
  const options = optionsOf(document, results);
  const { best, tied } = netBenefit(options, threshold);
  return {
    profile,
    share,
    rows: incremental(options),
    against: againstComparator(options, document.question.comparator, threshold),
    best,
    tied,
  };
}
