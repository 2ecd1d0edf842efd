/**
 * A formula taken apart: the value of each part, what each name stands for, where each
 * table was read. Values are those of MEANING, which the engine's operations agree with.
 */
import { lookupOf, position } from '../../engine/lookup.ts';
import { formulaPath } from '../../formula/definitions.ts';
import type { CallExpr, Expr, NameExpr } from '../../formula/expr.ts';
import { MEANING } from '../../formula/meaning.ts';
import { parseFormula } from '../../formula/parse.ts';
import type { ModelDocument, Parameter, Table, Variable } from '../../model/document.ts';
import { DocumentError, error, type Issue, type Span } from '../../model/issue.ts';
import { CLOCKS, type Clock, START_AGE } from '../../model/names.ts';
import { formulaFor } from '../../model/strategy-formula.ts';
import type { FormulaSite } from './site.ts';

/** Where a formula is read: ids of strategy and profile, and the clocks. */
export interface FormulaPlace {
  readonly strategy: string;
  readonly profile: string;
  readonly cycle: number;
  /** Cycles spent in the state so far; only where the formula stands in a timed state. */
  readonly tunnel?: number;
}

/** What a name stands for. */
export type NameMeaning =
  | { readonly what: 'parameter'; readonly parameter: Parameter }
  /** `site` is the variable's own formula there, to be explained at the same place. */
  | { readonly what: 'variable'; readonly variable: Variable; readonly site: FormulaSite }
  | {
      readonly what: 'covariate';
      readonly id: string;
      readonly label: string;
      readonly unit: string;
    }
  | { readonly what: 'clock'; readonly clock: Clock };

/** Where along one key a table was read. */
export interface KeyReading {
  readonly label: string;
  readonly asked: number;
  /** The point read, and the next where the reading lies between the two. */
  readonly point: number;
  readonly next: number | null;
  /** How far on from `point` to `next`, 0 to 1. */
  readonly part: number;
}

interface Part {
  /** Place in the formula's text. */
  readonly at: Span;
  /** That stretch of the text. */
  readonly written: string;
  readonly value: number;
}

export type Explained =
  | (Part & { readonly type: 'number' })
  | (Part & { readonly type: 'name'; readonly name: string; readonly meaning: NameMeaning })
  | (Part & { readonly type: 'call'; readonly fn: string; readonly args: readonly Explained[] })
  | (Part & {
      readonly type: 'lookup';
      readonly table: Table;
      readonly keys: readonly KeyReading[];
      /** The keys' own formulas. */
      readonly args: readonly Explained[];
    });

/** Parts within parts, through variables of variables: as many as the engine follows. */
const DEEPEST = 1_000;

/**
 * @param values by parameter id, where not the base value
 * @throws DocumentError as data: what the parser says, `formula.unknownName`,
 *   `formula.unknownFunction`, `formula.noStartAge`, `formula.lookupNeedsTable`,
 *   `formula.missingForStrategy`, `formula.tooDeepTogether`; RangeError for unknown ids
 */
export function explainFormula(
  document: ModelDocument,
  text: string,
  place: FormulaPlace,
  values: ReadonlyMap<string, number> = new Map(),
): Explained {
  return new Explainer(document, place, values).explain(text);
}

class Explainer {
  private depth = 0;
  private readonly variables = new Map<string, number>();

  constructor(
    private readonly document: ModelDocument,
    private readonly place: FormulaPlace,
    private readonly values: ReadonlyMap<string, number>,
  ) {}

  explain(text: string): Explained {
    const parsed = parseFormula(text);
    if (!parsed.expr) throw new DocumentError(parsed.issues);
    return this.expr(parsed.expr, text);
  }

  /** Refuses a definition that runs in a circle, before the stack does. */
  private expr(expr: Expr, text: string): Explained {
    if (this.depth >= DEEPEST) throw refusal('formula.tooDeepTogether', { maximum: DEEPEST });
    this.depth++;
    const explained = this.exprWithin(expr, text);
    this.depth--;
    return explained;
  }

