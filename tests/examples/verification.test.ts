/**
 * Verification tests on the examples. The numbers are those of the list that the
 * project works to, in the tradition of TECH-VER (Büyükkaramikli et al. 2019) and
 * Tappenden and Chilcott 2014; tolerances: F relative 1e-9, E exact, S sign.
 */
import { describe, expect, it } from 'vitest';
import { againstComparator } from '../../shared/analysis/against-comparator.ts';
import { toHealth } from '../../shared/analysis/direction.ts';
import { frontierRows, incremental } from '../../shared/analysis/incremental.ts';
import { netBenefit } from '../../shared/analysis/net-benefit.ts';
import { prepare } from '../../shared/engine/engine.ts';
import { type BaseRun, BLOCK_DRAWS, type StrategyRun } from '../../shared/engine/results.ts';
import { EXAMPLE_SLUGS } from '../../shared/examples/slugs.ts';
import type { ModelDocument } from '../../shared/model/document.ts';
import { applyScenario } from '../../shared/model/scenario.ts';
import { expectClose, expectRelative } from '../engine/close.ts';
import { differences } from '../reference/compare.ts';
import { baseValues, simulate } from '../reference/simulate.ts';
import { asking, baseOf, discounting, exampleOf, runOf } from './load.ts';

const F = 1e-9;

const total = (values: readonly number[]): number => values.reduce((sum, value) => sum + value, 0);

const subtotal = (run: StrategyRun, measure: 'cost' | 'outcome'): number =>
  total(run.byPayoff.filter((each) => each.measure === measure).map((each) => each.total));

function optionsOf({ question }: ModelDocument, base: BaseRun) {
  const { direction } = question.outcome;
  return base.strategies.map(({ id, cost, outcome }) => ({
    id,
    cost,
    health: toHealth(outcome, direction),
  }));
}

function expectSameTotals(got: BaseRun, want: BaseRun): void {
  for (const run of want.strategies) {
    expectRelative(runOf(got, run.id).cost, run.cost, F, `${run.id} cost`);
    expectRelative(runOf(got, run.id).outcome, run.outcome, F, `${run.id} outcome`);
    expectRelative(runOf(got, run.id).lifeYears, run.lifeYears, F, `${run.id} life years`);
  }
}

