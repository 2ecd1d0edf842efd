/**
 * The names in a formula's text, found without parsing it, so that a formula that is
 * being written, or is broken, is dealt with like any other.
 *
 *   wordsIn(text): Word[]
 *   substitute(text, replacements): string
 */
import type { Span } from '../../model/issue.ts';
import { WORDS } from '../../model/names.ts';

export interface Word {
  readonly name: string;
  readonly at: Span;
}

/** A number with what sticks to it, or a word and the bracket that makes it a function. */
const PIECE = /(?:\d|\.\d)[A-Za-z0-9_.]*|([A-Za-z_][A-Za-z0-9_]*)([ \t\r\n]*\()?/g;
const LANGUAGE: ReadonlySet<string> = new Set(WORDS);

/** Names used as values or as tables, in their order; functions and words left out. */
export function wordsIn(text: string): Word[] {
  const words: Word[] = [];
  for (const { 1: name, 2: bracket, index } of text.matchAll(PIECE)) {
    if (name === undefined || bracket !== undefined || LANGUAGE.has(name)) continue;
    words.push({ name, at: { start: index, end: index + name.length } });
  }
  return words;
}

/** The text with other text in the place of names. */
export function substitute(text: string, replacements: ReadonlyMap<string, string>): string {
  let from = 0;
  let result = '';
  for (const { name, at } of wordsIn(text)) {
    const replacement = replacements.get(name);
    if (replacement === undefined) continue;
    result += text.slice(from, at.start) + replacement;
    from = at.end;
  }
  return result + text.slice(from);
}
