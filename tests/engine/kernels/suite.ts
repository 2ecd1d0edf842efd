/** What every implementation of the kernels must do: run by the test of each. */
import { expect, it } from 'vitest';
import type { KernelsOf } from '../../../shared/engine/kernels/kernels.ts';
import {
  type BinaryOp,
  binaryMeaning,
  type UnaryOp,
  unaryMeaning,
} from '../../../shared/engine/operations.ts';

const LENGTH = 7;
const A = [0.5, -1, 2, 0, 3.25, 1, 0.1];
const B = [2, 0.5, -3, 0, 1, 7, 0.1];
const C = [1, 0, 0, 1, 1, 0, 2];
const [AT_A, AT_B, AT_C, OUT, SUM] = [0, 10, 20, 30, 40] as const;

export function kernelSuite(kernelsOf: KernelsOf): void {
  const fresh = () => {
    const memory = new Float64Array(60);
    memory.set(A, AT_A);
    memory.set(B, AT_B);
    memory.set(C, AT_C);
    return kernelsOf(memory);
  };
  const read = (memory: Float64Array, at: number) => [...memory.subarray(at, at + LENGTH)];
  type Of = (i: number) => number;
  const each = (of: Of) => A.map((_, i) => of(i));

  it('compute every operation by its meaning, to the last bit', () => {
    for (const op of Object.keys(unaryMeaning) as UnaryOp[]) {
      const kernels = fresh();
      kernels.unary(op, OUT, AT_A, LENGTH);
      expect([op, read(kernels.memory, OUT)]).toEqual([op, A.map(unaryMeaning[op])]);
    }
    for (const op of Object.keys(binaryMeaning) as BinaryOp[]) {
      const kernels = fresh();
      kernels.binary(op, OUT, AT_A, AT_B, LENGTH);
      const want = each((i) => binaryMeaning[op](A[i]!, B[i]!));
      expect([op, read(kernels.memory, OUT)]).toEqual([op, want]);
    }
  });

  it('may write over an input', () => {
    const kernels = fresh();
    kernels.binary('multiply', AT_A, AT_A, AT_B, LENGTH);
    expect(read(kernels.memory, AT_A)).toEqual(each((i) => A[i]! * B[i]!));
  });

  it('write nothing past the length', () => {
    const kernels = fresh();
    kernels.fill(OUT, 9, LENGTH + 2);
    kernels.binary('add', OUT, AT_A, AT_B, LENGTH);
    expect([...kernels.memory.subarray(OUT + LENGTH, OUT + LENGTH + 2)]).toEqual([9, 9]);
  });

  it('select, apply, spread, copy and fill', () => {
    const kernels = fresh();
    kernels.select(OUT, AT_C, AT_A, AT_B, LENGTH);
    expect(read(kernels.memory, OUT)).toEqual(each((i) => (C[i] ? A[i]! : B[i]!)));
    kernels.apply((a, b, c) => a + 10 * b + 100 * c, OUT, [AT_A, AT_B, AT_C], LENGTH);
    expect(read(kernels.memory, OUT)).toEqual(each((i) => A[i]! + 10 * B[i]! + 100 * C[i]!));
    kernels.spread(OUT, AT_A + 4, LENGTH);
    expect(read(kernels.memory, OUT)).toEqual(each(() => 3.25));
    kernels.copy(OUT, AT_B, LENGTH);
    expect(read(kernels.memory, OUT)).toEqual(B);
    kernels.fill(OUT, 4, LENGTH);
    expect(read(kernels.memory, OUT)).toEqual(each(() => 4));
  });

  it('sum any number of products in order', () => {
    const columns = [AT_A, AT_B, AT_C];
    for (let terms = 0; terms <= 9; terms++) {
      const left = Int32Array.from({ length: terms }, (_, k) => columns[k % 3]!);
      const right = Int32Array.from({ length: terms }, (_, k) => columns[(k + 1) % 3]!);
      const kernels = fresh();
      const value = (at: number, i: number) => kernels.memory[at + i]!;
      const want = each((i) => {
        let sum = terms === 0 ? 0 : value(left[0]!, i) * value(right[0]!, i);
        for (let k = 1; k < terms; k++) sum += value(left[k]!, i) * value(right[k]!, i);
        return sum;
      });
      kernels.dot(OUT, left, right, LENGTH);
      expect([terms, read(kernels.memory, OUT)]).toEqual([terms, want]);
      kernels.fill(SUM, 1, LENGTH);
      kernels.dotAdding(OUT, left, right, SUM, 0.3, LENGTH);
      expect([terms, read(kernels.memory, OUT)]).toEqual([terms, want]);
      expect([terms, read(kernels.memory, SUM)]).toEqual([terms, want.map((x) => 1 + 0.3 * x)]);
    }
  });

  it('add scaled columns and products', () => {
    const kernels = fresh();
    kernels.copy(OUT, AT_C, LENGTH);
    kernels.addScaled(OUT, AT_A, 0.7, LENGTH);
    expect(read(kernels.memory, OUT)).toEqual(each((i) => C[i]! + 0.7 * A[i]!));
    kernels.copy(OUT, AT_C, LENGTH);
    kernels.addProduct(OUT, AT_A, AT_B, LENGTH);
    expect(read(kernels.memory, OUT)).toEqual(each((i) => C[i]! + A[i]! * B[i]!));
  });

  it('count what lies outside, NaN included', () => {
    const kernels = fresh();
    kernels.memory[AT_A] = Number.NaN;
    expect(kernels.countOutside(AT_A, 0, 2, LENGTH)).toBe(3);
    expect(kernels.countOutside(AT_B, -3, 7, LENGTH)).toBe(0);
  });
}
