/** Random parameters, correlation groups, tables and variables for a test model. */
import { type DocumentInput, parameter } from './blank.ts';
import { SORTS, type Sort, type Word, type Writer, write } from './random-formula.ts';
import type { Seeded } from './seeded.ts';

type ParameterInput = DocumentInput['parameters'][number];
type DistributionInput = ParameterInput['distribution'];
type GroupInput = NonNullable<DocumentInput['groups']>[number];
type TableInput = NonNullable<DocumentInput['tables']>[number];
type VariableInput = NonNullable<DocumentInput['variables']>[number];

const list = (random: Seeded, count: number, low: number, high: number): number[] =>
  Array.from({ length: count }, () => random.between(low, high));

/** Distributions on (0, 1) that can give any value from 0.2 to 0.25. */
function unitDistribution(random: Seeded): DistributionInput {
  return random.pick<DistributionInput>([
    { type: 'beta', alpha: random.between(2, 30), beta: random.between(5, 80) },
    { type: 'uniform', low: random.between(0.01, 0.2), high: random.between(0.25, 0.7) },
    { type: 'triangular', low: 0.02, mode: random.between(0.05, 0.3), high: 0.6 },
    { type: 'pert', low: 0.05, mode: random.between(0.1, 0.4), high: 0.8 },
    { type: 'empirical', values: [0.05, ...list(random, 20, 0.05, 0.6), 0.6] },
    { type: 'fixed' },
  ]);
}

/** Distributions above 0 that can give `middle`, and most often values near it. */
function positiveDistribution(random: Seeded, middle: number): DistributionInput {
  const shape = random.between(4, 40);
  const low = middle / 2;
  return random.pick<DistributionInput>([
    { type: 'gamma', shape, scale: middle / shape },
    { type: 'lognormal', meanlog: Math.log(middle), sdlog: random.between(0.05, 0.4) },
    { type: 'weibull', shape: random.between(1.5, 4), scale: middle },
    { type: 'exponential', rate: 1 / middle },
    { type: 'loglogistic', shape: random.between(6, 12), scale: middle },
    { type: 'gompertz', shape: 0.5 / middle, rate: 0.5 / middle },
    { type: 'generalisedGamma', mu: Math.log(middle), sigma: 0.3, q: random.between(0.3, 1.2) },
    { type: 'uniform', low, high: 2 * middle },
    { type: 'triangular', low, mode: middle, high: 2 * middle },
    { type: 'pert', low, mode: middle, high: 2 * middle },
    { type: 'empirical', values: [middle, ...list(random, 15, low, 2 * middle)] },
    { type: 'fixed' },
  ]);
}

const MIDDLES: Record<Exclude<Sort, 'logOdds' | 'probability' | 'utility'>, [number, number]> = {
  rate: [0.02, 0.5],
  ratio: [0.5, 1.4],
  costPerYear: [50, 4000],
  costPerCycle: [5, 300],
  costOnce: [100, 8000],
};

function randomParameter(random: Seeded, sort: Sort, symbol: string): ParameterInput {
  if (sort === 'logOdds') {
    const mean = random.between(-2.5, 1);
    const distribution: DistributionInput = { type: 'normal', mean, sd: random.between(0.1, 0.5) };
    return parameter(symbol, mean, distribution, sort);
  }
  if (sort === 'probability' || sort === 'utility') {
    return parameter(symbol, random.between(0.2, 0.25), unitDistribution(random), sort);
  }
  const middle = random.between(...MIDDLES[sort]);
  return parameter(symbol, middle, positiveDistribution(random, middle), sort);
}

export interface Parameters {
  readonly parameters: ParameterInput[];
  readonly groups: GroupInput[];
  readonly words: Word[];
}

export function randomParameters(random: Seeded): Parameters {
  const parameters: ParameterInput[] = [];
  const words: Word[] = [];
  for (const sort of SORTS) {
    for (let n = random.whole(1, 4); n > 0; n--) {
      const symbol = `${sort}_${n}`;
      parameters.push(randomParameter(random, sort, symbol));
      words.push({ symbol, sort });
    }
  }
  const groups = random.happens(0.5) ? randomGroups(random, parameters) : [];
  return { parameters, groups, words };
}

/** Ties some parameters together, two or three at a time, none of them twice. */
function randomGroups(random: Seeded, parameters: ParameterInput[]): GroupInput[] {
  const groups: GroupInput[] = [];
  for (const [kind, makes] of [
    ['probability', [dirichlet, jointRows]],
    ['logOdds', [jointNormal]],
    ['ratio', [jointLogNormal]],
    ['rate', [rankCorrelation]],
  ] as const) {
    const alike = parameters.filter((each) => each.kind === kind);
    if (alike.length < 2 || random.happens(0.4)) continue;
    groups.push(random.pick(makes)(random, random.some(alike, random.whole(2, 3)), `tied_${kind}`));
  }
  return groups;
}

type MakeGroup = (random: Seeded, members: ParameterInput[], id: string) => GroupInput;

function join(members: ParameterInput[], group: string) {
  for (const member of members) member.distribution = { type: 'inGroup', group };
  return { id: group, label: group, members: members.map((member) => member.id) };
}

