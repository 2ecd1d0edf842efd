/**
 * Between rates, probabilities and odds, and treatment effects on them. A `p` is a
 * probability in [0, 1] within a stated time, a rate is events per person-year at a
 * constant hazard, times are years (of `rescale`: both in one unit, whichever).
 * Outside these domains the result is whatever the formula gives (NaN, infinite or
 * past 1) and is reported where it is used; nothing is clipped.
 * Source: Briggs, Claxton and Sculpher 2006, chapters 2 and 3, but where said.
 */
import normalCdf from '@stdlib/stats-base-dists-normal-cdf';

/** Probability of an event within `years` at a constant rate: 1 - exp(-rate years). */
export const chance = (rate: number, years: number): number => -Math.expm1(-rate * years);

/** Constant yearly rate that gives probability `p` within `years`: -ln(1 - p) / years. */
export const hazard = (p: number, years: number): number => -Math.log1p(-p) / years;

/** Probability within `to` from the one within `from`, constant rate: 1 - (1 - p)^(to/from). */
export const rescale = (p: number, from: number, to: number): number =>
  -Math.expm1(Math.log1p(-p) * (to / from));

/** p / (1 - p); infinite at 1. */
export const odds = (p: number): number => p / (1 - p);

/** Probability with these odds: odds / (1 + odds); 1 for infinite odds. */
export const chanceOf = (value: number): number =>
  value === Number.POSITIVE_INFINITY ? 1 : value / (1 + value);

/** ln(p / (1 - p)). */
export const logOdds = (p: number): number => Math.log(p) - Math.log1p(-p);

/** Inverse of `logOdds`: 1 / (1 + exp(-x)). */
export const chanceOfLogOdds = (x: number): number => 1 / (1 + Math.exp(-x));

/** Standard normal distribution function, for probit predictors. */
export const standardNormal = (x: number): number => normalCdf(x, 0, 1);

/** Relative risk on a probability: p ratio; may pass 1, where the ratio cannot hold. */
export const timesRisk = (p: number, ratio: number): number => p * ratio;

/** Odds ratio on a probability: p ratio / (1 - p + p ratio). */
export const timesOdds = (p: number, ratio: number): number => {
  const raised = p * ratio;
  return raised / (1 - p + raised);
};

/** Hazard (or rate) ratio on a probability, proportional hazards: 1 - (1 - p)^ratio. */
export const timesHazard = (p: number, ratio: number): number =>
  -Math.expm1(ratio * Math.log1p(-p));

/**
 * Probability that the event of `rate`, among competing events of `total` rate in
 * all, comes first and within `years`: rate / total (1 - exp(-total years)); its
 * limit, rate years, at a total of 0. Source: Putter, Fiocco and Geskus 2007.
 */
export const competing = (rate: number, total: number, years: number): number =>
  total === 0 ? rate * years : (rate * -Math.expm1(-total * years)) / total;

/**
 * Probability of the event between two times, given none before the first, from
 * survival at each: 1 - then / now. Where nobody is left (`now` 0) it is 1.
 */
export const eventBy = (now: number, then: number): number => (now === 0 ? 1 : (now - then) / now);
