/**
 *   tokensOf(text, names): ColouredToken[]
 *
 * The whole text cut into stretches of one kind each, in order, white space and what the
 * language has no use for included: their texts put together are the text.
 */
import { scan, type Token } from '../../../shared/formula/scan.ts';
import type { FormulaNames, NameKind } from './formula-names.ts';

export type TokenKind = NameKind | 'number' | 'operator' | 'plain' | 'unknown';

export interface ColouredToken {
  readonly text: string;
  readonly kind: TokenKind;
  /** Offset in the text. */
  readonly start: number;
}

/** Stray characters that are passed over before the rest is left plain. */
const MOST_STRAYS = 20;

export function tokensOf(text: string, names: FormulaNames): ColouredToken[] {
  const tokens: ColouredToken[] = [];
  let end = 0;
  for (const token of scanned(text)) {
    const { start } = token.at;
    if (start > end) tokens.push({ text: text.slice(end, start), kind: 'plain', start: end });
    tokens.push({ text: token.text, kind: kindOf(token, names), start });
    end = token.at.end;
  }
  if (end < text.length) tokens.push({ text: text.slice(end), kind: 'plain', start: end });
  return tokens;
}

/** Tokens of what can be read, where characters that cannot be are blanked out. */
function scanned(text: string): readonly Token[] {
  let readable = text;
  for (let strays = 0; strays < MOST_STRAYS; strays += 1) {
    const result = scan(readable);
    if ('tokens' in result) return result.tokens;
    const { start, end } = result.issue.at ?? { start: 0, end: readable.length };
    readable = readable.slice(0, start) + ' '.repeat(end - start) + readable.slice(end);
  }
  return [];
}

function kindOf({ type, text }: Token, names: FormulaNames): TokenKind {
  if (type === 'number') return 'number';
  if (type !== 'word') return 'operator';
  return names.bySymbol.get(text)?.what ?? 'unknown';
}
