/**
 * From formulas to graph nodes. Names are looked up, variables are put in place of
 * their names, functions become operations. Checked documents only: what a formula
 * may say is settled by shared/formula/check.ts before.
 */
import type { Expr } from '../formula/expr.ts';
import { MEANING } from '../formula/meaning.ts';
import { parseFormula } from '../formula/parse.ts';
import type { ModelDocument, StrategyFormula, Variable } from '../model/document.ts';
import { DocumentError, error } from '../model/issue.ts';
import { START_AGE } from '../model/names.ts';
import { formulaFor } from '../model/strategy-formula.ts';
import type { Graph, NodeId } from './graph.ts';
import { type Lookup, lookupOf } from './lookup.ts';
import { LOWER } from './lower-functions.ts';

/** Where a formula stands: it decides what clocks and per-strategy formulas mean. */
export interface Place {
  readonly strategy: string;
  /** The cycle that clocks read: a clock, or a constant for a formula of one moment. */
  readonly cycle: NodeId;
  /** Cycles spent in the state so far, where the state is timed. */
  readonly tunnel?: number;
}

/** Calls within calls, through variables of variables, that a formula may be deep. */
const DEEPEST = 1_000;

export class Lowering {
  readonly graph: Graph;
  private depth = 0;
  private readonly document: ModelDocument;
  private readonly leaves = new Map<string, NodeId>();
  private readonly variables = new Map<string, Variable>();
  private readonly tables = new Map<string, { id: string; lookup: Lookup }>();
  private readonly done = new Map<string, NodeId>();

  constructor(graph: Graph, document: ModelDocument) {
    this.graph = graph;
    this.document = document;
    document.parameters.forEach((parameter, index) => {
      const uncertain = parameter.distribution.type !== 'fixed';
      this.leaves.set(parameter.symbol, graph.parameter(index, uncertain));
    });
    document.covariates.forEach((covariate, index) => {
      this.leaves.set(covariate.symbol, graph.covariate(index));
    });
    for (const variable of document.variables) this.variables.set(variable.symbol, variable);
    for (const table of document.tables) {
      this.tables.set(table.symbol, { id: table.id, lookup: lookupOf(table) });
    }
  }

  /** The node of a formula, or of the strategy's own one of several. */
  formula(formula: StrategyFormula, place: Place): NodeId {
    const text = formulaFor(formula, place.strategy);
    if (text === undefined) throw new DocumentError([error('formula.missingForStrategy')]);
    const key = `${place.strategy} ${place.cycle} ${place.tunnel} ${text}`;
    const known = this.done.get(key);
    if (known !== undefined) return known;
    const parsed = parseFormula(text);
    if (!parsed.expr) throw new DocumentError(parsed.issues);
    const node = this.expr(parsed.expr, place);
    this.done.set(key, node);
    return node;
  }

  /** Refuses what would overflow the stack: thousands of variables, each of the next. */
  private expr(expr: Expr, place: Place): NodeId {
    if (this.depth >= DEEPEST) {
      throw new DocumentError([error('formula.tooDeepTogether', [], { maximum: DEEPEST })]);
    }
    this.depth++;
    try {
      return this.exprWithin(expr, place);
    } finally {
      this.depth--;
    }
  }

  private exprWithin(expr: Expr, place: Place): NodeId {
    if (expr.type === 'number') return this.graph.constant(expr.value);
    if (expr.type === 'name') return this.name(expr.name, place);
    if (expr.fn === 'lookup') return this.lookup(expr.args, place);
    const args = expr.args.map((arg) => this.expr(arg, place));
    const lower = LOWER.get(expr.fn);
    if (lower) return lower(this.graph, args);
    const meaning = MEANING.get(expr.fn);
    if (!meaning) throw new DocumentError([error('formula.unknownFunction', [], {}, expr.at)]);
    return this.graph.apply(expr.fn, meaning, args);
  }

  private name(name: string, place: Place): NodeId {
    const leaf = this.leaves.get(name);
    if (leaf !== undefined) return leaf;
    const variable = this.variables.get(name);
    if (variable) return this.formula(variable.formula, place);
    return this.clock(name, place);
  }

  private clock(name: string, place: Place): NodeId {
    const { graph } = this;
    const length = graph.constant(this.document.question.cycleLength);
    if (name === 'cycle') return place.cycle;
    if (name === 'cycle_length') return length;
    if (name === 'time') return graph.binary('multiply', place.cycle, length);
    if (name === 'age') {
      const start = this.leaves.get(START_AGE);
      if (start === undefined) throw new DocumentError([error('formula.noStartAge')]);
      return graph.binary('add', start, this.clock('time', place));
    }
    if (name === 'time_in_state' && place.tunnel !== undefined) {
      return graph.constant(place.tunnel * this.document.question.cycleLength);
    }
    throw new DocumentError([error('formula.unknownName', [], { name })]);
  }

  private lookup(args: readonly Expr[], place: Place): NodeId {
    const [table, ...keys] = args;
    const found = table?.type === 'name' ? this.tables.get(table.name) : undefined;
    if (!found) throw new DocumentError([error('formula.lookupNeedsTable')]);
    const nodes = keys.map((key) => this.expr(key, place));
    return this.graph.apply(`lookup ${found.id}`, found.lookup, nodes);
  }
}
