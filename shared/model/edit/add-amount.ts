/**
 *   addAmount(document, payoffId, { state, formula? }): Added
 *
 * What a payoff by state pays in one more state.
 * Throws an EditError (`edit.noSuchItem`, `edit.noSuchPlace`) where no payoff by state
 * has this id, and `edit.badValue` where the state has an amount already.
 */
import type { ModelDocument, StrategyFormula } from '../document.ts';
import { type Added, insertion } from './add.ts';
import type { Place } from './edit.ts';
import { EditError } from './edit-error.ts';
import { freshId } from './fresh-id.ts';

export function addAmount(
  document: ModelDocument,
  payoffId: string,
  { state, formula = '0' }: { readonly state: string; readonly formula?: StrategyFormula },
): Added {
  const at: Place = ['payoffs', { id: payoffId }, 'amounts'];
  const payoff = document.payoffs.find(({ id }) => id === payoffId);
  if (!payoff) throw new EditError('edit.noSuchItem', at, { id: payoffId });
  if (payoff.type !== 'state') throw new EditError('edit.noSuchPlace', at);
  if (payoff.amounts.some((amount) => amount.state === state)) {
    throw new EditError('edit.badValue', at, { state });
  }
  const taken = payoff.amounts.map(({ id }) => id);
  const id = freshId(taken, state);
  return { id, edits: [insertion(at, { id, state, formula })] };
}
