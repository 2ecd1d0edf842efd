/**
 * Each strategy against the comparator of the question. A ratio stands only where it
 * can be read: gains that cost money have an ICER, savings that lose health have money
 * saved per unit of health lost, all else is a word.
 */
import { netMonetaryBenefit } from './net-benefit.ts';
import { type Option, requireFinite } from './option.ts';
import { difference } from './tie.ts';

export type AgainstWord =
  | 'comparator'
  /** Same cost and same health, up to rounding. */
  | 'noDifference'
  /** Costs no more and gains no less, one of them strictly. */
  | 'dominates'
  /** Costs no less and gains no more, one of them strictly. */
  | 'dominated'
  | 'moreCostlyMoreEffective'
  | 'lessCostlyLessEffective';

export interface AgainstRow {
  readonly id: string;
  readonly incrementalCost: number;
  readonly incrementalHealth: number;
  readonly word: AgainstWord;
  /** Money per unit of health gained; with `moreCostlyMoreEffective` only. */
  readonly icer: number | null;
  /** Money saved per unit of health lost; with `lessCostlyLessEffective` only. */
  readonly savingsPerUnitLost: number | null;
  /** Incremental net monetary benefit at the threshold, money per person. */
  readonly inmb: number;
}

/**
 * Rows in the order given, the comparator among them.
 * @param comparator id of one of the options.
 * @param threshold 0 or more, finite.
 * @throws DocumentError `analysis.notFinite`; RangeError where the comparator is missing.
 */
export function againstComparator(
  options: readonly Option[],
  comparator: string,
  threshold: number,
): AgainstRow[] {
  requireFinite(options);
  const base = options.find(({ id }) => id === comparator);
  if (base === undefined) throw new RangeError(`comparator ${comparator}`);
  return options.map((option) => weigh(option, base, threshold));
}

function weigh(option: Option, base: Option, threshold: number): AgainstRow {
  const cost = difference(option.cost, base.cost);
  const health = difference(option.health, base.health);
  const word = option.id === base.id ? 'comparator' : wordFor(cost, health);
  const ratio = cost / health;
  const readable = Number.isFinite(ratio) ? ratio : null;
  return {
    id: option.id,
    incrementalCost: cost,
    incrementalHealth: health,
    word,
    icer: word === 'moreCostlyMoreEffective' ? readable : null,
    savingsPerUnitLost: word === 'lessCostlyLessEffective' ? readable : null,
    inmb: netMonetaryBenefit({ cost, health }, threshold),
  };
}

function wordFor(cost: number, health: number): AgainstWord {
  if (cost === 0 && health === 0) return 'noDifference';
  if (cost <= 0 && health >= 0) return 'dominates';
  if (cost >= 0 && health <= 0) return 'dominated';
  return cost > 0 ? 'moreCostlyMoreEffective' : 'lessCostlyLessEffective';
}
