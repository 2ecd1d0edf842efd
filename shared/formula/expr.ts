/**
 * A formula after parsing: numbers, names and calls. Operators are calls too
 * (`a + b` is `add(a, b)`), so whatever walks an expression has three cases.
 */
import type { Span } from '../model/issue.ts';

export type Expr = NumberExpr | NameExpr | CallExpr;

export interface NumberExpr {
  readonly type: 'number';
  readonly value: number;
  readonly at: Span;
}

export interface NameExpr {
  readonly type: 'name';
  readonly name: string;
  readonly at: Span;
}

export interface CallExpr {
  readonly type: 'call';
  /** An operator's word (see OPERATORS) or a function of shared/formula/functions.ts. */
  readonly fn: string;
  readonly args: readonly Expr[];
  readonly at: Span;
}

/** The word that each operator becomes. `true` and `false` parse as 1 and 0. */
export const OPERATORS = {
  '+': 'add',
  '-': 'subtract',
  '*': 'multiply',
  '/': 'divide',
  '^': 'power',
  '<': 'less',
  '<=': 'less_equal',
  '>': 'greater',
  '>=': 'greater_equal',
  '==': 'equal',
  '!=': 'not_equal',
  and: 'and',
  or: 'or',
} as const;

/** Words of the one-sided operators: `-x` is `negate`, `not x` is `not`. */
export const PREFIX_OPERATORS = { '-': 'negate', not: 'not' } as const;
