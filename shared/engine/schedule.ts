/**
 * Gives every node of the graph the outermost place it can be computed at, and a
 * place in memory.
 *
 * Profiles are looped over, within them strategies, within them cycles. What varies
 * with nothing is computed once a block of draws; with the profile, once a profile.
 * What varies with the cycle would be computed anew for each cohort; where several
 * cohorts need it, it is kept for all cycles (a tape).
 */
import type { Accounts } from './accounts.ts';
import type { CompiledModel } from './compile.ts';
import { type Graph, type NodeId, VARIES } from './graph.ts';
import { Layout } from './layout.ts';
import type { Dot, Program, Slot, Stage, StrategyProgram } from './program.ts';
import { type Roots, reachedFrom, sojournsOf, strategyRoots } from './roots.ts';

/** Doubles that tapes of columns may take; beyond, values are computed anew: 64 MB. */
const TAPE_LIMIT = 8_000_000;

type StageName = 'leaf' | 'once' | 'tape' | 'profile' | 'profileTape' | 'cycle';

export interface ScheduleOptions {
  /** Draws a column holds. */
  readonly width: number;
  /** Follow every substate, whether it matters to a sum or not. */
  readonly trace: boolean;
}

export function schedule(
  model: CompiledModel,
  accounts: Accounts,
  options: ScheduleOptions,
): Program {
  const roots = model.plans.map((plan, index) =>
    strategyRoots(
      model.graph,
      plan,
      accounts.plans[index]!,
      model.substates.all.length,
      options.trace,
    ),
  );
  return new Scheduler(model, accounts, roots, options).program();
}

class Scheduler {
  private readonly graph: Graph;
  private readonly reached: readonly ReadonlySet<NodeId>[];
  private readonly stages: StageName[];
  private readonly layout: Layout;
  private readonly checked = new Set<string>();

  constructor(
    private readonly model: CompiledModel,
    private readonly accounts: Accounts,
    private readonly roots: readonly Roots[],
    private readonly options: ScheduleOptions,
  ) {
    this.graph = model.graph;
    this.reached = roots.map((own) => reachedFrom(this.graph, own));
    this.stages = this.placeAll();
    this.layout = new Layout(this.graph, options.width, model.cycles);
  }

  program(): Program {
    const { layout } = this;
    const leaves = this.leaves();
    const once = this.stage('once', this.union());
    const tape = this.stage('tape', this.union());
    const profile = this.stage('profile', this.union());
    const profileTape = this.stage('profileTape', this.union());
    const work = this.work();
    const strategies = this.roots.map((own, index) => this.strategy(own, index));
    return {
      ...leaves,
      once,
      tape,
      profile,
      profileTape,
      strategies,
      work,
      width: this.options.width,
      clocks: this.clocks(),
      size: layout.highest,
    };
  }

  private placeAll(): StageName[] {
    const users = this.graph.nodes.map(
      (_, node) => this.reached.filter((reached) => reached.has(node)).length,
    );
    const place = (tapes: boolean) =>
      this.graph.nodes.map((node, id) => this.place(node, users[id]!, tapes));
    const stages = place(true);
    const columns = stages.filter(
      (stage, id) => stage.endsWith('ape') && this.graph.node(id).wide,
    ).length;
    const size = columns * this.options.width * this.model.cycles;
    return size <= TAPE_LIMIT ? stages : place(false);
  }

  private place(node: Graph['nodes'][number], users: number, wideTapes: boolean): StageName {
    if (['constant', 'parameter', 'covariate', 'clock'].includes(node.operation.op)) return 'leaf';
    const byCycle = (node.varies & VARIES.cycle) !== 0;
    const byProfile = (node.varies & VARIES.profile) !== 0;
    if (!byCycle) return byProfile ? 'profile' : 'once';
    const cohorts = byProfile ? users : users * this.model.document.profiles.length;
    if (cohorts < 2 || (node.wide && !wideTapes)) return 'cycle';
    return byProfile ? 'profileTape' : 'tape';
  }

  private union(): ReadonlySet<NodeId> {
    const all = new Set<NodeId>();
    for (const reached of this.reached) for (const node of reached) all.add(node);
    return all;
  }

