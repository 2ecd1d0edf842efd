/**
 * Random formulas that mean something: a probability stays in [0, 1], a rate and a
 * ratio above 0, whatever the parameters are drawn as.
 */
import type { Seeded } from './seeded.ts';

export const SORTS = [
  'probability',
  'rate',
  'ratio',
  'logOdds',
  'utility',
  'costPerYear',
  'costPerCycle',
  'costOnce',
] as const;
export type Sort = (typeof SORTS)[number];

/** A name that formulas may use. */
export interface Word {
  readonly symbol: string;
  readonly sort: Sort;
  /** It uses `time_in_state`, so it belongs to timed states only. */
  readonly timed?: boolean;
  /** A table's key expressions; absent for parameters and variables. */
  readonly keys?: readonly string[];
}

export interface Writer {
  readonly random: Seeded;
  readonly words: readonly Word[];
  /** Symbols of covariates that are 0 or 1. */
  readonly flags: readonly string[];
  /** Whether `time_in_state` has a meaning here. */
  readonly timed: boolean;
}

const LITERALS: Record<Sort, readonly [number, number]> = {
  probability: [0.01, 0.6],
  rate: [0.01, 0.8],
  ratio: [0.4, 1.6],
  logOdds: [-3, 1],
  utility: [0.1, 1],
  costPerYear: [10, 5000],
  costPerCycle: [1, 400],
  costOnce: [50, 9000],
};

type Form = (writer: Writer, depth: number) => string;

const of =
  (sort: Sort): Form =>
  (writer, depth) =>
    write(writer, sort, depth);
const P = of('probability');
const R = of('rate');
const X = of('ratio');
const L = of('logOdds');

/** A probability that is neither 0 nor 1, for odds and hazards. */
const inner: Form = (w, d) => `clamp(${P(w, d)}, 0.02, 0.97)`;
const number = (w: Writer, low: number, high: number): string =>
  String(w.random.between(low, high));

/** A time that starts at 0. */
const clock: Form = (w) =>
  w.timed && w.random.happens(0.6)
    ? 'time_in_state'
    : w.random.pick(['time', 'cycle * cycle_length']);

/** Survival to a time; stays well above 0 over the horizons used. */
export function alive(w: Writer, at: string): string {
  return w.random.pick([
    () => `alive_exponential(${at}, ${number(w, 0.02, 0.3)})`,
    () => `alive_weibull(${at}, ${number(w, 0.7, 1.5)}, ${number(w, 6, 30)})`,
    () => `alive_gompertz(${at}, ${number(w, -0.05, 0.1)}, ${number(w, 0.01, 0.1)})`,
    () => `alive_lognormal(${at}, ${number(w, 1.5, 2.5)}, ${number(w, 0.6, 1.2)})`,
    () => `alive_loglogistic(${at}, ${number(w, 0.8, 2.5)}, ${number(w, 3, 20)})`,
    () =>
      `alive_generalised_gamma(${at}, ${number(w, 1.5, 2.5)}, ${number(w, 0.6, 1.1)}, ${w.random.pick(
        [number(w, 0.3, 1.4), number(w, -1.2, -0.3), '0'],
      )})`,
  ])();
}

const eventSoon: Form = (w, d) => {
  const start = clock(w, d);
  if (w.random.happens(0.3)) {
    const shape = number(w, 0.05, 0.09);
    const rate = number(w, 0.00002, 0.0002);
    const at = (then: string) => `alive_gompertz(${then}, ${shape}, ${rate})`;
    return `event_by(${at('age')}, ${at('age + cycle_length')})`;
  }
  const now = alive(w, start);
  return `event_by(${now}, ${now.replace(start, `${start} + cycle_length`)})`;
};

const condition: Form = (w) => {
  const one = (): string =>
    w.random.pick([
      () => `cycle ${w.random.pick(['<', '<=', '>', '>=', '==', '!='])} ${w.random.whole(0, 8)}`,
      () => `time ${w.random.pick(['<', '>='])} ${number(w, 0.05, 6)}`,
      () => `age > ${number(w, 30, 70)}`,
      () => (w.flags.length > 0 ? `${w.random.pick(w.flags)} == 1` : 'true'),
      () => (w.timed ? `time_in_state >= ${number(w, 0.01, 2)}` : 'cycle_length < 1'),
    ])();
  return w.random.pick([
    () => one(),
    () => one(),
    () => `${one()} and ${one()}`,
    () => `${one()} or ${one()}`,
    () => `not (${one()})`,
  ])();
};

const either =
  (sort: Sort): Form =>
  (w, d) =>
    `if(${condition(w, d)}, ${write(w, sort, d)}, ${write(w, sort, d)})`;

