/**
 * What each strategy's simulation reads from the graph, and all that this needs.
 */
import type { Booking, StrategyAccounts } from './accounts.ts';
import type { CohortPlan } from './compile.ts';
import { followedSubstates } from './followed.ts';
import type { Graph, NodeId } from './graph.ts';

/** What a strategy's simulation reads, all as columns. */
export interface Roots {
  readonly followed: Int32Array;
  readonly initial: NodeId[];
  readonly steps: { substates: Int32Array; factors: NodeId[] }[] | null;
  readonly curves: NodeId[] | null;
  readonly steady: Booking[];
  readonly varying: { tally: number; set: number; substates: Int32Array; factors: NodeId[] }[];
  readonly atStart: { tally: number; value: NodeId }[];
  readonly checks: CohortPlan['checks'];
}

export function strategyRoots(
  graph: Graph,
  plan: CohortPlan,
  accounts: StrategyAccounts,
  substates: number,
  trace: boolean,
): Roots {
  const followed = trace
    ? Int32Array.from({ length: substates }, (_, index) => index)
    : followedSubstates(plan, accounts);
  const column = (node: NodeId) => graph.column(node);
  const stepOf = (to: number) => {
    const moves = plan.moves!.filter((move) => move.to === to);
    return {
      substates: Int32Array.from(moves, ({ from }) => from),
      factors: moves.map(({ chance }) => column(chance)),
    };
  };
  return {
    followed,
    initial: Array.from(followed, (substate) => column(plan.initial[substate]!)),
    steps: plan.moves && Array.from(followed, stepOf),
    curves: plan.curves && Array.from(followed, (substate) => column(plan.curves![substate]!)),
    steady: accounts.steady.map((booking) => ({ ...booking, value: column(booking.value) })),
    varying: gather(accounts.varying).map(({ tally, set, bookings }) => ({
      tally,
      set,
      substates: Int32Array.from(bookings, ({ substate }) => substate),
      factors: bookings.map(({ value }) => column(value)),
    })),
    atStart: accounts.atStart.map(({ tally, value }) => ({ tally, value: column(value) })),
    checks: plan.checks,
  };
}

/** Varying values of one tally and weight set, to be summed in one pass. */
function gather(
  bookings: readonly Booking[],
): { tally: number; set: number; bookings: Booking[] }[] {
  const groups = new Map<string, { tally: number; set: number; bookings: Booking[] }>();
  for (const booking of bookings) {
    const key = `${booking.tally} ${booking.set}`;
    const group = groups.get(key) ?? { tally: booking.tally, set: booking.set, bookings: [] };
    group.bookings.push(booking);
    groups.set(key, group);
  }
  return [...groups.values()];
}

function rootNodes(roots: Roots): NodeId[] {
  return [
    ...roots.initial,
    ...(roots.steps?.flatMap(({ factors }) => factors) ?? []),
    ...(roots.curves ?? []),
    ...roots.steady.map(({ value }) => value),
    ...roots.varying.flatMap(({ factors }) => factors),
    ...roots.atStart.map(({ value }) => value),
    ...roots.checks.map(({ node }) => node),
  ];
}

/** The weighted occupancies that steady values are multiplied by, each once. */
export function sojournsOf(roots: Roots): { set: number; substate: number }[] {
  const found: { set: number; substate: number }[] = [];
  for (const { set, substate } of roots.steady) {
    if (!found.some((one) => one.set === set && one.substate === substate)) {
      found.push({ set, substate });
    }
  }
  return found;
}

/** Every node that the roots need, themselves included. */
export function reachedFrom(graph: Graph, roots: Roots): ReadonlySet<NodeId> {
  const found = new Set<NodeId>();
  const open = rootNodes(roots);
  for (let node = open.pop(); node !== undefined; node = open.pop()) {
    if (found.has(node)) continue;
    found.add(node);
    open.push(...graph.node(node).args);
  }
  return found;
}
