/**
 * What can be undone and redone, read from the journal row by row. It is a value: a step
 * gives a new history and leaves the old one as it was, so edits on trial cost nothing.
 */
import type { Edit } from '../../shared/model/edit/edit.ts';
import type { JournalRow } from './database.ts';

/** One thing that was done: a row, or neighbouring rows of one group. */
interface Done {
  /** Number of its first row. */
  readonly seq: number;
  readonly label: string;
  readonly group: string | null;
  /** Edits that take it back. */
  readonly edits: readonly Edit[];
}

interface Stack {
  readonly top: Done;
  readonly rest: Stack | null;
}

export interface History {
  readonly undo: Stack | null;
  readonly redo: Stack | null;
}

/** What a row says of the history; numbers are those of journal rows. */
export type Step = Pick<JournalRow, 'seq' | 'label' | 'inverse' | 'group' | 'undoOf' | 'redoOf'>;

export const NO_HISTORY: History = { undo: null, redo: null };

export function afterStep(history: History, step: Step): History {
  const { seq, label, inverse, undoOf, redoOf } = step;
  const done: Done = { seq, label, group: step.group ?? null, edits: inverse };
  if (undoOf !== undefined) {
    return {
      undo: without(history.undo, undoOf),
      redo: { top: { ...done, group: null }, rest: history.redo },
    };
  }
  if (redoOf !== undefined) {
    // A step brought back is whole: what is typed after it is a step of its own.
    return {
      undo: { top: { ...done, group: null }, rest: history.undo },
      redo: without(history.redo, redoOf),
    };
  }
  return { undo: grown(history, done), redo: null };
}

/** Whether a step would be taken together with the one before. */
export function joins({ undo, redo }: History, group: string | undefined): boolean {
  return group !== undefined && redo === null && undo?.top.group === group;
}

function grown(history: History, done: Done): Stack {
  const { undo } = history;
  if (!undo || !joins(history, done.group ?? undefined)) return { top: done, rest: undo };
  const edits = [...done.edits, ...undo.top.edits];
  return { top: { ...undo.top, edits }, rest: undo.rest };
}

/** Usually the top; another where a second tab wrote in between. */
function without(stack: Stack | null, seq: number): Stack | null {
  const above: Done[] = [];
  let here = stack;
  while (here && here.top.seq !== seq) {
    above.push(here.top);
    here = here.rest;
  }
  if (!here) return stack;
  let result = here.rest;
  for (const top of above.reverse()) result = { top, rest: result };
  return result;
}
