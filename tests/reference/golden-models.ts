/**
 * The models of tests/golden (cohort*.json) as documents, so that the numbers made
 * there with R can be asked of any simulator. Sources: tests/golden/README.md.
 */
import type { ModelDocument } from '../../shared/model/document.ts';
import cohort from '../golden/cohort.json' with { type: 'json' };
import golden1 from '../golden/cohort_model1.json' with { type: 'json' };
import golden2 from '../golden/cohort_model2.json' with { type: 'json' };
import golden3 from '../golden/cohort_model3.json' with { type: 'json' };
import { type DocumentInput, documentOf, fixed, question } from './blank.ts';

/** The golden data's names of counting conventions, and how a question says them. */
export const CONVENTIONS = {
  start: { counting: 'start', at: 'counted' },
  end: { counting: 'end', at: 'counted' },
  trapezoid: { counting: 'trapezoid', at: 'counted' },
  trapezoid_dStart: { counting: 'trapezoid', at: 'cycleStart' },
  trapezoid_dMid: { counting: 'trapezoid', at: 'cycleMiddle' },
  trapezoid_dEnd: { counting: 'trapezoid', at: 'cycleEnd' },
  simpson: { counting: 'simpson', at: 'counted' },
} as const;
export type Convention = keyof typeof CONVENTIONS;
export const CONVENTION_NAMES = Object.keys(CONVENTIONS) as Convention[];

export interface Variant {
  readonly convention: Convention;
  /** Otherwise both discount rates are 0. */
  readonly discounted: boolean;
  readonly wholeYears?: boolean;
}

type State = DocumentInput['states'][number];
type PayoffInput = DocumentInput['payoffs'][number];
type Amounts = Record<string, string | number>;

const states = (...ids: string[]): State[] =>
  ids.map((id) => {
    const dead = id.startsWith('dead');
    return { id, label: id, type: dead ? 'absorbing' : 'ordinary', dead };
  });

const cells = (to: Record<string, string>) =>
  Object.entries(to).map(([id, formula]) => ({ id: `to_${id}`, to: id, formula }));

const amounts = (by: Amounts) =>
  Object.entries(by).map(([state, value]) => ({ id: state, state, formula: String(value) }));

function inStates(id: string, measure: 'cost' | 'outcome', by: Amounts): PayoffInput {
  return {
    id,
    label: id,
    measure,
    category: id,
    type: 'state',
    per: 'year',
    amounts: amounts(by),
  };
}

const onMoving = (id: string, to: string, formula: string): PayoffInput => ({
  id,
  label: id,
  measure: 'cost',
  category: 'transition',
  type: 'movement',
  to,
  formula,
});

/** A variable that is a number a strategy. */
function byStrategy(symbol: string, numbers: Record<string, number | string>) {
  const formulas = Object.entries(numbers).map(([id, value]) => [id, String(value)]);
  return {
    id: symbol,
    symbol,
    label: symbol,
    formula: { byStrategy: Object.fromEntries(formulas) as Record<string, string> },
  };
}

const variable = (symbol: string, formula: string) => ({
  id: symbol,
  symbol,
  label: symbol,
  formula,
});

interface Clockwork {
  readonly cycles: number;
  readonly dt: number;
  readonly rC: number;
  readonly rO: number;
}

function ask({ cycles, dt, rC, rO }: Clockwork, first: string, variant: Variant) {
  const { counting, at } = CONVENTIONS[variant.convention];
  return question({
    horizon: cycles * dt,
    cycleLength: dt,
    counting,
    discounting: {
      costs: variant.discounted ? rC : 0,
      outcomes: variant.discounted ? rO : 0,
      at,
      wholeYears: variant.wholeYears ?? false,
    },
    comparator: first,
  });
}

const strategiesOf = (ids: readonly string[]) => ids.map((id) => ({ id, label: id }));

const aged = (age: number) => ({
  covariates: [{ id: 'start_age', symbol: 'start_age', label: 'Age' }],
  profiles: [{ id: 'all', label: 'All', share: 1, covariates: { start_age: age } }],
});

const everybody = [{ id: 'all', label: 'All', share: 1, covariates: {} }];

/** The field of each strategy of a golden model, by strategy. */
function field<T extends object, K extends keyof T>(
  strategies: Record<string, T>,
  name: K,
): Record<string, T[K]> {
  return Object.fromEntries(Object.entries(strategies).map(([id, each]) => [id, each[name]]));
}

