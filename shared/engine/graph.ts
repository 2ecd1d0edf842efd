/**
 * The model as a graph of elementwise operations. Equal nodes are made once
 * (hash-consing), so what strategies, tunnels or payoffs share is computed once,
 * and what is constant is folded while building.
 *
 * A node says what it varies with: with the draw (then its value is a column, one
 * number a draw), with the profile, with the cycle. The schedule uses only that.
 */
import { type BinaryOp, binaryMeaning, type UnaryOp, unaryMeaning } from './operations.ts';

/** A node's place in the graph; arguments always come before what uses them. */
export type NodeId = number;

export const VARIES = { profile: 1, cycle: 2 } as const;

export type Operation =
  | { readonly op: 'constant'; readonly value: number }
  | { readonly op: 'parameter'; readonly index: number }
  | { readonly op: 'covariate'; readonly index: number }
  /** `cycle` is the cycle being simulated, `boundary` the end of it. */
  | { readonly op: 'clock'; readonly clock: 'cycle' | 'boundary' }
  | { readonly op: 'unary'; readonly name: UnaryOp; readonly a: NodeId }
  | { readonly op: 'binary'; readonly name: BinaryOp; readonly a: NodeId; readonly b: NodeId }
  | { readonly op: 'select'; readonly condition: NodeId; readonly a: NodeId; readonly b: NodeId }
  /** A function without a kernel of its own, element by element. */
  | {
      readonly op: 'apply';
      readonly key: string;
      readonly fn: (...values: number[]) => number;
      readonly args: readonly NodeId[];
    }
  /** A number made into a column. */
  | { readonly op: 'spread'; readonly a: NodeId }
  /** The first row of the exponential of a generator; see expm.ts. */
  | {
      readonly op: 'exponential';
      readonly years: number;
      readonly size: number;
      /** Row and column of each rate in `rates`. */
      readonly places: readonly (readonly [number, number])[];
      readonly rates: readonly NodeId[];
    }
  | { readonly op: 'entry'; readonly of: NodeId; readonly index: number };

export interface GraphNode {
  readonly operation: Operation;
  readonly args: readonly NodeId[];
  /** Varies with the draw: the value is a column. */
  readonly wide: boolean;
  /** Bits of VARIES. */
  readonly varies: number;
}

export class Graph {
  readonly nodes: GraphNode[] = [];
  private readonly made = new Map<string, NodeId>();

  node(id: NodeId): GraphNode {
    return this.nodes[id] as GraphNode;
  }

  constant(value: number): NodeId {
    return this.add(`c${Object.is(value, -0) ? '-0' : value}`, { op: 'constant', value }, []);
  }

  /** The number a node always is, or undefined where it varies or was not folded. */
  valueOf(id: NodeId): number | undefined {
    const { operation } = this.node(id);
    return operation.op === 'constant' ? operation.value : undefined;
  }

  parameter(index: number, uncertain: boolean): NodeId {
    return this.add(`p${index}`, { op: 'parameter', index }, [], uncertain);
  }

  covariate(index: number): NodeId {
    return this.add(`v${index}`, { op: 'covariate', index }, [], false, VARIES.profile);
  }

  clock(clock: 'cycle' | 'boundary'): NodeId {
    return this.add(`k${clock}`, { op: 'clock', clock }, [], false, VARIES.cycle);
  }

  unary(name: UnaryOp, a: NodeId): NodeId {
    const value = this.valueOf(a);
    if (value !== undefined) return this.constant(unaryMeaning[name](value));
    return this.add(`u${name}(${a}`, { op: 'unary', name, a }, [a]);
  }

  binary(name: BinaryOp, a: NodeId, b: NodeId): NodeId {
    const left = this.valueOf(a);
    const right = this.valueOf(b);
    if (left !== undefined && right !== undefined) {
      return this.constant(binaryMeaning[name](left, right));
    }
    const same = neutral(name, a, b, left, right);
    if (same !== undefined) return same === 'zero' ? this.constant(0) : same;
    const [x, y] = this.columns(a, b);
    return this.add(`b${name}(${x},${y}`, { op: 'binary', name, a: x, b: y }, [x, y]);
  }

  select(condition: NodeId, a: NodeId, b: NodeId): NodeId {
    const known = this.valueOf(condition);
    if (known !== undefined) return known !== 0 ? a : b;
    if (a === b) return a;
    const [c, x, y] = this.columns(condition, a, b);
    return this.add(`s(${c},${x},${y}`, { op: 'select', condition: c, a: x, b: y }, [c, x, y]);
  }

  /** `key` names the function: the same key must always mean the same function. */
  apply(key: string, fn: (...values: number[]) => number, args: readonly NodeId[]): NodeId {
    const values = args.map((arg) => this.valueOf(arg));
    if (values.every((value) => value !== undefined)) {
      return this.constant(fn(...(values as number[])));
    }
    const columns = this.columns(...args);
    return this.add(`a${key}(${columns}`, { op: 'apply', key, fn, args: columns }, columns);
  }

  /** The first row of exp(Q years), Q holding `rates` at `places`; one node an entry. */
  exponential(
    size: number,
    places: readonly (readonly [number, number])[],
    rates: readonly NodeId[],
    years: number,
  ): NodeId[] {
    const columns = this.columns(...rates);
    const key = `e${size};${years};${places.join(' ')};${columns}`;
    const operation: Operation = { op: 'exponential', size, places, rates: columns, years };
    const row = this.add(key, operation, columns);
    return Array.from({ length: size }, (_, index) =>
      this.add(`i${row}.${index}`, { op: 'entry', of: row, index }, [row]),
    );
  }

  sum(terms: readonly NodeId[]): NodeId {
    return terms.reduce((total, term) => this.binary('add', total, term), this.constant(0));
  }

  /** The node as a column: a number is spread. */
  column(id: NodeId): NodeId {
    return this.node(id).wide ? id : this.add(`w${id}`, { op: 'spread', a: id }, [id], true);
  }

  /** Where one of them varies with the draw, all as columns. */
  private columns(...ids: NodeId[]): NodeId[] & [NodeId, NodeId, NodeId] {
    const wide = ids.some((id) => this.node(id).wide);
    return (wide ? ids.map((id) => this.column(id)) : ids) as NodeId[] & [NodeId, NodeId, NodeId];
  }

  private add(
    key: string,
    operation: Operation,
    args: readonly NodeId[],
    wide = args.some((arg) => this.node(arg).wide),
    varies = args.reduce((bits, arg) => bits | this.node(arg).varies, 0),
  ): NodeId {
    const known = this.made.get(key);
    if (known !== undefined) return known;
    const id = this.nodes.length;
    this.nodes.push({ operation, args, wide, varies });
    this.made.set(key, id);
    return id;
  }
}

/** x + 0, x - 0, 1 x, x / 1, x ^ 1 are x; 0 x is 0. */
function neutral(
  name: BinaryOp,
  a: NodeId,
  b: NodeId,
  left: number | undefined,
  right: number | undefined,
): NodeId | 'zero' | undefined {
  if (name === 'multiply' && (left === 0 || right === 0)) return 'zero';
  if (left === 0 && name === 'add') return b;
  if (left === 1 && name === 'multiply') return b;
  if (right === 0 && (name === 'add' || name === 'subtract')) return a;
  if (right === 1 && (name === 'multiply' || name === 'divide' || name === 'power')) return a;
  return undefined;
}
