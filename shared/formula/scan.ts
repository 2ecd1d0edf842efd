/**
 * Cuts a formula into tokens with their places, and refuses every character that
 * the language has no use for. What passes holds nothing but numbers, words,
 * operators, brackets, commas and white space.
 */
import { error, type Issue, type IssueParams, type Span } from '../model/issue.ts';

export interface Token {
  readonly type: 'number' | 'word' | 'operator' | 'open' | 'close' | 'comma';
  readonly text: string;
  readonly at: Span;
}

/**
 * White space, a number with whatever sticks to it (so that `12abc` and `1.2.3` are
 * refused whole), a word, an operator, or a mark: one group each.
 */
const PIECE =
  /([ \t\r\n]+)|((?:\d|\.\d)(?:[eE][+-]?\d|[A-Za-z0-9_.])*)|([A-Za-z_][A-Za-z0-9_]*)|(<=|>=|==|!=|[-+*/^<>])|([(),])/y;
const NUMBER = /^(?:\d+(?:\.\d+)?|\.\d+)(?:[eE][+-]?\d+)?$/;
const MARKS: ReadonlyMap<string, Token['type']> = new Map([
  ['(', 'open'],
  [')', 'close'],
  [',', 'comma'],
]);

/** What other notations write, and what this language writes for it. */
const INSTEAD: ReadonlyMap<string, string> = new Map([
  ['=', '=='],
  ['&&', 'and'],
  ['&', 'and'],
  ['||', 'or'],
  ['|', 'or'],
  ['!', 'not'],
  ['[', '('],
  ['{', '('],
  [']', ')'],
  ['}', ')'],
  [';', ','],
  ['\u2212', '-'],
  ['\u2013', '-'],
  ['\u00d7', '*'],
  ['\u00b7', '*'],
  ['\u00f7', '/'],
  ['\u2264', '<='],
  ['\u2265', '>='],
  ['\u2260', '!='],
]);

type Found = { readonly token: Token } | { readonly issue: Issue } | undefined;

/** A token, an issue in its place, or undefined for white space. */
function classify([text, space, number, word, operator]: RegExpExecArray, start: number): Found {
  const at = { start, end: start + text.length };
  if (space !== undefined) return undefined;
  if (number !== undefined) return numberToken(text, at);
  if (word !== undefined) return { token: { type: 'word', text, at } };
  if (operator !== undefined) return { token: { type: 'operator', text, at } };
  return { token: { type: MARKS.get(text) ?? 'comma', text, at } };
}

function numberToken(text: string, at: Span): Found {
  if (!NUMBER.test(text)) return { issue: error('formula.badNumber', [], { text }, at) };
  if (Number.isFinite(Number(text))) return { token: { type: 'number', text, at } };
  return { issue: error('formula.numberTooLarge', [], { text }, at) };
}

function strayCharacter(text: string, at: number): Issue {
  const pair = text.slice(at, at + 2);
  const character = INSTEAD.has(pair) ? pair : String.fromCodePoint(text.codePointAt(at) ?? 0);
  const instead = INSTEAD.get(character);
  const params: IssueParams = instead === undefined ? { character } : { character, instead };
  const span = { start: at, end: at + character.length };
  return error('formula.strayCharacter', [], params, span);
}

/**
 * Tokens in the order of the text, or the first thing that is none.
 * Errors: `formula.strayCharacter` (params character, instead where known),
 * `formula.badNumber` and `formula.numberTooLarge` (params text).
 */
export function scan(text: string): { tokens: readonly Token[] } | { issue: Issue } {
  const tokens: Token[] = [];
  let at = 0;
  while (at < text.length) {
    PIECE.lastIndex = at;
    const piece = PIECE.exec(text);
    if (!piece) return { issue: strayCharacter(text, at) };
    const found = classify(piece, at);
    if (found && 'issue' in found) return found;
    if (found) tokens.push(found.token);
    at += piece[0].length;
  }
  return { tokens };
}