const background = [
  variable('alive_now', 'alive_gompertz(age, gomp_b, gomp_a)'),
  variable('alive_then', 'alive_gompertz(age + cycle_length, gomp_b, gomp_a)'),
  variable('p_background', 'event_by(alive_now, alive_then)'),
];

/** Three states, yearly, Gompertz mortality. */
export function model1(variant: Variant): ModelDocument {
  const z = golden1.inputs;
  const ids = Object.keys(z.strategies);
  const numbers = ['gomp_a', 'gomp_b', 'hr_death_sick', 'incidence_rate', 'recovery'] as const;
  return documentOf({
    question: ask(z, ids[0] as string, variant),
    strategies: strategiesOf(ids),
    ...aged(z.start_age),
    parameters: numbers.map((symbol) => fixed(symbol, z[symbol])),
    variables: [
      ...background,
      variable('p_dead_sick', 'times_hazard(p_background, hr_death_sick)'),
      byStrategy('hr_incidence', field(z.strategies, 'hr_incidence')),
      variable('p_sick', 'chance(incidence_rate * hr_incidence, cycle_length)'),
      byStrategy('drug_well', field(z.strategies, 'drug_well')),
      byStrategy('drug_sick', field(z.strategies, 'drug_sick')),
    ],
    states: states('well', 'sick', 'dead'),
    start: { remainder: 'well', shares: [] },
    movements: {
      type: 'rows',
      rows: [
        {
          id: 'well',
          from: 'well',
          basis: 'probabilities',
          remainder: 'well',
          cells: cells({ sick: '(1 - p_background) * p_sick', dead: 'p_background' }),
        },
        {
          id: 'sick',
          from: 'sick',
          basis: 'probabilities',
          remainder: 'sick',
          cells: cells({ well: '(1 - p_dead_sick) * recovery', dead: 'p_dead_sick' }),
        },
      ],
    },
    payoffs: [
      inStates('state', 'cost', { well: z.cost[0] as number, sick: z.cost[1] as number }),
      inStates('drug', 'cost', { well: 'drug_well', sick: 'drug_sick' }),
      inStates('qaly', 'outcome', { well: z.utility[0] as number, sick: z.utility[1] as number }),
      inStates('ly', 'outcome', { well: 1, sick: 1 }),
    ],
  });
}

/** Four states, monthly, yearly rates through the matrix exponential; treatment ends. */
export function model2(variant: Variant): ModelDocument {
  const z = golden2.inputs;
  const ids = Object.keys(z.strategies);
  const [stable, progressed, remission] = z.cost as [number, number, number];
  const [uStable, uProgressed, uRemission] = z.utility as [number, number, number];
  const row = (from: string, to: Record<string, string>) => ({
    id: from,
    from,
    basis: 'rates' as const,
    method: 'generator' as const,
    cells: cells(to),
  });
  return documentOf({
    question: ask(z, ids[0] as string, variant),
    strategies: strategiesOf(ids),
    profiles: everybody,
    parameters: [
      ...Object.entries(z.rates).map(([symbol, value]) => fixed(symbol, value)),
      fixed('treat_cycles', z.treat_cycles),
      fixed('entry_cost', z.entry_cost_progressed),
      fixed('death_cost', z.death_cost),
    ],
    variables: [
      byStrategy('hr', field(z.strategies, 'hr')),
      byStrategy('drug', field(z.strategies, 'drug_stable')),
      variable('treated', 'cycle < treat_cycles'),
      variable('hr_now', 'if(treated, hr, 1)'),
    ],
    states: states('stable', 'progressed', 'remission', 'dead'),
    start: { remainder: 'stable', shares: [] },
    movements: {
      type: 'rows',
      rows: [
        row('stable', { progressed: 'stable_progressed * hr_now', dead: 'stable_dead' }),
        row('progressed', { remission: 'progressed_remission', dead: 'progressed_dead' }),
        row('remission', { progressed: 'remission_progressed', dead: 'remission_dead' }),
      ],
    },
    payoffs: [
      inStates('state', 'cost', { stable, progressed, remission }),
      inStates('drug', 'cost', { stable: 'if(treated, drug, 0)' }),
      onMoving('entry', 'progressed', 'entry_cost'),
      onMoving('death', 'dead', 'death_cost'),
      inStates('qaly', 'outcome', {
        stable: uStable,
        progressed: uProgressed,
        remission: uRemission,
      }),
      inStates('ly', 'outcome', { stable: 1, progressed: 1, remission: 1 }),
    ],
  });
}

