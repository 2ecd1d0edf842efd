import type { ModelDocument } from '../document.ts';
import type { Place } from './edit.ts';
import { labelAt } from './label-at.ts';

/** The part that a thing plays where it is used. */
export type Role =
  /** Named in a formula: of a variable, a start share, a curve, a cell, an amount, a payoff. */
  | 'variable'
  | 'start'
  | 'curve'
  | 'cell'
  | 'amount'
  | 'payoff'
  /** Overridden, or named in a formula, by a scenario. */
  | 'scenario'
  /** A state that a row leaves; that takes what the rest of a row, or of the start, leaves. */
  | 'row'
  | 'rest'
  /** A parameter drawn in a group; a group that draws a parameter. */
  | 'group'
  | 'parameter'
  /** A strategy with a formula of its own; one that a row or payoff is limited to. */
  | 'ownFormula'
  | 'limitedTo'
  | 'comparator'
  | 'thresholdInForce'
  /** A covariate's value. */
  | 'profile';

/** Where a thing is used. */
export interface Use {
  readonly role: Role;
  readonly place: Place;
  /** What is found there, in the document's own labels; may be empty. */
  readonly label: string;
}

export function useAt(document: ModelDocument, role: Role, place: Place): Use {
  return { role, place, label: labelAt(document, place) };
}
