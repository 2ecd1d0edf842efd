/**
 * Compile the document: every strategy becomes a cohort plan over one shared graph.
 * The plan says who is where at the start, what moves where with what chance, what
 * counts, and what must hold.
 */
import { cycleCount } from '../model/cycles.ts';
import type { ModelDocument, Row } from '../model/document.ts';
import { Graph, type NodeId } from './graph.ts';
import { Lowering, type Place } from './lower.ts';
import { logitChances } from './movement/logit.ts';
import { probabilityChances } from './movement/probabilities.ts';
import { chancesByGenerator, chancesByRow } from './movement/rates.ts';
import type { Chance, Check, RowPlace } from './movement/row.ts';
import { SLACK } from './movement/row.ts';
import { type PayoffTerm, payoffTerms } from './payoffs.ts';
import { arrival, expandStates, type Substates } from './substates.ts';

/** A share of one substate that moves to another within a cycle. */
export interface Move {
  readonly from: number;
  readonly to: number;
  readonly chance: NodeId;
}

export interface CohortPlan {
  readonly strategy: string;
  /** Share of the cohort in each substate at time 0. */
  readonly initial: readonly NodeId[];
  /** Moves between substates, or under survival curves the occupancy at each cycle's end. */
  readonly moves: readonly Move[] | null;
  readonly curves: readonly NodeId[] | null;
  readonly terms: readonly PayoffTerm[];
  readonly checks: readonly Check[];
}

export interface CompiledModel {
  readonly document: ModelDocument;
  readonly graph: Graph;
  readonly substates: Substates;
  readonly cycles: number;
  readonly plans: readonly CohortPlan[];
}

/** @param document one that has passed all checks */
export function compile(document: ModelDocument): CompiledModel {
  const graph = new Graph();
  const lowering = new Lowering(graph, document);
  const substates = expandStates(document.states);
  const plans = document.strategies.map(({ id }) =>
    new StrategyCompiler(document, lowering, substates, id).plan(),
  );
  return { document, graph, substates, cycles: cycleCount(document.question), plans };
}

class StrategyCompiler {
  private readonly checks: Check[] = [];
  private readonly indexOf: ReadonlyMap<string, number>;
  private readonly clock: NodeId;

  constructor(
    private readonly document: ModelDocument,
    private readonly lowering: Lowering,
    private readonly substates: Substates,
    private readonly strategy: string,
  ) {
    this.indexOf = new Map(document.states.map(({ id }, index) => [id, index]));
    this.clock = lowering.graph.clock('cycle');
  }

  plan(): CohortPlan {
    const survival = this.document.movements.type === 'survival';
    const chances = survival ? null : this.chances();
    return {
      strategy: this.strategy,
      initial: survival ? this.curveShares(this.lowering.graph.constant(0)) : this.startShares(),
      moves: chances && this.moves(chances),
      curves: survival ? this.curveShares(this.lowering.graph.clock('boundary')) : null,
      terms: this.terms(chances),
      checks: this.checks,
    };
  }

  private stateIndex = (id: string): number => this.indexOf.get(id) as number;

  private place = (substate: number): Place => {
    const { state, tunnel } = this.substates.all[substate]!;
    const timed = this.document.states[state]!.type === 'timed';
    return { strategy: this.strategy, cycle: this.clock, ...(timed ? { tunnel } : {}) };
  };

  private check = (check: Omit<Check, 'strategy'>): void => {
    this.checks.push({ ...check, strategy: this.strategy });
  };

  private startShares(): NodeId[] {
    const { graph } = this.lowering;
    const { shares, remainder } = this.document.start;
    const place = { strategy: this.strategy, cycle: graph.constant(0) };
    const bounds = { low: -SLACK, high: 1 + SLACK };
    const initial = this.substates.all.map(() => graph.constant(0));
    const nodes = shares.map(({ state, formula }, index) => {
      const node = this.lowering.formula(formula, place);
      const path = ['start', 'shares', index, 'formula'];
      this.check({ node, ...bounds, code: 'run.startOutside', path });
      initial[this.substates.first[this.stateIndex(state)]!] = node;
      return node;
    });
    const left = graph.binary('subtract', graph.constant(1), graph.sum(nodes));
    const path = ['start', 'remainder'];
    this.check({ node: left, ...bounds, code: 'run.startRemainderOutside', path });
    initial[this.substates.first[this.stateIndex(remainder)]!] = left;
    return initial;
  }

