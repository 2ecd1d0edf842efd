/** What would change the answer: other thresholds, and other people. */
import { incrementalByProfile } from '../../analysis/breakdown/by-profile.ts';
import { frontierSegments } from '../../analysis/frontier-segments.ts';
import type { BriefCase } from './case.ts';
import { labels, type Sentence, value } from './sentence.ts';

/** Profiles that are named; a page has no room for more. */
const NAMED = 4;

/**
 * Codes: `change.below` and `change.above` (the threshold beyond which another strategy
 * is best) or `change.noThreshold`; with several profiles `change.profiles` for each
 * other strategy that is best for some, or `change.sameForAll`.
 */
export function changeSentences(brief: BriefCase): Sentence[] {
  if (brief.options.length < 2) return [];
  return [...thresholdSentences(brief), ...profileSentences(brief)];
}

function thresholdSentences({ document, rows, best }: BriefCase): Sentence[] {
  const segments = frontierSegments(rows, Number.POSITIVE_INFINITY);
  const own = segments.findIndex(({ strategy, tied }) => strategy === best || tied.includes(best));
  const label = labels(document.strategies);
  const said = (code: string, threshold: number | undefined, strategy: string | undefined) =>
    threshold === undefined || strategy === undefined
      ? []
      : [
          {
            code,
            params: {
              threshold: value.threshold(threshold),
              strategy: value.text(label(strategy)),
            },
          },
        ];
  const segment = segments[own];
  const found = [
    ...said('change.below', segment?.from, segments[own - 1]?.strategy),
    ...said('change.above', segment?.to, own < 0 ? undefined : segments[own + 1]?.strategy),
  ];
  return found.length > 0 ? found : [{ code: 'change.noThreshold', params: {} }];
}

function profileSentences({ document, base, best, threshold }: BriefCase): Sentence[] {
  const { profiles, strategies } = document;
  if (profiles.length < 2) return [];
  const [, ...results] = incrementalByProfile(document, base, threshold);
  const differing = results.filter(({ tied }) => !tied.includes(best));
  const count = value.count(profiles.length);
  if (differing.length === 0) return [{ code: 'change.sameForAll', params: { count } }];
  return strategies.flatMap(({ id, label }) => {
    const own = differing.filter((result) => result.best === id);
    if (own.length === 0) return [];
    const named = own.slice(0, NAMED).map(({ profile }) => labels(profiles)(profile ?? ''));
    const params = {
      strategy: value.text(label),
      profiles: value.list(named),
      more: value.count(own.length - named.length),
      count: value.count(own.length),
      of: count,
    };
    return [{ code: 'change.profiles', params }];
  });
}
