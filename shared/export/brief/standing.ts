/**
 * Whether a brief may be printed: as it is, with a watermark because it does not tell
 * what the model now says, or not at all because the model gives no answer.
 */
import { ENGINE_VERSION } from '../../engine/results.ts';
import type { Issue } from '../../model/issue.ts';

/** What a part of the page was made from. */
export interface MadeFrom {
  /** Digest of the document. */
  readonly document: string;
  readonly engine: string;
}

export interface BriefState {
  /** Digest of the document as it stands now. */
  readonly document: string;
  /** What its checks and its base case found. */
  readonly issues: readonly Issue[];
  /** What the base case on the page was run from; null where there is none. */
  readonly base: MadeFrom | null;
  /** The same of the draws; `notAsked` where the analysis is to have none. */
  readonly draws: MadeFrom | 'notAsked' | null;
  /** Digests of the documents that sentences were written by hand for. */
  readonly written: readonly string[];
}

export type StandingReason =
  | { readonly code: 'standing.errors'; readonly params: { count: number; first: string } }
  | {
      readonly code:
        | 'standing.noBase'
        | 'standing.baseOfOther'
        | 'standing.noDraws'
        | 'standing.drawsOfOther'
        | 'standing.otherEngine'
        | 'standing.writtenForOther';
      readonly params: Readonly<Record<string, never>>;
    };

export interface BriefStanding {
  /** `ready`: print; `stale`: print with a watermark; `broken`: refuse. */
  readonly standing: 'ready' | 'stale' | 'broken';
  /** Why it is not ready, the gravest first. */
  readonly reasons: readonly StandingReason[];
}

export function briefStanding(state: BriefState): BriefStanding {
  const broken = brokenBy(state);
  const stale = staleBy(state);
  if (broken.length > 0) return { standing: 'broken', reasons: [...broken, ...stale] };
  return { standing: stale.length > 0 ? 'stale' : 'ready', reasons: stale };
}

function brokenBy({ issues, base }: BriefState): StandingReason[] {
  const errors = issues.filter(({ severity }) => severity === 'error');
  const [first] = errors;
  if (first) {
    return [{ code: 'standing.errors', params: { count: errors.length, first: first.code } }];
  }
  return base === null ? [{ code: 'standing.noBase', params: {} }] : [];
}

function staleBy({ document, base, draws, written }: BriefState): StandingReason[] {
  const drawn = draws === 'notAsked' ? null : draws;
  const made = [base, drawn].filter((each) => each !== null);
  const when = (holds: boolean, code: Exclude<StandingReason['code'], 'standing.errors'>) =>
    holds ? [{ code, params: {} }] : [];
  return [
    ...when(base !== null && base.document !== document, 'standing.baseOfOther'),
    ...when(draws === null, 'standing.noDraws'),
    ...when(drawn !== null && drawn.document !== document, 'standing.drawsOfOther'),
    ...when(
      made.some(({ engine }) => engine !== ENGINE_VERSION),
      'standing.otherEngine',
    ),
    ...when(
      written.some((digest) => digest !== document),
      'standing.writtenForOther',
    ),
  ];
}
