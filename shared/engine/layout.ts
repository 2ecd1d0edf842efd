/** Places in the engine's one memory, given out from the bottom up. */
import type { Graph, NodeId } from './graph.ts';
import type { Instruction, Slot } from './program.ts';

export class Layout {
  /** Doubles given out so far. */
  size = 0;
  private top = 0;
  private readonly slots = new Map<NodeId, Slot>();
  private scratch: NodeId[] | null = null;

  constructor(
    private readonly graph: Graph,
    private readonly width: number,
    private readonly cycles: number,
  ) {}

  /** Room for so many columns; the address of the first. */
  columns(count: number): number {
    return this.take(count * this.width);
  }

  /** Room for so many numbers. */
  numbers(count: number): number {
    return this.take(count);
  }

  /** A node's place: for one cycle, or kept for all of them. */
  place(id: NodeId, kept: boolean): Slot {
    const { operation, wide } = this.graph.node(id);
    if (operation.op === 'entry') return this.entry(id, operation.of, operation.index);
    const one = wide ? this.width : 1;
    const outputs = operation.op === 'exponential' ? operation.size : 1;
    const base = this.take(one * outputs * (kept ? this.cycles : 1));
    return this.keep(id, { base, stride: kept ? one * outputs : 0 });
  }

  slot(id: NodeId): Slot {
    const slot = this.slots.get(id);
    if (!slot) throw new Error(`node ${id} has no place`);
    return slot;
  }

  instruction(id: NodeId): Instruction {
    const { operation, args, wide } = this.graph.node(id);
    return { operation, wide, out: this.slot(id), args: args.map((arg) => this.slot(arg)) };
  }

  /** From here on places are given that the next strategy may have again. */
  beginScratch(): void {
    this.top = this.size;
    this.scratch = [];
  }

  endScratch(): void {
    for (const id of this.scratch ?? []) this.slots.delete(id);
    this.scratch = null;
    this.highest = Math.max(this.highest, this.size);
    this.size = this.top;
  }

  /** The most that was ever given out. */
  highest = 0;

  private entry(id: NodeId, of: NodeId, index: number): Slot {
    const row = this.slot(of);
    const one = this.graph.node(of).wide ? this.width : 1;
    return this.keep(id, { base: row.base + index * one, stride: row.stride });
  }

  private keep(id: NodeId, slot: Slot): Slot {
    this.slots.set(id, slot);
    this.scratch?.push(id);
    return slot;
  }

  private take(length: number): number {
    const at = this.size;
    this.size += length;
    this.highest = Math.max(this.highest, this.size);
    return at;
  }
}
