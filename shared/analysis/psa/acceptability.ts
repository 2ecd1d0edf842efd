/**
 * Cost-effectiveness acceptability curves (CEAC): by strategy and threshold, the share
 * of draws in which it has the highest net benefit. Where strategies tie in a draw they
 * share it, so that the curves sum to 1 and do not depend on the order of strategies.
 * Source: Fenwick, Claxton and Sculpher 2001, Health Economics 10:779-787 (from memory).
 */
import type { Sweep } from './sweep.ts';

export interface AcceptabilityCurve {
  readonly strategy: string;
  /** One a threshold of the sweep. */
  readonly probabilities: readonly number[];
}

export function acceptability({ strategies, points }: Sweep): AcceptabilityCurve[] {
  return strategies.map((strategy, s) => ({
    strategy,
    probabilities: points.map(({ probability }) => probability[s] as number),
  }));
}
