/**
 * Expected loss curves: by strategy and threshold, the net benefit forgone on average
 * by choosing it where another turns out best. The lowest is that of the strategy of
 * the highest mean net benefit, and equals the EVPI.
 * Source: Alarid-Escudero et al. 2019, Value in Health 22:611-618 (from memory).
 */
import type { Sweep } from './sweep.ts';

export interface ExpectedLossCurve {
  readonly strategy: string;
  /** Money per person, one a threshold of the sweep. */
  readonly losses: readonly number[];
}

export function expectedLoss({ strategies, points }: Sweep): ExpectedLossCurve[] {
  return strategies.map((strategy, s) => ({
    strategy,
    losses: points.map((point) => point.expectedLoss[s] as number),
  }));
}