  /** Instructions of one stage among the nodes, in order; results get their places. */
  private stage(name: StageName, nodes: ReadonlySet<NodeId>): Stage {
    const own = [...nodes].filter((node) => this.stages[node] === name).sort((a, b) => a - b);
    const kept = name === 'tape' || name === 'profileTape';
    for (const node of own) this.layout.place(node, kept);
    const leaves = [...nodes].filter((node) => this.leafStage(node) === name);
    return {
      instructions: own
        .filter((node) => this.isComputed(node))
        .map((node) => this.layout.instruction(node)),
      checks: this.checksOf([...leaves, ...own]),
    };
  }

  /** Entries lie within their exponential: nothing is left to compute. */
  private isComputed(node: NodeId): boolean {
    return this.graph.node(node).operation.op !== 'entry';
  }

  /** The stage that a leaf is looked at in: the first in which it is set. */
  private leafStage(node: NodeId): StageName | null {
    if (this.stages[node] !== 'leaf') return null;
    const { varies } = this.graph.node(node);
    if (varies === VARIES.cycle) return 'tape';
    return varies === VARIES.profile ? 'profile' : 'once';
  }

  /** Each quantity is looked at once, wherever it is computed. */
  private checksOf(nodes: readonly NodeId[]): Stage['checks'] {
    const here = new Set(nodes);
    return this.roots.flatMap(({ checks }) =>
      checks
        .filter(({ node, code, path }) => {
          const key = `${node} ${code} ${path.join('.')}`;
          if (!here.has(node) || this.checked.has(key)) return false;
          this.checked.add(key);
          return true;
        })
        .map((check) => ({
          check,
          at: this.layout.slot(check.node),
          wide: this.graph.node(check.node).wide,
        })),
    );
  }

  private leaves(): Pick<Program, 'constants' | 'parameters' | 'covariates'> {
    const constants: Program['constants'][number][] = [];
    const parameters: Program['parameters'][number][] = [];
    const covariates: Program['covariates'][number][] = [];
    this.graph.nodes.forEach(({ operation, wide }, id) => {
      if (this.stages[id] !== 'leaf') return;
      const at = this.layout.place(id, false).base;
      if (operation.op === 'constant') constants.push({ at, value: operation.value });
      if (operation.op === 'parameter') parameters.push({ index: operation.index, at, wide });
      if (operation.op === 'covariate') covariates.push({ index: operation.index, at });
    });
    return { constants, parameters, covariates };
  }

  private clocks(): Program['clocks'] {
    const place = (clock: 'cycle' | 'boundary') => {
      const id = this.graph.clock(clock);
      return id < this.stages.length ? this.layout.slot(id).base : this.layout.numbers(1);
    };
    return { cycle: place('cycle'), boundary: place('boundary') };
  }

  private work(): Program['work'] {
    const { layout, model, accounts } = this;
    const substates = model.substates.all.length;
    const sojourns = Math.max(0, ...this.roots.map((own) => sojournsOf(own).length));
    return {
      occupancy: [layout.columns(substates), layout.columns(substates)],
      sojourns: layout.columns(sojourns),
      tallies: layout.columns(accounts.tallies),
      scratch: layout.columns(1),
    };
  }

  private strategy(own: Roots, index: number): StrategyProgram {
    const { layout } = this;
    layout.beginScratch();
    const cycle = this.stage('cycle', this.reached[index]!);
    const slot = (node: NodeId): Slot => layout.slot(node);
    const dot = (substates: Int32Array, factors: readonly NodeId[]): Dot => ({
      substates,
      factors: factors.map(slot),
    });
    const sojourns = sojournsOf(own);
    const program = {
      cycle,
      followed: own.followed,
      initial: own.initial.map(slot),
      steps: own.steps?.map((step) => dot(step.substates, step.factors)) ?? null,
      curves: own.curves?.map(slot) ?? null,
      sojourns,
      steady: own.steady.map(({ tally, set, substate, value }) => ({
        tally,
        sojourn: sojourns.findIndex((one) => one.set === set && one.substate === substate),
        value: slot(value),
      })),
      varying: own.varying.map(({ tally, set, substates, factors }) => ({
        tally,
        set,
        dot: dot(substates, factors),
      })),
      atStart: own.atStart.map(({ tally, value }) => ({ tally, value: slot(value) })),
    };
    layout.endScratch();
    return program;
  }
}
