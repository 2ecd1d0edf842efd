/**
 * Random valid documents from a seed, for comparing simulators: every movement
 * basis (mixed in one model too), tunnels, profiles, all payoffs, all ways of
 * counting. Probabilities stay valid in every draw by construction.
 */
import type { ModelDocument } from '../../shared/model/document.ts';
import { type DocumentInput, documentOf, question } from './blank.ts';
import {
  forStrategies,
  randomParameters,
  randomTables,
  randomVariables,
} from './random-evidence.ts';
import { alive, type Sort, type Word, type Writer, write } from './random-formula.ts';
import { Seeded } from './seeded.ts';

type StateInput = DocumentInput['states'][number];
type RowInput = Extract<DocumentInput['movements'], { type: 'rows' }>['rows'][number];
type PayoffInput = DocumentInput['payoffs'][number];

/** All that the parts of one model need to know of each other. */
interface Draft {
  readonly random: Seeded;
  readonly strategies: readonly string[];
  readonly states: readonly StateInput[];
  readonly words: readonly Word[];
  readonly flags: readonly string[];
  readonly cycles: number;
}

export function randomModel(seed: number): ModelDocument {
  const random = new Seeded(seed);
  const strategies = Array.from({ length: random.whole(1, 5) }, (_, i) => `s${i + 1}`);
  const flags = random.some(['female', 'smoker'], random.whole(0, 2));
  const evidence = randomParameters(random);
  const look = randomTables(random);
  const named = [...evidence.words, ...look.words];
  const { variables, words } = randomVariables(random, strategies, named, flags);
  const bySurvival = random.happens(0.12);
  /** Rates that depend on time in state, in many states at once. */
  const sojourn = !bySurvival && random.happens(0.2);
  const states = randomStates(random, bySurvival ? 0 : sojourn ? 0.7 : 0.3);
  const asked = randomQuestion(random);
  const draft: Draft = { random, strategies, states, words, flags, cycles: asked.cycles };
  return documentOf({
    question: asked.question,
    strategies: strategies.map((id) => ({ id, label: id })),
    ...randomProfiles(random, flags),
    parameters: evidence.parameters,
    groups: evidence.groups,
    tables: look.tables,
    variables,
    states,
    start: bySurvival ? { remainder: 'a', shares: [] } : randomStart(draft),
    movements: bySurvival ? randomCurves(draft) : randomRows(draft, sojourn),
    payoffs: randomPayoffs(draft, bySurvival),
  });
}

function randomQuestion(random: Seeded) {
  const cycleLength = random.pick([1, 1, 1 / 2, 1 / 12, 7 / 365.25]);
  const counting = random.pick(['start', 'end', 'trapezoid', 'simpson'] as const);
  const any = random.whole(2, cycleLength === 1 ? 14 : 24);
  const cycles = counting === 'simpson' ? 2 * Math.ceil(any / 2) : any;
  const rate = () =>
    random.happens(0.3)
      ? { byYear: Array.from({ length: random.whole(1, 4) }, () => random.between(0, 0.08)) }
      : random.pick([0, 0.03, random.between(0.01, 0.1)]);
  return {
    cycles,
    question: question({
      // Rounds to the same number of cycles.
      horizon: (cycles + random.pick([0, 0, 0, 0.3, -0.4])) * cycleLength,
      cycleLength,
      counting,
      discounting: {
        costs: rate(),
        outcomes: rate(),
        at: random.pick(['counted', 'counted', 'cycleStart', 'cycleMiddle', 'cycleEnd']),
        wholeYears: random.happens(0.3),
      },
    }),
  };
}

function randomProfiles(random: Seeded, flags: readonly string[]) {
  const count = random.whole(1, 4);
  const parts = random.parts(count - 1, 0.7);
  const shares = [...parts, 1 - parts.reduce((a, b) => a + b, 0)];
  const covariates = ['start_age', ...flags];
  return {
    covariates: covariates.map((symbol) => ({ id: `c_${symbol}`, symbol, label: symbol })),
    profiles: shares.map((share, i) => ({
      id: `p${i + 1}`,
      label: `p${i + 1}`,
      share,
      covariates: Object.fromEntries([
        ['c_start_age', random.whole(20, 75)],
        ...flags.map((flag) => [`c_${flag}`, random.whole(0, 1)]),
      ]) as Record<string, number>,
    })),
  };
}

