/**
 *   addPayoff(document, { label, category, measure, type, ... }): Added
 *
 * A new cost or outcome of nothing yet: every formula is 0. One by state has an amount
 * for each state in which people live.
 */
import type { ModelDocument, Payoff } from '../document.ts';
import { type Added, adding, newId } from './add.ts';
import { freshId } from './fresh-id.ts';

export interface NewPayoff {
  readonly label: string;
  readonly category: string;
  readonly measure: Payoff['measure'];
  readonly type: Payoff['type'];
  /** Strategies that it is limited to; all where absent. */
  readonly strategies?: string[];
}

export function addPayoff(document: ModelDocument, { type, ...fields }: NewPayoff): Added {
  const id = newId(document, 'payoff', fields.label);
  const base = { id, ...fields };
  return { id, edits: [adding('payoff', payoffOf(document, base, type))] };
}

type Base = Omit<NewPayoff, 'type'> & { readonly id: string };

function payoffOf(document: ModelDocument, base: Base, type: Payoff['type']): Payoff {
  switch (type) {
    case 'state':
      return { ...base, type, per: 'year', amounts: amountsOf(document) };
    case 'once':
      return { ...base, type, cycle: 0, formula: '0' };
    case 'movement':
    case 'start':
      return { ...base, type, formula: '0' };
  }
}

type Amounts = Extract<Payoff, { type: 'state' }>['amounts'];

function amountsOf({ states }: ModelDocument): Amounts {
  const living = states.filter(({ dead }) => !dead);
  const taken: string[] = [];
  return (living.length > 0 ? living : states).map(({ id: state }) => {
    const id = freshId(taken, state);
    taken.push(id);
    return { id, state, formula: '0' };
  });
}
