/**
 * The kind of an expression, from the kinds of its names and the rules of its
 * functions, and the mixtures inside it that cannot be right.
 */
import { error, type Issue, warning } from '../model/issue.ts';
import type { CallExpr, Expr } from './expr.ts';
import { FUNCTIONS, paramAt } from './functions.ts';
import {
  addKinds,
  divideKinds,
  type Inferred,
  inferred,
  isMoney,
  multiplyKinds,
  NUMBER,
  powerKind,
} from './kind-algebra.ts';
import { mismatchIssue, severityOf } from './mismatch.ts';
import type { Scope } from './scope.ts';

/** Kinds inferred for variables that declare none, by symbol. */
export type VariableKinds = ReadonlyMap<string, Inferred>;

/** What `1 - x` is for an x of these kinds. */
const COMPLEMENT = new Map([
  ['probability', 'probability'],
  ['utility', 'disabilityWeight'],
  ['disabilityWeight', 'utility'],
  ['ratio', 'ratio'],
] as const);

const isOne = (expr: Expr | undefined): boolean => expr?.type === 'number' && expr.value === 1;

class Inference {
  readonly issues: Issue[] = [];
  private readonly scope: Scope;
  private readonly variables: VariableKinds;

  constructor(scope: Scope, variables: VariableKinds) {
    this.scope = scope;
    this.variables = variables;
  }

  infer(expr: Expr): Inferred {
    if (expr.type === 'number') return NUMBER;
    if (expr.type === 'name') return this.name(expr.name);
    const fn = FUNCTIONS.get(expr.fn);
    const args = expr.args.map((arg) => this.infer(arg));
    if (!fn) return NUMBER;
    if (fn.result === 'depends') return this.depending(expr, args);
    this.checkArguments(expr, args);
    return inferred(fn.result);
  }

  private name(name: string): Inferred {
    const entry = this.scope.names.get(name);
    if (!entry) return NUMBER;
    if (entry.what === 'variable' && !entry.declared) return this.variables.get(name) ?? NUMBER;
    return inferred(entry.kind);
  }

  private checkArguments(call: CallExpr, args: readonly Inferred[]): void {
    const fn = FUNCTIONS.get(call.fn);
    args.forEach((got, index) => {
      const param = fn && paramAt(fn, index);
      const at = call.args[index]?.at;
      if (!param || !at) return;
      const severity = severityOf(param.kind, got);
      if (!severity) return;
      const where = { function: call.fn, argument: param.name };
      this.issues.push(mismatchIssue(severity, param.kind, got.kind, at, where));
    });
  }

  /** Functions whose result takes its kind from the arguments. */
  private depending(call: CallExpr, args: readonly Inferred[]): Inferred {
    const [a = NUMBER, b = NUMBER] = args;
    switch (call.fn) {
      case 'add':
      case 'min':
      case 'max':
      case 'sum':
      case 'clamp':
        return this.together(call, args, 0);
      case 'if':
        return this.together(call, args, 1);
      case 'subtract':
        return this.difference(call, a, b);
      case 'multiply':
      case 'product':
        return args.slice(1).reduce(multiplyKinds, a);
      case 'divide':
        return divideKinds(a, b);
      case 'power':
        return powerKind(a);
      case 'negate':
      case 'abs':
      case 'floor':
      case 'round':
        return a;
      case 'exp':
        return a.kind === 'logOdds' ? inferred('ratio') : NUMBER;
      case 'ln':
        return a.kind === 'ratio' ? inferred('logOdds') : NUMBER;
      case 'lookup':
        return this.lookup(call);
      default:
        return NUMBER;
    }
  }

  /** The common kind of the arguments from `first` on. */
  private together(call: CallExpr, args: readonly Inferred[], first: number): Inferred {
    let common = args[first] ?? NUMBER;
    for (let index = first + 1; index < args.length; index += 1) {
      const next = args[index] ?? NUMBER;
      const joined = addKinds(common, next);
      if (joined === 'clash') return this.clash(call, common, next);
      common = joined;
    }
    return common;
  }

  private clash(call: CallExpr, left: Inferred, right: Inferred): Inferred {
    const params = { left: left.kind, right: right.kind };
    const bothMoney = isMoney(left.kind) && isMoney(right.kind);
    this.issues.push(
      bothMoney
        ? warning('formula.mixedFlows', [], params, call.at)
        : error('formula.mixedKinds', [], params, call.at),
    );
    return NUMBER;
  }

  private difference(call: CallExpr, a: Inferred, b: Inferred): Inferred {
    const complement = isOne(call.args[0]) ? COMPLEMENT.get(b.kind as never) : undefined;
    if (complement) return inferred(complement, b.scaled);
    const isWeight = b.kind === 'utility' || b.kind === 'disabilityWeight';
    // Some other number less a utility could be either; hold it to neither.
    if (a.kind === 'number' && isWeight) return inferred(b.kind, true);
    return this.together(call, [a, b], 0);
  }

  private lookup(call: CallExpr): Inferred {
    const [table] = call.args;
    const entry = table?.type === 'name' ? this.scope.names.get(table.name) : undefined;
    return entry?.what === 'table' ? inferred(entry.kind) : NUMBER;
  }
}

/**
 * The kind of an expression and what is wrong inside it, each with its place:
 * `formula.mixedKinds` (error) and `formula.mixedFlows` (warning: costs over different
 * times), params left and right; an argument of the wrong kind as in mismatch.ts, with
 * params function and argument too. Names that are not in scope count as numbers.
 */
export function inferKind(
  expr: Expr,
  scope: Scope,
  variables: VariableKinds = new Map(),
): { kind: Inferred; issues: readonly Issue[] } {
  const inference = new Inference(scope, variables);
  const kind = inference.infer(expr);
  return { kind, issues: inference.issues };
}
