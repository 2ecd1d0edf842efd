/**
 *   duplicateState(document, id, label): Added
 *
 * A state like another, right after it: the same way out and the same amounts. Nobody
 * goes there yet. Throws an EditError (`edit.noSuchItem`) where there is no such state.
 */
import type { ModelDocument, Row } from '../document.ts';
import { type Added, adding, insertion, newId } from './add.ts';
import { addState } from './add-state.ts';
import type { Edit, Place } from './edit.ts';
import { EditError } from './edit-error.ts';
import { freshId } from './fresh-id.ts';

export function duplicateState(document: ModelDocument, id: string, label: string): Added {
  const { states, movements } = document;
  const index = states.findIndex((state) => state.id === id);
  const state = states[index];
  if (!state) throw new EditError('edit.noSuchItem', ['states'], { id });
  const before = states[index + 1]?.id ?? null;
  const copy = { ...state, id: newId(document, 'state', label), label };
  if (movements.type === 'survival') {
    const added = addState(document, { label, type: 'ordinary', dead: state.dead, before });
    return { ...added, edits: [...added.edits, ...payoffEdits(document, id, added.id)] };
  }
  return {
    id: copy.id,
    edits: [
      adding('state', copy, before),
      ...rowEdits(movements.rows, id, copy.id),
      ...payoffEdits(document, id, copy.id),
    ],
  };
}

function rowEdits(rows: readonly Row[], from: string, copy: string): Edit[] {
  const taken = rows.map(({ id }) => id);
  const own = rows.filter((row) => row.from === from);
  return own.map((row) => {
    const id = freshId(taken, `from-${copy}`);
    taken.push(id);
    return insertion(['movements', 'rows'], { ...leaving(row, copy), id });
  });
}

/** The row out of the copy: who stayed in the first stays in the copy. */
function leaving(row: Row, copy: string): Row {
  const own = (state: string) => (state === row.from ? copy : state);
  const cells = row.cells.map((cell) => ({ ...cell, to: own(cell.to) }));
  switch (row.basis) {
    case 'probabilities':
      return { ...row, from: copy, cells, remainder: own(row.remainder) };
    case 'logit':
      return { ...row, from: copy, cells, reference: own(row.reference) };
    case 'rates':
      return { ...row, from: copy, cells };
  }
}

function payoffEdits({ payoffs }: ModelDocument, state: string, copy: string): Edit[] {
  return payoffs.flatMap((payoff): Edit[] => {
    const at: Place = ['payoffs', { id: payoff.id }];
    if (payoff.type === 'once' && payoff.states?.includes(state)) {
      return [{ type: 'set', at: [...at, 'states'], value: [...payoff.states, copy] }];
    }
    if (payoff.type !== 'state') return [];
    const amount = payoff.amounts.find((each) => each.state === state);
    if (!amount) return [];
    const id = freshId(
      payoff.amounts.map((each) => each.id),
      copy,
    );
    return [insertion([...at, 'amounts'], { ...amount, id, state: copy })];
  });
}