const byTunnel = (symbol: string, values: number[]) => ({
  id: symbol,
  symbol,
  label: symbol,
  keys: [{ label: 'Years in state', points: values.map((_, k) => k) }],
  values,
  interpolation: 'step' as const,
});

/** Six states, yearly, one of them with five tunnels. */
export function model3(variant: Variant): ModelDocument {
  const z = golden3.inputs;
  const ids = Object.keys(z.strategies);
  const numbers = [
    ...(['gomp_a', 'gomp_b', 'hr_death_complication', 'event_rate', 'event_age_slope'] as const),
    ...(['acute_p_death', 'p_complication', 'complication_p_death'] as const),
    'acute_admission_cost' as const,
  ];
  const row = (from: string, remainder: string, to: Record<string, string>) => ({
    id: from,
    from,
    basis: 'probabilities' as const,
    remainder,
    cells: cells(to),
  });
  return documentOf({
    question: ask(z, ids[0] as string, variant),
    strategies: strategiesOf(ids),
    ...aged(z.start_age),
    parameters: numbers.map((symbol) => fixed(symbol, z[symbol])),
    tables: [
      byTunnel('post_p_death', z.post_p_death),
      byTunnel('u_post', z.u_post),
      byTunnel('c_post', z.c_post),
    ],
    variables: [
      ...background,
      variable('left', '1 - p_background'),
      byStrategy('hr_event', field(z.strategies, 'hr_event')),
      byStrategy('rr_complication', field(z.strategies, 'rr_complication')),
      byStrategy('drug', field(z.strategies, 'drug')),
      variable('event_now', 'event_rate * exp(event_age_slope * time) * hr_event'),
      variable('p_event', 'chance(event_now, cycle_length)'),
      variable('p_post', 'lookup(post_p_death, time_in_state)'),
      variable('p_other_complication', 'times_hazard(p_background, hr_death_complication)'),
    ],
    states: [
      ...states('healthy', 'acute'),
      { id: 'post', label: 'Post', type: 'timed', cycles: z.post_p_death.length },
      ...states('complication', 'dead_disease', 'dead_other'),
    ],
    start: { remainder: 'healthy', shares: [] },
    movements: {
      type: 'rows',
      rows: [
        row('healthy', 'healthy', { dead_other: 'p_background', acute: 'left * p_event' }),
        row('acute', 'post', { dead_other: 'p_background', dead_disease: 'left * acute_p_death' }),
        row('post', 'post', {
          dead_other: 'p_background',
          dead_disease: 'left * p_post',
          complication: 'left * (1 - p_post) * times_risk(p_complication, rr_complication)',
        }),
        row('complication', 'complication', {
          dead_other: 'p_other_complication',
          dead_disease: '(1 - p_other_complication) * complication_p_death',
        }),
      ],
    },
    payoffs: [
      inStates('state', 'cost', {
        healthy: z.c_healthy,
        acute: z.c_acute,
        post: 'lookup(c_post, time_in_state)',
        complication: z.c_complication,
      }),
      inStates('drug', 'cost', { healthy: 'drug', acute: 'drug', post: 'drug' }),
      onMoving('admission', 'acute', 'acute_admission_cost'),
      inStates('qaly', 'outcome', {
        healthy: z.u_healthy,
        acute: z.u_acute,
        post: 'lookup(u_post, time_in_state)',
        complication: z.u_complication,
      }),
      inStates('ly', 'outcome', { healthy: 1, acute: 1, post: 1, complication: 1 }),
    ],
  });
}

