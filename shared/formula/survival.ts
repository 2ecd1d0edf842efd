/**
 * Survival functions S(time): the probability of no event by `time`, 1 at and
 * before time 0. Times and scales share one unit (years in a model); parameters
 * as in R's d/p/q functions, Gompertz by its hazard rate exp(shape time).
 * Outside its domain a function gives NaN or a value past 1, never an error.
 * Source: Collett 2015, Modelling Survival Data in Medical Research, chapters 5
 * and 6; generalised gamma: Prentice 1974, Biometrika 61:539-544.
 */
import normalCdf from '@stdlib/stats-base-dists-normal-cdf';
import { gammaTails } from './incomplete-gamma.ts';

/** Nothing has happened before the clock starts. */
const since = (time: number): number => Math.max(time, 0);

/** exp(-rate time); rate 0 or more, a unit of time. */
export const aliveExponential = (time: number, rate: number): number =>
  Math.exp(-rate * since(time));

/** exp(-(time / scale)^shape); shape and scale above 0. */
export const aliveWeibull = (time: number, shape: number, scale: number): number =>
  Math.exp(-((since(time) / scale) ** shape));

/** exp(-(rate / shape) (exp(shape time) - 1)); rate above 0, any shape, exponential at 0. */
export const aliveGompertz = (time: number, shape: number, rate: number): number => {
  if (shape === 0) return aliveExponential(time, rate);
  return Math.exp(-rate * (Math.expm1(shape * since(time)) / shape));
};

/** Normal upper tail at (ln time - meanlog) / sdlog; sdlog above 0. */
export const aliveLognormal = (time: number, meanlog: number, sdlog: number): number =>
  normalCdf(-(Math.log(since(time)) - meanlog) / sdlog, 0, 1);

/** 1 / (1 + (time / scale)^shape); shape and scale above 0. */
export const aliveLoglogistic = (time: number, shape: number, scale: number): number =>
  1 / (1 + (since(time) / scale) ** shape);

/**
 * With w = (ln time - mu) / sigma: the upper tail (q > 0) or lower tail (q < 0) of a
 * gamma variable of shape 1/q^2 at exp(q w)/q^2; log-normal at q = 0. Sigma above 0.
 */
export const aliveGeneralisedGamma = (
  time: number,
  mu: number,
  sigma: number,
  q: number,
): number => {
  if (Math.abs(q) < 1e-100) return aliveLognormal(time, mu, sigma);
  if (time <= 0) return 1;
  const tails = gammaTails(1 / (q * q), (q * (Math.log(time) - mu)) / sigma);
  return q > 0 ? tails.upper : tails.lower;
};
