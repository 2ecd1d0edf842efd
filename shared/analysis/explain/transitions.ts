/**
 * What moves where within one cycle, by state: the chances and the flows of one cohort,
 * or of all profiles together. Where a state's chances differ among those who are in it
 * (by time in state, by profile), its chance is the mean over them.
 */
import type { ModelDocument } from '../../model/document.ts';
import { type Cohort, cohortsOf } from './cohort.ts';

export interface Transitions {
  /** Share of the cohort in each state at the start of the cycle, in document order. */
  readonly occupancy: readonly number[];
  /** Chance of each move: row = origin, column = destination; rows sum to 1. */
  readonly chance: readonly (readonly number[])[];
  /** Share of the cohort that makes each move: occupancy x chance. */
  readonly flow: readonly (readonly number[])[];
}

/**
 * The transition matrix in force during a cycle, states in document order.
 * @param profile id, or null for the whole population
 * @param cycle 0 .. N - 1
 * @returns null under survival curves, which have no movements
 * @throws DocumentError where the document has errors; RangeError for unknown ids, cycles
 */
export function transitionMatrixAt(
  document: ModelDocument,
  strategy: string,
  profile: string | null,
  cycle: number,
): readonly (readonly number[])[] | null {
  return transitionsAt(cohortsOf(document, strategy, profile), cycle)?.chance ?? null;
}

/** @param cohorts of one strategy; at least one */
export function transitionsAt(cohorts: readonly Cohort[], cycle: number): Transitions | null {
  const { model, plan } = cohorts[0] as Cohort;
  if (plan.moves === null) return null;
  if (!(cycle >= 0 && cycle < model.cycles)) throw new RangeError(`cycle ${cycle}`);
  const states = model.document.states.length;
  const flow = table(states);
  const newcomers = table(states);
  const occupancy = new Array<number>(states).fill(0);
  for (const cohort of cohorts) {
    const now = cohort.occupancy[cycle] as readonly number[];
    addOccupancy(occupancy, cohort, now);
    addMoves(flow, newcomers, cohort, now, cycle);
  }
  // Where nobody is: the chances that newcomers would have.
  const chance = flow.map((row, from) => {
    const there = occupancy[from] as number;
    return there > 0 ? row.map((part) => part / there) : (newcomers[from] as number[]);
  });
  return { occupancy, chance, flow };
}

function addOccupancy(occupancy: number[], { model, share }: Cohort, now: readonly number[]): void {
  model.substates.all.forEach(({ state }, substate) => {
    occupancy[state] = (occupancy[state] as number) + share * (now[substate] as number);
  });
}

function addMoves(
  flow: number[][],
  newcomers: number[][],
  cohort: Cohort,
  now: readonly number[],
  cycle: number,
): void {
  const { all } = cohort.model.substates;
  for (const { from, to, chance } of cohort.plan.moves ?? []) {
    const [origin, arrival] = [all[from]!, all[to]!];
    const value = cohort.share * cohort.value(chance, cycle);
    add(flow, origin.state, arrival.state, (now[from] as number) * value);
    if (origin.tunnel === 0) add(newcomers, origin.state, arrival.state, value);
  }
}

function add(to: number[][], row: number, column: number, value: number): void {
  const cells = to[row] as number[];
  cells[column] = (cells[column] as number) + value;
}

function table(size: number): number[][] {
  return Array.from({ length: size }, () => new Array<number>(size).fill(0));
}