/** HIV monotherapy and combination therapy (Chancellor et al. 1997). */
export function hivModel(convention: Convention, discounted = true): ModelDocument {
  const z = cohort.published_example.inputs;
  const clock = { cycles: z.cycles, dt: 1, rC: z.rC, rO: z.rO };
  const letters = ['A', 'B', 'C', 'D'] as const;
  const counts = letters.flatMap((from) =>
    letters.map((to, j) => fixed(`n_${from}${to}`, z.counts[from][j] as number)),
  );
  const living = letters.slice(0, 3);
  const id = (letter: string) => (letter === 'D' ? 'dead' : letter);
  const rows = living.map((from, i) => {
    const total = letters.map((to) => `n_${from}${to}`).join(', ');
    const worse = letters.slice(i + 1);
    const to = worse.map((letter) => [id(letter), `rr_now * n_${from}${letter} / sum(${total})`]);
    return {
      id: from,
      from,
      basis: 'probabilities' as const,
      remainder: from,
      cells: cells(Object.fromEntries(to) as Record<string, string>),
    };
  });
  const yearly = living.map((letter, i) => [letter, `${z.direct[i]} + ${z.community[i]} + zdv`]);
  const each = (value: string) => Object.fromEntries(living.map((letter) => [letter, value]));
  return documentOf({
    question: ask(clock, 'mono', { convention, discounted }),
    strategies: strategiesOf(['mono', 'combination']),
    profiles: everybody,
    parameters: [
      ...counts,
      ...(['rr', 'effect_years', 'zdv', 'lam', 'lam_years'] as const).map((symbol) =>
        fixed(symbol, z[symbol]),
      ),
    ],
    variables: [
      byStrategy('rr_now', { mono: 1, combination: 'if(time < effect_years, rr, 1)' }),
      byStrategy('lam_now', { mono: 0, combination: 'if(time < lam_years, lam, 0)' }),
    ],
    states: states('A', 'B', 'C', 'dead'),
    start: { remainder: 'A', shares: [] },
    movements: { type: 'rows', rows },
    payoffs: [
      inStates('state', 'cost', Object.fromEntries(yearly) as Amounts),
      inStates('drug', 'cost', each('lam_now')),
      inStates('ly', 'outcome', each('1')),
    ],
  });
}

interface Chain extends Clockwork {
  readonly convention?: Convention;
  /** Row i: chances of moving from state i, the last state absorbing. */
  readonly matrix: readonly (readonly number[])[];
  /** State that all start in, from 0. */
  readonly from?: number;
}

/** A chain of constant chances that yields 1 a year in each living state. */
export function chainModel(chain: Chain): ModelDocument {
  const living = chain.matrix.slice(0, -1).map((_, i) => `s${i}`);
  const ids = [...living, 'dead'];
  return documentOf({
    question: ask(chain, 'only', { convention: chain.convention ?? 'start', discounted: true }),
    strategies: strategiesOf(['only']),
    profiles: everybody,
    parameters: [],
    states: states(...ids),
    start: { remainder: `s${chain.from ?? 0}`, shares: [] },
    movements: {
      type: 'rows',
      rows: living.map((from, i) => {
        const others = ids.map((to, j) => [to, String(chain.matrix[i]?.[j])]);
        return {
          id: from,
          from,
          basis: 'probabilities' as const,
          remainder: from,
          cells: cells(
            Object.fromEntries(others.filter(([to]) => to !== from)) as Record<string, string>,
          ),
        };
      }),
    },
    payoffs: [inStates('ly', 'outcome', Object.fromEntries(living.map((s) => [s, 1])))],
  });
}

export type Basis = 'generator' | 'byRow' | 'survival';

/** One constant yearly hazard of dying, on each basis that can say so. */
export function hazardModel(
  hazard: number,
  clock: Clockwork,
  convention: Convention,
  basis: Basis,
): ModelDocument {
  return documentOf({
    question: ask(clock, 'only', { convention, discounted: true }),
    strategies: strategiesOf(['only']),
    profiles: everybody,
    parameters: [fixed('death_rate', hazard)],
    states: states('alive', 'dead'),
    start: { remainder: 'alive', shares: [] },
    movements:
      basis === 'survival'
        ? {
            type: 'survival',
            curves: [
              { id: 'alive', state: 'alive', formula: 'alive_exponential(time, death_rate)' },
            ],
            last: 'dead',
          }
        : {
            type: 'rows',
            rows: [
              {
                id: 'alive',
                from: 'alive',
                basis: 'rates',
                method: basis,
                cells: cells({ dead: 'death_rate' }),
              },
            ],
          },
    payoffs: [inStates('ly', 'outcome', { alive: 1 })],
  });
}
