/**
 * Simulate the cohort: for every profile and strategy, step the occupancy cycle by
 * cycle for a block of draws at once, and add up what counts as it goes.
 */
import type { Accounts, WeightSet } from './accounts.ts';
import { type PreparedStrategy, prepareStrategy, type Side } from './addresses.ts';
import type { CompiledModel } from './compile.ts';
import { address, Executor } from './execute.ts';
import type { Kernels, KernelsOf } from './kernels/kernels.ts';
import type { ProblemLog } from './problems.ts';
import type { Program, Stage } from './program.ts';

/** What a simulation tells while it runs; all addresses are good until the next call. */
export interface Listener {
  /** The tallies of one cohort: tally t of draw i is at memory[at + t * width + i]. */
  cohort(profile: number, strategy: number, memory: Float64Array, at: number): void;
  /** Occupancy at a boundary: followed substate k of draw i is at memory[at + k * width + i]. */
  boundary?(
    profile: number,
    strategy: number,
    boundary: number,
    memory: Float64Array,
    at: number,
  ): void;
}

export class Simulator {
  private readonly kernels: Kernels;
  private readonly executor: Executor;
  private readonly strategies: readonly PreparedStrategy[];

  constructor(
    private readonly model: CompiledModel,
    private readonly program: Program,
    private readonly accounts: Accounts,
    kernelsOf: KernelsOf,
  ) {
    this.kernels = kernelsOf(new Float64Array(program.size));
    this.executor = new Executor(this.kernels, program.width);
    for (const { at, value } of program.constants) this.kernels.memory[at] = value;
    this.strategies = program.strategies.map((strategy) => prepareStrategy(strategy, program));
  }

  /**
   * Runs one block.
   * @param values by parameter in document order: one value a draw, or one for all
   * @param draws draws in the block, at most the program's width
   */
  run(
    values: readonly (Float64Array | number)[],
    draws: number,
    listener: Listener,
    problems: ProblemLog,
  ): void {
    const { program, model } = this;
    this.setParameters(values, draws);
    this.runStage(program.once, 0, draws, problems);
    this.runTape(program.tape, draws, problems);
    for (let profile = 0; profile < model.document.profiles.length; profile++) {
      problems.profile = profile;
      this.setCovariates(profile);
      this.runStage(program.profile, 0, draws, problems);
      this.runTape(program.profileTape, draws, problems);
      for (let strategy = 0; strategy < this.strategies.length; strategy++) {
        this.runCohort(profile, strategy, draws, listener, problems);
      }
    }
  }

  private setParameters(values: readonly (Float64Array | number)[], draws: number): void {
    const { memory } = this.kernels;
    for (const { index, at, wide } of this.program.parameters) {
      const value = values[index]!;
      if (typeof value === 'number') memory.fill(value, at, at + (wide ? draws : 1));
      else if (wide) memory.set(value, at);
      else memory[at] = value[0]!;
    }
  }

  private setCovariates(profile: number): void {
    const { covariates, profiles } = this.model.document;
    for (const { index, at } of this.program.covariates) {
      this.kernels.memory[at] = profiles[profile]!.covariates[covariates[index]!.id]!;
    }
  }

  private setClocks(cycle: number): void {
    const { memory } = this.kernels;
    memory[this.program.clocks.cycle] = cycle;
    memory[this.program.clocks.boundary] = cycle + 1;
  }

  private runTape(stage: Stage, draws: number, problems: ProblemLog): void {
    if (stage.instructions.length + stage.checks.length === 0) return;
    for (let cycle = 0; cycle < this.model.cycles; cycle++) {
      this.setClocks(cycle);
      this.runStage(stage, cycle, draws, problems);
    }
  }

  private runStage(stage: Stage, cycle: number, draws: number, problems: ProblemLog): void {
    this.executor.run(stage, cycle, draws);
    for (const { check, at, wide } of stage.checks) {
      const length = wide ? draws : 1;
      const from = address(at, cycle);
      const outside = this.kernels.countOutside(from, check.low, check.high, length);
      if (outside > 0) problems.add(check, outside, cycle, this.kernels.memory, from, length);
    }
  }

