/**
 * Edits as data: small, serialisable steps that a journal can keep, a person can undo
 * and two people's work can be merged by. Things are addressed by id, never by
 * position.
 */

/** A field's name, or a member of a list by its id. */
export type Step = string | { readonly id: string };

/** From the document's root. */
export type Place = readonly Step[];

export type Json =
  | null
  | boolean
  | number
  | string
  | readonly Json[]
  | { readonly [key: string]: Json };

/** A member of a list. */
export type Item = { readonly id: string } & { readonly [key: string]: Json };

export type Edit =
  /** Gives a field a value, whether it had one or not. Lists without ids are set whole. */
  | { readonly type: 'set'; readonly at: Place; readonly value: Json }
  | { readonly type: 'unset'; readonly at: Place }
  /** Puts an item into the list at `at`, before the item named, or last. */
  | {
      readonly type: 'insert';
      readonly at: Place;
      readonly item: Item;
      readonly before: string | null;
    }
  | { readonly type: 'remove'; readonly at: Place; readonly id: string }
  | {
      readonly type: 'move';
      readonly at: Place;
      readonly id: string;
      readonly before: string | null;
    };
