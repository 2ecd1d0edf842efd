/** What each word of the formula language means for plain numbers, from the definitions. */
import { lowerGamma, normalCdf, upperGamma } from './special.ts';

type Meaning = (...args: number[]) => number;

const bit = (truth: boolean): number => (truth ? 1 : 0);

const operators: Record<string, Meaning> = {
  add: (a = 0, b = 0) => a + b,
  subtract: (a = 0, b = 0) => a - b,
  multiply: (a = 0, b = 0) => a * b,
  divide: (a = 0, b = 0) => a / b,
  power: (a = 0, b = 0) => a ** b,
  negate: (a = 0) => -a,
  less: (a = 0, b = 0) => bit(a < b),
  less_equal: (a = 0, b = 0) => bit(a <= b),
  greater: (a = 0, b = 0) => bit(a > b),
  greater_equal: (a = 0, b = 0) => bit(a >= b),
  equal: (a = 0, b = 0) => bit(a === b),
  not_equal: (a = 0, b = 0) => bit(a !== b),
  and: (a = 0, b = 0) => bit(a !== 0 && b !== 0),
  or: (a = 0, b = 0) => bit(a !== 0 || b !== 0),
  not: (a = 0) => bit(a === 0),
};

const arithmetic: Record<string, Meaning> = {
  min: (...list) => Math.min(...list),
  max: (...list) => Math.max(...list),
  sum: (...list) => list.reduce((a, b) => a + b, 0),
  product: (...list) => list.reduce((a, b) => a * b, 1),
  abs: (a = 0) => (a < 0 ? -a : a),
  exp: (a = 0) => Math.exp(a),
  ln: (a = 0) => Math.log(a),
  log10: (a = 0) => Math.log10(a),
  sqrt: (a = 0) => Math.sqrt(a),
  floor: (a = 0) => Math.floor(a),
  round: (a = 0) => Math.round(a),
  clamp: (a = 0, low = 0, high = 0) => Math.min(Math.max(a, low), high),
};

const conversions: Record<string, Meaning> = {
  chance: (rate = 0, years = 0) => 1 - Math.exp(-rate * years),
  hazard: (p = 0, years = 0) => -Math.log(1 - p) / years,
  rescale: (p = 0, from = 0, to = 0) => 1 - (1 - p) ** (to / from),
  odds: (p = 0) => p / (1 - p),
  chance_of: (odds = 0) => odds / (1 + odds),
  log_odds: (p = 0) => Math.log(p / (1 - p)),
  chance_of_log_odds: (x = 0) => 1 / (1 + Math.exp(-x)),
  standard_normal: (x = 0) => normalCdf(x),
  times_risk: (p = 0, ratio = 0) => p * ratio,
  times_odds: (p = 0, ratio = 0) => (p * ratio) / (1 - p + p * ratio),
  times_hazard: (p = 0, ratio = 0) => 1 - (1 - p) ** ratio,
  competing: (rate = 0, total = 0, years = 0) =>
    total === 0 ? 0 : (rate / total) * (1 - Math.exp(-total * years)),
  event_by: (now = 0, then = 0) => 1 - then / now,
};

/** Survival functions; all give 1 at time 0. */
const survival: Record<string, Meaning> = {
  alive_exponential: (t = 0, rate = 0) => Math.exp(-rate * t),
  alive_weibull: (t = 0, shape = 0, scale = 0) => Math.exp(-((t / scale) ** shape)),
  alive_gompertz: (t = 0, shape = 0, rate = 0) =>
    shape === 0 ? Math.exp(-rate * t) : Math.exp(-(rate / shape) * (Math.exp(shape * t) - 1)),
  alive_lognormal: (t = 0, meanlog = 0, sdlog = 0) =>
    t <= 0 ? 1 : normalCdf(-(Math.log(t) - meanlog) / sdlog),
  alive_loglogistic: (t = 0, shape = 0, scale = 0) => 1 / (1 + (t / scale) ** shape),
  alive_generalised_gamma: (t = 0, mu = 0, sigma = 0, q = 0) => {
    if (t <= 0) return 1;
    const w = (Math.log(t) - mu) / sigma;
    if (q === 0) return normalCdf(-w);
    const u = Math.exp(q * w) / (q * q);
    return q > 0 ? upperGamma(1 / (q * q), u) : lowerGamma(1 / (q * q), u);
  },
};

const MEANINGS = new Map<string, Meaning>(
  [operators, arithmetic, conversions, survival].flatMap((group) => Object.entries(group)),
);

export function apply(fn: string, args: readonly number[]): number {
  const meaning = MEANINGS.get(fn);
  if (!meaning) throw new Error(`the reference does not know ${fn}`);
  return meaning(...args);
}
