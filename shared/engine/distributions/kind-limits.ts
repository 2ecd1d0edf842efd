/** Values that a quantity of each kind can have; see shared/model/kinds.ts. */
import type { Distribution } from '../../model/document.ts';
import type { Kind } from '../../model/kinds.ts';

const ANY = [-Infinity, Infinity] as const;
const SHARE = [0, 1] as const;
const NOT_NEGATIVE = [0, Infinity] as const;

/** Limits included; a utility can be worse than death. */
const KIND_LIMITS: Readonly<Record<Kind, readonly [number, number]>> = {
  probability: SHARE,
  rate: NOT_NEGATIVE,
  perCycle: NOT_NEGATIVE,
  ratio: NOT_NEGATIVE,
  logOdds: ANY,
  utility: [-Infinity, 1],
  disabilityWeight: SHARE,
  costPerYear: ANY,
  costPerCycle: ANY,
  costOnce: ANY,
  money: ANY,
  time: NOT_NEGATIVE,
  count: NOT_NEGATIVE,
  number: ANY,
};

const COSTS: readonly Kind[] = ['costPerYear', 'costPerCycle', 'costOnce', 'money'];

/**
 * Smallest and largest value for the kind. Money may be negative (a saving), but not where
 * the base value is a cost: draws would turn it into a saving unsaid.
 */
export function kindLimits(kind: Kind, value: number): readonly [number, number] {
  return COSTS.includes(kind) && value >= 0 ? NOT_NEGATIVE : KIND_LIMITS[kind];
}

const BETA_KINDS: readonly Kind[] = ['probability', 'utility', 'disabilityWeight', 'number'];

/** True for a distribution that can never reach values that the kind is about. */
export function isUnusual(type: Distribution['type'], kind: Kind): boolean {
  return type === 'beta' && !BETA_KINDS.includes(kind);
}
