/**
 *   removeState(document, id): Edit[] | null
 *
 * A state goes with its row and its curve, the cells that lead to it, its share of the
 * start, its amounts, and the payoffs that are on it alone. Who would have gone there
 * stays (or, where log odds compete, goes where the others go, in the odds there were).
 * Null where no state, or no curve, would be left.
 */
import type { ModelDocument, Payoff, Row } from '../document.ts';
import type { Edit, Json, Place } from './edit.ts';
import { inTurn } from './in-turn.ts';
import { setRest } from './row-rest.ts';
import { restOf, rowPlace } from './rows.ts';

type Survival = Extract<ModelDocument['movements'], { type: 'survival' }>;

export function removeState(document: ModelDocument, id: string): Edit[] | null {
  const { movements, states } = document;
  if (states.every((state) => state.id === id)) return null;
  if (movements.type === 'survival' && movements.curves.length === 1) return null;
  return inTurn(
    document,
    (current) => startEdits(current, id),
    (current) => movementEdits(current, id),
    ({ payoffs }) => payoffs.flatMap((payoff) => payoffEdits(payoff, id)),
    () => [{ type: 'remove', at: ['states'], id }],
  );
}

function startEdits({ start, states }: ModelDocument, id: string): Edit[] {
  const at: Place = ['start', 'shares'];
  const own = start.shares.filter(({ state }) => state === id);
  const edits = own.map((share): Edit => ({ type: 'remove', at, id: share.id }));
  if (start.remainder !== id) return edits;
  const heir = start.shares.find(({ state }) => state !== id);
  const others = states.filter((state) => state.id !== id);
  const value = heir?.state ?? (others.find(({ dead }) => !dead) ?? others[0])?.id ?? null;
  if (heir) edits.push({ type: 'remove', at, id: heir.id });
  return [...edits, { type: 'set', at: ['start', 'remainder'], value }];
}

function movementEdits(document: ModelDocument, id: string): Edit[] {
  const { movements } = document;
  if (movements.type === 'survival') return curveEdits(movements, id);
  return movements.rows.flatMap((row) => rowEdits(document, row, id));
}

/** Where the last state goes, the one before it takes its place. */
function curveEdits({ curves, last }: Survival, id: string): Edit[] {
  const at: Place = ['movements', 'curves'];
  const own = curves.filter(({ state }) => state === id);
  const edits = own.map((curve): Edit => ({ type: 'remove', at, id: curve.id }));
  const heir = curves.findLast(({ state }) => state !== id);
  if (last !== id || !heir) return edits;
  return [
    ...edits,
    { type: 'remove', at, id: heir.id },
    { type: 'set', at: ['movements', 'last'], value: heir.state },
  ];
}

function rowEdits(document: ModelDocument, row: Row, id: string): Edit[] {
  if (row.from === id) return [{ type: 'remove', at: ['movements', 'rows'], id: row.id }];
  const at: Place = [...rowPlace(row.id), 'cells'];
  if (restOf(row) === id) return restEdits(document, row, id);
  const cells = row.cells.filter(({ to }) => to === id);
  return cells.map((cell): Edit => ({ type: 'remove', at, id: cell.id }));
}

function restEdits(document: ModelDocument, row: Row, id: string): Edit[] {
  const left = row.cells.filter(({ to }) => to !== id && to !== row.from);
  const staying = row.cells.some(({ to }) => to === row.from);
  const at = rowPlace(row.id);
  if (row.basis !== 'logit' || (!staying && left.length === 0)) {
    const field = row.basis === 'logit' ? 'reference' : 'remainder';
    return [
      { type: 'set', at: [...at, field], value: row.from },
      { type: 'set', at: [...at, 'cells'], value: left as Json },
    ];
  }
  const heir = staying ? row.from : (left[0]?.to ?? row.from);
  return inTurn(
    document,
    (current) => setRest(current, row.id, heir),
    ({ movements }) => {
      const rows = movements.type === 'rows' ? movements.rows : [];
      const turned = rows.find((each) => each.id === row.id)?.cells ?? [];
      const kept = turned.filter(({ to }) => to !== id);
      return [{ type: 'set', at: [...at, 'cells'], value: kept as Json }];
    },
  );
}

function payoffEdits(payoff: Payoff, id: string): Edit[] {
  const at: Place = ['payoffs', { id: payoff.id }];
  const gone: Edit[] = [{ type: 'remove', at: ['payoffs'], id: payoff.id }];
  if (payoff.type === 'state') {
    const own = payoff.amounts.filter(({ state }) => state === id);
    if (own.length === payoff.amounts.length) return gone;
    return own.map((amount) => ({ type: 'remove', at: [...at, 'amounts'], id: amount.id }));
  }
  if (payoff.type === 'movement') return payoff.from === id || payoff.to === id ? gone : [];
  if (payoff.type !== 'once' || !payoff.states?.includes(id)) return [];
  const left = payoff.states.filter((state) => state !== id);
  return left.length === 0 ? gone : [{ type: 'set', at: [...at, 'states'], value: left }];
}
