/**
 * Formula text to `Expr`. White space is free; names and words are as written
 * (lower case for words); numbers take a decimal point. Tightest first:
 * calls and brackets, `^` (from the right), unary minus (so -2^2 is -4),
 * `* /`, `+ -`, comparison (not chained), `not`, `and`, `or`.
 */
import { error, type Issue, type Span } from '../model/issue.ts';
import { type CallExpr, type Expr, OPERATORS, PREFIX_OPERATORS } from './expr.ts';
import { LIMITS, type Limits } from './limits.ts';
import { scan } from './scan.ts';
import { checkSyntax } from './syntax.ts';
import { buildTree, type Node } from './tree.ts';

export type Parsed =
  | { readonly expr: Expr; readonly issues?: undefined }
  | { readonly issues: readonly Issue[]; readonly expr?: undefined };

const WORD_OF: ReadonlyMap<string, string> = new Map(Object.entries(OPERATORS));
const PREFIX_WORD_OF: ReadonlyMap<string, string> = new Map(Object.entries(PREFIX_OPERATORS));
/** Names that operators have in the tree; nobody may write them as functions. */
const OPERATOR_WORDS: ReadonlySet<string> = new Set([
  ...WORD_OF.values(),
  ...PREFIX_WORD_OF.values(),
]);
const CONSTANTS: ReadonlyMap<string, number> = new Map([
  ['true', 1],
  ['false', 0],
]);
const COMPARISONS: ReadonlySet<string> = new Set(['<', '<=', '>', '>=', '==', '!=']);

class Refused extends Error {
  readonly issue: Issue;
  constructor(issue: Issue) {
    super(issue.code);
    this.issue = issue;
  }
}

/** A two-sided node of jsep without brackets: it has no place of its own. */
const isBare = (node: Node): boolean => node.type === 'BinaryExpression' && !node.extent;

/** The first or last part, along a chain of any length, that has a place of its own. */
function outermost(node: Node, side: 'left' | 'right'): Span {
  let part = node[side] as Node;
  while (isBare(part)) part = part[side] as Node;
  return part.extent ?? { start: 0, end: 0 };
}

/** The text of a node without brackets around it; a two-sided node reaches from side to side. */
function innerSpan(node: Node): Span {
  if (node.type !== 'BinaryExpression') return node.inner ?? { start: 0, end: 0 };
  return { start: outermost(node, 'left').start, end: outermost(node, 'right').end };
}

/** `a < b < c` would compare 0 or 1 with c, which nobody means. */
function refuseChain(node: Node, at: Span): void {
  if (!COMPARISONS.has(node.operator as string)) return;
  const left = node.left as Node;
  if (isBare(left) && COMPARISONS.has(left.operator as string)) {
    throw new Refused(error('formula.chainedComparison', [], {}, at));
  }
}

function nameOrConstant(name: string, at: Span): Expr {
  const value = CONSTANTS.get(name);
  return value === undefined ? { type: 'name', name, at } : { type: 'number', value, at };
}

const nameOf = (node: Node): string =>
  node.type === 'ThisExpression' ? 'this' : (node.name as string);

/** Turns jsep's tree into ours, within the limits. */
class Converter {
  private count = 0;
  private depth = 0;
  private readonly limits: Limits;

  constructor(limits: Limits) {
    this.limits = limits;
  }

  convert(node: Node): Expr {
    const at = innerSpan(node);
    this.count += 1;
    if (this.count > this.limits.nodes) {
      throw new Refused(error('formula.tooLarge', [], { limit: this.limits.nodes }, at));
    }
    if (this.depth >= this.limits.depth) {
      throw new Refused(error('formula.tooDeep', [], { limit: this.limits.depth }, at));
    }
    this.depth += 1;
    const expr = this.expression(node, at);
    this.depth -= 1;
    return expr;
  }

  private expression(node: Node, at: Span): Expr {
    if (node.type === 'Literal') return { type: 'number', value: Number(node.raw), at };
    if (node.type === 'Identifier' || node.type === 'ThisExpression') {
      return nameOrConstant(nameOf(node), at);
    }
    if (node.type === 'CallExpression') return this.writtenCall(node, at);
    return this.operator(node, at);
  }

  private writtenCall(node: Node, at: Span): CallExpr {
    const name = nameOf(node.callee as Node);
    if (OPERATOR_WORDS.has(name)) {
      const span = { start: at.start, end: at.start + name.length };
      throw new Refused(error('formula.unknownFunction', [], { name }, span));
    }
    return this.call(name, node.arguments as Node[], at);
  }

  private operator(node: Node, at: Span): CallExpr {
    const symbol = node.operator as string;
    if (node.type === 'UnaryExpression') {
      return this.call(PREFIX_WORD_OF.get(symbol), [node.argument as Node], at);
    }
    refuseChain(node, at);
    return this.call(WORD_OF.get(symbol), [node.left as Node, node.right as Node], at);
  }

  private call(fn: string | undefined, args: readonly Node[], at: Span): CallExpr {
    if (fn === undefined) throw new Refused(error('formula.syntax', [], {}, at));
    return { type: 'call', fn, args: args.map((arg) => this.convert(arg)), at };
  }
}

function convertText(text: string, limits: Limits): Parsed {
  try {
    return { expr: new Converter(limits).convert(buildTree(text)) };
  } catch (thrown) {
    if (thrown instanceof Refused) return { issues: [thrown.issue] };
    // The syntax check lets nothing through that jsep refuses; if it ever does, say so as data.
    return { issues: [error('formula.syntax', [], {}, { start: 0, end: text.length })] };
  }
}

/** `parseFormula` without its memory, under limits of the caller's own. */
export function readFormula(text: string, limits: Limits = LIMITS): Parsed {
  if (text.length > limits.length) {
    const params = { length: text.length, limit: limits.length };
    return { issues: [error('formula.tooLong', [], params)] };
  }
  const scanned = scan(text);
  if ('issue' in scanned) return { issues: [scanned.issue] };
  const issue = checkSyntax(scanned.tokens, limits.depth);
  return issue ? { issues: [issue] } : convertText(text, limits);
}

/** Characters of text whose answers are remembered; the oldest go first. */
const REMEMBERED = 1_000_000;
const memory = new Map<string, Parsed>();
let remembered = 0;

function remember(text: string, parsed: Parsed): void {
  memory.set(text, parsed);
  remembered += text.length;
  for (const oldest of memory.keys()) {
    if (remembered <= REMEMBERED) return;
    memory.delete(oldest);
    remembered -= oldest.length;
  }
}

/**
 * The expression of a formula, or what is wrong with it: one issue with an empty
 * path (the caller prefixes the formula's) and its place in the text.
 * Codes: `formula.` empty, incomplete, tooLong, tooDeep, tooLarge, strayCharacter,
 * badNumber, numberTooLarge, decimalComma, valueExpected, operatorExpected,
 * misplacedNot, unclosedBracket, unopenedBracket, chainedComparison, unknownFunction.
 *
 * @example parseFormula('1 - p_die') // { expr: subtract(1, p_die) }
 */
export function parseFormula(text: string): Parsed {
  const known = memory.get(text);
  if (known) return known;
  const parsed = readFormula(text);
  // Keeping a copy of a huge text only to refuse it again is worth nothing.
  if (text.length <= LIMITS.length) remember(text, parsed);
  return parsed;
}
