/** What the page and a simulator worker say to each other (over Comlink). */
import type { BaseRun, DrawsBlock, SamplingSettings } from '../../shared/engine/results.ts';
import type { ModelDocument } from '../../shared/model/document.ts';
import type { Issue } from '../../shared/model/issue.ts';
import type { DraftAnswer } from './answer-draft.ts';

/** Issues cross between threads as data: an error thrown there would lose them. */
export type Reply<T> =
  | { readonly ok: true; readonly value: T }
  | { readonly ok: false; readonly issues: readonly Issue[] };

export interface Simulator {
  /** Makes ready the document that later calls name by `key`; the last one stays ready. */
  load(key: string, document: ModelDocument): Reply<null>;
  base(key: string): Reply<BaseRun>;
  /** Draws `from` to `to`, end not included. */
  draws(key: string, settings: SamplingSettings, from: number, to: number): Reply<DrawsBlock>;
}

/** All that a simulator worker does. */
export interface DraftSimulator extends Simulator {
  /** Checks a draft and runs its base case; what is loaded stays loaded. */
  answer(draft: ModelDocument): DraftAnswer;
  /** Identity of a document: too slow for the page between two keystrokes. */
  digest(document: ModelDocument): string;
}
