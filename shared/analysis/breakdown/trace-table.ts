/** The cohort trace as rows for charts and tables. */
import type { BaseRun } from '../../engine/results.ts';
import type { ModelDocument } from '../../model/document.ts';

export interface TraceRow {
  /** Boundary: cycles gone by, 0..N. */
  readonly cycle: number;
  /** Years from the start. */
  readonly time: number;
  /** Share of the population in each state, in document order; sums to 1. */
  readonly shares: readonly number[];
  /** Share in states that are not dead. */
  readonly alive: number;
}

/**
 * Rows of one strategy, the whole population together.
 * @throws RangeError where the run has no such strategy, or kept no trace
 */
export function traceTable(document: ModelDocument, base: BaseRun, strategy: string): TraceRow[] {
  const trace = base.strategies.find(({ id }) => id === strategy)?.trace;
  if (!trace) throw new RangeError(`trace of ${strategy}`);
  return trace.map((shares, cycle) => ({
    cycle,
    time: cycle * base.cycleLength,
    shares,
    alive: aliveOf(document, shares),
  }));
}

export interface Survivors {
  readonly id: string;
  /** Share alive when the model ends: what happens to them later is not counted. */
  readonly alive: number;
  /** Share in each state at the end, in document order. */
  readonly shares: readonly number[];
}

/**
 * Who is left at the end of the horizon, by strategy.
 * @throws RangeError where the run kept no trace
 */
export function survivors(document: ModelDocument, base: BaseRun): Survivors[] {
  return base.strategies.map(({ id, trace }) => {
    const shares = trace?.at(-1);
    if (!shares) throw new RangeError(`trace of ${id}`);
    return { id, shares, alive: aliveOf(document, shares) };
  });
}

function aliveOf({ states }: ModelDocument, shares: readonly number[]): number {
  return shares.reduce((sum, share, state) => (states[state]?.dead ? sum : sum + share), 0);
}
