/**
 * Engine and reference both give the numbers of tests/golden/cohort*.json, made with
 * base R 4.2.2 (see tests/golden/README.md, whose tolerances are used): traces and
 * totals by all seven counting conventions, discounted and not.
 */
import { describe, expect, it } from 'vitest';
import { prepare } from '../../shared/engine/engine.ts';
import type { ModelDocument } from '../../shared/model/document.ts';
import cohort from '../golden/cohort.json' with { type: 'json' };
import golden1 from '../golden/cohort_model1.json' with { type: 'json' };
import golden2 from '../golden/cohort_model2.json' with { type: 'json' };
import golden3 from '../golden/cohort_model3.json' with { type: 'json' };
import {
  CONVENTION_NAMES,
  type Convention,
  chainModel,
  hazardModel,
  hivModel,
  model1,
  model2,
  model3,
  type Variant,
} from './golden-models.ts';
import { baseValues, type ReferenceRun, simulate } from './simulate.ts';

type Run = Omit<ReferenceRun, 'byProfile'>;
type Simulator = (document: ModelDocument) => readonly Run[];

const SIMULATORS: Record<string, Simulator> = {
  reference: (document) => simulate(document, baseValues(document)),
  engine: (document) => {
    const { strategies, problems } = prepare(document).base({ trace: true });
    expect(problems).toEqual([]);
    return strategies.map((run) => ({ ...run, trace: run.trace ?? [] }));
  },
};

/** Relative to max(1, |want|), as tests/golden/README.md says. */
function near(got: number, want: number, tolerance: number, what: string): void {
  const off = Math.abs(got - want) / Math.max(1, Math.abs(want));
  expect(off, `${what}: got ${got}, want ${want}`).toBeLessThanOrEqual(tolerance);
}

function nearRows(
  got: readonly (readonly number[])[],
  want: readonly (readonly number[])[],
  tolerance: number,
): void {
  expect(got.length).toBe(want.length);
  want.forEach((row, k) => {
    expect(got[k]?.length).toBe(row.length);
    row.forEach((share, i) => {
      near(got[k]?.[i] as number, share, tolerance, `trace ${k} ${i}`);
    });
  });
}

const paid = (run: Run, ...payoffs: string[]): number =>
  run.byPayoff
    .filter(({ payoff }) => payoffs.includes(payoff))
    .reduce((sum, { total }) => sum + total, 0);

const run = (runs: readonly Run[], id: string): Run => {
  const found = runs.find((each) => each.id === id);
  if (!found) throw new Error(`no strategy ${id}`);
  return found;
};

type Totals = Record<string, number>;
interface GoldenStrategy {
  readonly trace: readonly (readonly number[])[];
}

interface GoldenCase<S extends GoldenStrategy> {
  readonly name: string;
  readonly model: (variant: Variant) => ModelDocument;
  readonly strategies: Record<string, S>;
  readonly results: (strategy: S) => Record<Convention, Totals>;
  readonly moving: readonly string[];
  readonly wholeYears?: boolean;
  readonly tolerance: number;
}

function check<S extends GoldenStrategy>(
  golden: GoldenCase<S>,
  simulator: Simulator,
  convention: Convention,
  discounted: boolean,
): void {
  const { tolerance, wholeYears = false, moving } = golden;
  const runs = simulator(golden.model({ convention, discounted, wholeYears }));
  expect(runs.map(({ id }) => id)).toEqual(Object.keys(golden.strategies));
  for (const [id, strategy] of Object.entries(golden.strategies)) {
    const got = run(runs, id);
    const totals = golden.results(strategy)[convention];
    const want = (name: string) => totals[discounted ? `${name}_disc` : name] as number;
    const same = (value: number, name: string) =>
      near(value, want(name), tolerance, `${id} ${name}`);
    nearRows(got.trace, strategy.trace, tolerance);
    same(paid(got, 'state'), 'cost_state');
    same(paid(got, 'drug'), 'cost_drug');
    same(paid(got, ...moving), 'cost_transition');
    same(got.cost, 'cost_total');
    same(paid(got, 'qaly'), 'qaly');
    same(paid(got, 'ly'), 'ly');
    near(got.outcome, want('qaly') + want('ly'), tolerance, `${id} outcome`);
    near(got.lifeYears, totals.ly as number, tolerance, `${id} life years`);
  }
}

function suite<S extends GoldenStrategy>(golden: GoldenCase<S>, simulator: Simulator): void {
  describe(golden.name, () => {
    for (const convention of CONVENTION_NAMES) {
      it(`${convention}, discounted`, () => check(golden, simulator, convention, true));
      it(`${convention}, undiscounted`, () => check(golden, simulator, convention, false));
    }
  });
}

const HIV = [
  ['end', 0],
  ['start', 1],
  ['trapezoid', 2],
  ['trapezoid_dEnd', 3],
  ['simpson', 4],
] as const;

