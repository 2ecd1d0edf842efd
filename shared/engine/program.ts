/**
 * The executable form of a compiled model: straight lists of instructions over one
 * memory, each list run as seldom as what it computes allows.
 */
import type { Operation } from './graph.ts';
import type { Check } from './movement/row.ts';

/** Where a value lives: `base`, moved on by `stride` doubles a cycle where it is kept for all. */
export interface Slot {
  readonly base: number;
  readonly stride: number;
}

export interface Instruction {
  readonly operation: Operation;
  readonly out: Slot;
  readonly args: readonly Slot[];
  /** One number a draw; else one number. */
  readonly wide: boolean;
}

export interface SlotCheck {
  readonly check: Check;
  readonly at: Slot;
  readonly wide: boolean;
}

/** Instructions that are run together, and what must then hold. */
export interface Stage {
  readonly instructions: readonly Instruction[];
  readonly checks: readonly SlotCheck[];
}

/** A sum of products over substates. */
export interface Dot {
  readonly substates: Int32Array;
  readonly factors: readonly Slot[];
}

export interface StrategyProgram {
  /** What varies with the cycle and serves this strategy alone. */
  readonly cycle: Stage;
  /** Substates that must be followed; the others do not matter to any sum. */
  readonly followed: Int32Array;
  readonly initial: readonly Slot[];
  /** By followed substate: where its occupancy comes from. Null under survival curves. */
  readonly steps: readonly Dot[] | null;
  /** By followed substate: its occupancy at the cycle's end. Null but under survival curves. */
  readonly curves: readonly Slot[] | null;
  /** Weighted occupancies to keep: of a substate under a weight set. */
  readonly sojourns: readonly { readonly set: number; readonly substate: number }[];
  /** Products of a sojourn and a steady value. */
  readonly steady: readonly {
    readonly tally: number;
    readonly sojourn: number;
    readonly value: Slot;
  }[];
  readonly varying: readonly {
    readonly tally: number;
    readonly set: number;
    readonly dot: Dot;
  }[];
  readonly atStart: readonly { readonly tally: number; readonly value: Slot }[];
}

export interface Program {
  /** Length of the memory in doubles, constants' and results' places included. */
  readonly size: number;
  /** Draws that a column holds. */
  readonly width: number;
  readonly constants: readonly { readonly at: number; readonly value: number }[];
  readonly parameters: readonly {
    readonly index: number;
    readonly at: number;
    readonly wide: boolean;
  }[];
  readonly covariates: readonly { readonly index: number; readonly at: number }[];
  readonly clocks: { readonly cycle: number; readonly boundary: number };
  /** Run once a block of draws. */
  readonly once: Stage;
  /** Run for each cycle, once a block: serves all profiles and strategies. */
  readonly tape: Stage;
  /** Run once a profile. */
  readonly profile: Stage;
  /** Run for each cycle, once a profile: serves several strategies. */
  readonly profileTape: Stage;
  readonly strategies: readonly StrategyProgram[];
  /** Places of the simulation's own columns. */
  readonly work: {
    /** Two sets of occupancy columns, a substate each. */
    readonly occupancy: readonly [number, number];
    /** One column a sojourn of the strategy with most. */
    readonly sojourns: number;
    /** One column a tally. */
    readonly tallies: number;
    readonly scratch: number;
  };
}