  private runCohort(
    profile: number,
    index: number,
    draws: number,
    listener: Listener,
    problems: ProblemLog,
  ): void {
    const strategy = this.strategies[index]!;
    this.begin(strategy, draws);
    listener.boundary?.(profile, index, 0, this.kernels.memory, strategy.occupancy[0]);
    for (let cycle = 0; cycle < this.model.cycles; cycle++) {
      const now = strategy.sides[cycle & 1]!;
      const then = strategy.sides[1 - (cycle & 1)]!;
      this.setClocks(cycle);
      this.runStage(strategy.program.cycle, cycle, draws, problems);
      this.countVarying(strategy, now, 'start', cycle, draws);
      this.step(strategy, now, then, cycle, draws);
      this.countVarying(strategy, then, 'end', cycle, draws);
      this.countSojourns(strategy, then, cycle + 1, draws, !strategy.program.curves);
      listener.boundary?.(profile, index, cycle + 1, this.kernels.memory, then.base);
    }
    this.close(strategy, draws);
    listener.cohort(profile, index, this.kernels.memory, this.program.work.tallies);
  }

  /** The cohort at time 0, sums at nought but for what falls at the start. */
  private begin(strategy: PreparedStrategy, draws: number): void {
    const { kernels, program } = this;
    const { width, work } = program;
    const { initial, sojourns, atStart } = strategy.program;
    kernels.fill(work.tallies, 0, this.accounts.tallies * width);
    kernels.fill(work.sojourns, 0, sojourns.length * width);
    initial.forEach((slot, k) => {
      kernels.copy(strategy.occupancy[0] + k * width, address(slot, 0), draws);
    });
    for (const { tally, value } of atStart) {
      kernels.addScaled(work.tallies + tally * width, address(value, 0), 1, draws);
    }
    this.countSojourns(strategy, strategy.sides[0]!, 0, draws, false);
  }

  private step(
    strategy: PreparedStrategy,
    now: Side,
    then: Side,
    cycle: number,
    draws: number,
  ): void {
    const { width } = this.program;
    const { curves } = strategy.program;
    if (curves) {
      for (let k = 0; k < curves.length; k++) {
        this.kernels.copy(then.base + k * width, address(curves[k]!, cycle), draws);
      }
      return;
    }
    for (let k = 0; k < now.steps.length; k++) {
      const { left, right } = now.steps[k]!;
      const out = then.base + k * width;
      const sojourn = strategy.firstSojourn[k]!;
      const weight = sojourn < 0 ? 0 : this.weight(strategy, sojourn, cycle + 1);
      if (weight === 0) this.kernels.dot(out, left, right.at(cycle), draws);
      else {
        const sum = this.program.work.sojourns + sojourn * width;
        this.kernels.dotAdding(out, left, right.at(cycle), sum, weight, draws);
      }
    }
  }

  /** @param stepped whether the step has counted each substate's first sojourn already */
  private countSojourns(
    strategy: PreparedStrategy,
    side: Side,
    boundary: number,
    draws: number,
    stepped: boolean,
  ): void {
    const { width, work } = this.program;
    for (let k = 0; k < side.sojourns.length; k++) {
      const weight = this.weight(strategy, k, boundary);
      if (weight === 0 || (stepped && strategy.isFirst[k])) continue;
      this.kernels.addScaled(work.sojourns + k * width, side.sojourns[k]!, weight, draws);
    }
  }

  private countVarying(
    strategy: PreparedStrategy,
    side: Side,
    moment: 'start' | 'end',
    cycle: number,
    draws: number,
  ): void {
    const { width, work } = this.program;
    const { varying } = strategy.program;
    for (let k = 0; k < varying.length; k++) {
      const { tally, set } = varying[k]!;
      const weight = this.set(set)[moment][cycle]!;
      if (weight === 0) continue;
      const { left, right } = side.varying[k]!;
      this.kernels.dot(work.scratch, left, right.at(cycle), draws);
      this.kernels.addScaled(work.tallies + tally * width, work.scratch, weight, draws);
    }
  }

  /** Steady values times the weighted occupancy that was summed for them. */
  private close(strategy: PreparedStrategy, draws: number): void {
    const { width, work } = this.program;
    for (const { tally, sojourn, value } of strategy.program.steady) {
      const out = work.tallies + tally * width;
      const time = work.sojourns + sojourn * width;
      this.kernels.addProduct(out, time, address(value, 0), draws);
    }
  }

  private weight(strategy: PreparedStrategy, sojourn: number, boundary: number): number {
    return this.set(strategy.program.sojourns[sojourn]!.set).boundary[boundary]!;
  }

  private set(index: number): WeightSet {
    return this.accounts.sets[index]!;
  }
}
