/**
 * The model document: one JSON value a version, the whole of an appraisal's model
 * and evidence. Every way in (editor, import, command line, later sync) parses it
 * with `documentSchema`; the published JSON Schema is made from the same schema.
 *
 * Objects are loose: fields of a newer minor version survive a round trip.
 * Everything inside is addressed by stable ids, never by position.
 */
import './no-eval.ts';
import { z } from 'zod';
import { KINDS } from './kinds.ts';
import { HOSTILE_KEYS } from './names.ts';

export const FORMAT = 'steelyard/model';
export const FORMAT_VERSION = 1;

const id = z
  .string()
  .regex(/^[A-Za-z0-9_-]{1,64}$/)
  .refine((value) => !HOSTILE_KEYS.has(value));
const symbol = z
  .string()
  .regex(/^[A-Za-z][A-Za-z0-9_]{0,63}$/)
  .refine((value) => !HOSTILE_KEYS.has(value));
const label = z.string().min(1).max(300);
const text = z.string().max(20_000);
const finite = z.number();
const positive = z.number().positive();
const notNegative = z.number().min(0);
const share = z.number().min(0).max(1);
const formula = z.string().min(1).max(4_000);

/** One formula for all strategies, or one a strategy with an optional fallback. */
const strategyFormula = z.union([
  formula,
  z.looseObject({ byStrategy: z.record(id, formula), otherwise: formula.optional() }),
]);

/** A rate a year, or a list of rates by year whose last one holds on. */
const discountRate = z.union([
  z.number().gt(-1),
  z.looseObject({ byYear: z.array(z.number().gt(-1)).min(1).max(1_000) }),
]);

const threshold = z.looseObject({
  id,
  label,
  /** Money per unit of the primary outcome. */
  value: notNegative,
  source: text.optional(),
});

const question = z.looseObject({
  title: label,
  /** The decision to be made, in a sentence or two. */
  decision: text.optional(),
  population: text,
  perspective: text,
  setting: text,
  /** Years that the model runs. */
  horizon: positive,
  /** Years that a cycle lasts. */
  cycleLength: positive,
  /** Calendar year of cycle 0, for reading price and policy tables. */
  clockStart: z.number().int().optional(),
  discounting: z.looseObject({
    costs: discountRate,
    outcomes: discountRate,
    /** The time within a cycle whose factor is used; `counted`: when the payoff is counted. */
    at: z.enum(['counted', 'cycleStart', 'cycleMiddle', 'cycleEnd']).default('counted'),
    /** Discount in whole years (the factor steps at each anniversary). */
    wholeYears: z.boolean().default(false),
  }),
  /** How state payoffs are counted within a cycle. */
  counting: z.enum(['start', 'end', 'trapezoid', 'simpson']),
  thresholds: z.array(threshold).min(1).max(20),
  /** Id of the threshold in force; the first where absent. */
  thresholdInForce: id.optional(),
  currency: z.looseObject({
    /** ISO 4217; XTS is the test code. */
    code: z.string().regex(/^[A-Z]{3}$/),
    symbol: z.string().min(1).max(8),
    priceYear: z.number().int(),
  }),
  outcome: z.looseObject({
    measure: z.enum(['qaly', 'lifeYears', 'daly', 'natural']),
    /** Unit in the plural, such as QALYs. */
    unit: label,
    /** Unit in the singular, such as QALY. */
    unitSingular: label,
    direction: z.enum(['moreIsBetter', 'fewerIsBetter']),
  }),
  /** Id of the strategy that others are weighed against. */
  comparator: id,
  referenceCase: z.looseObject({ label, source: text.optional() }).optional(),
  /** Who the decision is for, to scale values of information. */
  beneficiaries: z
    .looseObject({
      label,
      /** Persons newly facing the decision each year. */
      incidence: notNegative,
      /** Persons facing it at once, today. */
      prevalent: notNegative.default(0),
      /** Years that the decision is expected to hold. */
      years: positive,
      /** Yearly rate at which future beneficiaries are discounted. */
      discountRate: z.number().gt(-1),
    })
    .optional(),
});

