import { describe, expect, it } from 'vitest';
import { address, Executor } from '../../shared/engine/execute.ts';
import { transitionMatrix } from '../../shared/engine/expm.ts';
import type { Operation } from '../../shared/engine/graph.ts';
import { plainKernels } from '../../shared/engine/kernels/plain.ts';
import type { Instruction, Stage } from '../../shared/engine/program.ts';

const WIDTH = 4;
const at = (base: number, stride = 0) => ({ base, stride });

function run(instruction: Instruction, memory: number[], cycle = 0, draws = 2): number[] {
  const kernels = plainKernels(Float64Array.from(memory));
  const stage: Stage = { instructions: [instruction], checks: [] };
  new Executor(kernels, WIDTH).run(stage, cycle, draws);
  return [...kernels.memory];
}

const add: Operation = { op: 'binary', name: 'add', a: 0, b: 0 };

describe('Executor', () => {
  it('works on the draws in use, or on one number', () => {
    const columns = { operation: add, out: at(4), args: [at(0), at(0)], wide: true };
    expect(run(columns, [1, 2, 3, 4, 0, 0, 0, 0])).toEqual([1, 2, 3, 4, 2, 4, 0, 0]);
    const numbers = { ...columns, wide: false };
    expect(run(numbers, [1, 2, 3, 4, 0, 0, 0, 0])).toEqual([1, 2, 3, 4, 2, 0, 0, 0]);
  });

  it('reads and writes a tape at the cycle', () => {
    const taped = { operation: add, out: at(4, 1), args: [at(0, 1), at(0, 1)], wide: false };
    expect(run(taped, [1, 2, 3, 4, 0, 0, 0, 0], 2)).toEqual([1, 2, 3, 4, 0, 0, 6, 0]);
  });

  it('fills the row of an exponential, draw by draw', () => {
    const operation: Operation = {
      op: 'exponential',
      years: 1,
      size: 2,
      places: [[0, 1]],
      rates: [0],
    };
    const memory = run({ operation, out: at(4), args: [at(0)], wide: true }, [
      0.3,
      0.6,
      0,
      0,
      ...new Array(8).fill(0),
    ]);
    for (const [draw, rate] of [0.3, 0.6].entries()) {
      const [want] = transitionMatrix(
        [
          [0, rate],
          [0, 0],
        ],
        1,
      );
      expect([memory[4 + draw], memory[4 + WIDTH + draw]]).toEqual(want);
    }
  });
});

describe('address', () => {
  it('moves on by the stride', () => {
    expect(address(at(5, 3), 4)).toBe(17);
    expect(address(at(5), 4)).toBe(5);
  });
});
