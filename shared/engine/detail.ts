/**
 * The base case in detail: every payoff by the state that earned it, so that totals
 * can be broken down by category and state, and each breakdown sums to the total.
 */
import type { TallyPlan } from './accounts.ts';
import type { CompiledModel } from './compile.ts';
import type { PayoffTotal, ProfileTotals, StrategyRun } from './results.ts';
import type { Listener } from './simulate.ts';

export interface DetailTallies {
  readonly plan: TallyPlan & { readonly lifeYears: number };
  /** Payoff and state index (null: none) of each tally but the last, which counts life years. */
  readonly keys: readonly { readonly payoff: number; readonly state: number | null }[];
}

/** One tally for each payoff and state that any strategy books to. */
export function detailTallies(model: CompiledModel): DetailTallies {
  const keys: { payoff: number; state: number | null }[] = [];
  const index = new Map<string, number>();
  const keyOf = (payoff: number, state: number | null) => `${payoff} ${state}`;
  const stateOf = (moment: unknown, substate: number | null) =>
    moment === 'occupancy' && substate !== null ? model.substates.all[substate]!.state : null;
  for (const { terms } of model.plans) {
    for (const { payoff, moment, substate } of terms) {
      const state = stateOf(moment, substate);
      if (index.has(keyOf(payoff, state))) continue;
      index.set(keyOf(payoff, state), keys.length);
      keys.push({ payoff, state });
    }
  }
  return {
    keys,
    plan: {
      tallies: keys.length + 1,
      tallyOf: ({ payoff, moment, substate }) =>
        index.get(keyOf(payoff, stateOf(moment, substate)))!,
      lifeYears: keys.length,
    },
  };
}

/** A listener (for columns of one draw) that gathers strategy runs. */
export function readDetail(
  model: CompiledModel,
  detail: DetailTallies,
  withTrace: boolean,
): Listener & { strategies(): StrategyRun[] } {
  const { document } = model;
  const runs = document.strategies.map(() => ({
    tallies: new Float64Array(detail.plan.tallies),
    byProfile: [] as ProfileTotals[],
    trace: Array.from({ length: model.cycles + 1 }, () => document.states.map(() => 0)),
  }));
  return {
    cohort(profile, strategy, memory, at) {
      const { id, share } = document.profiles[profile]!;
      const run = runs[strategy]!;
      const own = memory.subarray(at, at + detail.plan.tallies);
      own.forEach((value, tally) => {
        run.tallies[tally] = run.tallies[tally]! + share * value;
      });
      run.byProfile.push({ id, ...totals(model, detail, own) });
    },
    boundary(profile, strategy, boundary, memory, at) {
      const { share } = document.profiles[profile]!;
      const row = runs[strategy]!.trace[boundary]!;
      model.substates.all.forEach(({ state }, substate) => {
        row[state] = row[state]! + share * memory[at + substate]!;
      });
    },
    strategies: () =>
      runs.map((run, index) => ({
        id: document.strategies[index]!.id,
        ...totals(model, detail, run.tallies),
        byProfile: run.byProfile,
        byPayoff: payoffTotals(model, detail, run.tallies),
        ...(withTrace ? { trace: run.trace } : {}),
      })),
  };
}

function totals(model: CompiledModel, detail: DetailTallies, tallies: Float64Array) {
  const sum = { cost: 0, outcome: 0, lifeYears: tallies[detail.plan.lifeYears]! };
  detail.keys.forEach(({ payoff }, tally) => {
    sum[model.document.payoffs[payoff]!.measure] += tallies[tally]!;
  });
  return sum;
}

function payoffTotals(
  model: CompiledModel,
  detail: DetailTallies,
  tallies: Float64Array,
): PayoffTotal[] {
  return detail.keys.map(({ payoff, state }, tally) => {
    const { id, measure, category } = model.document.payoffs[payoff]!;
    const total = tallies[tally]!;
    const stateId = state === null ? null : model.document.states[state]!.id;
    return { payoff: id, measure, category, state: stateId, total };
  });
}
