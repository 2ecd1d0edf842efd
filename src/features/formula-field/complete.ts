/**
 *   completionsAt(text, caret, names): Completions | null
 *   completed(text, completions, chosen): { text, caret }
 *
 * What the word before the caret can become.
 */
import type { FormulaNames, KnownName } from './formula-names.ts';

export interface Completions {
  /** The stretch of text that a choice takes the place of. */
  readonly from: number;
  readonly to: number;
  /** Best first. */
  readonly options: readonly KnownName[];
}

const MOST = 12;

/** Null where nothing fits, or where what stands there is whole already. */
export function completionsAt(
  text: string,
  caret: number,
  names: FormulaNames,
  isAsked = false,
): Completions | null {
  const from = caret - (/[A-Za-z_][A-Za-z0-9_]*$/.exec(text.slice(0, caret))?.[0].length ?? 0);
  // A number with letters stuck to it is no name.
  if (/[0-9.]/.test(text[from - 1] ?? '')) return null;
  const to = caret + (/^[A-Za-z0-9_]*/.exec(text.slice(caret))?.[0].length ?? 0);
  const sought = text.slice(from, caret).toLowerCase();
  if (sought === '' && !isAsked) return null;
  const ranked = names.list
    .map((name) => ({ name, rank: rankOf(name, sought) }))
    .filter(({ rank }) => rank < NO_MATCH);
  ranked.sort((a, b) => a.rank - b.rank || a.name.symbol.localeCompare(b.name.symbol, 'en'));
  const options = ranked.slice(0, MOST).map(({ name }) => name);
  const isWhole = options.length === 1 && options[0]?.symbol === text.slice(from, to);
  return options.length === 0 || (isWhole && !isAsked) ? null : { from, to, options };
}

const NO_MATCH = 5;

/** Lower is better: the name begins so, a part of it does, it holds it, its label does. */
function rankOf({ symbol, label, what }: KnownName, sought: string): number {
  const name = symbol.toLowerCase();
  const late = what === 'function' || what === 'word' ? 0.5 : 0;
  if (name.startsWith(sought)) return 0 + late;
  if (name.includes(`_${sought}`)) return 1 + late;
  const words = label.toLowerCase();
  if (words.startsWith(sought) || words.includes(` ${sought}`)) return 2 + late;
  return sought.length > 1 && name.includes(sought) ? 3 + late : NO_MATCH;
}

/** A function comes with its bracket, and the caret inside. */
export function completed(
  text: string,
  { from, to }: Completions,
  { symbol, what }: KnownName,
): { text: string; caret: number } {
  const rest = text.slice(to);
  const isCall = what === 'function' && !/^\s*\(/.test(rest);
  const inserted = isCall ? `${symbol}()` : symbol;
  const caret = from + inserted.length - (isCall ? 1 : 0);
  return { text: text.slice(0, from) + inserted + rest, caret };
}
