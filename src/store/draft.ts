/**
 * The draft in memory: a document with its history, moved on by journal rows. What is
 * written is told from what still waits, so that another tab's rows can come in between.
 */
import type { ModelDocument } from '../../shared/model/document.ts';
import { applyEdits } from '../../shared/model/edit/apply.ts';
import type { Edit } from '../../shared/model/edit/edit.ts';
import { EditError } from '../../shared/model/edit/edit-error.ts';
import type { JournalRow } from './database.ts';
import { afterStep, type History } from './history.ts';
import { overlap } from './overlap.ts';

/** The draft after the journal row `seq`. */
export interface Point {
  readonly seq: number;
  readonly document: ModelDocument;
  readonly history: History;
}

export type Row = Omit<JournalRow, 'appraisal'>;

/** A row before it has its number and its inverse. */
export type Proposal = Omit<Row, 'seq' | 'inverse'>;

export interface Pending {
  readonly row: Row;
  readonly after: Point;
  /** Told once: whether it was written. */
  readonly done: (written: boolean) => void;
}

/** @throws EditError where the edits do not fit. */
export function advance(point: Point, proposal: Proposal): Pick<Pending, 'row' | 'after'> {
  const { document, inverse } = applyEdits(point.document, proposal.edits);
  const row = { ...proposal, seq: point.seq + 1, inverse };
  return { row, after: { seq: row.seq, document, history: afterStep(point.history, row) } };
}

/** Rows that no longer fit are passed over, the same ones at every opening. */
export function replay(
  point: Point,
  rows: readonly Row[],
): { readonly point: Point; readonly unreadable: number } {
  let here = point;
  let unreadable = 0;
  for (const row of rows) {
    const next = attempt(() => advance({ ...here, seq: row.seq - 1 }, row));
    if (next) here = next.after;
    else {
      here = { ...here, seq: row.seq };
      unreadable += 1;
    }
  }
  return { point: here, unreadable };
}

export interface Rebased {
  readonly pending: readonly Pending[];
  /** Fit no longer, or would undo what another tab built upon. */
  readonly dropped: readonly Pending[];
  /** Stand, and cover something that another tab wrote. */
  readonly covering: readonly Pending[];
}

/** Puts what waits on top of another tab's rows, which `point` holds already. */
export function rebase(
  point: Point,
  pending: readonly Pending[],
  theirs: readonly Edit[],
): Rebased {
  const kept: Pending[] = [];
  const dropped: Pending[] = [];
  const covering: Pending[] = [];
  const numbers = new Map<number, number | null>();
  let here = point;
  for (const waiting of pending) {
    const meets = overlap(waiting.row.edits, theirs);
    const proposal = renumbered(waiting.row, numbers);
    const stale = meets && waiting.row.undoOf !== undefined;
    const moved = proposal && !stale ? attempt(() => advance(here, proposal)) : null;
    numbers.set(waiting.row.seq, moved?.row.seq ?? null);
    if (!moved) {
      dropped.push(waiting);
      continue;
    }
    here = moved.after;
    kept.push({ ...moved, done: waiting.done });
    if (meets) covering.push(waiting);
  }
  return { pending: kept, dropped, covering };
}

/** Null where it undoes or redoes a row that was dropped. */
function renumbered(row: Row, numbers: ReadonlyMap<number, number | null>): Proposal | null {
  const { seq: _, inverse: __, ...proposal } = row;
  const { undoOf, redoOf } = proposal;
  const undone = undoOf === undefined ? undefined : moved(undoOf, numbers);
  const redone = redoOf === undefined ? undefined : moved(redoOf, numbers);
  if (undone === null || redone === null) return null;
  return {
    ...proposal,
    ...(undone === undefined ? {} : { undoOf: undone }),
    ...(redone === undefined ? {} : { redoOf: redone }),
  };
}

function moved(seq: number, numbers: ReadonlyMap<number, number | null>): number | null {
  const number = numbers.get(seq);
  return number === undefined ? seq : number;
}

/** Null where an edit does not fit. */
export function attempt<T>(work: () => T): T | null {
  try {
    return work();
  } catch (problem) {
    if (problem instanceof EditError) return null;
    throw problem;
  }
}

/** Edits that turn one document into another, a whole field of the root at a time. */
export function fieldsBetween(from: ModelDocument, to: ModelDocument): Edit[] {
  const before = from as Record<string, unknown>;
  const after = to as Record<string, unknown>;
  const same = (key: string) => JSON.stringify(before[key]) === JSON.stringify(after[key]);
  const set = Object.keys(after).filter((key) => after[key] !== undefined && !same(key));
  const unset = Object.keys(before).filter((key) => after[key] === undefined);
  return [
    ...unset.map((key): Edit => ({ type: 'unset', at: [key] })),
    ...set.map((key): Edit => ({ type: 'set', at: [key], value: after[key] as never })),
  ];
}
