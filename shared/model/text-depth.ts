import { MAX_DEPTH } from './limits.ts';

const QUOTE = 0x22;
const BACKSLASH = 0x5c;

/**
 * Offset of the first bracket that opens deeper than `limit`, or -1. One pass over
 * the text, strings left out; run before parsing, whose recursion could be exhausted.
 */
export function tooDeepAt(text: string, limit = MAX_DEPTH): number {
  let depth = 0;
  let inString = false;
  for (let i = 0; i < text.length; i += 1) {
    const unit = text.charCodeAt(i);
    if (unit === QUOTE) inString = !inString;
    else if (inString) i += unit === BACKSLASH ? 1 : 0;
    else if (opens(unit)) {
      depth += 1;
      if (depth > limit) return i;
    } else if (closes(unit)) depth -= 1;
  }
  return -1;
}

/** `[` or `{`. */
function opens(unit: number): boolean {
  return unit === 0x5b || unit === 0x7b;
}

/** `]` or `}`. */
function closes(unit: number): boolean {
  return unit === 0x5d || unit === 0x7d;
}