/** `a`, `b`, ... where some know the time spent in them; the last one or two absorb. */
function randomStates(random: Seeded, timed: number): StateInput[] {
  const count = random.whole(2, 8);
  const ends = count > 3 && timed > 0 ? random.whole(0, 2) : 1;
  return Array.from({ length: count }, (_, i) => {
    const id = String.fromCharCode(97 + i);
    if (i >= count - ends) return { id, label: id, type: 'absorbing', dead: random.happens(0.85) };
    if (random.happens(timed)) {
      return { id, label: id, type: 'timed', cycles: random.whole(1, 5) };
    }
    return { id, label: id, type: 'ordinary' };
  });
}

const writerFor = ({ random, words, flags }: Draft, timed: boolean): Writer => ({
  random,
  words,
  flags,
  timed,
});

const formula = (draft: Draft, make: () => string) =>
  forStrategies(draft.random, draft.strategies, make);

const isTimed = (draft: Draft, id: string | undefined): boolean =>
  draft.states.some((state) => state.id === id && state.type === 'timed');

/** Chances that leave something over, or all of it in one. */
function shareCells(draft: Draft, to: readonly string[], timed: boolean) {
  const { random } = draft;
  const writer = writerFor(draft, timed);
  const caps = random.parts(to.length, random.pick([0.2, 0.6, 0.95]));
  return to.map((state, i) => ({
    id: `to_${state}`,
    to: state,
    formula: formula(draft, () => `${caps[i]} * ${write(writer, 'probability', 3)}`),
  }));
}

function randomStart(draft: Draft): DocumentInput['start'] {
  const { random, states } = draft;
  const ids = states.map((state) => state.id);
  const remainder = random.pick(ids);
  const others = random.some(
    ids.filter((id) => id !== remainder),
    random.whole(0, 2),
  );
  const shares = shareCells(draft, others, false).map(({ id, to, formula: text }) => ({
    id,
    state: to,
    formula: text,
  }));
  return { remainder, shares };
}

const BASES = ['probabilities', 'generator', 'byRow', 'logit'] as const;

function randomRows(draft: Draft, sojourn: boolean): DocumentInput['movements'] {
  const { random, states, strategies } = draft;
  const some = random.happens(0.5) ? BASES : [random.pick(BASES)];
  const bases = sojourn ? (['generator'] as const) : some;
  const rows = states
    .filter((state) => state.type !== 'absorbing')
    .flatMap(({ id }) => {
      if (strategies.length === 1 || random.happens(0.7)) {
        return [randomRow(draft, id, random.pick(bases), `from_${id}`)];
      }
      const first = random.some(strategies, random.whole(1, strategies.length - 1));
      const rest = strategies.filter((strategy) => !first.includes(strategy));
      return [first, rest].map((holds, n) => ({
        ...randomRow(draft, id, random.pick(bases), `from_${id}_${n}`),
        strategies: holds,
      }));
    });
  return { type: 'rows', rows };
}

function randomRow(
  draft: Draft,
  from: string,
  basis: (typeof BASES)[number],
  id: string,
): RowInput {
  const { random, states } = draft;
  const ids = states.map((state) => state.id);
  const timed = isTimed(draft, from);
  const others = ids.filter((state) => state !== from);
  if (basis === 'generator' || basis === 'byRow') {
    const to = random.some(others, random.whole(1, Math.min(4, others.length)));
    return { id, from, basis: 'rates', method: basis, cells: cellsOf(draft, to, 'rate', timed) };
  }
  const rest = random.happens(0.7) ? from : random.pick(ids);
  const free = ids.filter((state) => state !== rest);
  const to = random.some(free, random.whole(1, Math.min(4, free.length)));
  return basis === 'logit'
    ? { id, from, basis, reference: rest, cells: cellsOf(draft, to, 'logOdds', timed) }
    : { id, from, basis, remainder: rest, cells: shareCells(draft, to, timed) };
}

function cellsOf(draft: Draft, to: readonly string[], sort: Sort, timed: boolean) {
  const { random } = draft;
  const writer = writerFor(draft, timed);
  /** A predictor that would overflow if it were exponentiated as it is. */
  const huge = sort === 'logOdds' && random.happens(0.08) ? '800 + ' : '';
  return to.map((state) => ({
    id: `to_${state}`,
    to: state,
    formula: formula(draft, () => huge + write(writer, sort, 3)),
  }));
}

