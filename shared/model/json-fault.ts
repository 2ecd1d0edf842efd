/**
 * Where a text stops being JSON (RFC 8259). Engines word and place their parse
 * errors each in their own way; this place is the same everywhere.
 */

const SPACE = /[ \t\n\r]*/y;
const NUMBER = /-?(?:0|[1-9][0-9]*)(?:\.[0-9]+)?(?:[eE][+-]?[0-9]+)?/y;
// Everything from the space up but the quote and the backslash.
const STRING_PART = /[ !#-[\]-\uffff]*/y;
const ESCAPE = /\\(?:["\\/bfnrt]|u[0-9a-fA-F]{4})/y;

/** A place in a text: both from 1; columns count UTF-16 units. */
export interface Place {
  readonly line: number;
  readonly column: number;
}

/**
 * Offset of the first unit that cannot be part of JSON: the text's length where it
 * ends too early, -1 where it is whole. Nesting has to be bounded beforehand.
 */
export function jsonFaultAt(text: string): number {
  const scan = new Scan(text);
  const end = scan.spaced(scan.value(scan.space(0)));
  if (scan.fault >= 0) return scan.fault;
  return end < text.length ? end : -1;
}

/** Line and column of an offset. */
export function placeOf(text: string, offset: number): Place {
  let line = 1;
  let lineStart = 0;
  for (let at = text.indexOf('\n'); at >= 0 && at < offset; at = text.indexOf('\n', at + 1)) {
    line += 1;
    lineStart = at + 1;
  }
  return { line, column: offset - lineStart + 1 };
}

/** Each step takes an offset and gives the offset after what it read, or -1 after a fault. */
class Scan {
  fault = -1;
  constructor(private readonly text: string) {}

  space(at: number): number {
    return this.match(SPACE, at);
  }

  spaced(at: number): number {
    return at < 0 ? at : this.space(at);
  }

  value(at: number): number {
    const first = this.text[at];
    if (first === '{') return this.list(at, '}', (from) => this.member(from));
    if (first === '[') return this.list(at, ']', (from) => this.value(from));
    if (first === '"') return this.string(at);
    for (const word of ['true', 'false', 'null']) {
      if (first === word[0]) return this.word(at, word);
    }
    const end = this.match(NUMBER, at);
    return end > at ? end : this.fail(at);
  }

  private list(at: number, close: string, item: (at: number) => number): number {
    let here = this.space(at + 1);
    if (this.text[here] === close) return here + 1;
    for (;;) {
      here = this.spaced(item(here));
      if (here < 0) return here;
      if (this.text[here] === close) return here + 1;
      if (this.text[here] !== ',') return this.fail(here);
      here = this.space(here + 1);
    }
  }

  private member(at: number): number {
    if (this.text[at] !== '"') return this.fail(at);
    const colon = this.spaced(this.string(at));
    if (colon < 0) return colon;
    if (this.text[colon] !== ':') return this.fail(colon);
    return this.value(this.space(colon + 1));
  }

  private string(at: number): number {
    let here = at + 1;
    for (;;) {
      here = this.match(STRING_PART, here);
      if (this.text[here] === '"') return here + 1;
      const after = this.match(ESCAPE, here);
      if (after === here) return this.fail(here);
      here = after;
    }
  }

  private word(at: number, word: string): number {
    for (let i = 0; i < word.length; i += 1) {
      if (this.text[at + i] !== word[i]) return this.fail(at + i);
    }
    return at + word.length;
  }

  private match(pattern: RegExp, at: number): number {
    pattern.lastIndex = at;
    return pattern.test(this.text) ? pattern.lastIndex : at;
  }

  private fail(at: number): number {
    this.fault = at;
    return -1;
  }
}
