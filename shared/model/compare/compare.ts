/**
 * What differs between two documents, thing by thing (by id, never by position).
 *
 *   compareDocuments(before, after): Change[]
 *
 * Pure and exact: no change is left out, the same document has none, and one edit shows
 * as one change (but for items moved within a list: the fewest moves that explain it).
 */
import type { ModelDocument } from '../document.ts';
import type { Item, Json, Place, Step } from '../edit/edit.ts';
import { labelAt } from '../edit/label-at.ts';
import { longestRising } from './longest-rising.ts';
import { type Nature, natureOf, natureOfMove } from './nature.ts';

export type Section = 'question' | 'evidence' | 'model' | 'scenarios' | 'analysis' | 'about';

export interface Change {
  readonly kind: 'added' | 'removed' | 'changed' | 'moved';
  /** Of the item that came, went or moved, or of the field that changed. */
  readonly place: Place;
  /** What it is called, in the labels of the later document that has it. */
  readonly label: string;
  /** Name of the field that changed, or of the list that the item is in. */
  readonly field: string;
  /** Value before; undefined where there was none. A moved item: its position, from 0. */
  readonly before: Json | undefined;
  readonly after: Json | undefined;
  /** Step of the appraisal that it belongs to. */
  readonly section: Section;
  readonly nature: Nature;
}

type Keyed = { readonly [key: string]: Json };

export function compareDocuments(before: ModelDocument, after: ModelDocument): Change[] {
  const comparison = new Comparison(before, after);
  comparison.values(before as unknown as Json, after as unknown as Json, []);
  return comparison.changes;
}

class Comparison {
  readonly changes: Change[] = [];
  constructor(
    private readonly first: ModelDocument,
    private readonly second: ModelDocument,
  ) {}

  values(before: Json | undefined, after: Json | undefined, place: Place): void {
    if (before === after) return;
    if (isItems(before) && isItems(after)) return this.lists(before, after, place);
    if (isKeyed(before) && isKeyed(after) && isSameSort(before, after, place)) {
      return this.fields(before, after, place);
    }
    if (!isEqual(before, after)) this.add('changed', place, before, after);
  }

  private fields(before: Keyed, after: Keyed, place: Place): void {
    const keys = new Set([...Object.keys(before), ...Object.keys(after)]);
    for (const key of keys) this.values(own(before, key), own(after, key), [...place, key]);
  }

  private lists(before: readonly Item[], after: readonly Item[], place: Place): void {
    const old = new Map(before.map((item, index) => [item.id, { item, index }]));
    const now = new Set(after.map(({ id }) => id));
    for (const item of before) {
      if (!now.has(item.id)) this.add('removed', [...place, { id: item.id }], item, undefined);
    }
    const kept = after.flatMap(({ id }) => old.get(id)?.index ?? []);
    const still = new Set(longestRising(kept));
    for (const [index, item] of after.entries()) {
      const at: Place = [...place, { id: item.id }];
      const match = old.get(item.id);
      if (!match) {
        this.add('added', at, undefined, item);
        continue;
      }
      if (!still.has(match.index)) this.add('moved', at, match.index, index);
      this.values(match.item, item, at);
    }
  }

  private add(
    kind: Change['kind'],
    place: Place,
    before: Json | undefined,
    after: Json | undefined,
  ): void {
    const label = labelAt(kind === 'removed' ? this.first : this.second, place);
    const field = place.findLast((step) => typeof step === 'string') ?? '';
    const nature = kind === 'moved' ? natureOfMove(place) : natureOf(place, before, after);
    this.changes.push({
      kind,
      place,
      label,
      field,
      before,
      after,
      section: sectionOf(place),
      nature,
    });
  }
}

const EVIDENCE: readonly (Step | undefined)[] = ['parameters', 'groups', 'tables'];
const SECTIONS: readonly (Step | undefined)[] = ['question', 'scenarios', 'analysis'];
const MODEL: readonly (Step | undefined)[] = [
  'covariates',
  'variables',
  'states',
  'start',
  'movements',
  'payoffs',
];

/** Strategies and profiles are framed with the question. */
function sectionOf([top]: Place): Section {
  if (EVIDENCE.includes(top)) return 'evidence';
  if (MODEL.includes(top)) return 'model';
  if (top === 'strategies' || top === 'profiles') return 'question';
  return SECTIONS.includes(top) ? (top as Section) : 'about';
}

/**
 * Things of two sorts (a beta and a gamma distribution) share nothing but names of
 * fields: one took the other's place. The fields of the document itself are its own.
 */
function isSameSort(before: Keyed, after: Keyed, place: Place): boolean {
  if (place.length === 0) return true;
  return before.type === after.type && before.basis === after.basis;
}

function isKeyed(value: Json | undefined): value is Keyed {
  return typeof value === 'object' && value !== null && !Array.isArray(value);
}

/** A list whose items each have an id of their own; an empty list may be one. */
function isItems(value: Json | undefined): value is readonly Item[] {
  if (!Array.isArray(value)) return false;
  const ids = value.map((item: Json) => (isKeyed(item) ? item.id : undefined));
  return ids.every((id) => typeof id === 'string') && new Set(ids).size === ids.length;
}

function own(value: Keyed, key: string): Json | undefined {
  return Object.hasOwn(value, key) ? value[key] : undefined;
}

/** As JSON: 0 and -0 are the same number, a field of undefined is none. */
function isEqual(a: Json | undefined, b: Json | undefined): boolean {
  if (a === b) return true;
  if (Array.isArray(a) && Array.isArray(b)) {
    return a.length === b.length && a.every((item: Json, index) => isEqual(item, b[index]));
  }
  if (!isKeyed(a) || !isKeyed(b)) return false;
  const keys = new Set([...Object.keys(a), ...Object.keys(b)]);
  return [...keys].every((key) => isEqual(own(a, key), own(b, key)));
}
