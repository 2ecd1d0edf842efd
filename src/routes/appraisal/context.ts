/** What every step of an appraisal can see. */
import { useOutletContext } from 'react-router-dom';
import type { ModelDocument } from '../../../shared/model/document.ts';
import type { Issue } from '../../../shared/model/issue.ts';
import type { Move } from '../../components/move.ts';
import type { OutcomeWords } from '../../i18n/outcome-words.ts';
import type { Answer, Comparison } from '../../store/answer.ts';
import type { DrawsRun } from '../../store/draws.ts';
import type { Levers } from '../../store/levers.ts';
import type { Language } from '../../store/settings.ts';

export interface AppraisalContext {
  readonly slug: string;
  /** The draft as it stands. */
  readonly document: ModelDocument;
  /** What is wrong with the model, or was found on running it. */
  readonly issues: readonly Issue[];
  readonly result: Result | null;
  /** What-ifs in force: `result` is then of the model with them, not of the draft. */
  readonly levers: Levers;
  readonly language: Language;
}

export type Basis = 'base' | 'mean';

/** There only while the model is whole. */
export interface Result {
  /** What the numbers are of: the draft, or for a moment what it was before the last edit. */
  readonly document: ModelDocument;
  readonly comparison: Comparison;
  /** What costs and health are taken from. */
  readonly basis: Basis;
  readonly setBasis: (basis: Basis) => void;
  readonly now: Answer;
  /** Before the last change of the model or its levers; null where nothing has changed. */
  readonly was: { readonly comparison: Comparison; readonly answer: Answer } | null;
  readonly run: DrawsRun;
  readonly move: (move: Move) => void;
  /** Strategies' names by id, in document order. */
  readonly names: ReadonlyMap<string, string>;
  readonly outcome: OutcomeWords;
  /** A threshold in words, such as "KM 1,500 per QALY". */
  readonly thresholdWords: (threshold: number) => string;
}

export function useAppraisalContext(): AppraisalContext {
  return useOutletContext<AppraisalContext>();
}
