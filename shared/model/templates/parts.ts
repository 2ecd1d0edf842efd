/** Parts that templates are put together from: placeholders, and said to be so. */
import {
  FORMAT,
  FORMAT_VERSION,
  type ModelDocument,
  type Parameter,
  type Payoff,
  type State,
} from '../document.ts';
import type { TemplateSetting, TemplateWords } from './template-words.ts';

/** A document with everything but a model: to be completed by `parts`. */
export function baseDocument(
  { id, year, words }: TemplateSetting,
  parts: Partial<ModelDocument> &
    Pick<ModelDocument, 'strategies' | 'states' | 'movements' | 'start'>,
): ModelDocument {
  return {
    format: FORMAT,
    formatVersion: FORMAT_VERSION,
    id,
    about: { invented: false, limits: words.allPlaceholders },
    question: question(words, year, parts.strategies[0]?.id ?? ''),
    covariates: [],
    profiles: [{ id: 'everybody', label: words.everybody, share: 1, covariates: {} }],
    parameters: [],
    groups: [],
    tables: [],
    variables: [],
    payoffs: [],
    scenarios: [],
    analysis: { samples: 1_000, seed: 1, plan: 'plain', designs: [] },
    ...parts,
  };
}

/** XXX is ISO 4217's code for no currency: the author's own takes its place. */
function question(
  words: TemplateWords,
  year: number,
  comparator: string,
): ModelDocument['question'] {
  return {
    title: words.untitled,
    population: '',
    perspective: '',
    setting: '',
    horizon: 20,
    cycleLength: 1,
    discounting: { costs: 0.03, outcomes: 0.03, at: 'counted', wholeYears: false },
    counting: 'trapezoid',
    thresholds: [
      { id: 'threshold', label: words.threshold, value: 1_000, source: words.notYetGiven },
    ],
    currency: { code: 'XXX', symbol: '¤', priceYear: year },
    outcome: {
      measure: 'qaly',
      unit: words.qalys,
      unitSingular: words.qaly,
      direction: 'moreIsBetter',
    },
    comparator,
  };
}

export const living = (id: string, label: string): State => {
  return { id, label, type: 'ordinary', dead: false };
};

export const deadState = (words: TemplateWords): State => {
  return { id: 'dead', label: words.dead, type: 'absorbing', dead: true };
};

type Fields = Pick<Parameter, 'unit' | 'kind' | 'value' | 'distribution'>;

/** Makes the placeholders of a template; ids are the symbols. */
export class Placeholders {
  constructor(private readonly words: TemplateWords) {}

  /** Beta worth a hundred observations. */
  chance(symbol: string, label: string, value: number): Parameter {
    return this.parameter(symbol, label, {
      ...beta(value),
      unit: this.words.perYear,
      kind: 'probability',
    });
  }

  share(symbol: string, label: string, value: number): Parameter {
    return this.parameter(symbol, label, {
      ...beta(value),
      unit: this.words.share,
      kind: 'probability',
    });
  }

  utility(symbol: string, label: string, value: number): Parameter {
    return this.parameter(symbol, label, {
      ...beta(value),
      unit: this.words.utility,
      kind: 'utility',
    });
  }

  /** Log-normal with its median at the value. */
  ratio(symbol: string, label: string, value: number): Parameter {
    const distribution = { type: 'lognormal', meanlog: Math.log(value), sdlog: 0.1 } as const;
    return this.parameter(symbol, label, {
      unit: this.words.ratio,
      kind: 'ratio',
      value,
      distribution,
    });
  }

  /** Gamma with a standard error of a fifth of the mean. */
  costPerYear(symbol: string, label: string, value: number): Parameter {
    const distribution = { type: 'gamma', shape: 25, scale: value / 25 } as const;
    return this.parameter(symbol, label, {
      unit: this.words.moneyPerYear,
      kind: 'costPerYear',
      value,
      distribution,
    });
  }

  costOnce(symbol: string, label: string, value: number): Parameter {
    const distribution = { type: 'gamma', shape: 25, scale: value / 25 } as const;
    return this.parameter(symbol, label, {
      unit: this.words.moneyOnce,
      kind: 'costOnce',
      value,
      distribution,
    });
  }

  private parameter(symbol: string, label: string, fields: Fields): Parameter {
    const { notYetGiven, replaceMe } = this.words;
    const source = { citation: notYetGiven, invented: false };
    return { id: symbol, symbol, label, ...fields, source, notes: replaceMe };
  }
}

function beta(value: number): Pick<Parameter, 'value' | 'distribution'> {
  return { value, distribution: { type: 'beta', alpha: 100 * value, beta: 100 * (1 - value) } };
}

type Row = Extract<ModelDocument['movements'], { type: 'rows' }>['rows'][number];

/** A row of probabilities, where staying takes what the others leave. */
export function rowOut(from: string, to: Readonly<Record<string, string>>): Row {
  const cells = Object.entries(to).map(([state, formula]) => {
    return { id: `to-${state}`, to: state, formula };
  });
  return { id: `from-${from}`, from, basis: 'probabilities', remainder: from, cells };
}

type Base = Pick<Payoff, 'id' | 'label' | 'measure' | 'category' | 'strategies'>;

/** A yearly amount in each state named. */
export function byState(base: Base, formulas: Readonly<Record<string, string>>): Payoff {
  const amounts = Object.entries(formulas).map(([state, formula]) => ({
    id: state,
    state,
    formula,
  }));
  return { ...base, type: 'state', per: 'year', amounts };
}

/** The outcome of every template. */
export function qalyPayoff(
  words: TemplateWords,
  formulas: Readonly<Record<string, string>>,
): Payoff {
  const base = {
    id: 'qalys',
    label: words.qalys,
    measure: 'outcome',
    category: words.qalys,
  } as const;
  return byState(base, formulas);
}

/** Care that every strategy has. */
export function carePayoff(
  words: TemplateWords,
  formulas: Readonly<Record<string, string>>,
): Payoff {
  return byState(
    { id: 'care', label: words.care, measure: 'cost', category: words.care },
    formulas,
  );
}

/** What the new option costs a year, in the states where it is given. */
export function optionPayoff(words: TemplateWords, states: readonly string[]): Payoff {
  const base = {
    id: 'option',
    label: words.option,
    measure: 'cost',
    category: words.option,
  } as const;
  const formulas = Object.fromEntries(states.map((state) => [state, 'c_option']));
  return byState({ ...base, strategies: ['new'] }, formulas);
}

/** The two strategies of most templates. */
export function usualAndNew(words: TemplateWords): ModelDocument['strategies'] {
  return [
    { id: 'usual', label: words.usualCare },
    { id: 'new', label: words.newOption },
  ];
}
