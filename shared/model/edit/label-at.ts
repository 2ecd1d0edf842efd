/**
 *   labelAt(document, place): string
 *
 * What the thing at a place is called, by the labels of the document alone: "Alive →
 * Dead" for a cell, "Medicines: Alive" for an amount. Empty where nothing on the way has
 * a name. The place may be one that is no longer there.
 */
import type { ModelDocument } from '../document.ts';
import type { Json, Place, Step } from './edit.ts';

type Keyed = { readonly [key: string]: Json };

export function labelAt(document: ModelDocument, place: Place): string {
  const names: string[] = [];
  let here: Json | undefined = document as unknown as Json;
  for (const step of place) {
    here = inside(here, step);
    if (typeof step !== 'string' && here !== undefined) names.push(nameOf(document, here as Keyed));
  }
  return names.filter((name) => name !== '').join(place[0] === 'movements' ? ' → ' : ': ');
}

function inside(here: Json | undefined, step: Step): Json | undefined {
  if (typeof here !== 'object' || here === null) return undefined;
  if (typeof step === 'string') {
    return Object.hasOwn(here, step) ? (here as Keyed)[step] : undefined;
  }
  if (!Array.isArray(here)) return undefined;
  return (here as Keyed[]).find((item) => item?.id === step.id);
}

/** A label of its own, or that of the state it is about. */
function nameOf(document: ModelDocument, item: Keyed): string {
  if (typeof item.label === 'string') return item.label;
  const state = item.from ?? item.to ?? item.state;
  const found = document.states.find(({ id }) => id === state);
  return found?.label ?? (typeof state === 'string' ? state : '');
}
