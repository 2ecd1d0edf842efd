/**
 * Expected value of perfect information (EVPI) per person: the mean of the highest net
 * benefit of each draw less the highest mean net benefit.
 * Source: Briggs, Claxton and Sculpher 2006; Rothery et al. 2020 (from memory).
 */
import type { Sweep } from './sweep.ts';

export interface EvpiPoint {
  readonly threshold: number;
  /** Money per person, 0 or more. */
  readonly perPerson: number;
  /**
   * Monte Carlo standard error of the mean loss of the strategy best on average; null
   * for one draw. It leaves out that the draws also chose that strategy.
   */
  readonly standardError: number | null;
}

export function evpi({ points }: Sweep): EvpiPoint[] {
  return points.map(({ threshold, best, expectedLoss, lossSe }) => ({
    threshold,
    perPerson: expectedLoss[best] as number,
    standardError: lossSe,
  }));
}
