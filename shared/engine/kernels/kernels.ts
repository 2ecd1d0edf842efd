/**
 * The seam between the engine and its arithmetic. All columns live in one memory
 * of doubles; kernels are given offsets into it and a length, and know nothing of
 * models. Another implementation (such as WebAssembly) replaces only this folder.
 *
 * An output may be the same column as an input; partial overlaps never occur.
 */
import type { BinaryOp, UnaryOp } from '../operations.ts';

/** Offset of a column's first element in the memory, in doubles. */
export type Address = number;

export interface Kernels {
  readonly memory: Float64Array;
  /** out = op(a) */
  unary(op: UnaryOp, out: Address, a: Address, length: number): void;
  /** out = a op b */
  binary(op: BinaryOp, out: Address, a: Address, b: Address, length: number): void;
  /** out = a where the condition is not 0, else b */
  select(out: Address, condition: Address, a: Address, b: Address, length: number): void;
  /** out = fn(args...), element by element: for what has no kernel of its own. */
  apply(
    fn: (...values: number[]) => number,
    out: Address,
    args: readonly Address[],
    length: number,
  ): void;
  /** out = the one number at a */
  spread(out: Address, a: Address, length: number): void;
  /** out = a */
  copy(out: Address, a: Address, length: number): void;
  /** out = value */
  fill(out: Address, value: number, length: number): void;
  /** out = sum over terms of left * right, in the order of the terms */
  dot(out: Address, left: Int32Array, right: Int32Array, length: number): void;
  /** The same, and sum += weight * out. */
  dotAdding(
    out: Address,
    left: Int32Array,
    right: Int32Array,
    sum: Address,
    weight: number,
    length: number,
  ): void;
  /** out += weight * a */
  addScaled(out: Address, a: Address, weight: number, length: number): void;
  /** out += a * b */
  addProduct(out: Address, a: Address, b: Address, length: number): void;
  /** How many elements are not within [low, high]; NaN is not. */
  countOutside(a: Address, low: number, high: number, length: number): number;
}

export type KernelsOf = (memory: Float64Array) => Kernels;