for (const [name, simulator] of Object.entries(SIMULATORS)) {
  describe(name, () => {
    suite(
      {
        name: 'model 1: yearly, three states, Gompertz mortality',
        model: model1,
        strategies: golden1.strategies,
        results: ({ results }) => results,
        moving: [],
        tolerance: 1e-10,
      },
      simulator,
    );
    const monthly = {
      model: model2,
      strategies: golden2.strategies,
      moving: ['entry', 'death'],
      tolerance: 1e-9,
    };
    suite(
      {
        ...monthly,
        name: 'model 2: monthly, rates, discounted continuously',
        results: ({ results_continuous }) => results_continuous,
      },
      simulator,
    );
    suite(
      {
        ...monthly,
        name: 'model 2: monthly, rates, discounted at whole years',
        results: ({ results_annualStep }) => results_annualStep,
        wholeYears: true,
      },
      simulator,
    );
    suite(
      {
        name: 'model 3: yearly, time in state',
        model: model3,
        strategies: golden3.strategies,
        results: ({ results }) => results,
        moving: ['admission'],
        tolerance: 1e-10,
      },
      simulator,
    );

    describe('HIV therapy (Chancellor et al. 1997)', () => {
      const golden = cohort.published_example;
      it.each(HIV)('%s', (convention, index) => {
        const want = golden.results[index];
        const runs = simulator(hivModel(convention));
        const mono = run(runs, 'mono');
        const combination = run(runs, 'combination');
        expect(want?.convention).toBe(convention);
        nearRows(mono.trace, golden.trace_mono, 1e-10);
        nearRows(combination.trace, golden.trace_combination, 1e-10);
        near(mono.cost, want?.mono.cost as number, 1e-10, 'mono cost');
        near(mono.outcome, want?.mono.ly as number, 1e-10, 'mono years');
        near(mono.lifeYears, want?.mono.ly as number, 1e-10, 'mono life years');
        near(combination.cost, want?.combination.cost as number, 1e-10, 'combination cost');
        near(combination.outcome, want?.combination.ly as number, 1e-10, 'combination years');
        const icer = (combination.cost - mono.cost) / (combination.outcome - mono.outcome);
        near(icer, want?.icer as number, 1e-8, 'icer');
      });

      it('published: 44,663 and 7.99; 50,602 and 8.94; 6,276 per life year', () => {
        const [mono, combination] = simulator(hivModel('end')) as [Run, Run];
        expect(Math.round(mono.cost)).toBe(44_663);
        expect(mono.lifeYears.toFixed(2)).toBe('7.99');
        expect(Math.round(combination.cost)).toBe(50_602);
        expect(combination.lifeYears.toFixed(2)).toBe('8.94');
        const years = combination.lifeYears - mono.lifeYears;
        expect(Math.round((combination.cost - mono.cost) / years)).toBe(6_276);
      });
    });

    describe('closed forms', () => {
      for (const form of cohort.closed_forms) {
        if (form.id === 'two-state-geometric') {
          const z = form.inputs as { p: number; r: number; N: number };
          it(`${form.id}, p = ${z.p}`, () =>
            geometric(simulator, z, form.expected as unknown as Totals));
        } else if (form.id === 'absorbing-chain-fundamental-matrix') {
          const z = form.inputs as unknown as FundamentalInputs;
          const expected = form.expected as unknown as FundamentalExpected;
          it(`${form.id}, ${z.P.length} states`, () => fundamental(simulator, z, expected));
        } else {
          const z = form.inputs as HazardInputs;
          const expected = form.expected as { by_method: Record<Convention, number> };
          it(`${form.id}, hazard ${z.h}`, () => hazard(simulator, z, expected.by_method));
        }
      }
    });
  });
}

/** Life years of a constant chance of death: geometric sums. */
function geometric(simulator: Simulator, z: { p: number; r: number; N: number }, want: Totals) {
  const matrix = [
    [1 - z.p, z.p],
    [0, 1],
  ];
  for (const convention of ['start', 'end', 'trapezoid'] as const) {
    const chain = { cycles: z.N, dt: 1, rC: 0, rO: z.r, matrix, convention };
    const [got] = simulator(chainModel(chain)) as [Run];
    near(got.lifeYears, want[`ly_${convention}`] as number, 1e-10, convention);
    near(got.outcome, want[`ly_disc_${convention}`] as number, 1e-10, `${convention} discounted`);
  }
  const forever = { cycles: Math.ceil(26 / z.p), dt: 1, rC: 0, rO: z.r, matrix };
  const [got] = simulator(chainModel(forever)) as [Run];
  near(got.lifeYears, want.ly_infinite_start as number, 1e-10, 'for ever');
  near(got.outcome, want.ly_disc_infinite_start as number, 1e-10, 'for ever, discounted');
}

interface FundamentalInputs {
  readonly P: number[][];
  readonly r: number;
}
interface FundamentalExpected {
  readonly fundamental: number[][];
  readonly discounted: number[][];
}

/** Time in each transient state: the fundamental matrix of an absorbing chain. */
function fundamental(simulator: Simulator, z: FundamentalInputs, want: FundamentalExpected) {
  want.discounted.forEach((discounted, from) => {
    for (const [r, expected] of [
      [z.r, discounted],
      [0, want.fundamental[from] as number[]],
    ] as const) {
      const chain = { cycles: 600, dt: 1, rC: 0, rO: r, matrix: z.P, from };
      const [got] = simulator(chainModel(chain)) as [Run];
      expected.forEach((cycles, i) => {
        const spent = got.byPayoff.find(({ state }) => state === `s${i}`)?.total ?? 0;
        near(spent, cycles, 1e-10, `from ${from} in ${i}`);
      });
      near(
        got.outcome,
        expected.reduce((a, b) => a + b, 0),
        1e-10,
        `from ${from}`,
      );
    }
  });
}

interface HazardInputs {
  readonly h: number;
  readonly r: number;
  readonly T: number;
  readonly dt: number;
}

/** A constant hazard by every convention, on every basis that can say it. */
function hazard(simulator: Simulator, z: HazardInputs, want: Record<Convention, number>) {
  const clock = { cycles: z.T / z.dt, dt: z.dt, rC: 0, rO: z.r };
  for (const convention of CONVENTION_NAMES) {
    for (const basis of ['generator', 'byRow', 'survival'] as const) {
      const [got] = simulator(hazardModel(z.h, clock, convention, basis)) as [Run];
      near(got.outcome, want[convention], 1e-10, `${convention} ${basis}`);
    }
  }
}
