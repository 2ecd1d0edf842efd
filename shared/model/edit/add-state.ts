/**
 *   addState(document, { label, type?, dead?, cycles?, before? }): Added
 *
 * A new state that nobody enters yet: its row keeps everybody where they are; under
 * survival curves its own curve leaves nobody in it.
 */
import type { ModelDocument, State } from '../document.ts';
import { type Added, adding, insertion, newId } from './add.ts';
import type { Edit } from './edit.ts';
import { freshId } from './fresh-id.ts';

export interface NewState {
  readonly label: string;
  readonly type?: State['type'];
  readonly dead?: boolean;
  /** Tunnels of a timed state; 2 where absent. */
  readonly cycles?: number;
  /** State that it goes before; null for last; before the absorbing ones where absent. */
  readonly before?: string | null;
}

export function addState(document: ModelDocument, fields: NewState): Added {
  const { label, type = 'ordinary', dead = false, cycles = 2 } = fields;
  const id = newId(document, 'state', label);
  const state: State = { id, label, type, dead, ...(type === 'timed' ? { cycles } : {}) };
  const before = fields.before === undefined ? placeFor(document, type) : fields.before;
  return { id, edits: [adding('state', state, before), ...movementEdits(document, state)] };
}

function placeFor({ states }: ModelDocument, type: State['type']): string | null {
  if (type === 'absorbing') return null;
  return states.find((state) => state.type === 'absorbing')?.id ?? null;
}

function movementEdits({ movements }: ModelDocument, { id, label, type }: State): Edit[] {
  if (movements.type === 'rows') {
    if (type === 'absorbing') return [];
    const taken = movements.rows.map((row) => row.id);
    const row = { id: freshId(taken, `from ${label}`), from: id, remainder: id, cells: [] };
    return [insertion(['movements', 'rows'], { ...row, basis: 'probabilities' })];
  }
  const { curves } = movements;
  const taken = curves.map((curve) => curve.id);
  // As many are in the first n states as were in the first n - 1: nobody in the new one.
  const formula = curves.at(-1)?.formula ?? '1';
  const curve = { id: freshId(taken, label), state: id, formula };
  return [insertion(['movements', 'curves'], curve)];
}
