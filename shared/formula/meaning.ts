/**
 * What every operator and function of a formula means, on plain numbers: the
 * definition that folded constants, explanations and the engine's columns share.
 * `lookup` is not here: its meaning is in the table (shared/engine/lookup.ts).
 */
import { choose, clamp, operators, product, round, sum } from './arithmetic.ts';
import * as conversions from './conversions.ts';
import * as survival from './survival.ts';

export type Meaning = (...args: number[]) => number;

/** By the name in `CallExpr.fn`. Callers pass as many arguments as FUNCTIONS allows. */
export const MEANING: ReadonlyMap<string, Meaning> = new Map(
  Object.entries<Meaning>({
    ...operators,
    if: choose,
    min: Math.min,
    max: Math.max,
    sum,
    product,
    abs: Math.abs,
    exp: Math.exp,
    ln: Math.log,
    log10: Math.log10,
    sqrt: Math.sqrt,
    floor: Math.floor,
    round,
    clamp,
    chance: conversions.chance,
    hazard: conversions.hazard,
    rescale: conversions.rescale,
    odds: conversions.odds,
    chance_of: conversions.chanceOf,
    log_odds: conversions.logOdds,
    chance_of_log_odds: conversions.chanceOfLogOdds,
    standard_normal: conversions.standardNormal,
    times_risk: conversions.timesRisk,
    times_odds: conversions.timesOdds,
    times_hazard: conversions.timesHazard,
    competing: conversions.competing,
    event_by: conversions.eventBy,
    alive_exponential: survival.aliveExponential,
    alive_weibull: survival.aliveWeibull,
    alive_gompertz: survival.aliveGompertz,
    alive_lognormal: survival.aliveLognormal,
    alive_loglogistic: survival.aliveLoglogistic,
    alive_generalised_gamma: survival.aliveGeneralisedGamma,
  }),
);
