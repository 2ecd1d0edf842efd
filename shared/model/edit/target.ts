/**
 * The things of a document that can be added, duplicated, used and removed.
 *
 *   listOf(what): Place            where things of a kind stand
 *   itemsOf(document, what)        those there are
 */
import type { ModelDocument } from '../document.ts';
import type { Place } from './edit.ts';

export type What =
  | 'strategy'
  | 'state'
  | 'profile'
  | 'covariate'
  | 'parameter'
  | 'group'
  | 'table'
  | 'variable'
  | 'payoff'
  | 'scenario'
  | 'threshold';

export interface Target {
  readonly what: What;
  readonly id: string;
}

const FIELDS = {
  strategy: 'strategies',
  state: 'states',
  profile: 'profiles',
  covariate: 'covariates',
  parameter: 'parameters',
  group: 'groups',
  table: 'tables',
  variable: 'variables',
  payoff: 'payoffs',
  scenario: 'scenarios',
} as const;

/** Place of the list that things of this kind stand in. */
export function listOf(what: What): Place {
  return what === 'threshold' ? ['question', 'thresholds'] : [FIELDS[what]];
}

/** Things of this kind, in document order. */
export function itemsOf(
  document: ModelDocument,
  what: What,
): readonly { readonly id: string; readonly label: string }[] {
  return what === 'threshold' ? document.question.thresholds : document[FIELDS[what]];
}
