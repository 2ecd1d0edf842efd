/** The names and calls of an expression: which there are, and whether they fit the scope. */
import { error, type Issue, type IssueParams, type Span } from '../model/issue.ts';
import type { CallExpr, Expr, NameExpr } from './expr.ts';
import { type FormulaFunction, FUNCTIONS } from './functions.ts';
import type { Scope, ScopeEntry } from './scope.ts';

const known = new WeakMap<Expr, ReadonlySet<string>>();

/** Names in the order of their first use, tables included, functions left out. */
export function namesIn(expr: Expr): ReadonlySet<string> {
  const before = known.get(expr);
  if (before) return before;
  const names = new Set<string>();
  const visit = (part: Expr): void => {
    if (part.type === 'name') names.add(part.name);
    if (part.type === 'call') part.args.forEach(visit);
  };
  visit(expr);
  known.set(expr, names);
  return names;
}

/** Where a name is first used as a value, or undefined. */
export function placeOf(expr: Expr, name: string): Span | undefined {
  if (expr.type === 'name') return expr.name === name ? expr.at : undefined;
  if (expr.type === 'number') return undefined;
  for (const arg of expr.args) {
    const place = placeOf(arg, name);
    if (place) return place;
  }
  return undefined;
}

export interface NameOptions {
  /** Whether `time_in_state` has a meaning where the formula stands. */
  readonly timeInState: boolean;
}

/** Issues reported of one formula; what follows is mostly noise. */
const MOST_ISSUES = 20;

class NameCheck {
  readonly issues: Issue[] = [];
  private readonly scope: Scope;
  private readonly options: NameOptions;

  constructor(scope: Scope, options: NameOptions) {
    this.scope = scope;
    this.options = options;
  }

  visit(expr: Expr): void {
    if (expr.type === 'name') this.value(expr);
    if (expr.type === 'call') this.call(expr);
  }

  private report(code: string, at: Span, params: IssueParams): void {
    if (this.issues.length < MOST_ISSUES) this.issues.push(error(code, [], params, at));
  }

  /** A name that stands for a number. */
  private value({ name, at }: NameExpr): void {
    const entry = this.scope.names.get(name);
    if (!entry) return this.unknownName(name, at);
    if (entry.what === 'table') return this.report('formula.tableWithoutLookup', at, { name });
    if (name === 'age' && !this.scope.hasStartAge) return this.report('formula.noStartAge', at, {});
    if (name === 'time_in_state' && !this.options.timeInState) {
      this.report('formula.noTimeInState', at, {});
    }
  }

  private unknownName(name: string, at: Span): void {
    if (FUNCTIONS.get(name)?.isOperator === false) {
      return this.report('formula.functionWithoutBrackets', at, { name });
    }
    this.report('formula.unknownName', at, withSuggestion(name, this.scope.suggestName(name)));
  }

  private call(call: CallExpr): void {
    const fn = FUNCTIONS.get(call.fn);
    const at = { start: call.at.start, end: call.at.start + call.fn.length };
    if (!fn) this.unknownFunction(call.fn, at);
    else if (call.args.length < fn.min || call.args.length > fn.max) this.wrongCount(call, fn);
    if (call.fn === 'lookup') return this.lookup(call);
    for (const arg of call.args) this.visit(arg);
  }

  private unknownFunction(name: string, at: Span): void {
    const entry = this.scope.names.get(name);
    if (entry) return this.report('formula.notAFunction', at, { name, what: entry.what });
    const suggestion = this.scope.suggestFunction(name);
    this.report('formula.unknownFunction', at, withSuggestion(name, suggestion));
  }

  private wrongCount(call: CallExpr, { name, min, max }: FormulaFunction): void {
    const most: IssueParams = Number.isFinite(max) ? { max } : {};
    const params = { name, got: call.args.length, min, ...most };
    this.report('formula.wrongArgumentCount', call.at, params);
  }

  /** `lookup(table, key[, key])`: the table by its symbol, then as many keys as it has. */
  private lookup(call: CallExpr): void {
    const [first, ...keys] = call.args;
    for (const key of keys) this.visit(key);
    if (!first || keys.length === 0) return;
    const entry = first.type === 'name' ? this.scope.names.get(first.name) : undefined;
    if (first.type === 'name' && !entry) this.unknownName(first.name, first.at);
    else if (entry?.what !== 'table') this.report('formula.lookupNeedsTable', first.at, {});
    else this.keys(call, entry, keys.length);
  }

  private keys(call: CallExpr, { keys: wanted = 1, id }: ScopeEntry, got: number): void {
    // More than two has been said by the count of arguments.
    if (got !== wanted && got <= 2)
      this.report('formula.wrongKeyCount', call.at, { table: id, got, wanted });
  }
}

function withSuggestion(name: string, suggestion: string | undefined): IssueParams {
  return suggestion === undefined ? { name } : { name, suggestion };
}

/**
 * What is wrong with the names and calls of a formula, each with its place:
 * `formula.` unknownName and unknownFunction (params name, suggestion where one is
 * near), notAFunction (name, what), functionWithoutBrackets (name),
 * wrongArgumentCount (name, got, min, max unless unbounded), tableWithoutLookup
 * (name), lookupNeedsTable, wrongKeyCount (table, got, wanted), noStartAge,
 * noTimeInState. At most 20.
 */
export function checkNames(
  expr: Expr,
  scope: Scope,
  options: NameOptions = { timeInState: true },
): Issue[] {
  const check = new NameCheck(scope, options);
  check.visit(expr);
  return check.issues;
}
