/**
 * Puts edits into force.
 *
 *   applyEdits(document, edits) -> { document, inverse }
 *
 * Pure: the document given is never touched, and what no edit reaches is shared with
 * it. An edit can leave a document that does not hold together (that is for
 * `checkDocument` to say); one that has no place in the document throws. Nothing is
 * filled in: a field with a default that is unset stays absent until the document is read.
 */
import type { ModelDocument } from '../document.ts';
import { HOSTILE_KEYS } from '../names.ts';
import { plainIssues } from '../plain.ts';
import type { Edit, Item, Json, Place } from './edit.ts';
import { EditError } from './edit-error.ts';

export interface Edited {
  readonly document: ModelDocument;
  /** Edits that bring the first document back, to the same digest. */
  readonly inverse: Edit[];
}

/**
 * The document after all the edits, in their order.
 * @throws EditError where one does not fit; then none is in force.
 */
export function applyEdits(document: ModelDocument, edits: readonly Edit[]): Edited {
  // A document is plain JSON; its type says more than edits need to know.
  let root = document as unknown as Json;
  const inverse: Edit[] = [];
  for (const edit of edits) {
    const applied = applyEdit(root, edit);
    root = applied.root;
    inverse.push(applied.inverse);
  }
  return { document: root as unknown as ModelDocument, inverse: inverse.reverse() };
}

interface Applied {
  readonly root: Json;
  readonly inverse: Edit;
}

function applyEdit(root: Json, edit: Edit): Applied {
  switch (edit.type) {
    case 'set':
      checkValue(edit.at, edit.value);
      return setField(root, edit.at, edit.value);
    case 'unset':
      return setField(root, edit.at, undefined);
    case 'insert':
      checkValue(edit.at, edit.item);
      return insert(root, edit.at, edit.item, edit.before);
    case 'remove':
      return remove(root, edit.at, edit.id);
    case 'move':
      return move(root, edit.at, edit.id, edit.before);
  }
}

function checkValue(at: Place, value: Json): void {
  const issue = value === undefined ? null : plainIssues(value)[0];
  if (issue === undefined) return;
  if (issue?.code === 'document.hostileKey') {
    throw new EditError('edit.hostileKey', at, issue.params);
  }
  throw new EditError('edit.badValue', at, issue?.params);
}

/** Sets a field, replaces an item by one with its id, or (undefined) takes a field away. */
function setField(root: Json, at: Place, value: Json | undefined): Applied {
  checkIdKept(at, value);
  let before: Json | undefined;
  const changed = rebuilt(root, at, 0, (old) => {
    before = old;
    return value;
  });
  const inverse: Edit =
    before === undefined ? { type: 'unset', at } : { type: 'set', at, value: before };
  return { root: changed as Json, inverse };
}

/** An item is known by its id, so nothing may change it. */
function checkIdKept(at: Place, value: Json | undefined): void {
  const last = at.at(-1);
  const parent = at.at(-2);
  if (last === undefined || typeof last !== 'string') {
    if (value === undefined) throw new EditError('edit.notAField', at);
    if (!isKeyed(value)) throw new EditError('edit.badValue', at);
    if (last && own(value, 'id') !== last.id) throw new EditError('edit.idFixed', at, last);
    return;
  }
  if (last === 'id' && typeof parent === 'object' && value !== parent.id) {
    throw new EditError('edit.idFixed', at, parent);
  }
}

function insert(root: Json, at: Place, item: Item, before: string | null): Applied {
  if (!isKeyed(item) || typeof item.id !== 'string') throw new EditError('edit.badValue', at);
  const { id } = item;
  const changed = inList(root, at, (list) => {
    if (list.some((each) => idOf(each) === id)) throw new EditError('edit.idTaken', at, { id });
    return list.toSpliced(indexBefore(list, before, at), 0, item);
  });
  return { root: changed, inverse: { type: 'remove', at, id } };
}

