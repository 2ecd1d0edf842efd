/**
 * Builds the operator tree of a formula with jsep, and keeps the place of each
 * part, which jsep does not. Only this file knows jsep; the text it is given has
 * passed scan.ts and syntax.ts, so nothing of JavaScript is left in it.
 */
import jsep from 'jsep';
import type { Span } from '../model/issue.ts';

/** jsep's node with its place: the text of the node itself, and with brackets around it. */
export interface Node extends jsep.Expression {
  inner?: Span;
  extent?: Span;
}

/** The parts of jsep's parser class that its type declarations leave out. */
interface Parser {
  expr: string;
  index: number;
  gobbleSpaces(): void;
  gobbleExpression(): Node;
  gobbleBinaryExpression(): Node;
  gobbleBinaryOp(): string | false;
  gobbleToken(): Node | false;
  parse(): Node;
}
const { Jsep } = jsep as unknown as { Jsep: new (text: string) => Parser };

/** How tightly each operator binds; `-x` sits just below `^`, `not x` just below comparison. */
const BINDS = new Map([
  ['or', 1],
  ['and', 2],
  ['==', 3],
  ['!=', 3],
  ['<', 3],
  ['<=', 3],
  ['>', 3],
  ['>=', 3],
  ['+', 4],
  ['-', 4],
  ['*', 5],
  ['/', 5],
  ['^', 6],
]);
const PREFIX_TAKES = { '-': BINDS.get('^') ?? 0, not: BINDS.get('<') ?? 0 };

// jsep keeps its set-up in the class itself; this is the only user of it.
jsep.removeAllUnaryOps();
jsep.removeAllBinaryOps();
jsep.removeAllLiterals();
for (const [operator, binding] of BINDS) jsep.addBinaryOp(operator, binding, operator === '^');

const NOT = /not(?![A-Za-z0-9_])/y;

class TreeBuilder extends Jsep {
  /** Operators that bind less than this end the current operand. */
  floor = 0;

  override gobbleExpression(): Node {
    return this.withFloor(0, () => super.gobbleExpression());
  }

  override gobbleBinaryOp(): string | false {
    const before = this.index;
    const operator = super.gobbleBinaryOp();
    if (operator === false || (BINDS.get(operator) ?? 0) >= this.floor) return operator;
    this.index = before;
    return false;
  }

  override gobbleToken(): Node | false {
    this.gobbleSpaces();
    const start = this.index;
    const prefix = this.prefixHere();
    const node = prefix ? this.gobblePrefixed(prefix) : super.gobbleToken();
    if (!node) return node;
    node.extent = { start, end: this.endBeforeSpaces() };
    node.inner ??= node.extent;
    return node;
  }

  private prefixHere(): '-' | 'not' | undefined {
    if (this.expr.charAt(this.index) === '-') return '-';
    NOT.lastIndex = this.index;
    return NOT.test(this.expr) ? 'not' : undefined;
  }

  private gobblePrefixed(operator: '-' | 'not'): Node {
    this.index += operator.length;
    const take = () => this.gobbleBinaryExpression();
    const argument = this.withFloor(PREFIX_TAKES[operator], take);
    return { type: 'UnaryExpression', operator, argument, prefix: true };
  }

  private withFloor<T>(floor: number, read: () => T): T {
    const before = this.floor;
    this.floor = floor;
    const result = read();
    this.floor = before;
    return result;
  }

  /** jsep reads on over white space; the text of a part ends before it. */
  private endBeforeSpaces(): number {
    let end = this.index;
    while (end > 0 && this.expr.charCodeAt(end - 1) <= 32) end -= 1;
    return end;
  }
}

/** jsep's tree of a text that has passed the syntax check. */
export function buildTree(text: string): Node {
  return new TreeBuilder(text).parse();
}
