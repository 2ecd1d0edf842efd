/**
 * The reference simulator: one draw, one strategy, one profile, one cycle at a
 * time. Slow and plain on purpose: a second opinion on the engine, sharing with it
 * only the document's types and the formula parser.
 */
import type { ModelDocument, Payoff, Profile } from '../../shared/model/document.ts';
import type { Setting } from './evaluate.ts';
import { type Occupancy, occupancy } from './occupancy.ts';
import { type ByState, lifeYears, payoffTotals } from './payoff.ts';

export interface ReferenceTotals {
  readonly cost: number;
  readonly outcome: number;
  readonly lifeYears: number;
}

export interface ReferencePayoff {
  readonly payoff: string;
  readonly state: string | null;
  readonly total: number;
}

export interface ReferenceRun extends ReferenceTotals {
  readonly id: string;
  readonly byProfile: readonly (ReferenceTotals & { readonly id: string })[];
  /** Payoffs that the strategy has, in document order, all profiles together. */
  readonly byPayoff: readonly ReferencePayoff[];
  /** Share in each state of the document at boundaries 0..N, all profiles together. */
  readonly trace: readonly (readonly number[])[];
}

/** `values` gives every parameter, by symbol; strategies come in document order. */
export function simulate(
  document: ModelDocument,
  values: Readonly<Record<string, number>>,
): ReferenceRun[] {
  return document.strategies.map(({ id }) => {
    const parts = document.profiles.map((profile) =>
      simulateProfile({ document, values, strategy: id, profile }),
    );
    return combine(document, id, parts);
  });
}

/** Every parameter at its base-case value. */
export function baseValues(document: ModelDocument): Record<string, number> {
  return Object.fromEntries(document.parameters.map(({ symbol, value }) => [symbol, value]));
}

interface Part extends ReferenceTotals {
  readonly profile: Profile;
  readonly payoffs: readonly { readonly payoff: Payoff; readonly byState: ByState }[];
  readonly trace: readonly (readonly number[])[];
}

function simulateProfile(setting: Setting): Part {
  const { document, strategy, profile } = setting;
  const cohort = occupancy(setting);
  const payoffs = document.payoffs
    .filter((payoff) => !payoff.strategies || payoff.strategies.includes(strategy))
    .map((payoff) => ({ payoff, byState: payoffTotals(payoff, setting, cohort) }));
  const sum = (measure: Payoff['measure']): number =>
    payoffs
      .filter(({ payoff }) => payoff.measure === measure)
      .flatMap(({ byState }) => [...byState.values()])
      .reduce((a, b) => a + b, 0);
  return {
    profile,
    cost: sum('cost'),
    outcome: sum('outcome'),
    lifeYears: lifeYears(setting, cohort),
    payoffs,
    trace: stateTrace(document, cohort),
  };
}

function stateTrace(document: ModelDocument, cohort: Occupancy): number[][] {
  return cohort.shares.map((shares) =>
    document.states.map(({ id }) =>
      shares.reduce((sum, x, i) => (cohort.places[i]?.state === id ? sum + x : sum), 0),
    ),
  );
}

function combine(document: ModelDocument, id: string, parts: readonly Part[]): ReferenceRun {
  const mean = (of: (part: Part) => number): number =>
    parts.reduce((sum, part) => sum + part.profile.share * of(part), 0);
  const [first] = parts as [Part];
  return {
    id,
    cost: mean((part) => part.cost),
    outcome: mean((part) => part.outcome),
    lifeYears: mean((part) => part.lifeYears),
    byProfile: parts.map(({ profile, cost, outcome, lifeYears: years }) => ({
      id: profile.id,
      cost,
      outcome,
      lifeYears: years,
    })),
    byPayoff: first.payoffs.flatMap(({ payoff, byState }, p) =>
      [...byState.keys()].map((state) => ({
        payoff: payoff.id,
        state,
        total: mean((part) => part.payoffs[p]?.byState.get(state) as number),
      })),
    ),
    trace: first.trace.map((_, k) =>
      document.states.map((_, i) => mean((part) => part.trace[k]?.[i] as number)),
    ),
  };
}
