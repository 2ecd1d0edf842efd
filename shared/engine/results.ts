/** What the engine gives back: plain data that can be posted between threads. */
import type { Issue } from '../model/issue.ts';

/** Changes whenever the same document and settings could give other numbers. */
export const ENGINE_VERSION = '1.0.0';

export interface SamplingSettings {
  /** Number of draws, 1 or more. */
  readonly samples: number;
  /** Unsigned 32-bit integer; the same seed gives the same draws. */
  readonly seed: number;
  readonly plan: 'plain' | 'lhs' | 'sobol';
}

/** Totals per person, discounted as the question says, except `lifeYears`. */
export interface Totals {
  /** Money per person. */
  readonly cost: number;
  /** Primary outcome per person, in its own direction (a DALY count is not turned). */
  readonly outcome: number;
  /** Years spent in states that are not dead, undiscounted, counted as payoffs are. */
  readonly lifeYears: number;
}

export interface ProfileTotals extends Totals {
  readonly id: string;
}

/** One payoff's total per person, split by the state or moment it fell in. */
export interface PayoffTotal {
  readonly payoff: string;
  readonly measure: 'cost' | 'outcome';
  readonly category: string;
  /** State whose occupancy earned it; null for movements, one-off and start payoffs. */
  readonly state: string | null;
  readonly total: number;
}

export interface StrategyRun extends Totals {
  readonly id: string;
  readonly byProfile: readonly ProfileTotals[];
  readonly byPayoff: readonly PayoffTotal[];
  /** Share of the cohort in each state (document order) at boundaries 0..N; when asked for. */
  readonly trace?: readonly (readonly number[])[];
}

/** The base case: every parameter at its value. Strategies in document order. */
export interface BaseRun {
  readonly strategies: readonly StrategyRun[];
  /** Length of a cycle in years and number of cycles, for reading the trace. */
  readonly cycleLength: number;
  readonly cycles: number;
  /** Warnings and errors that only running shows, such as a remainder below 0. */
  readonly problems: readonly Issue[];
}

/** Draws `from`..`to` (end not included) of a probabilistic run. */
export interface DrawsBlock {
  readonly from: number;
  readonly to: number;
  /** By strategy in document order, one value a draw: money per person. */
  readonly cost: readonly Float64Array[];
  /** By strategy in document order, one value a draw: primary outcome per person, not turned. */
  readonly outcome: readonly Float64Array[];
  /** What went wrong in these draws; params say draw, cycle, strategy and profile of the first, and the count. */
  readonly problems: readonly Issue[];
}

/** Draws per block: fixed, so that results do not depend on the number of workers. */
export const BLOCK_DRAWS = 125;
