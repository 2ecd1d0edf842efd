/**
 * Grammar check of a token sequence, before the tree is built: it gives errors
 * with their places, which the tree builder does not, and bounds the nesting.
 * The grammar has two positions (a value is due, or an operator is due) and
 * a stack of open brackets.
 */
import { error, type Issue } from '../model/issue.ts';
import type { Token } from './scan.ts';

const INFIX_WORDS: ReadonlySet<string> = new Set(['and', 'or']);
const CONSTANTS: ReadonlySet<string> = new Set(['true', 'false']);

interface Walk {
  readonly tokens: readonly Token[];
  readonly open: { readonly token: Token; readonly isCall: boolean }[];
  /** Prefix operators just read with no value yet. */
  prefixes: number;
  valueDue: boolean;
}

const issueAt = (code: string, token: Token, params: Record<string, string> = {}): Issue =>
  error(code, [], { found: token.text, ...params }, token.at);

const isInfix = (token: Token): boolean =>
  token.type === 'operator' || (token.type === 'word' && INFIX_WORDS.has(token.text));

/** `not` binds looser than comparison, so it cannot be an operand of `+` or `<`. */
function notFits(walk: Walk, index: number): boolean {
  const before = walk.tokens[index - 1];
  if (!before || before.type === 'open' || before.type === 'comma') return true;
  return before.type === 'word';
}

function readValue(walk: Walk, token: Token, index: number): Issue | undefined {
  const isMinus = token.type === 'operator' && token.text === '-';
  const isNot = token.type === 'word' && token.text === 'not';
  if (isNot && !notFits(walk, index)) return issueAt('formula.misplacedNot', token);
  if (isMinus || isNot) {
    walk.prefixes += 1;
    return undefined;
  }
  if (token.type === 'open') {
    walk.open.push({ token, isCall: false });
    walk.prefixes = 0;
    return undefined;
  }
  if (token.type === 'close') return readCloseForValue(walk, token, index);
  if (token.type === 'number' || (token.type === 'word' && !isInfix(token))) {
    walk.valueDue = false;
    walk.prefixes = 0;
    return undefined;
  }
  return issueAt('formula.valueExpected', token);
}

/** A closing bracket where a value is due is right only in `name()`. */
function readCloseForValue(walk: Walk, token: Token, index: number): Issue | undefined {
  if (walk.open.length === 0) return issueAt('formula.unopenedBracket', token);
  const isEmptyCall = walk.open.at(-1)?.isCall && walk.tokens[index - 1]?.type === 'open';
  if (!isEmptyCall) return issueAt('formula.valueExpected', token);
  walk.open.pop();
  walk.valueDue = false;
  return undefined;
}

function readAfterValue(walk: Walk, token: Token, index: number): Issue | undefined {
  if (token.type === 'close') {
    if (!walk.open.pop()) return issueAt('formula.unopenedBracket', token);
    return undefined;
  }
  if (isInfix(token)) {
    walk.valueDue = true;
    return undefined;
  }
  if (token.type === 'comma') return readComma(walk, token, index);
  const before = walk.tokens[index - 1];
  if (token.type === 'open' && before?.type === 'word' && !CONSTANTS.has(before.text)) {
    walk.open.push({ token, isCall: true });
    walk.valueDue = true;
    return undefined;
  }
  const meant = token.text.toLowerCase();
  const params: Record<string, string> = INFIX_WORDS.has(meant) ? { instead: meant } : {};
  return issueAt('formula.operatorExpected', token, params);
}

function readComma(walk: Walk, token: Token, index: number): Issue | undefined {
  if (walk.open.at(-1)?.isCall) {
    walk.valueDue = true;
    return undefined;
  }
  const [left, right] = [walk.tokens[index - 1], walk.tokens[index + 1]];
  const touches = left?.at.end === token.at.start && right?.at.start === token.at.end;
  if (touches && left?.type === 'number' && right?.type === 'number') {
    const span = { start: left.at.start, end: right.at.end };
    return error('formula.decimalComma', [], { text: `${left.text},${right.text}` }, span);
  }
  return issueAt('formula.operatorExpected', token);
}

function atEnd(walk: Walk): Issue | undefined {
  const last = walk.tokens.at(-1);
  if (!last) return error('formula.empty');
  const unclosed = walk.open.at(-1);
  if (walk.valueDue) {
    return error('formula.incomplete', [], { after: last.text }, last.at);
  }
  return unclosed && issueAt('formula.unclosedBracket', unclosed.token);
}

/**
 * The first thing that is wrong with the order of the tokens, or undefined.
 * `depth` bounds the brackets and prefix operators open at once.
 */
export function checkSyntax(tokens: readonly Token[], depth: number): Issue | undefined {
  const walk: Walk = { tokens, open: [], prefixes: 0, valueDue: true };
  for (const [index, token] of tokens.entries()) {
    const read = walk.valueDue ? readValue : readAfterValue;
    const issue = read(walk, token, index);
    if (issue) return issue;
    if (walk.open.length + walk.prefixes > depth) {
      return error('formula.tooDeep', [], { limit: depth }, token.at);
    }
  }
  return atEnd(walk);
}
