/** What every movement basis gives and is given. */
import type { Row } from '../../model/document.ts';
import type { Path } from '../../model/issue.ts';
import type { NodeId } from '../graph.ts';
import type { Lowering, Place } from '../lower.ts';

/** The chance of moving to a state within a cycle. */
export interface Chance {
  /** Index of the destination state; the origin's own for staying. */
  readonly to: number;
  readonly chance: NodeId;
}

/** A quantity that must stay within bounds, looked at wherever it is computed. */
export interface Check {
  readonly node: NodeId;
  readonly low: number;
  readonly high: number;
  readonly code: string;
  readonly path: Path;
  readonly strategy: string;
}

/** One row of one strategy, seen from one substate of its origin. */
export interface RowPlace<R extends Row = Row> {
  readonly row: R;
  /** Path of the row in the document. */
  readonly path: Path;
  readonly place: Place;
  readonly lowering: Lowering;
  /** Index of a state by id. */
  readonly stateIndex: (id: string) => number;
  /** Asks for a check. */
  readonly check: (check: Omit<Check, 'strategy'>) => void;
}

/** Rounding that a probability may be out of bounds by. */
export const SLACK = 1e-12;

export function cellPath(at: RowPlace, cell: number): Path {
  return [...at.path, 'cells', cell, 'formula'];
}
