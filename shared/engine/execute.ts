/** Runs a stage's instructions over the memory. */
import { Exponential } from './expm.ts';
import type { Operation } from './graph.ts';
import type { Kernels } from './kernels/kernels.ts';
import type { Instruction, Slot, Stage } from './program.ts';

export class Executor {
  private readonly exponentials = new Map<Operation, ExponentialWork>();

  /** @param width room of a column, in draws */
  constructor(
    private readonly kernels: Kernels,
    private readonly width: number,
  ) {}

  /**
   * @param cycle which cycle's places tapes are read and written at
   * @param draws how many draws of a column are in use
   */
  run(stage: Stage, cycle: number, draws: number): void {
    const { instructions } = stage;
    for (let k = 0; k < instructions.length; k++) {
      const instruction = instructions[k]!;
      this.execute(instruction, cycle, instruction.wide ? draws : 1);
    }
  }

  private execute(instruction: Instruction, cycle: number, length: number): void {
    const { operation, args } = instruction;
    const { kernels } = this;
    const out = address(instruction.out, cycle);
    const a = args.length > 0 ? address(args[0]!, cycle) : 0;
    const b = args.length > 1 ? address(args[1]!, cycle) : 0;
    switch (operation.op) {
      case 'binary':
        return kernels.binary(operation.name, out, a, b, length);
      case 'unary':
        return kernels.unary(operation.name, out, a, length);
      case 'select':
        return kernels.select(out, a, b, address(args[2]!, cycle), length);
      case 'spread':
        return kernels.spread(out, a, length);
      case 'apply':
        return kernels.apply(
          operation.fn,
          out,
          args.map((slot) => address(slot, cycle)),
          length,
        );
      case 'exponential':
        return this.exponential(instruction, operation, cycle, length);
      default:
        // Leaves are written before the stages run; entries lie within their exponential.
        return;
    }
  }

  private exponential(
    { out, args, wide }: Instruction,
    operation: Extract<Operation, { op: 'exponential' }>,
    cycle: number,
    length: number,
  ): void {
    const { memory } = this.kernels;
    const work = this.exponentialWork(operation);
    const base = address(out, cycle);
    const step = wide ? this.width : 1;
    const from = args.map((slot) => address(slot, cycle));
    const row = operation.places[0]?.[0] ?? 0;
    for (let draw = 0; draw < length; draw++) {
      for (let k = 0; k < from.length; k++) work.rates[k] = memory[from[k]! + draw]!;
      const matrix = work.exponential.compute(work.rates, operation.years, row);
      for (let j = 0; j < operation.size; j++) {
        memory[base + j * step + draw] = matrix[row * operation.size + j]!;
      }
    }
  }

  private exponentialWork(operation: Extract<Operation, { op: 'exponential' }>): ExponentialWork {
    const known = this.exponentials.get(operation);
    if (known) return known;
    const work = {
      exponential: new Exponential(operation.size, operation.places),
      rates: new Float64Array(operation.rates.length),
    };
    this.exponentials.set(operation, work);
    return work;
  }
}

interface ExponentialWork {
  readonly exponential: Exponential;
  readonly rates: Float64Array;
}

export function address(slot: Slot, cycle: number): number {
  return slot.base + slot.stride * cycle;
}