const strategy = z.looseObject({ id, label, description: text.optional() });

const covariate = z.looseObject({ id, symbol, label, unit: z.string().max(60).optional() });

const profile = z.looseObject({
  id,
  label,
  /** Share of the population; the shares of all profiles sum to 1. */
  share,
  /** Value of each covariate, by covariate id. */
  covariates: z.record(id, finite),
});

const distribution = z.discriminatedUnion('type', [
  /** Known or chosen, not uncertain; `reason` says why. */
  z.looseObject({ type: z.literal('fixed'), reason: text.optional() }),
  z.looseObject({ type: z.literal('normal'), mean: finite, sd: positive }),
  z.looseObject({ type: z.literal('lognormal'), meanlog: finite, sdlog: positive }),
  z.looseObject({ type: z.literal('beta'), alpha: positive, beta: positive }),
  z.looseObject({ type: z.literal('gamma'), shape: positive, scale: positive }),
  z.looseObject({ type: z.literal('uniform'), low: finite, high: finite }),
  z.looseObject({ type: z.literal('triangular'), low: finite, mode: finite, high: finite }),
  /** Beta on [low, high] with mean (low + weight mode + high) / (weight + 2). */
  z.looseObject({
    type: z.literal('pert'),
    low: finite,
    mode: finite,
    high: finite,
    weight: positive.default(4),
  }),
  z.looseObject({ type: z.literal('weibull'), shape: positive, scale: positive }),
  z.looseObject({ type: z.literal('exponential'), rate: positive }),
  z.looseObject({ type: z.literal('loglogistic'), shape: positive, scale: positive }),
  z.looseObject({ type: z.literal('gompertz'), shape: finite, rate: positive }),
  /** Prentice's parametrisation. */
  z.looseObject({ type: z.literal('generalisedGamma'), mu: finite, sigma: positive, q: finite }),
  /** Drawn with equal chance from a list (bootstrap or posterior draws). */
  z.looseObject({ type: z.literal('empirical'), values: z.array(finite).min(1).max(100_000) }),
  /** Drawn together with the other members of the group with this id. */
  z.looseObject({ type: z.literal('inGroup'), group: id }),
]);

const source = z.looseObject({
  citation: text,
  page: z.string().max(60).optional(),
  url: z.string().max(2_000).optional(),
  /** Invented for a demonstration: said wherever the value is shown. */
  invented: z.boolean().optional(),
});

const parameter = z.looseObject({
  id,
  symbol,
  label,
  unit: z.string().max(60),
  kind: z.enum(KINDS),
  /** Base-case value. */
  value: finite,
  distribution,
  source,
  /** Who judged the quality of the evidence, how, and what they found. */
  grade: z
    .looseObject({
      level: z.enum(['high', 'moderate', 'low', 'veryLow', 'notGraded']),
      by: z.string().max(200).optional(),
      method: z.string().max(200).optional(),
    })
    .optional(),
  notes: text.optional(),
});

const matrix = z.array(z.array(finite)).max(100);
const members = z.array(id).min(2).max(100);

/** Parameters that are uncertain together; `members` are parameter ids. */
const group = z.discriminatedUnion('type', [
  /** Probabilities of one row: counts (all > 0) in the order of `members`. */
  z.looseObject({
    id,
    label,
    type: z.literal('dirichlet'),
    members,
    counts: z.array(positive).min(2).max(100),
  }),
  /** Joint normal; `scale: log` exponentiates each draw. */
  z.looseObject({
    id,
    label,
    type: z.literal('multivariateNormal'),
    members,
    means: z.array(finite),
    covariance: matrix,
    scale: z.enum(['identity', 'log']).default('identity'),
  }),
  /** Members keep their own distributions; rank (Spearman) correlation by a Gaussian copula. */
  z.looseObject({ id, label, type: z.literal('rankCorrelation'), members, correlation: matrix }),
  /** Rows of joint draws (a posterior sample); a draw takes one row for all members. */
  z.looseObject({
    id,
    label,
    type: z.literal('jointRows'),
    members,
    rows: z.array(z.array(finite)).min(1).max(100_000),
  }),
]);

