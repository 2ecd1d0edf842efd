/**
 * Damerau-Levenshtein distance (optimal string alignment: insert, delete, change,
 * swap two neighbours), as in Boytsov 2011, ACM J Exp Algorithmics 16:1.1.
 */
export function editDistance(a: string, b: string): number {
  let beforeLast: number[] = [];
  let last = Array.from({ length: b.length + 1 }, (_, j) => j);
  for (let i = 1; i <= a.length; i += 1) {
    const row = [i];
    for (let j = 1; j <= b.length; j += 1) {
      const change = a[i - 1] === b[j - 1] ? 0 : 1;
      let best = Math.min(last[j]! + 1, row[j - 1]! + 1, last[j - 1]! + change);
      const swapped = i > 1 && j > 1 && a[i - 1] === b[j - 2] && a[i - 2] === b[j - 1];
      if (swapped) best = Math.min(best, beforeLast[j - 2]! + 1);
      row.push(best);
    }
    beforeLast = last;
    last = row;
  }
  return last[b.length]!;
}

/** Edits that still count as a slip: one in a short name, a third of a longer one. */
const slips = (name: string): number => Math.max(1, Math.floor(name.length / 3));

/** The candidate nearest to a mistyped name (case aside), or undefined where none is near. */
export function closest(name: string, candidates: Iterable<string>): string | undefined {
  const lower = name.toLowerCase();
  let found: string | undefined;
  let least = slips(name) + 1;
  for (const candidate of candidates) {
    if (Math.abs(candidate.length - name.length) >= least) continue;
    const distance = editDistance(lower, candidate.toLowerCase());
    if (distance < least) [found, least] = [candidate, distance];
  }
  return found;
}
