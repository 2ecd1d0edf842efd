/**
 * What stands in a field while it is typed: the document holds the last text that could be
 * read, and the field keeps the reader's own until it is left. Undo, or another tab,
 * changes the value under the field: then that is shown.
 */
import { type KeyboardEvent, useState } from 'react';

interface Draft<T> {
  readonly text: string;
  /** What the document holds while this draft stands. */
  readonly value: T;
  readonly isSound: boolean;
}

export interface DraftField {
  readonly text: string;
  /** False where what is typed is not in the document. */
  readonly isSound: boolean;
  readonly change: (text: string) => void;
  readonly leave: () => void;
  /** Undoes a text that cannot be read before it undoes an edit. */
  readonly undo: (event: KeyboardEvent) => void;
}

interface DraftOptions<T> {
  readonly value: T;
  readonly format: (value: T) => string;
  /** `null` where the text says nothing that could be kept. */
  readonly parse: (text: string) => { readonly value: T } | null;
  readonly commit: (value: T) => void;
}

export function useDraft<T>({ value, format, parse, commit }: DraftOptions<T>): DraftField {
  const [kept, setDraft] = useState<Draft<T> | null>(null);
  const draft = kept && Object.is(kept.value, value) ? kept : null;
  const change = (text: string) => {
    const read = parse(text);
    setDraft({ text, value: read ? read.value : value, isSound: read !== null });
    if (read && !Object.is(read.value, value)) commit(read.value);
  };
  const undo = (event: KeyboardEvent) => {
    if (!draft || draft.isSound || !isUndo(event)) return;
    event.preventDefault();
    event.stopPropagation();
    setDraft(null);
  };
  return {
    text: draft ? draft.text : format(value),
    isSound: draft?.isSound ?? true,
    change,
    leave: () => draft?.isSound && setDraft(null),
    undo,
  };
}

function isUndo({ key, ctrlKey, metaKey, shiftKey }: KeyboardEvent): boolean {
  return key.toLowerCase() === 'z' && (ctrlKey || metaKey) && !shiftKey;
}
