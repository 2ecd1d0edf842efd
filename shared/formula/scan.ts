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

const SPACE = /[ \t\r\n]+/y;
const NUMBER = /(?:\d+(?:\.\d+)?|\.\d+)(?:[eE][+-]?\d+)?/y;
/** A number with whatever sticks to it, so that `12abc` and `1.2.3` are refused whole. */
const NUMBER_LIKE = /(?:\d|\.\d)(?:[eE][+-]\d|[A-Za-z0-9_.])*/y;
const WORD = /[A-Za-z_][A-Za-z0-9_]*/y;
const OPERATOR = /<=|>=|==|!=|[-+*/^<>]/y;
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

function match(pattern: RegExp, text: string, at: number): string | undefined {
  pattern.lastIndex = at;
  return pattern.exec(text)?.[0];
}

/** The token at `at`, or the issue that stands in its place. */
function tokenAt(text: string, at: number): Token | Issue {
  const make = (type: Token['type'], found: string): Token => ({
    type,
    text: found,
    at: { start: at, end: at + found.length },
  });
  const numberLike = match(NUMBER_LIKE, text, at);
  if (numberLike !== undefined) return numberToken(text, at, numberLike);
  const word = match(WORD, text, at);
  if (word !== undefined) return make('word', word);
  const operator = match(OPERATOR, text, at);
  if (operator !== undefined) return make('operator', operator);
  const mark = MARKS.get(text.charAt(at));
  return mark ? make(mark, text.charAt(at)) : strayCharacter(text, at);
}

function numberToken(text: string, at: number, numberLike: string): Token | Issue {
  const span = { start: at, end: at + numberLike.length };
  if (match(NUMBER, text, at) !== numberLike) {
    return error('formula.badNumber', [], { text: numberLike }, span);
  }
  if (!Number.isFinite(Number(numberLike))) {
    return error('formula.numberTooLarge', [], { text: numberLike }, span);
  }
  return { type: 'number', text: numberLike, at: span };
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
    const space = match(SPACE, text, at);
    if (space !== undefined) {
      at += space.length;
      continue;
    }
    const found = tokenAt(text, at);
    if ('code' in found) return { issue: found };
    tokens.push(found);
    at = found.at.end;
  }
  return { tokens };
}