const probabilities: readonly Form[] = [
  (w, d) => `chance(${R(w, d)}, cycle_length)`,
  (w, d) => `rescale(${P(w, d)}, ${w.random.pick(['1', '0.5', '5'])}, cycle_length)`,
  (w, d) => `times_hazard(${P(w, d)}, ${X(w, d)})`,
  (w, d) => `min(times_risk(${P(w, d)}, ${X(w, d)}), 1)`,
  (w, d) => `times_odds(${inner(w, d)}, ${X(w, d)})`,
  (w, d) => `chance_of_log_odds(${L(w, d)})`,
  (w, d) => `chance_of(odds(${inner(w, d)}) * ${X(w, d)})`,
  (w, d) => {
    const rate = R(w, d);
    return `competing(${rate}, sum(${rate}, ${R(w, d)}, 0.01), cycle_length)`;
  },
  (w, d) => `standard_normal(${L(w, d)})`,
  (w, d) => `(1 - ${P(w, d)})`,
  (w, d) => `product(${P(w, d)}, ${P(w, d)})`,
  eventSoon,
  eventSoon,
];

const rates: readonly Form[] = [
  (w, d) => `${R(w, d)} * ${X(w, d)}`,
  (w, d) => `${R(w, d)} * exp(${number(w, -0.05, 0.05)} * ${clock(w, d)})`,
  (w, d) => `${R(w, d)} * exp(${number(w, -0.02, 0.02)} * (age - 50))`,
  (w, d) => `hazard(${inner(w, d)}, ${w.random.pick(['1', '2', '0.5'])})`,
  (w, d) => `max(${R(w, d)}, ${R(w, d)})`,
  (w, d) => `sqrt(${R(w, d)} * ${R(w, d)})`,
  (w, d) => `(${R(w, d)}) ^ ${number(w, 0.8, 1.2)}`,
  (w, d) => `if(${condition(w, d)}, ${R(w, d)}, 0)`,
];

const ratios: readonly Form[] = [
  (w, d) => `${X(w, d)} * ${X(w, d)}`,
  (w, d) => `(1 + abs(${X(w, d)} - 1) / 2)`,
  (w, d) => `(1 + log10(1 + ${clock(w, d)}))`,
  (w) =>
    `(${number(w, 0.5, 1)} + ${w.flags.length > 0 ? w.random.pick(w.flags) : number(w, 0.1, 0.5)})`,
  (w, d) => `exp(${number(w, -0.3, 0.3)}) * ${X(w, d)}`,
];

const logOdds: readonly Form[] = [
  (w, d) => `${L(w, d)} + ${L(w, d)}`,
  (w, d) => `${L(w, d)} - ${number(w, 0.1, 0.5)} * (age - 50) / 10`,
  (w, d) => `${L(w, d)} + ${number(w, -0.1, 0.1)} * cycle`,
  (w, d) => `log_odds(${inner(w, d)})`,
  (w, d) => `ln(odds(${inner(w, d)}))`,
  (w, d) => `-(${L(w, d)})`,
  (w, d) => `${L(w, d)} + ln(${X(w, d)})`,
  (w, d) => (w.flags.length > 0 ? `${L(w, d)} + ${L(w, d)} * ${w.random.pick(w.flags)}` : L(w, d)),
];

const utilities: readonly Form[] = [
  (w, d) => `min(${write(w, 'utility', d)}, ${write(w, 'utility', d)})`,
  (w, d) => `${write(w, 'utility', d)} * (1 - 0.002 * (age - 30))`,
  (w, d) => `clamp(${write(w, 'utility', d)}, 0, 0.95)`,
];

const costs = (sort: Sort): readonly Form[] => [
  (w, d) => `${write(w, sort, d)} * ${X(w, d)}`,
  (w, d) => `${write(w, sort, d)} + ${write(w, sort, d)}`,
  (w, d) => `if(${condition(w, d)}, ${write(w, sort, d)}, 0)`,
  (w, d) => `round(${write(w, sort, d)})`,
  (w, d) => `floor(${write(w, sort, d)} / ${number(w, 2, 9)})`,
];

const FORMS: Record<Sort, readonly Form[]> = {
  probability: probabilities,
  rate: rates,
  ratio: ratios,
  logOdds,
  utility: utilities,
  costPerYear: costs('costPerYear'),
  costPerCycle: costs('costPerCycle'),
  costOnce: costs('costOnce'),
};

/** A formula of the sort, nested at most `depth` deep. */
export function write(writer: Writer, sort: Sort, depth: number): string {
  const { random } = writer;
  if (depth <= 0 || random.happens(0.35)) return atom(writer, sort);
  const form = random.happens(0.12) ? either(sort) : random.pick(FORMS[sort]);
  return `(${form(writer, depth - 1)})`;
}

function atom(writer: Writer, sort: Sort): string {
  const { random, words, timed } = writer;
  const fitting = words.filter((word) => word.sort === sort && (timed || !word.timed));
  if (fitting.length === 0 || random.happens(0.15)) {
    const literal = random.between(...LITERALS[sort]);
    return literal < 0 ? `(${literal})` : String(literal);
  }
  const word = random.pick(fitting);
  return word.keys ? `lookup(${word.symbol}, ${word.keys.join(', ')})` : word.symbol;
}
