/** Beta for a probability from events among n. */
import { type Fitted, fitted, refused } from './fitted.ts';

/**
 * What is added to events and to non-events: `none` (the counts themselves; improper prior),
 * `uniform` (1 and 1: Bayes, Laplace), `jeffreys` (1/2 and 1/2: Jeffreys 1946).
 */
export type CountPrior = 'none' | 'uniform' | 'jeffreys';

const ADDED: Readonly<Record<CountPrior, number>> = { none: 0, uniform: 1, jeffreys: 0.5 };

/**
 * alpha = events + added, beta = n - events + added. Refused: `fit.counts` (not
 * 0 <= events <= n, or n not > 0), `fit.improper` (no prior, and no events or only events).
 */
export function betaFromCounts(of: {
  events: number;
  n: number;
  prior: CountPrior;
}): Fitted<'beta'> {
  const { events, n, prior } = of;
  if (!(n > 0 && n < Infinity && events >= 0 && events <= n)) {
    return refused('fit.counts', { events, n });
  }
  const alpha = events + ADDED[prior];
  const beta = n - events + ADDED[prior];
  if (alpha === 0 || beta === 0) return refused('fit.improper', { events, n });
  return fitted<'beta'>({ type: 'beta', alpha, beta });
}
