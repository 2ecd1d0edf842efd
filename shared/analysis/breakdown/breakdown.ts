/**
 * Costs or outcomes of the base case split up: by category, by state, by profile. The
 * values of a strategy sum to its total, which is the run's own.
 */
import type { BaseRun, StrategyRun } from '../../engine/results.ts';
import type { ModelDocument } from '../../model/document.ts';

export type Measure = 'cost' | 'outcome';

export interface Breakdown {
  readonly measure: Measure;
  /** What the total is split by: categories (their text), ids of states or profiles. */
  readonly parts: readonly string[];
  readonly strategies: readonly {
    readonly id: string;
    /** One a part: money or outcome per person of the whole population. */
    readonly values: readonly number[];
    /** What belongs to no part; only by state: moves, one-off and start payoffs. */
    readonly rest: number;
    readonly total: number;
  }[];
}

/** Categories in the order in which the document first names them. */
export function byCategory(document: ModelDocument, base: BaseRun, measure: Measure): Breakdown {
  const own = document.payoffs.filter((payoff) => payoff.measure === measure);
  const parts = [...new Set(own.map(({ category }) => category))];
  return split(base, measure, parts, (run) => payoffsOf(run, measure, ({ category }) => category));
}

/** States that earn something of the measure, in document order. */
export function byState(document: ModelDocument, base: BaseRun, measure: Measure): Breakdown {
  const earning = new Set(
    base.strategies.flatMap(({ byPayoff }) =>
      byPayoff.filter((part) => part.measure === measure).map(({ state }) => state),
    ),
  );
  const parts = document.states.map(({ id }) => id).filter((id) => earning.has(id));
  return split(base, measure, parts, (run) => payoffsOf(run, measure, ({ state }) => state));
}

/** What each profile contributes: its own result times its share. */
export function byProfile(document: ModelDocument, base: BaseRun, measure: Measure): Breakdown {
  const parts = document.profiles.map(({ id }) => id);
  const shares = new Map(document.profiles.map(({ id, share }) => [id, share]));
  return split(base, measure, parts, (run) =>
    run.byProfile.map((own) => [own.id, (shares.get(own.id) ?? 0) * own[measure]]),
  );
}

type Entry = readonly [part: string | null, value: number];

function payoffsOf(
  { byPayoff }: StrategyRun,
  measure: Measure,
  partOf: (payoff: StrategyRun['byPayoff'][number]) => string | null,
): Entry[] {
  const own = byPayoff.filter((payoff) => payoff.measure === measure);
  return own.map((payoff) => [partOf(payoff), payoff.total]);
}

function split(
  { strategies }: BaseRun,
  measure: Measure,
  parts: readonly string[],
  entriesOf: (run: StrategyRun) => readonly Entry[],
): Breakdown {
  return {
    measure,
    parts,
    strategies: strategies.map((run) => {
      const sums = new Map<string | null, number>();
      for (const [part, value] of entriesOf(run)) sums.set(part, (sums.get(part) ?? 0) + value);
      const values = parts.map((part) => sums.get(part) ?? 0);
      return { id: run.id, values, rest: sums.get(null) ?? 0, total: run[measure] };
    }),
  };
}
