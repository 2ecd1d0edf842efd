/**
 * Addresses that a cohort's simulation reads and writes. Occupancy is stepped from one
 * set of columns to another and back, so each address comes for both sides.
 */
import { address } from './execute.ts';
import type { Dot, Program, Slot, StrategyProgram } from './program.ts';

/** Addresses of a sum of products whose occupancy is on one of the two sides. */
interface PreparedDot {
  readonly left: Int32Array;
  readonly right: Factors;
}

/** One of the two sets of occupancy columns, with every address that lies in it. */
export interface Side {
  readonly base: number;
  readonly steps: readonly PreparedDot[];
  readonly varying: readonly PreparedDot[];
  /** Column of each sojourn's substate. */
  readonly sojourns: Int32Array;
}

export interface PreparedStrategy {
  readonly program: StrategyProgram;
  readonly occupancy: readonly [number, number];
  readonly sides: readonly Side[];
  /** By followed substate, its first sojourn: counted in the pass of the step; -1 for none. */
  readonly firstSojourn: Int32Array;
  /** By sojourn, whether it is the first of its substate. */
  readonly isFirst: readonly boolean[];
}

/** The factors' addresses at a cycle; rewritten only where some are on a tape. */
class Factors {
  private readonly now: Int32Array;
  private readonly onTape: boolean;

  constructor(private readonly slots: readonly Slot[]) {
    this.now = Int32Array.from(slots, ({ base }) => base);
    this.onTape = slots.some(({ stride }) => stride !== 0);
  }

  at(cycle: number): Int32Array {
    if (this.onTape) {
      for (let k = 0; k < this.slots.length; k++) this.now[k] = address(this.slots[k]!, cycle);
    }
    return this.now;
  }
}

/** Every address that a cohort's simulation needs, worked out once. */
export function prepareStrategy(strategy: StrategyProgram, program: Program): PreparedStrategy {
  const { occupancy } = program.work;
  const first = (substate: number) =>
    strategy.sojourns.findIndex((sojourn) => sojourn.substate === substate);
  return {
    program: strategy,
    occupancy,
    firstSojourn: strategy.followed.map(first),
    isFirst: strategy.sojourns.map(({ substate }, k) => first(substate) === k),
    sides: occupancy.map((base) => side(strategy, base, program.width)),
  };
}

function side(strategy: StrategyProgram, base: number, width: number): Side {
  const position = new Map(Array.from(strategy.followed, (substate, k) => [substate, k]));
  const column = (substate: number) => base + position.get(substate)! * width;
  const dot = ({ substates, factors }: Dot): PreparedDot => ({
    left: substates.map(column),
    right: new Factors(factors),
  });
  return {
    base,
    steps: strategy.steps?.map(dot) ?? [],
    varying: strategy.varying.map((one) => dot(one.dot)),
    sojourns: Int32Array.from(strategy.sojourns, ({ substate }) => column(substate)),
  };
}
