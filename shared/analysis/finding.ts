/**
 * What to say of a strategy in one sentence: over which thresholds it is worth its
 * cost. Codes and values only; the interface has the words.
 */
import { frontierSegments } from './frontier-segments.ts';
import type { IncrementalRow } from './incremental.ts';

export type Finding = {
  /** Other strategies that the same holds of, as they cost and gain the same. */
  readonly tied: readonly string[];
} & (
  | { readonly code: 'onlyStrategy'; readonly params: { strategy: string } }
  | { readonly code: 'bestEverywhere'; readonly params: { strategy: string } }
  | { readonly code: 'worthAbove'; readonly params: { strategy: string; threshold: number } }
  | { readonly code: 'worthBelow'; readonly params: { strategy: string; threshold: number } }
  | {
      readonly code: 'worthBetween';
      readonly params: { strategy: string; from: number; to: number };
    }
  | { readonly code: 'neverBest'; readonly params: { strategy: string } }
);

/**
 * @param rows as `incremental` gives them.
 * @param strategy the one that is best at the poise (or any other).
 */
export function finding(rows: readonly IncrementalRow[], strategy: string): Finding {
  const all = frontierSegments(rows, Number.POSITIVE_INFINITY);
  const found = all.find((each) => each.strategy === strategy || each.tied.includes(strategy));
  if (found === undefined) return { code: 'neverBest', params: { strategy }, tied: [] };
  const tied = [found.strategy, ...found.tied].filter((id) => id !== strategy);
  if (rows.length === 1) return { code: 'onlyStrategy', params: { strategy }, tied };
  return { ...worth(strategy, found.from, found.to), tied };
}

function worth(strategy: string, from: number, to: number) {
  const open = to === Number.POSITIVE_INFINITY;
  if (from === 0 && open) return { code: 'bestEverywhere', params: { strategy } } as const;
  if (from === 0) return { code: 'worthBelow', params: { strategy, threshold: to } } as const;
  if (open) return { code: 'worthAbove', params: { strategy, threshold: from } } as const;
  return { code: 'worthBetween', params: { strategy, from, to } } as const;
}
