import { describe, expect, it } from 'vitest';
import { openAccounts } from '../../shared/engine/accounts.ts';
import { compile } from '../../shared/engine/compile.ts';
import { plainKernels } from '../../shared/engine/kernels/plain.ts';
import { ProblemLog } from '../../shared/engine/problems.ts';
import { schedule } from '../../shared/engine/schedule.ts';
import { Simulator } from '../../shared/engine/simulate.ts';
import { tinyDocument } from '../fixtures/tiny-document.ts';

const WIDTH = 4;

function simulator() {
  const document = tinyDocument();
  const model = compile(document);
  const tallyOf = ({ measure }: { measure: string }) => (measure === 'cost' ? 0 : 1);
  const accounts = openAccounts(model, { tallies: 2, tallyOf, lifeYears: null });
  const program = schedule(model, accounts, { width: WIDTH, trace: true });
  return { document, own: new Simulator(model, program, accounts, plainKernels) };
}

describe('Simulator', () => {
  it('steps each draw of a block by itself', () => {
    const { document, own } = simulator();
    const chances = [0.1, 0.5, 0];
    const values = document.parameters.map(({ id, value }) =>
      id === 'p_die' ? Float64Array.from(chances) : value,
    );
    const alive: number[][] = [];
    own.run(
      values,
      3,
      {
        cohort: () => {},
        boundary: (_, strategy, boundary, memory, at) => {
          if (strategy === 0) alive[boundary] = [...memory.subarray(at, at + 3)];
        },
      },
      new ProblemLog(document, 0),
    );
    expect(alive).toHaveLength(11);
    chances.forEach((p, draw) => {
      alive.forEach((row, k) => {
        expect(row[draw]).toBeCloseTo((1 - p) ** k, 12);
      });
    });
  });

  it('starts every run afresh', () => {
    const { document, own } = simulator();
    const totals: number[][] = [];
    const values = document.parameters.map(({ value }) => value);
    for (let round = 0; round < 2; round++) {
      totals.push([]);
      own.run(
        values,
        1,
        { cohort: (_, __, memory, at) => totals[round]!.push(memory[at]!, memory[at + WIDTH]!) },
        new ProblemLog(document, 0),
      );
    }
    expect(totals[1]).toEqual(totals[0]);
  });

  it('tells every cohort, profile by profile and strategy by strategy', () => {
    const { document, own } = simulator();
    const told: string[] = [];
    own.run(
      document.parameters.map(({ value }) => value),
      1,
      { cohort: (profile, strategy) => told.push(`${profile}${strategy}`) },
      new ProblemLog(document, 0),
    );
    expect(told).toEqual(['00', '01']);
  });
});
