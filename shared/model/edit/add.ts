/** What every operation that adds something gives back. */
import type { ModelDocument } from '../document.ts';
import type { Edit, Item, Place } from './edit.ts';
import { freshId } from './fresh-id.ts';
import { itemsOf, listOf, type What } from './target.ts';

export interface Added {
  /** To be applied as one. */
  readonly edits: Edit[];
  /** Of what was added. */
  readonly id: string;
}

/** An id for a new thing of this kind. */
export function newId(document: ModelDocument, what: What, label: string): string {
  const taken = itemsOf(document, what).map(({ id }) => id);
  return freshId(taken, label);
}

/** Puts a part of a document into the list at `at`, before the one named, or last. */
export function insertion<T extends { readonly id: string }>(
  at: Place,
  item: T,
  before: string | null = null,
): Edit {
  // Parts of a document are JSON; the compiler cannot see it in their loose types.
  return { type: 'insert', at, item: item as unknown as Item, before };
}

/** Puts a thing of this kind into its list. */
export function adding<T extends { readonly id: string }>(
  what: What,
  item: T,
  before: string | null = null,
): Edit {
  return insertion(listOf(what), item, before);
}
