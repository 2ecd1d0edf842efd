/**
 * What a run adds up, and how. Each payoff term is booked to a tally under a set of
 * weights. A value that is the same in every cycle needs only the weighted
 * occupancy of its substate, summed once for all such values; a value that varies
 * with the cycle is multiplied cycle by cycle.
 */
import type { CohortPlan, CompiledModel } from './compile.ts';
import { boundaryWeights, type CountingWeights, countingWeights } from './counting.ts';
import { discountFactor } from './discount.ts';
import { type NodeId, VARIES } from './graph.ts';
import type { PayoffTerm } from './payoffs.ts';

/** Weights of a cycle's start and end by cycle, and of the boundaries 0..N for steady values. */
export interface WeightSet {
  readonly start: Float64Array;
  readonly end: Float64Array;
  readonly boundary: Float64Array;
}

export interface Booking {
  readonly tally: number;
  /** Index of the weight set. */
  readonly set: number;
  readonly substate: number;
  readonly value: NodeId;
}

export interface Accounts {
  readonly tallies: number;
  readonly sets: readonly WeightSet[];
  /** By strategy. */
  readonly plans: readonly StrategyAccounts[];
}

export interface StrategyAccounts {
  /** Values that are the same in every cycle. */
  readonly steady: readonly Booking[];
  /** Values that vary with the cycle. */
  readonly varying: readonly Booking[];
  /** Amounts of the whole cohort at time 0. */
  readonly atStart: readonly { readonly tally: number; readonly value: NodeId }[];
}

/** Which tally a term belongs to. */
export type TallyOf = (term: PayoffTerm, strategy: number) => number;

export interface TallyPlan {
  readonly tallies: number;
  readonly tallyOf: TallyOf;
  /** Tally of undiscounted years alive, where wanted. */
  readonly lifeYears: number | null;
}

/** Books every term of every strategy. */
export function openAccounts(model: CompiledModel, tallyPlan: TallyPlan): Accounts {
  const sets = new WeightSets(model);
  const plans = model.plans.map((plan, strategy) => {
    const booker = new Booker(model, sets);
    for (const term of plan.terms) booker.book(term, tallyPlan.tallyOf(term, strategy));
    if (tallyPlan.lifeYears !== null) booker.bookLifeYears(plan, tallyPlan.lifeYears);
    return booker.accounts();
  });
  return { tallies: tallyPlan.tallies, sets: sets.all, plans };
}

class Booker {
  private readonly byKey = new Map<string, { booking: Omit<Booking, 'value'>; values: NodeId[] }>();
  private readonly atStart = new Map<number, NodeId[]>();

  constructor(
    private readonly model: CompiledModel,
    private readonly sets: WeightSets,
  ) {}

  book(term: PayoffTerm, tally: number): void {
    if (this.model.graph.valueOf(term.value) === 0) return;
    if (term.substate === null) this.push(this.atStart, tally, term.value);
    else if (term.moment !== 'start') {
      const set = this.sets.of(term.measure, term.moment);
      if (set !== null) this.add({ tally, set, substate: term.substate }, term.value);
    }
  }

  bookLifeYears(plan: CohortPlan, tally: number): void {
    const { document, graph, substates } = this.model;
    const year = graph.constant(document.question.cycleLength);
    const set = this.sets.undiscounted();
    plan.initial.forEach((_, substate) => {
      const state = substates.all[substate]!.state;
      if (!document.states[state]!.dead) this.add({ tally, set, substate }, year);
    });
  }

  /** Values of one tally, set and substate are summed in the graph, before simulating. */
  accounts(): StrategyAccounts {
    const { graph } = this.model;
    const bookings = [...this.byKey.values()].map(({ booking, values }) => ({
      ...booking,
      value: graph.sum(values),
    }));
    const varies = ({ value }: Booking) => (graph.node(value).varies & VARIES.cycle) !== 0;
    return {
      steady: bookings.filter((booking) => !varies(booking)),
      varying: bookings.filter(varies),
      atStart: [...this.atStart].map(([tally, values]) => ({ tally, value: graph.sum(values) })),
    };
  }

  private add(booking: Omit<Booking, 'value'>, value: NodeId): void {
    const varies = this.model.graph.node(value).varies & VARIES.cycle;
    const key = `${booking.tally} ${booking.set} ${booking.substate} ${varies}`;
    const known = this.byKey.get(key);
    if (known) known.values.push(value);
    else this.byKey.set(key, { booking, values: [value] });
  }

  private push(map: Map<number, NodeId[]>, tally: number, value: NodeId): void {
    const known = map.get(tally);
    if (known) known.push(value);
    else map.set(tally, [value]);
  }
}

/** The weight sets in use; sets of equal weights are one. */
class WeightSets {
  readonly all: WeightSet[] = [];
  private readonly byKey = new Map<string, number>();
  private readonly counting: Record<'cost' | 'outcome', CountingWeights>;

  constructor(private readonly model: CompiledModel) {
    const { question } = model.document;
    this.counting = {
      cost: countingWeights(question, question.discounting.costs, model.cycles),
      outcome: countingWeights(question, question.discounting.outcomes, model.cycles),
    };
  }

  /** Index of the set, or null where the moment lies beyond the horizon. */
  of(measure: 'cost' | 'outcome', moment: Exclude<PayoffTerm['moment'], 'start'>): number | null {
    const { start, end, move } = this.counting[measure];
    if (moment === 'occupancy') return this.occupancy(start, end);
    if (moment === 'moves') return this.occupancy(move, new Float64Array(move.length));
    if (moment.boundary > this.model.cycles) return null;
    return this.once(measure, moment.boundary);
  }

  undiscounted(): number {
    const { start, end } = countingWeights(this.model.document.question, 0, this.model.cycles);
    return this.occupancy(start, end);
  }

  private occupancy(start: Float64Array, end: Float64Array): number {
    return this.keep({ start, end, boundary: boundaryWeights({ start, end }) });
  }

  private once(measure: 'cost' | 'outcome', at: number): number {
    const { question } = this.model.document;
    const { discounting, cycleLength } = question;
    const rate = measure === 'cost' ? discounting.costs : discounting.outcomes;
    const boundary = new Float64Array(this.model.cycles + 1);
    boundary[at] = discountFactor(rate, at * cycleLength, discounting.wholeYears);
    const none = new Float64Array(this.model.cycles);
    return this.keep({ start: none, end: none, boundary });
  }

  private keep(set: WeightSet): number {
    const key = `${set.start};${set.end};${set.boundary}`;
    const known = this.byKey.get(key);
    if (known !== undefined) return known;
    this.byKey.set(key, this.all.length);
    return this.all.push(set) - 1;
  }
}
