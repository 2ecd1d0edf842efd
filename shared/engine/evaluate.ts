/**
 * Any node of the graph as one plain number: for one profile, at given parameter
 * values and a given cycle. Slow and simple, for explaining single numbers; the
 * simulation takes the way of schedule.ts and execute.ts and knows nothing of this.
 */
import type { CompiledModel } from './compile.ts';
import { Exponential } from './expm.ts';
import { type GraphNode, type NodeId, type Operation, VARIES } from './graph.ts';
import { binaryMeaning, unaryMeaning } from './operations.ts';

/** Stamp of a value that holds at every cycle. */
const ALWAYS = -1;
/** Stamp of a value not yet known. */
const NEVER = -2;

type ExponentialOperation = Extract<Operation, { op: 'exponential' }>;

export class NodeValues {
  private readonly values: Float64Array;
  private readonly stamps: Int32Array;
  /** Rows of exponentials, which are no single number. */
  private readonly rows = new Map<NodeId, Float64Array>();
  private cycle = 0;

  /**
   * @param profile index in the document
   * @param parameters by parameter in document order
   */
  constructor(
    private readonly model: CompiledModel,
    private readonly profile: number,
    private readonly parameters: readonly number[],
  ) {
    this.values = new Float64Array(model.graph.nodes.length);
    this.stamps = new Int32Array(model.graph.nodes.length).fill(NEVER);
  }

  /** The value during `cycle`, 0 or more; the clock `boundary` then reads `cycle + 1`. */
  at(node: NodeId, cycle: number): number {
    this.cycle = cycle;
    return this.value(node);
  }

  private value = (id: NodeId): number => {
    const node = this.model.graph.node(id);
    const stamp = (node.varies & VARIES.cycle) === 0 ? ALWAYS : this.cycle;
    if (this.stamps[id] !== stamp) {
      this.values[id] = this.compute(id, node);
      this.stamps[id] = stamp;
    }
    return this.values[id] as number;
  };

  private compute(id: NodeId, { operation }: GraphNode): number {
    switch (operation.op) {
      case 'constant':
        return operation.value;
      case 'parameter':
        return this.parameters[operation.index] as number;
      case 'covariate':
        return this.covariate(operation.index);
      case 'clock':
        return operation.clock === 'cycle' ? this.cycle : this.cycle + 1;
      case 'unary':
        return unaryMeaning[operation.name](this.value(operation.a));
      case 'binary':
        return binaryMeaning[operation.name](this.value(operation.a), this.value(operation.b));
      case 'select':
        return this.value(this.value(operation.condition) !== 0 ? operation.a : operation.b);
      case 'apply':
        return operation.fn(...operation.args.map(this.value));
      case 'spread':
        return this.value(operation.a);
      case 'exponential':
        return this.exponential(id, operation);
      case 'entry':
        this.value(operation.of);
        return this.rows.get(operation.of)?.[operation.index] as number;
    }
  }

  private covariate(index: number): number {
    const { covariates, profiles } = this.model.document;
    return profiles[this.profile]!.covariates[covariates[index]!.id]!;
  }

  /** Keeps the row that is wanted; its entries read it. The number itself means nothing. */
  private exponential(id: NodeId, { size, places, rates, years }: ExponentialOperation): number {
    const row = places[0]?.[0] ?? 0;
    const given = Float64Array.from(rates, this.value);
    const matrix = new Exponential(size, places).compute(given, years, row);
    this.rows.set(id, matrix.slice(row * size, (row + 1) * size));
    return 0;
  }
}
