/**
 * How the share of the cohort in one state at one boundary came about, and where it goes
 * next: the flows of the cycle before and of the cycle after, or the start shares or
 * survival curves that it is made of.
 */
import type { ModelDocument } from '../../model/document.ts';
import { type Cohort, cohortsOf } from './cohort.ts';
import { explainFormula } from './formula.ts';
import { type FormulaSite, moveSite, siteOf } from './site.ts';
import { type Transitions, transitionsAt } from './transitions.ts';

export interface Flow {
  /** The state at the other end: the origin of an inflow, the destination of an outflow. */
  readonly state: string;
  /** Whether it is those who stay. */
  readonly stays: boolean;
  /** Share of the cohort in the origin at the start of the cycle. */
  readonly occupancy: number;
  /** Chance of the move within the cycle; the mean of those there where it differs. */
  readonly chance: number;
  /** Occupancy x chance. */
  readonly flow: number;
  /** Formula of the move; null for a remainder, and where it follows from others. */
  readonly site: FormulaSite | null;
}

/** A part of a sum of start shares or survival curves: `sign` x `value`. */
export interface ShareTerm {
  readonly sign: 1 | -1;
  /** The mean over profiles by their shares, for the whole population. */
  readonly value: number;
  /** Null for the whole (1), from which others are taken. */
  readonly site: FormulaSite | null;
}

export interface OccupancyExplanation {
  readonly occupancy: number;
  /** Flows of cycle - 1, which sum to the occupancy; none at 0 and under survival curves. */
  readonly inflows: readonly Flow[];
  /** Flows of `cycle`, which sum to it too; none at the horizon and under survival curves. */
  readonly outflows: readonly Flow[];
  /** Start shares at 0, or survival curves: sum to the occupancy where there are any. */
  readonly terms: readonly ShareTerm[];
}

/**
 * @param profile id, or null for the whole population
 * @param cycle boundary, 0..N
 * @throws DocumentError where the document has errors; RangeError for unknown ids, cycles
 */
export function explainOccupancy(
  document: ModelDocument,
  strategy: string,
  profile: string | null,
  state: string,
  cycle: number,
): OccupancyExplanation {
  const cohorts = cohortsOf(document, strategy, profile);
  const index = document.states.findIndex(({ id }) => id === state);
  const { cycles } = (cohorts[0] as Cohort).model;
  if (index < 0) throw new RangeError(`state ${state}`);
  if (!(cycle >= 0 && cycle <= cycles)) throw new RangeError(`cycle ${cycle}`);
  const before = cycle === 0 ? null : transitionsAt(cohorts, cycle - 1);
  const after = cycle === cycles ? null : transitionsAt(cohorts, cycle);
  return {
    occupancy: occupancyOf(cohorts, index, cycle),
    inflows: before ? flows(document, strategy, before, (from) => [from, index]) : [],
    outflows: after ? flows(document, strategy, after, (to) => [index, to]) : [],
    terms: shareTerms(document, strategy, profile, state, cycle),
  };
}

function occupancyOf(cohorts: readonly Cohort[], state: number, boundary: number): number {
  return cohorts.reduce((sum, { model, occupancy, share }) => {
    const first = model.substates.first[state] as number;
    const own = occupancy[boundary]!.slice(
      first,
      first + (model.substates.length[state] as number),
    );
    return sum + share * own.reduce((total, part) => total + part, 0);
  }, 0);
}

/** The moves that anybody could make, in document order. */
function flows(
  document: ModelDocument,
  strategy: string,
  { occupancy, chance, flow }: Transitions,
  move: (other: number) => [from: number, to: number],
): Flow[] {
  return document.states.flatMap(({ id }, other): Flow[] => {
    const [from, to] = move(other);
    const moving = chance[from]![to] as number;
    if (moving === 0) return [];
    const [origin, destination] = [document.states[from]!.id, document.states[to]!.id];
    return [
      {
        state: id,
        stays: from === to,
        occupancy: occupancy[from] as number,
        chance: moving,
        flow: flow[from]![to] as number,
        site: moveSite(document, strategy, origin, destination),
      },
    ];
  });
}

type Signed = readonly [sign: 1 | -1, site: FormulaSite | null];

function shareTerms(
  document: ModelDocument,
  strategy: string,
  profile: string | null,
  state: string,
  cycle: number,
): ShareTerm[] {
  const survival = document.movements.type === 'survival';
  if (cycle > 0 && !survival) return [];
  const signed = survival
    ? curvesOf(document, strategy, state)
    : startOf(document, strategy, state);
  return signed.map(([sign, site]) => ({
    sign,
    site,
    value: site ? meanValue(document, site.text, strategy, profile, cycle) : 1,
  }));
}

function startOf({ start }: ModelDocument, strategy: string, state: string): Signed[] {
  const site = (share: number) =>
    siteOf(start.shares[share]!.formula, ['start', 'shares', share, 'formula'], strategy);
  if (state === start.remainder) {
    return [[1, null], ...start.shares.map((_, share): Signed => [-1, site(share)])];
  }
  const own = start.shares.findIndex((share) => share.state === state);
  return own < 0 ? [] : [[1, site(own)]];
}

/** What lies between a state's own curve and the one before it. */
function curvesOf({ movements }: ModelDocument, strategy: string, state: string): Signed[] {
  if (movements.type !== 'survival') return [];
  const { curves, last } = movements;
  const site = (curve: number) =>
    siteOf(curves[curve]!.formula, ['movements', 'curves', curve, 'formula'], strategy);
  if (state === last)
    return [
      [1, null],
      [-1, site(curves.length - 1)],
    ];
  const own = curves.findIndex((curve) => curve.state === state);
  if (own < 0) return [];
  return own === 0
    ? [[1, site(0)]]
    : [
        [1, site(own)],
        [-1, site(own - 1)],
      ];
}

function meanValue(
  document: ModelDocument,
  text: string,
  strategy: string,
  profile: string | null,
  cycle: number,
): number {
  const at = (id: string) => explainFormula(document, text, { strategy, profile: id, cycle }).value;
  if (profile !== null) return at(profile);
  return document.profiles.reduce((sum, { id, share }) => sum + share * at(id), 0);
}