const dirichlet: MakeGroup = (random, members, id) => {
  const counts = list(random, members.length, 5, 60);
  const total = counts.reduce((a, b) => a + b, 0);
  members.forEach((member, i) => {
    member.value = (counts[i] as number) / total;
  });
  return { ...join(members, id), type: 'dirichlet', counts };
};

const jointRows: MakeGroup = (random, members, id) => ({
  ...join(members, id),
  type: 'jointRows',
  rows: Array.from({ length: 30 }, () => list(random, members.length, 0.05, 0.6)),
});

const equicorrelated = (size: number, variance: number, correlation: number): number[][] =>
  Array.from({ length: size }, (_, i) =>
    Array.from({ length: size }, (_, j) => (i === j ? variance : variance * correlation)),
  );

const jointNormal: MakeGroup = (random, members, id) => ({
  ...join(members, id),
  type: 'multivariateNormal',
  means: members.map((member) => member.value),
  covariance: equicorrelated(members.length, 0.09, random.between(-0.3, 0.8)),
  scale: 'identity',
});

const jointLogNormal: MakeGroup = (random, members, id) => ({
  ...join(members, id),
  type: 'multivariateNormal',
  means: members.map((member) => Math.log(member.value)),
  covariance: equicorrelated(members.length, 0.04, random.between(-0.3, 0.8)),
  scale: 'log',
});

const rankCorrelation: MakeGroup = (random, members, id) => {
  for (const member of members) {
    const middle = member.value;
    member.distribution = { type: 'gamma', shape: 9, scale: middle / 9 };
  }
  return {
    id,
    label: id,
    members: members.map((member) => member.id),
    type: 'rankCorrelation',
    correlation: equicorrelated(members.length, 1, random.between(-0.3, 0.8)),
  };
};

/** What a table can be looked up by: a key's expression and points that suit it. */
const KEYS: readonly { key: string; points: number[]; timed?: boolean }[] = [
  { key: 'age', points: [0, 35, 50, 65.5, 80] },
  { key: 'floor(age)', points: [30, 31, 45, 60] },
  { key: 'time', points: [0, 0.3, 1, 2.5, 7] },
  { key: 'cycle', points: [1, 2, 5, 9] },
  { key: 'start_age', points: [40, 60] },
  { key: 'time_in_state', points: [0, 0.05, 0.5, 1, 2], timed: true },
  { key: 'time_in_state + time', points: [0.2, 1.1, 4], timed: true },
];

const TABLE_VALUES: Partial<Record<Sort, [number, number]>> = {
  probability: [0.01, 0.7],
  rate: [0.01, 0.9],
  ratio: [0.5, 1.5],
  utility: [0.2, 0.95],
  costPerYear: [10, 3000],
};

export function randomTables(random: Seeded): { tables: TableInput[]; words: Word[] } {
  const tables: TableInput[] = [];
  const words: Word[] = [];
  for (const [sort, [low, high]] of Object.entries(TABLE_VALUES) as [Sort, [number, number]][]) {
    for (let n = random.whole(0, 2); n > 0; n--) {
      const symbol = `${sort}_by_${n}`;
      const keys = random.happens(0.5)
        ? [random.pick(KEYS)]
        : [random.pick(KEYS), random.pick(KEYS)];
      const size = keys.reduce((product, { points }) => product * points.length, 1);
      tables.push({
        id: symbol,
        symbol,
        label: symbol,
        kind: sort,
        keys: keys.map(({ key, points }) => ({ label: key, points })),
        values: list(random, size, low, high),
        interpolation: random.pick(['step', 'linear']),
      });
      words.push({
        symbol,
        sort,
        keys: keys.map(({ key }) => key),
        timed: keys.some(({ timed }) => timed),
      });
    }
  }
  return { tables, words };
}

/** Variables, each of which may use those before it. */
export function randomVariables(
  random: Seeded,
  strategies: readonly string[],
  words: readonly Word[],
  flags: readonly string[],
): { variables: VariableInput[]; words: Word[] } {
  const known = [...words];
  const variables: VariableInput[] = [];
  for (let n = random.whole(0, 8); n > 0; n--) {
    const sort = random.pick(SORTS);
    const symbol = `${sort}_of_${n}`;
    const timed = random.happens(0.25);
    const writer: Writer = { random, words: known, flags, timed };
    variables.push({
      id: symbol,
      symbol,
      label: symbol,
      kind: sort,
      formula: forStrategies(random, strategies, () => write(writer, sort, 2)),
    });
    known.push({ symbol, sort, timed });
  }
  return { variables, words: known };
}

/** One formula for all, or one for some strategies and another for the rest. */
export function forStrategies(
  random: Seeded,
  strategies: readonly string[],
  make: () => string,
): VariableInput['formula'] {
  if (random.happens(0.6)) return make();
  const own = random.someOrAll(strategies).map((id) => [id, make()] as const);
  const byStrategy = Object.fromEntries(own) as Record<string, string>;
  const all = own.length === strategies.length;
  return all && random.happens(0.5) ? { byStrategy } : { byStrategy, otherwise: make() };
}