  private exprWithin(expr: Expr, text: string): Explained {
    const { at } = expr;
    const written = text.slice(at.start, at.end);
    if (expr.type === 'number') return { type: 'number', at, written, value: expr.value };
    if (expr.type === 'name') return { type: 'name', at, written, ...this.name(expr) };
    if (expr.fn === 'lookup') return { type: 'lookup', at, written, ...this.lookup(expr, text) };
    const meaning = MEANING.get(expr.fn);
    if (!meaning) throw refusal('formula.unknownFunction', { name: expr.fn }, at);
    const args = expr.args.map((arg) => this.expr(arg, text));
    const value = meaning(...args.map((arg) => arg.value));
    return { type: 'call', at, written, fn: expr.fn, args, value };
  }

  private lookup({ args: [first, ...rest], at }: CallExpr, text: string) {
    const symbol = first?.type === 'name' ? first.name : undefined;
    const table = this.document.tables.find((each) => each.symbol === symbol);
    if (!table) throw refusal('formula.lookupNeedsTable', {}, at);
    const args = rest.map((arg) => this.expr(arg, text));
    const asked = args.map(({ value }) => value);
    return { table, args, keys: readingsOf(table, asked), value: lookupOf(table)(...asked) };
  }

  private name({ name, at }: NameExpr): { name: string; meaning: NameMeaning; value: number } {
    const { parameters, variables, covariates } = this.document;
    const parameter = parameters.find(({ symbol }) => symbol === name);
    if (parameter) {
      const value = this.values.get(parameter.id) ?? parameter.value;
      return { name, meaning: { what: 'parameter', parameter }, value };
    }
    const variable = variables.find(({ symbol }) => symbol === name);
    if (variable) return { name, ...this.variable(variable) };
    const covariate = covariates.find(({ symbol }) => symbol === name);
    if (covariate) {
      const { id, label, unit = '' } = covariate;
      return { name, meaning: { what: 'covariate', id, label, unit }, value: this.covariate(id) };
    }
    const clock = CLOCKS.find((each) => each === name);
    if (!clock) throw refusal('formula.unknownName', { name }, at);
    return { name, meaning: { what: 'clock', clock }, value: this.clock(clock, at) };
  }

  private variable(variable: Variable): { meaning: NameMeaning; value: number } {
    const { strategy } = this.place;
    const text = formulaFor(variable.formula, strategy);
    if (text === undefined) throw refusal('formula.missingForStrategy', { strategy });
    const base = ['variables', this.document.variables.indexOf(variable), 'formula'];
    const site = { path: formulaPath(variable.formula, base, strategy), text };
    const value = this.variables.get(variable.id) ?? this.explain(text).value;
    this.variables.set(variable.id, value);
    return { meaning: { what: 'variable', variable, site }, value };
  }

  private covariate(id: string): number {
    const { profile } = this.place;
    const found = this.document.profiles.find((each) => each.id === profile);
    if (!found) throw new RangeError(`profile ${profile}`);
    return found.covariates[id] ?? Number.NaN;
  }

  private clock(clock: Clock, at: Span): number {
    const { cycle, tunnel } = this.place;
    const { cycleLength } = this.document.question;
    if (clock === 'cycle') return cycle;
    if (clock === 'cycle_length') return cycleLength;
    if (clock === 'time') return cycle * cycleLength;
    if (clock === 'age') return this.startAge(at) + cycle * cycleLength;
    if (tunnel === undefined) throw refusal('formula.unknownName', { name: clock }, at);
    return tunnel * cycleLength;
  }

  private startAge(at: Span): number {
    const covariate = this.document.covariates.find(({ symbol }) => symbol === START_AGE);
    if (!covariate) throw refusal('formula.noStartAge', {}, at);
    return this.covariate(covariate.id);
  }
}

function readingsOf({ keys, interpolation }: Table, asked: readonly number[]): KeyReading[] {
  return keys.map(({ label, points }, key) => {
    const value = asked[key] ?? 0;
    const [index, part] = position(points, value, interpolation === 'linear');
    const next = part > 0 ? (points[index + 1] ?? null) : null;
    return { label, asked: value, point: points[index] as number, next, part };
  });
}

function refusal(code: string, params: Issue['params'], at?: Span): DocumentError {
  return new DocumentError([error(code, [], params, at)]);
}
