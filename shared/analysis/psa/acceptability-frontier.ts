/**
 * Cost-effectiveness acceptability frontier (CEAF): at each threshold the strategy of
 * the highest mean net benefit, and the probability that it is best. It need not be the
 * strategy that is most probably best.
 * Source: Fenwick, Claxton and Sculpher 2001, Health Economics 10:779-787 (from memory).
 */
import type { Sweep } from './sweep.ts';

export interface AcceptabilityFrontierPoint {
  readonly threshold: number;
  readonly strategy: string;
  readonly probability: number;
}

export function acceptabilityFrontier({ strategies, points }: Sweep): AcceptabilityFrontierPoint[] {
  return points.map(({ threshold, best, probability }) => ({
    threshold,
    strategy: strategies[best] as string,
    probability: probability[best] as number,
  }));
}
