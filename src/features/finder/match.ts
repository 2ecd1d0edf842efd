/** Which entries answer to what is written, best first. */
import type { Entry } from './entry.ts';

/** Without case, accents and ligatures, so that "etat" finds "État" and "oe" finds "œ". */
export function folded(text: string): string {
  const plain = text.normalize('NFKD').replace(/\p{M}/gu, '').toLowerCase();
  return plain.replace(/œ/g, 'oe').replace(/æ/g, 'ae');
}

/**
 * Entries of which every word written begins or stands within the name, the symbol or the
 * kind; those whose name begins with it come first, then those with a word that does.
 * With nothing written: steps and actions, which are few.
 * @param kindName a kind in the reader's language
 */
export function matching(
  entries: readonly Entry[],
  text: string,
  kindName: (kind: Entry['kind']) => string,
): Entry[] {
  const words = folded(text).split(/\s+/).filter(Boolean);
  if (words.length === 0) return entries.filter(({ kind }) => kind === 'step' || kind === 'action');
  const ranked = entries.flatMap((entry) => {
    const rank = rankOf(entry, words, kindName(entry.kind));
    return rank === null ? [] : [{ entry, rank }];
  });
  // A stable sort: within a rank the order of the job holds.
  return ranked.sort((a, b) => a.rank - b.rank).map(({ entry }) => entry);
}

function rankOf(entry: Entry, words: readonly string[], kind: string): number | null {
  const name = folded(entry.name);
  const symbol = folded(entry.symbol ?? '');
  const all = `${name} ${symbol} ${folded(kind)}`;
  if (!words.every((word) => all.includes(word))) return null;
  const written = words.join(' ');
  if (name.startsWith(written) || symbol === written) return 0;
  const parts = `${name} ${symbol}`.split(/[^\p{L}\p{N}]+/u);
  return words.every((word) => parts.some((part) => part.startsWith(word))) ? 1 : 2;
}
