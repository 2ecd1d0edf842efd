/** The kernels as plain loops over one Float64Array. */
import { type BinaryOp, binaryMeaning, type UnaryOp, unaryMeaning } from '../operations.ts';
import { addProductInto, addScaledInto, dotAddingInto, dotInto } from './dot.ts';
import type { Address, Kernels } from './kernels.ts';

type UnaryLoop = (m: Float64Array, out: Address, a: Address, length: number) => void;
type BinaryLoop = (m: Float64Array, out: Address, a: Address, b: Address, length: number) => void;

/*
 * Each operation gets a loop of its own: one shared loop that took the operation as
 * an argument would be compiled for all of them at once and run several times slower.
 */
const add: BinaryLoop = (m, out, a, b, length) => {
  for (let i = 0; i < length; i++) m[out + i] = m[a + i]! + m[b + i]!;
};
const subtract: BinaryLoop = (m, out, a, b, length) => {
  for (let i = 0; i < length; i++) m[out + i] = m[a + i]! - m[b + i]!;
};
const multiply: BinaryLoop = (m, out, a, b, length) => {
  for (let i = 0; i < length; i++) m[out + i] = m[a + i]! * m[b + i]!;
};
const divide: BinaryLoop = (m, out, a, b, length) => {
  for (let i = 0; i < length; i++) m[out + i] = m[a + i]! / m[b + i]!;
};
const max: BinaryLoop = (m, out, a, b, length) => {
  for (let i = 0; i < length; i++) m[out + i] = Math.max(m[a + i]!, m[b + i]!);
};
const exp: UnaryLoop = (m, out, a, length) => {
  for (let i = 0; i < length; i++) m[out + i] = Math.exp(m[a + i]!);
};

/** The less frequent operations share a loop over their meaning. */
function unaryLoop(op: UnaryOp): UnaryLoop {
  const meaning = unaryMeaning[op];
  return (m, out, a, length) => {
    for (let i = 0; i < length; i++) m[out + i] = meaning(m[a + i]!);
  };
}

function binaryLoop(op: BinaryOp): BinaryLoop {
  const meaning = binaryMeaning[op];
  return (m, out, a, b, length) => {
    for (let i = 0; i < length; i++) m[out + i] = meaning(m[a + i]!, m[b + i]!);
  };
}

const unaryLoops = {
  ...Object.fromEntries(Object.keys(unaryMeaning).map((op) => [op, unaryLoop(op as UnaryOp)])),
  exp,
} as Record<UnaryOp, UnaryLoop>;

const binaryLoops = {
  ...Object.fromEntries(Object.keys(binaryMeaning).map((op) => [op, binaryLoop(op as BinaryOp)])),
  add,
  subtract,
  multiply,
  divide,
  max,
} as Record<BinaryOp, BinaryLoop>;

function applyLoop(
  m: Float64Array,
  fn: (...values: number[]) => number,
  out: Address,
  args: readonly Address[],
  length: number,
): void {
  const values = new Array<number>(args.length).fill(0);
  for (let i = 0; i < length; i++) {
    for (let k = 0; k < args.length; k++) values[k] = m[args[k]! + i]!;
    m[out + i] = fn(...values);
  }
}

export function plainKernels(memory: Float64Array): Kernels {
  const m = memory;
  return {
    memory,
    unary: (op, out, a, length) => unaryLoops[op](m, out, a, length),
    binary: (op, out, a, b, length) => binaryLoops[op](m, out, a, b, length),
    select(out, condition, a, b, length) {
      for (let i = 0; i < length; i++) {
        m[out + i] = m[condition + i]! !== 0 ? m[a + i]! : m[b + i]!;
      }
    },
    apply: (fn, out, args, length) => applyLoop(m, fn, out, args, length),
    spread: (out, a, length) => void m.fill(m[a]!, out, out + length),
    copy: (out, a, length) => void m.copyWithin(out, a, a + length),
    fill: (out, value, length) => void m.fill(value, out, out + length),
    dot: (out, left, right, length) => dotInto(m, out, left, right, length),
    dotAdding: (out, left, right, sum, weight, length) =>
      dotAddingInto(m, out, left, right, sum, weight, length),
    addScaled: (out, a, weight, length) => addScaledInto(m, out, a, weight, length),
    addProduct: (out, a, b, length) => addProductInto(m, out, a, b, length),
    countOutside(a, low, high, length) {
      let count = 0;
      for (let i = 0; i < length; i++) {
        const value = m[a + i]!;
        if (!(value >= low && value <= high)) count++;
      }
      return count;
    },
  };
}