describe.each(EXAMPLE_SLUGS)('%s', (slug) => {
  const document = exampleOf(slug);
  const base = baseOf(document);
  const { states, question } = document;

  it('runs without a problem', () => {
    expect(base.problems).toEqual([]);
  });

  it('agrees with the plain reference simulator', () => {
    const want = simulate(document, baseValues(document));
    expect(differences(document, base.strategies, want)).toEqual([]);
  });

  it('T1, T2: occupancy is never below 0 and sums to the cohort', () => {
    for (const { id, trace } of base.strategies) {
      expect(trace).toHaveLength(base.cycles + 1);
      for (const row of trace ?? []) {
        expect(Math.min(...row), id).toBeGreaterThanOrEqual(0);
        expectClose(total(row), 1, F, id);
      }
    }
  });

  it('T5: nobody leaves an absorbing state', () => {
    states.forEach(({ type }, index) => {
      if (type !== 'absorbing') return;
      for (const { trace = [] } of base.strategies) {
        const shares = trace.map((row) => row[index] ?? Number.NaN);
        shares.slice(1).forEach((share, k) => {
          expect(share).toBeGreaterThanOrEqual((shares[k] ?? 0) - 1e-15);
        });
      }
    });
  });

  it('T7: the dead earn nothing', () => {
    const dead = states.filter((state) => state.dead).map(({ id }) => id);
    expect(dead).toEqual([expect.any(String)]);
    const earned = base.strategies.flatMap(({ byPayoff }) =>
      byPayoff.filter(({ state }) => state !== null && dead.includes(state)),
    );
    expect(earned.every((each) => each.total === 0)).toBe(true);
  });

  it('T26: subtotals of payoffs sum to the totals', () => {
    for (const run of base.strategies) {
      expectRelative(subtotal(run, 'cost'), run.cost, F, run.id);
      expectRelative(subtotal(run, 'outcome'), run.outcome, F, run.id);
    }
  });

  it('T61: profiles, weighted by their shares, sum to the totals', () => {
    const shareOf = new Map(document.profiles.map(({ id, share }) => [id, share]));
    for (const run of base.strategies) {
      for (const measure of ['cost', 'outcome', 'lifeYears'] as const) {
        const parts = run.byProfile.map((each) => (shareOf.get(each.id) ?? 0) * each[measure]);
        expectRelative(total(parts), run[measure], F, `${run.id} ${measure}`);
      }
    }
  });

  it('T30, T31: discounting lowers what is not negative, and not at all at 0%', () => {
    const undiscounted = baseOf(discounting(document, { costs: 0, outcomes: 0 }));
    const harsh = baseOf(discounting(document, { costs: 0.1, outcomes: 0.1 }));
    for (const { id, lifeYears } of base.strategies) {
      expect(runOf(harsh, id).cost).toBeLessThan(runOf(undiscounted, id).cost);
      expect(runOf(harsh, id).outcome).toBeLessThan(runOf(undiscounted, id).outcome);
      expectRelative(runOf(undiscounted, id).lifeYears, lifeYears, F, id);
      expectRelative(runOf(harsh, id).lifeYears, lifeYears, F, id);
    }
  });

  it('T33: the rate for costs leaves outcomes as they are, and the reverse', () => {
    const costs = baseOf(discounting(document, { costs: 0.08 }));
    const outcomes = baseOf(discounting(document, { outcomes: 0.08 }));
    for (const run of base.strategies) {
      expect(runOf(costs, run.id).outcome).toBe(run.outcome);
      expect(runOf(outcomes, run.id).cost).toBe(run.cost);
      expect(runOf(costs, run.id).cost).not.toBe(run.cost);
      expect(runOf(outcomes, run.id).outcome).not.toBe(run.outcome);
    }
  });

  it('T35: a longer horizon changes no earlier cycle and takes no life years away', () => {
    const horizon = question.horizon + 2 * question.cycleLength;
    const longer = baseOf(asking(document, { horizon }));
    for (const run of base.strategies) {
      const after = runOf(longer, run.id);
      expect(after.trace?.slice(0, base.cycles + 1)).toEqual(run.trace);
      expect(after.lifeYears).toBeGreaterThanOrEqual(run.lifeYears);
    }
  });

  it('T37: the trapezoid is the mean of counting at the start and at the end', () => {
    const [start, end, trapezoid] = (['start', 'end', 'trapezoid'] as const).map((counting) =>
      baseOf(asking(document, { counting })),
    ) as [BaseRun, BaseRun, BaseRun];
    for (const { id } of base.strategies) {
      for (const measure of ['cost', 'outcome', 'lifeYears'] as const) {
        const mean = (runOf(start, id)[measure] + runOf(end, id)[measure]) / 2;
        expectRelative(runOf(trapezoid, id)[measure], mean, F, `${id} ${measure}`);
      }
    }
  });

  it('T39, T42: a copy of a strategy ties with it and changes no other', () => {
    const options = optionsOf(document, base);
    const twice = [...options, { ...options[0]!, id: 'copy' }];
    const rows = new Map(incremental(twice).map((row) => [row.id, row]));
    for (const row of incremental(options)) {
      const { status, icer } = row;
      expect(rows.get(row.id)).toMatchObject({ status, icer });
    }
    expect(rows.get('copy')?.tiedWith).toBe(options[0]?.id);
    const copy = againstComparator(twice, options[0]!.id, 1).find(({ id }) => id === 'copy');
    expect(copy).toMatchObject({ word: 'noDifference', icer: null, inmb: 0 });
  });

  it('T41: swapping the comparator turns the signs of the increments', () => {
    const options = optionsOf(document, base);
    for (const { id: other } of options) {
      const there = againstComparator(options, question.comparator, 1_000);
      const back = againstComparator(options, other, 1_000);
      const [a, b] = [
        there.find(({ id }) => id === other),
        back.find(({ id }) => id === question.comparator),
      ];
      expect(a?.incrementalCost).toBeCloseTo(-(b?.incrementalCost ?? Number.NaN), 9);
      expect(a?.incrementalHealth).toBeCloseTo(-(b?.incrementalHealth ?? Number.NaN), 9);
      expect(a?.inmb).toBeCloseTo(-(b?.inmb ?? Number.NaN), 6);
    }
  });

  it('T43: the order of strategies, profiles, parameters and variables does not matter', () => {
    const turned = {
      ...document,
      strategies: [...document.strategies].reverse(),
      profiles: [...document.profiles].reverse(),
      parameters: [...document.parameters].reverse(),
      variables: [...document.variables].reverse(),
      payoffs: [...document.payoffs].reverse(),
    };
    expectSameTotals(baseOf(turned), base);
  });

  it('T44: at a threshold of 0 the cheapest is best, at a huge one the most effective', () => {
    const options = optionsOf(document, base);
    const cheapest = [...options].sort((a, b) => a.cost - b.cost)[0]?.id;
    const strongest = [...options].sort((a, b) => b.health - a.health)[0]?.id;
    expect(netBenefit(options, 0).best).toBe(cheapest);
    expect(netBenefit(options, 1e9).best).toBe(strongest);
  });

  it('T45, T46: ICERs rise along the frontier, and neighbours tie at them', () => {
    const options = optionsOf(document, base);
    const frontier = frontierRows(incremental(options));
    expect(frontier.length).toBeGreaterThan(1);
    frontier.slice(1).forEach((row, k) => {
      const icer = row.icer ?? Number.NaN;
      expect(icer).toBeGreaterThan(frontier[k]?.icer ?? 0);
      expect(netBenefit(options, icer).tied.slice().sort()).toEqual(
        [row.id, frontier[k]?.id].sort(),
      );
    });
  });

  it('T48: with nothing uncertain, every draw is the base case', () => {
    const certain = {
      ...document,
      groups: [],
      parameters: document.parameters.map((each) => ({
        ...each,
        distribution: { type: 'fixed' as const },
      })),
    };
    const { cost, outcome } = prepare(certain).draws({ samples: 3, seed: 1, plan: 'plain' }, 0, 3);
    base.strategies.forEach((run, index) => {
      for (const draw of cost[index] ?? []) expectRelative(draw, run.cost, F, run.id);
      for (const draw of outcome[index] ?? []) expectRelative(draw, run.outcome, F, run.id);
    });
  });

  it('T3, T4, T49: no draw leaves the range of a probability; the same seed gives the same', () => {
    const { seed, plan } = document.analysis;
    const settings = { samples: 1_000, seed, plan };
    const [once, again] = [0, 1].map(() => prepare(document).draws(settings, 0, BLOCK_DRAWS));
    expect(once?.problems).toEqual([]);
    expect(once).toEqual(again);
    const other = prepare(document).draws({ ...settings, seed: seed + 1 }, 0, 1);
    expect(other.cost[0]?.[0]).not.toBe(once?.cost[0]?.[0]);
  });

  it('T63: a document that is saved and read again gives the same', () => {
    expect(baseOf(JSON.parse(JSON.stringify(document)))).toEqual(base);
  });

  it.each(document.scenarios.map(({ id }) => id))(
    'scenario %s runs, and changes the answer',
    (id) => {
      const changed = baseOf(applyScenario(document, id));
      expect(changed.problems).toEqual([]);
      const moved = base.strategies.filter(({ id: strategy, cost, outcome }) => {
        const run = runOf(changed, strategy);
        return run.cost !== cost || run.outcome !== outcome;
      });
      expect(moved.length).toBeGreaterThan(0);
    },
  );
});
