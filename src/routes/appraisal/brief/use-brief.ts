/** The page as data, as the model now stands, and whether it may be printed. */
import { useMemo } from 'react';
import type { IncrementalRow } from '../../../../shared/analysis/incremental.ts';
import type { Draws } from '../../../../shared/analysis/psa/draws.ts';
import { ENGINE_VERSION } from '../../../../shared/engine/results.ts';
import { type Brief, draftBrief } from '../../../../shared/export/brief/draft.ts';
import { briefPsa } from '../../../../shared/export/brief/psa.ts';
import {
  type BriefStanding,
  briefStanding,
  type MadeFrom,
} from '../../../../shared/export/brief/standing.ts';
import { modelDigest, type WrittenSentence } from '../../../../shared/export/brief/written.ts';
import type { ModelDocument } from '../../../../shared/model/document.ts';
import { hasErrors, type Issue } from '../../../../shared/model/issue.ts';
import { compare } from '../../../store/answer.ts';
import { useFullRun } from '../../../store/base-run.ts';
import type { Result } from '../context.ts';

export interface Drafted {
  /** What it was drafted from. */
  readonly document: ModelDocument;
  readonly brief: Brief;
  /** Of the base case, in order of cost. */
  readonly rows: readonly IncrementalRow[];
}

/**
 * Null until the base case is there. For a moment after an edit it is that of the model
 * before, and has no draws.
 */
export function useDrafted(result: Result): Drafted | null {
  const full = useFullRun(result.document);
  const { threshold } = result.now;
  const draws = full?.document === result.document ? drawsOf(result) : null;
  return useMemo(() => {
    if (full === null || hasErrors(full.base.problems)) return null;
    const { document, base } = full;
    const psa = draws && briefPsa(document, draws, threshold);
    const brief = draftBrief(document, base, psa, threshold);
    return { document, brief, rows: compare(document, base).rows };
  }, [full, draws, threshold]);
}

function drawsOf({ run }: Result): Draws | null {
  return run.state.status === 'done' ? run.state.draws : null;
}

interface StandingOptions {
  /** The draft as it stands. */
  readonly document: ModelDocument;
  readonly issues: readonly Issue[];
  /** Null where there is no page. */
  readonly drafted: Drafted | null;
  readonly result: Result | null;
  /** What was written by hand and stands on the page. */
  readonly written: readonly WrittenSentence[];
}

export function useStanding(options: StandingOptions): BriefStanding {
  const { document, issues, drafted, result, written } = options;
  const now = useMemo(() => modelDigest(document), [document]);
  const base = useMade(drafted?.document ?? null);
  const drawn = useMade(result && drawsOf(result) ? result.document : null);
  return briefStanding({
    document: now,
    issues,
    base,
    draws: document.analysis.samples === 0 ? 'notAsked' : drawn,
    written: written.map(({ writtenFor }) => writtenFor),
  });
}

function useMade(document: ModelDocument | null): MadeFrom | null {
  return useMemo(
    () => document && { document: modelDigest(document), engine: ENGINE_VERSION },
    [document],
  );
}
