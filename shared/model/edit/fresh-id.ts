/**
 * Ids for new things, made from their labels and the ids there are: the same document
 * and label give the same id, on every device.
 *
 *   freshId(taken, label): string
 *   asciiWords(label, mark): string
 */
import { HOSTILE_KEYS } from '../names.ts';

/** Longest stem: leaves room for a number within the 64 characters of an id. */
const LONGEST = 48;

/** An id like the label that none of `taken` has: `well-again`, then `well-again-2`. */
export function freshId(taken: Iterable<string>, label: string): string {
  const stem = asciiWords(label, '-') || 'item';
  return firstFree(new Set(taken), stem, '-');
}

/** `stem`, or the first of `stem` with 2, 3, ... that is not in `taken`. */
export function firstFree(taken: ReadonlySet<string>, stem: string, mark: string): string {
  const isFree = (name: string) => !taken.has(name) && !HOSTILE_KEYS.has(name);
  let name = stem;
  for (let number = 2; !isFree(name); number += 1) name = `${stem}${mark}${number}`;
  return name;
}

/** The letters and digits of a text in lower case without accents, words joined by `mark`. */
export function asciiWords(text: string, mark: string): string {
  const plain = text.normalize('NFD').replace(/\p{M}/gu, '').toLowerCase();
  return (plain.match(/[a-z0-9]+/g) ?? [])
    .join(mark)
    .slice(0, LONGEST)
    .replace(/[-_]+$/, '');
}
