/**
 * The functions that a formula may call: how many arguments, what each is called
 * in help and completion, what kind it should be, and the kind of the result.
 * Operators are here too, by their words; their kinds are worked out in kinds.ts.
 */

import type { Kind } from '../model/kinds.ts';
import { OPERATORS, PREFIX_OPERATORS } from './expr.ts';

/** A function's argument. `number` asks for nothing in particular. */
export interface Param {
  readonly name: string;
  readonly kind: Kind;
}

/** Kind of the result: a fixed one, or one that depends on the arguments (see kinds.ts). */
export type ResultKind = Kind | 'depends';

export interface FormulaFunction {
  readonly name: string;
  /** Arguments by name; the last repeats where `max` is larger. */
  readonly params: readonly Param[];
  readonly min: number;
  /** `Infinity` where any number of arguments is fine. */
  readonly max: number;
  readonly result: ResultKind;
  /** Written as an operator, never called by name. */
  readonly isOperator: boolean;
}

/** `'rate:rate years:time'` to parameters; a name alone is of kind number. */
function paramsOf(text: string): Param[] {
  return text.split(' ').map((word) => {
    const [name = '', kind = 'number'] = word.split(':');
    return { name, kind: kind as Kind };
  });
}

function define(
  name: string,
  params: string,
  result: ResultKind,
  counts: { min?: number; max?: number; isOperator?: boolean } = {},
): FormulaFunction {
  const list = paramsOf(params);
  const { min = list.length, max = list.length, isOperator = false } = counts;
  return { name, params: list, min, max, result, isOperator };
}

const many = Number.POSITIVE_INFINITY;

const operatorFunctions = [
  ...Object.values(OPERATORS).map((word) => define(word, 'a b', 'depends', { isOperator: true })),
  ...Object.values(PREFIX_OPERATORS).map((word) =>
    define(word, 'a', 'depends', { isOperator: true }),
  ),
];

const arithmeticFunctions = [
  define('if', 'condition value_if_true value_if_false', 'depends'),
  define('min', 'a b', 'depends', { max: many }),
  define('max', 'a b', 'depends', { max: many }),
  define('sum', 'a b', 'depends', { min: 1, max: many }),
  define('product', 'a b', 'depends', { min: 1, max: many }),
  define('abs', 'x', 'depends'),
  define('exp', 'x', 'depends'),
  define('ln', 'x', 'depends'),
  define('log10', 'x', 'number'),
  define('sqrt', 'x', 'number'),
  define('floor', 'x', 'depends'),
  define('round', 'x', 'depends'),
  define('clamp', 'x low high', 'depends'),
  define('lookup', 'table key key', 'depends', { min: 2 }),
];

const conversionFunctions = [
  define('chance', 'rate:rate years:time', 'probability'),
  define('hazard', 'chance:probability years:time', 'rate'),
  define('rescale', 'chance:probability from_years:time to_years:time', 'probability'),
  define('odds', 'chance:probability', 'ratio'),
  define('chance_of', 'odds:ratio', 'probability'),
  define('log_odds', 'chance:probability', 'logOdds'),
  define('chance_of_log_odds', 'x:logOdds', 'probability'),
  define('standard_normal', 'x', 'probability'),
  define('times_risk', 'chance:probability ratio:ratio', 'probability'),
  define('times_odds', 'chance:probability ratio:ratio', 'probability'),
  define('times_hazard', 'chance:probability ratio:ratio', 'probability'),
  define('competing', 'rate:rate total_rate:rate years:time', 'probability'),
  define('event_by', 'alive_now:probability alive_then:probability', 'probability'),
];

const survivalFunctions = [
  define('alive_exponential', 'time:time rate:rate', 'probability'),
  define('alive_weibull', 'time:time shape scale', 'probability'),
  define('alive_gompertz', 'time:time shape rate:rate', 'probability'),
  define('alive_lognormal', 'time:time meanlog sdlog', 'probability'),
  define('alive_loglogistic', 'time:time shape scale', 'probability'),
  define('alive_generalised_gamma', 'time:time mu sigma q', 'probability'),
];

const all = [
  ...operatorFunctions,
  ...arithmeticFunctions,
  ...conversionFunctions,
  ...survivalFunctions,
];

/** Every operator and function, by the name in `CallExpr.fn`. */
export const FUNCTIONS: ReadonlyMap<string, FormulaFunction> = new Map(
  all.map((fn) => [fn.name, fn]),
);

/** Names that an author may call: no operators. */
export const CALLABLE: readonly string[] = all.filter((fn) => !fn.isOperator).map((fn) => fn.name);

/** The argument at a position, the last one repeating. */
export function paramAt(fn: FormulaFunction, index: number): Param | undefined {
  return fn.params[index] ?? (index < fn.max ? fn.params.at(-1) : undefined);
}
