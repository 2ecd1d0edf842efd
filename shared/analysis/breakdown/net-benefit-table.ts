/** Net benefit of every strategy at several thresholds. */
import type { BaseRun } from '../../engine/results.ts';
import type { ModelDocument } from '../../model/document.ts';
import { againstComparator } from '../against-comparator.ts';
import { netBenefit } from '../net-benefit.ts';
import { optionsOf } from './options-of.ts';

export interface NetBenefitCell {
  readonly id: string;
  /** Net monetary benefit, money per person. */
  readonly nmb: number;
  /** Net health benefit, units of health per person; null at a threshold of 0. */
  readonly nhb: number | null;
  /** Incremental net monetary benefit against the comparator. */
  readonly inmb: number;
}

export interface NetBenefitColumn {
  readonly threshold: number;
  /** In document order. */
  readonly cells: readonly NetBenefitCell[];
  readonly best: string | null;
  /** All that are best up to rounding. */
  readonly tied: readonly string[];
}

/**
 * One column a threshold, in the order given.
 * @param thresholds money per unit of health, each 0 or more
 * @throws DocumentError `analysis.notFinite`
 */
export function netBenefitTable(
  document: ModelDocument,
  base: BaseRun,
  thresholds: readonly number[],
): NetBenefitColumn[] {
  const options = optionsOf(document, base.strategies);
  const { comparator } = document.question;
  return thresholds.map((threshold) => {
    const { rows, best, tied } = netBenefit(options, threshold);
    const against = againstComparator(options, comparator, threshold);
    const cells = rows.map(({ id, nmb, nhb }, index) => ({
      ...{ id, nmb, nhb },
      inmb: against[index]?.inmb ?? Number.NaN,
    }));
    return { threshold, cells, best, tied };
  });
}