const table = z.looseObject({
  id,
  symbol,
  label,
  unit: z.string().max(60).optional(),
  kind: z.enum(KINDS).optional(),
  /** One or two keys, each a list of strictly rising points. */
  keys: z
    .array(z.looseObject({ label, points: z.array(finite).min(1).max(10_000) }))
    .min(1)
    .max(2),
  /** Row by row: the second key varies fastest. */
  values: z.array(finite).min(1).max(100_000),
  /** `step`: the value of the last point not above the key. Ends hold in both. */
  interpolation: z.enum(['step', 'linear']),
  source: source.optional(),
});

const variable = z.looseObject({
  id,
  symbol,
  label,
  unit: z.string().max(60).optional(),
  kind: z.enum(KINDS).optional(),
  formula: strategyFormula,
  notes: text.optional(),
});

const state = z.looseObject({
  id,
  label,
  description: text.optional(),
  /** `timed`: knows how long one has been in it, by `cycles` tunnels of which the last holds. */
  type: z.enum(['ordinary', 'absorbing', 'timed']),
  cycles: z.number().int().min(1).optional(),
  /** Nobody here is alive: left out of life years. */
  dead: z.boolean().default(false),
});

/** Share of the cohort at cycle 0; `remainder` takes what the others leave. */
const start = z.looseObject({
  remainder: id,
  shares: z.array(z.looseObject({ id, state: id, formula: strategyFormula })).max(500),
});

const cell = z.looseObject({ id, to: id, formula: strategyFormula });

const rowBase = {
  id,
  /** State that is left. */
  from: id,
  /** Strategies that the row holds for; all where absent. */
  strategies: z.array(id).optional(),
  cells: z.array(cell).max(500),
};

const row = z.discriminatedUnion('basis', [
  /** A probability a destination; `remainder` takes what is left. */
  z.looseObject({ ...rowBase, basis: z.literal('probabilities'), remainder: id }),
  /** Competing yearly rates; staying takes the rest. */
  z.looseObject({
    ...rowBase,
    basis: z.literal('rates'),
    /** `generator`: matrix exponential of all such rows; `byRow`: competing risks of this row alone. */
    method: z.enum(['generator', 'byRow']).default('generator'),
  }),
  /** Log odds of each destination against `reference`. */
  z.looseObject({ ...rowBase, basis: z.literal('logit'), reference: id }),
]);

const movements = z.discriminatedUnion('type', [
  z.looseObject({ type: z.literal('rows'), rows: z.array(row).max(2_000) }),
  /**
   * Partitioned survival: curve i is the share of the cohort that is in the first
   * i listed states at `time`; `last` takes those beyond the last curve.
   */
  z.looseObject({
    type: z.literal('survival'),
    curves: z
      .array(z.looseObject({ id, state: id, formula: strategyFormula }))
      .min(1)
      .max(50),
    last: id,
  }),
]);

const payoffBase = {
  id,
  label,
  /** `cost` counts money, `outcome` the primary outcome. */
  measure: z.enum(['cost', 'outcome']),
  /** Heading that results are broken down by. */
  category: label,
  /** Strategies that it applies to; all where absent. */
  strategies: z.array(id).optional(),
  notes: text.optional(),
};

const payoff = z.discriminatedUnion('type', [
  /** For the time spent in states. */
  z.looseObject({
    ...payoffBase,
    type: z.literal('state'),
    per: z.enum(['year', 'cycle']),
    amounts: z
      .array(z.looseObject({ id, state: id, formula: strategyFormula }))
      .min(1)
      .max(500),
  }),
  /** On moving; an absent `from` or `to` stands for any other state. */
  z.looseObject({
    ...payoffBase,
    type: z.literal('movement'),
    from: id.optional(),
    to: id.optional(),
    formula: strategyFormula,
  }),
  /** Once, at the start of the given cycle, for those then in `states` (all who live where absent). */
  z.looseObject({
    ...payoffBase,
    type: z.literal('once'),
    cycle: z.number().int().min(0),
    states: z.array(id).optional(),
    formula: strategyFormula,
  }),
  /** At time 0, for the whole cohort: what the tree before the cohort costs or yields. */
  z.looseObject({ ...payoffBase, type: z.literal('start'), formula: strategyFormula }),
]);