  /** Chances of moving out of each substate. */
  private chances(): Chance[][] {
    const rows = this.ownRows();
    return this.substates.all.map(({ state }, substate) => {
      const row = rows.find((candidate) => candidate.row.from === this.document.states[state]!.id);
      if (!row) return [{ to: state, chance: this.lowering.graph.constant(1) }];
      return this.rowChances({ ...row, place: this.place(substate) }, rows);
    });
  }

  /** The strategy's rows, each seen from its origin's first substate. */
  private ownRows(): RowPlace[] {
    const { movements } = this.document;
    if (movements.type !== 'rows') return [];
    return movements.rows.flatMap((row, index) => {
      if (row.strategies && !row.strategies.includes(this.strategy)) return [];
      const from = this.substates.first[this.stateIndex(row.from)]!;
      const { lowering, stateIndex, check } = this;
      const path = ['movements', 'rows', index];
      return [{ row, path, place: this.place(from), lowering, stateIndex, check }];
    });
  }

  private rowChances(at: RowPlace, rows: readonly RowPlace[]): Chance[] {
    if (isBasis(at, 'probabilities')) return probabilityChances(at);
    if (isBasis(at, 'logit')) return logitChances(at);
    if (!isBasis(at, 'rates')) return [];
    if (at.row.method === 'byRow') return chancesByRow(at);
    const others = rows.filter(
      (other): other is typeof at =>
        isBasis(other, 'rates') && other.row.method === 'generator' && other.row !== at.row,
    );
    return chancesByGenerator(at, others);
  }

  private moves(chances: readonly (readonly Chance[])[]): Move[] {
    const { graph } = this.lowering;
    return chances.flatMap((list, from) =>
      list
        .filter(({ chance }) => graph.valueOf(chance) !== 0)
        .map(({ to, chance }) => ({
          from,
          to: arrival(this.substates, this.substates.all[from]!, to),
          chance,
        })),
    );
  }

  /** Partitioned survival: what lies between one curve and the next. */
  private curveShares(cycle: NodeId): NodeId[] {
    const { movements } = this.document;
    const { graph } = this.lowering;
    if (movements.type !== 'survival') return [];
    const shares = this.document.states.map(() => graph.constant(0));
    let inner = graph.constant(0);
    const place = { strategy: this.strategy, cycle };
    movements.curves.forEach(({ state, formula }, index) => {
      const path = ['movements', 'curves', index, 'formula'];
      const curve = this.lowering.formula(formula, place);
      const share = graph.binary('subtract', curve, inner);
      const bounds = { low: -SLACK, high: 1 + SLACK };
      this.check({ node: curve, ...bounds, code: 'run.curveOutside', path });
      this.check({ node: share, ...bounds, code: 'run.curvesCross', path });
      shares[this.stateIndex(state)] = share;
      inner = curve;
    });
    shares[this.stateIndex(movements.last)] = graph.binary('subtract', graph.constant(1), inner);
    return shares;
  }

  private terms(chances: readonly (readonly Chance[])[] | null): PayoffTerm[] {
    const { document, lowering, substates, stateIndex, strategy, place } = this;
    const isDead = (state: number) => document.states[state]!.dead;
    const at = { lowering, substates, stateIndex, isDead, strategy, place, chances };
    return document.payoffs.flatMap((payoff, index) => payoffTerms(payoff, index, at));
  }
}

function isBasis<B extends Row['basis']>(
  at: RowPlace,
  basis: B,
): at is RowPlace<Extract<Row, { basis: B }>> {
  return at.row.basis === basis;
}
