/**
 *   argumentAt(text, caret): { fn, index } | null
 *
 * The function call that the caret is inside of, and which of its arguments it is in.
 */
export interface ArgumentPlace {
  readonly fn: string;
  /** 0 for the first. */
  readonly index: number;
}

export function argumentAt(text: string, caret: number): ArgumentPlace | null {
  let depth = 0;
  let index = 0;
  for (let at = caret - 1; at >= 0; at -= 1) {
    const character = text[at];
    if (character === ')') depth += 1;
    else if (character === ',' && depth === 0) index += 1;
    else if (character === '(' && depth > 0) depth -= 1;
    else if (character === '(') {
      const fn = /([A-Za-z_][A-Za-z0-9_]*)\s*$/.exec(text.slice(0, at))?.[1];
      if (fn) return { fn, index };
      // A bracket that only groups: what is outside it counts on from here.
      index = 0;
    }
  }
  return null;
}