/** Curves that cannot cross: each is the next one times a survival of its own. */
function randomCurves(draft: Draft): DocumentInput['movements'] {
  const { random, states, strategies } = draft;
  const writer = writerFor(draft, false);
  const ids = states.map((state) => state.id);
  const curves: { id: string; state: string; formula: ReturnType<typeof formula> }[] = [];
  let texts = strategies.map(() => '1');
  for (const state of ids.slice(0, -1).reverse()) {
    const shared = survivalFactor(writer);
    texts = texts.map(
      (text) => `${text} * ${random.happens(0.5) ? shared : survivalFactor(writer)}`,
    );
    const byStrategy = Object.fromEntries(strategies.map((id, i) => [id, texts[i] as string]));
    curves.unshift({ id: `curve_${state}`, state, formula: { byStrategy } });
  }
  return { type: 'survival', curves, last: ids[ids.length - 1] as string };
}

/** 1 at time 0, falling with time. */
function survivalFactor(writer: Writer): string {
  return writer.random.happens(0.6)
    ? alive(writer, 'time')
    : `alive_exponential(time, ${writer.random.pick(RATES(writer))})`;
}

/** Rates that do not change with the clock, so that a curve made of them never rises. */
const RATES = ({ words }: Writer): string[] => [
  '0.05',
  ...words.filter(({ symbol }) => /^rate_\d+$/.test(symbol)).map(({ symbol }) => symbol),
];

function randomPayoffs(draft: Draft, bySurvival: boolean): PayoffInput[] {
  const { random } = draft;
  const types = bySurvival ? (['state', 'once', 'start'] as const) : ALL_TYPES;
  const count = random.whole(3, 8);
  return Array.from({ length: count }, (_, n) => {
    const measure = n < 2 ? (['cost', 'outcome'] as const)[n] : random.pick(MEASURES);
    const type = n < 2 ? 'state' : random.pick(types);
    return randomPayoff(draft, `y${n + 1}`, measure as 'cost' | 'outcome', type);
  });
}

const MEASURES = ['cost', 'outcome'] as const;
/** Movements more often, for they have the most ways to go wrong. */
const ALL_TYPES = ['state', 'movement', 'movement', 'once', 'start'] as const;

function randomPayoff(
  draft: Draft,
  id: string,
  measure: 'cost' | 'outcome',
  type: (typeof ALL_TYPES)[number],
): PayoffInput {
  const { random, strategies } = draft;
  const base = {
    id,
    label: id,
    measure,
    category: random.pick(['Care', 'Medicines', 'Health']),
    ...(random.happens(0.3) ? { strategies: random.someOrAll(strategies) } : {}),
  };
  if (type === 'state') return { ...base, ...statePart(draft, measure) };
  if (type === 'movement') return { ...base, ...movementPart(draft, measure) };
  const writer = writerFor(draft, false);
  const paid = formula(draft, () => write(writer, oneOff(measure), 3));
  if (type === 'start') return { ...base, type, formula: paid };
  return {
    ...base,
    type,
    cycle: random.whole(0, draft.cycles + 1),
    ...(random.happens(0.5) ? { states: random.someOrAll(draft.states.map((s) => s.id)) } : {}),
    formula: paid,
  };
}

const oneOff = (measure: 'cost' | 'outcome'): Sort => (measure === 'cost' ? 'costOnce' : 'utility');

function statePart(draft: Draft, measure: 'cost' | 'outcome') {
  const { random, states } = draft;
  const per = random.pick(['year', 'cycle'] as const);
  const cost: Sort = per === 'year' ? 'costPerYear' : 'costPerCycle';
  const amounts = random.someOrAll(states).map(({ id }) => {
    const writer = writerFor(draft, isTimed(draft, id));
    const make = () => write(writer, measure === 'cost' ? cost : 'utility', 3);
    return { id: `in_${id}`, state: id, formula: formula(draft, make) };
  });
  return { type: 'state' as const, per, amounts };
}

function movementPart(draft: Draft, measure: 'cost' | 'outcome') {
  const { random, states } = draft;
  const timed = states.filter((state) => state.type === 'timed');
  const origins = timed.length > 0 && random.happens(0.5) ? timed : states;
  const from = random.happens(0.7) ? random.pick(origins).id : undefined;
  const others = states.filter((state) => state.id !== from);
  const to = random.happens(0.6) ? random.pick(others).id : undefined;
  const writer = writerFor(draft, isTimed(draft, from));
  return {
    type: 'movement' as const,
    ...(from === undefined ? {} : { from }),
    ...(to === undefined ? {} : { to }),
    formula: formula(draft, () => write(writer, oneOff(measure), 3)),
  };
}
