/**
 * The engine's front door: a checked document in, base case and draws out.
 *
 *   compile the document -> draw parameters -> simulate the cohort
 *
 * Comparing strategies and valuing research is shared/analysis.
 */
import type { ModelDocument } from '../model/document.ts';
import { DocumentError, error, type Issue } from '../model/issue.ts';
import { type Accounts, openAccounts } from './accounts.ts';
import { checkModel } from './check.ts';
import { type CompiledModel, compile } from './compile.ts';
import { detailTallies, readDetail } from './detail.ts';
import { drawParameters } from './draw/draw.ts';
import { plainKernels } from './kernels/plain.ts';
import { mergeProblems, ProblemLog } from './problems.ts';
import { type BaseRun, BLOCK_DRAWS, type DrawsBlock, type SamplingSettings } from './results.ts';
import { schedule } from './schedule.ts';
import { type Listener, Simulator } from './simulate.ts';

export interface Engine {
  /** Every parameter at its value. Errors of the run are in `problems`. */
  base(options?: { readonly trace?: boolean }): BaseRun;
  /** Draws `from`..`to` (end not included) of the plan. */
  draws(settings: SamplingSettings, from: number, to: number): DrawsBlock;
  /** The same from given draws: by parameter id, one value a draw from `from` on. */
  simulate(values: ReadonlyMap<string, Float64Array>, from: number, to: number): DrawsBlock;
}

/**
 * Compiles a document.
 * @throws DocumentError with every error found, where there is one
 */
export function prepare(document: ModelDocument): Engine {
  const errors = checkModel(document).filter(({ severity }) => severity === 'error');
  if (errors.length > 0) throw new DocumentError(errors);
  const model = compile(document);
  let totals: Totaller | null = null;
  const totaller = () => {
    totals ??= new Totaller(model);
    return totals;
  };
  return {
    base: (options = {}) => runBase(model, options.trace ?? false),
    simulate: (values, from, to) => totaller().simulate(values, from, to),
    draws: (settings, from, to) => {
      const { parameters, groups } = document;
      return totaller().simulate(drawParameters(parameters, groups, settings, from, to), from, to);
    },
  };
}

function runBase(model: CompiledModel, trace: boolean): BaseRun {
  const detail = detailTallies(model);
  const accounts = openAccounts(model, detail.plan);
  const program = schedule(model, accounts, { width: 1, trace: true });
  const simulator = new Simulator(model, program, accounts, plainKernels);
  const reader = readDetail(model, detail, trace);
  const problems = new ProblemLog(model.document, 0);
  const values = model.document.parameters.map(({ value }) => value);
  simulator.run(values, 1, reader, problems);
  const strategies = reader.strategies();
  const unreal = strategies.flatMap((run, index): Issue[] =>
    [run.cost, run.outcome].every(Number.isFinite)
      ? []
      : [error('run.notFinite', ['strategies', index], { strategy: run.id })],
  );
  return {
    strategies,
    cycleLength: model.document.question.cycleLength,
    cycles: model.cycles,
    problems: [...problems.issues('error'), ...unreal],
  };
}

/** Tallies of a probabilistic run. */
const COST = 0;
const OUTCOME = 1;

/** Simulates blocks of draws with costs and outcomes only; keeps its memory between blocks. */
class Totaller {
  private readonly simulator: Simulator;
  private readonly accounts: Accounts;

  constructor(private readonly model: CompiledModel) {
    this.accounts = openAccounts(model, {
      tallies: 2,
      tallyOf: ({ measure }) => (measure === 'cost' ? COST : OUTCOME),
      lifeYears: null,
    });
    const program = schedule(model, this.accounts, { width: BLOCK_DRAWS, trace: false });
    this.simulator = new Simulator(model, program, this.accounts, plainKernels);
  }

  simulate(values: ReadonlyMap<string, Float64Array>, from: number, to: number): DrawsBlock {
    const { document } = this.model;
    const columns = () => document.strategies.map(() => new Float64Array(to - from));
    const cost = columns();
    const outcome = columns();
    const problems: Issue[][] = [];
    for (let first = from; first < to; first += BLOCK_DRAWS) {
      const draws = Math.min(BLOCK_DRAWS, to - first);
      const offset = first - from;
      const log = new ProblemLog(document, first);
      const block = document.parameters.map(
        ({ id, value }) => values.get(id)?.subarray(offset, offset + draws) ?? value,
      );
      this.simulator.run(block, draws, this.adder(cost, outcome, offset, draws), log);
      problems.push(log.issues('warning'));
    }
    const unreal = notFinite(document, cost, outcome, from);
    return { from, to, cost, outcome, problems: mergeProblems([...problems, unreal]) };
  }

  /** Adds each cohort's totals, weighted by the profile's share. */
  private adder(
    cost: readonly Float64Array[],
    outcome: readonly Float64Array[],
    offset: number,
    draws: number,
  ): Listener {
    const { profiles } = this.model.document;
    return {
      cohort: (profile, strategy, memory, at) => {
        const { share } = profiles[profile]!;
        const costs = cost[strategy]!;
        const outcomes = outcome[strategy]!;
        const first = at + COST * BLOCK_DRAWS;
        const second = at + OUTCOME * BLOCK_DRAWS;
        for (let i = 0; i < draws; i++) {
          costs[offset + i] = costs[offset + i]! + share * memory[first + i]!;
          outcomes[offset + i] = outcomes[offset + i]! + share * memory[second + i]!;
        }
      },
    };
  }
}

/** One warning a strategy for totals that are no numbers. */
function notFinite(
  document: ModelDocument,
  cost: readonly Float64Array[],
  outcome: readonly Float64Array[],
  from: number,
): Issue[] {
  return document.strategies.flatMap(({ id }, index): Issue[] => {
    const bad = cost[index]!.map((value, i) =>
      Number.isFinite(value) && Number.isFinite(outcome[index]![i]!) ? 0 : 1,
    );
    const count = bad.reduce((sum, one) => sum + one, 0);
    if (count === 0) return [];
    const params = { strategy: id, draw: from + bad.indexOf(1), count };
    return [{ code: 'run.notFinite', severity: 'warning', path: ['strategies', index], params }];
  });
}