const override = z.discriminatedUnion('type', [
  z.looseObject({ type: z.literal('parameter'), parameter: id, value: finite }),
  z.looseObject({ type: z.literal('variable'), variable: id, formula: strategyFormula }),
  z.looseObject({
    type: z.literal('setting'),
    setting: z.enum(['horizon', 'discountCosts', 'discountOutcomes', 'counting']),
    value: z.union([finite, z.string().max(60)]),
  }),
]);

const scenario = z.looseObject({
  id,
  label,
  description: text.optional(),
  overrides: z.array(override).max(1_000),
});

const design = z.looseObject({ id, label, type: z.string().max(60) });

const analysis = z.looseObject({
  samples: z.number().int().min(0).max(1_000_000).default(1_000),
  seed: z.number().int().min(0).max(4_294_967_295).default(1),
  plan: z.enum(['plain', 'lhs', 'sobol']).default('plain'),
  /** Research designs whose worth is asked. */
  designs: z.array(design).max(100).default([]),
});

const sentenceKey = z
  .string()
  .regex(/^[A-Za-z0-9.]{1,100}$/)
  .refine((value) => !HOSTILE_KEYS.has(value));

/** Sentences of the one-page brief that a person wrote in place of the drafted ones. */
const brief = z.looseObject({
  /** By language of the page (ISO 639), then by the sentence's code. */
  sentences: z.record(
    z.string().regex(/^[a-z]{2,3}$/),
    z.record(
      sentenceKey,
      z.looseObject({
        text: z.string().min(1).max(2_000),
        /** Digest of the document without its `brief` that it was written for. */
        writtenFor: z.string().regex(/^[0-9a-f]{64}$/),
      }),
    ),
  ),
});

export const documentSchema = z.looseObject({
  format: z.literal(FORMAT),
  formatVersion: z.literal(FORMAT_VERSION),
  id,
  about: z.looseObject({
    /** Invented data: said wherever they are shown or printed. */
    invented: z.boolean().default(false),
    citation: text.optional(),
    summary: text.optional(),
    limits: text.optional(),
  }),
  question,
  strategies: z.array(strategy).min(1).max(50),
  covariates: z.array(covariate).max(50).default([]),
  profiles: z.array(profile).min(1).max(500),
  parameters: z.array(parameter).max(2_000),
  groups: z.array(group).max(200).default([]),
  tables: z.array(table).max(200).default([]),
  variables: z.array(variable).max(2_000).default([]),
  states: z.array(state).min(1).max(500),
  start,
  movements,
  payoffs: z.array(payoff).max(1_000),
  scenarios: z.array(scenario).max(200).default([]),
  analysis: analysis.prefault({}),
  brief: brief.optional(),
});

export type ModelDocument = z.infer<typeof documentSchema>;
export type Question = ModelDocument['question'];
export type Strategy = ModelDocument['strategies'][number];
export type Profile = ModelDocument['profiles'][number];
export type Parameter = ModelDocument['parameters'][number];
export type Distribution = Parameter['distribution'];
export type Group = ModelDocument['groups'][number];
export type Table = ModelDocument['tables'][number];
export type Variable = ModelDocument['variables'][number];
export type State = ModelDocument['states'][number];
export type Movements = ModelDocument['movements'];
export type Row = Extract<Movements, { type: 'rows' }>['rows'][number];
export type Payoff = ModelDocument['payoffs'][number];
export type StrategyFormula = z.infer<typeof strategyFormula>;
export type DiscountRate = z.infer<typeof discountRate>;
export type Scenario = ModelDocument['scenarios'][number];
export type AnalysisSettings = ModelDocument['analysis'];