function remove(root: Json, at: Place, id: string): Applied {
  let inverse: Edit | undefined;
  const changed = inList(root, at, (list) => {
    const index = indexOf(list, id, at);
    const before = neighbour(list, index);
    const item = list[index] as Item;
    inverse =
      before === undefined
        ? { type: 'set', at, value: list }
        : { type: 'insert', at, item, before };
    return list.toSpliced(index, 1);
  });
  return { root: changed, inverse: inverse as Edit };
}

function move(root: Json, at: Place, id: string, before: string | null): Applied {
  let inverse: Edit | undefined;
  const changed = inList(root, at, (list) => {
    const index = indexOf(list, id, at);
    const after = neighbour(list, index);
    inverse =
      after === undefined
        ? { type: 'set', at, value: list }
        : { type: 'move', at, id, before: after };
    if (before === id) return list;
    const rest = list.toSpliced(index, 1);
    return rest.toSpliced(indexBefore(rest, before, at), 0, list[index] as Json);
  });
  return { root: changed, inverse: inverse as Edit };
}

/** Id of the item after `index`, null at the end; undefined where it has none of its own. */
function neighbour(list: readonly Json[], index: number): string | null | undefined {
  const next = list[index + 1];
  if (next === undefined) return null;
  const id = idOf(next);
  return list.filter((each) => idOf(each) === id).length === 1 ? id : undefined;
}

function indexBefore(list: readonly Json[], before: string | null, at: Place): number {
  return before === null ? list.length : indexOf(list, before, at);
}

function indexOf(list: readonly Json[], id: string, at: Place): number {
  const index = list.findIndex((item) => idOf(item) === id);
  if (index < 0) throw new EditError('edit.noSuchItem', at, { id });
  if (list.findLastIndex((item) => idOf(item) === id) > index) {
    throw new EditError('edit.idNotUnique', at, { id });
  }
  return index;
}

function inList(root: Json, at: Place, change: (list: readonly Json[]) => readonly Json[]): Json {
  return rebuilt(root, at, 0, (old) => {
    if (!isList(old)) throw new EditError('edit.noSuchPlace', at);
    return change(old);
  }) as Json;
}

type Change = (old: Json | undefined) => Json | undefined;

/** `here` with the value at the rest of the place changed; shares all that is off the way. */
function rebuilt(here: Json | undefined, at: Place, depth: number, change: Change) {
  const step = at[depth];
  if (step === undefined) return change(here);
  if (typeof step === 'string') return withField(here, step, at, depth, change);
  if (!isList(here)) throw new EditError('edit.noSuchPlace', at);
  const index = indexOf(here, step.id, at);
  const item = rebuilt(here[index], at, depth + 1, change) as Json;
  return item === here[index] ? here : here.with(index, item);
}

function withField(
  here: Json | undefined,
  key: string,
  at: Place,
  depth: number,
  change: Change,
): Json {
  if (HOSTILE_KEYS.has(key)) throw new EditError('edit.hostileKey', at, { key });
  if (!isKeyed(here)) throw new EditError('edit.noSuchPlace', at);
  const old = own(here, key);
  const value: Json | undefined = rebuilt(old, at, depth + 1, change);
  if (value === old) return here;
  if (value !== undefined) return { ...here, [key]: value };
  const { [key]: _, ...rest } = here;
  return rest;
}

function isKeyed(value: Json | undefined): value is { readonly [key: string]: Json } {
  return typeof value === 'object' && value !== null && !isList(value);
}

/** `Array.isArray` does not know of read-only lists. */
function isList(value: Json | undefined): value is readonly Json[] {
  return Array.isArray(value);
}

function own(value: { readonly [key: string]: Json }, key: string): Json | undefined {
  return Object.hasOwn(value, key) ? value[key] : undefined;
}

function idOf(item: Json): string | undefined {
  const id = isKeyed(item) ? own(item, 'id') : undefined;
  return typeof id === 'string' ? id : undefined;
}
