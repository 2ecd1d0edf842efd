/** Seeded edits that fit a document, sensible or not: for properties and for walks. */
import type { ModelDocument } from '../../../shared/model/document.ts';
import type { Edit, Item, Json, Place, Step } from '../../../shared/model/edit/edit.ts';

type Keyed = { readonly [key: string]: Json };

const ODD_VALUES: readonly Json[] = [
  null,
  true,
  0,
  -1,
  0.5,
  1,
  1e308,
  '',
  'toString',
  'p_die * 2',
  '1 +',
  'if(age > 60, 0.1, 0.2)',
  [],
  {},
  ['usual'],
  { byStrategy: {}, otherwise: '0.1' },
];

/** Mulberry32, a public-domain generator: small, and the same everywhere. */
export class Dice {
  private state: number;
  constructor(seed: number) {
    this.state = seed >>> 0;
  }

  /** From 0 to 1, 1 not included. */
  next(): number {
    this.state = (this.state + 0x6d2b79f5) >>> 0;
    let mixed = Math.imul(this.state ^ (this.state >>> 15), this.state | 1);
    mixed ^= mixed + Math.imul(mixed ^ (mixed >>> 7), mixed | 61);
    return ((mixed ^ (mixed >>> 14)) >>> 0) / 4_294_967_296;
  }

  below(limit: number): number {
    return Math.floor(this.next() * limit);
  }

  pick<T>(list: readonly T[]): T {
    return list[this.below(list.length)]!;
  }
}

/** An edit that `applyEdits` takes, at a place chosen by descending from the root. */
export function randomEdit(document: ModelDocument, dice: Dice): Edit {
  for (;;) {
    const spot = descend(document as unknown as Json, dice);
    const edit = editAt(spot, dice);
    if (edit) return edit;
  }
}

interface Spot {
  readonly at: Place;
  readonly value: Json;
}

function descend(root: Json, dice: Dice): Spot {
  let spot: Spot = { at: [], value: root };
  for (;;) {
    const children = childrenOf(spot.value);
    if (children.length === 0 || (spot.at.length > 0 && dice.next() < 0.15)) return spot;
    const [step, value] = dice.pick(children);
    spot = { at: [...spot.at, step], value };
  }
}

function childrenOf(value: Json): [Step, Json][] {
  if (typeof value !== 'object' || value === null) return [];
  if (!Array.isArray(value)) return Object.entries(value as Keyed);
  if (!isListOfItems(value)) return [];
  return value.map((item) => [{ id: item.id }, item]);
}

function isListOfItems(value: Json): value is readonly Item[] {
  if (!Array.isArray(value)) return false;
  const ids = value.map((item: Json) => (item as Keyed | null)?.id);
  return ids.every((id) => typeof id === 'string') && new Set(ids).size === ids.length;
}

function editAt({ at, value }: Spot, dice: Dice): Edit | null {
  if (isListOfItems(value) && dice.next() < 0.95) return editList(at, value, dice);
  const last = at.at(-1)!;
  if (typeof last !== 'string') {
    return dice.next() < 0.5 ? { type: 'remove', at: at.slice(0, -1), id: last.id } : null;
  }
  if (last === 'id' && at.length > 1) return null;
  if (dice.next() < 0.1) return { type: 'unset', at };
  if (dice.next() < 0.05) return { type: 'set', at: [...at.slice(0, -1), 'addedLater'], value };
  return { type: 'set', at, value: changed(value, dice) };
}

function editList(at: Place, list: readonly Item[], dice: Dice): Edit | null {
  if (list.length === 0) {
    return { type: 'insert', at, item: { id: `new-${dice.below(1000)}` }, before: null };
  }
  const { id } = dice.pick(list);
  const before = dice.next() < 0.3 ? null : dice.pick(list).id;
  const kind = dice.below(4);
  if (kind < 2) return { type: 'move', at, id, before };
  if (kind === 2) return { type: 'remove', at, id };
  const copy = {
    ...list.find((item) => item.id === id)!,
    id: `${id.slice(0, 40)}-${dice.below(1000)}`,
  };
  if (list.some((item) => item.id === copy.id)) return null;
  return { type: 'insert', at, item: copy, before };
}

function changed(value: Json, dice: Dice): Json {
  if (typeof value === 'number' && dice.next() < 0.8) {
    return dice.pick([value * 1.01, value * 0.5, value + 1, -value]);
  }
  if (typeof value === 'string' && dice.next() < 0.7) {
    return dice.pick([`${value} `, `${value}_x`, value.slice(1), `(${value}) * 0.9`]);
  }
  return dice.pick(ODD_VALUES);
}
