/** The base case as all parts of the brief read it. */
import { optionsOf } from '../../analysis/breakdown/options-of.ts';
import { type IncrementalRow, incremental } from '../../analysis/incremental.ts';
import { type NetBenefits, netBenefit } from '../../analysis/net-benefit.ts';
import type { Option } from '../../analysis/option.ts';
import type { BaseRun } from '../../engine/results.ts';
import type { ModelDocument } from '../../model/document.ts';

export interface BriefCase {
  readonly document: ModelDocument;
  readonly base: BaseRun;
  /** Money per unit of health. */
  readonly threshold: number;
  /** In document order. */
  readonly options: readonly Option[];
  /** In order of cost. */
  readonly rows: readonly IncrementalRow[];
  readonly benefits: NetBenefits;
  /** Id of the best at the threshold. */
  readonly best: string;
}

/** @throws DocumentError `analysis.notFinite` */
export function briefCase(document: ModelDocument, base: BaseRun, threshold: number): BriefCase {
  const options = optionsOf(document, base.strategies);
  const benefits = netBenefit(options, threshold);
  const best = benefits.best ?? document.question.comparator;
  return { document, base, threshold, options, rows: incremental(options), benefits, best };
}
