/**
 * A formula's value for one draw, one strategy, one profile and one moment, by
 * plain recursion over its expression.
 */
import type { Expr } from '../../shared/formula/expr.ts';
import { parseFormula } from '../../shared/formula/parse.ts';
import type {
  ModelDocument,
  Profile,
  StrategyFormula,
  Table,
} from '../../shared/model/document.ts';
import { apply } from './functions.ts';

/** What a formula is evaluated for. */
export interface Setting {
  readonly document: ModelDocument;
  /** Value of each parameter in this draw, by symbol. */
  readonly values: Readonly<Record<string, number>>;
  /** Strategy id. */
  readonly strategy: string;
  readonly profile: Profile;
}

/** When a formula is evaluated. */
export interface Moment {
  /** 0 for the first movement. */
  readonly cycle: number;
  /** Cycles already spent in a timed state; 0 elsewhere. */
  readonly tunnel: number;
}

export function evaluate(formula: StrategyFormula, setting: Setting, moment: Moment): number {
  return value(parsed(textFor(formula, setting.strategy)), setting, moment);
}

function textFor(formula: StrategyFormula, strategy: string): string {
  if (typeof formula === 'string') return formula;
  const text = formula.byStrategy[strategy] ?? formula.otherwise;
  if (text === undefined) throw new Error(`no formula for strategy ${strategy}`);
  return text;
}

function parsed(text: string): Expr {
  const { expr, issues } = parseFormula(text);
  if (!expr) throw new Error(`${text}: ${JSON.stringify(issues)}`);
  return expr;
}

function value(expr: Expr, setting: Setting, moment: Moment): number {
  if (expr.type === 'number') return expr.value;
  if (expr.type === 'name') return named(expr.name, setting, moment);
  const { fn, args } = expr;
  if (fn === 'lookup') return lookupCall(args, setting, moment);
  if (fn === 'if') {
    const [condition, yes, no] = args as [Expr, Expr, Expr];
    return value(condition, setting, moment) !== 0
      ? value(yes, setting, moment)
      : value(no, setting, moment);
  }
  return apply(
    fn,
    args.map((arg) => value(arg, setting, moment)),
  );
}

function named(name: string, setting: Setting, moment: Moment): number {
  const { document, values, profile } = setting;
  const dt = document.question.cycleLength;
  if (name === 'cycle') return moment.cycle;
  if (name === 'cycle_length') return dt;
  if (name === 'time') return moment.cycle * dt;
  if (name === 'time_in_state') return moment.tunnel * dt;
  if (name === 'age') return covariate('start_age', document, profile) + moment.cycle * dt;
  const variable = document.variables.find((each) => each.symbol === name);
  if (variable) return evaluate(variable.formula, setting, moment);
  if (document.covariates.some((each) => each.symbol === name)) {
    return covariate(name, document, profile);
  }
  const parameter = values[name];
  if (parameter === undefined) throw new Error(`no value for ${name}`);
  return parameter;
}

function covariate(symbol: string, document: ModelDocument, profile: Profile): number {
  const found = document.covariates.find((each) => each.symbol === symbol);
  const given = found && profile.covariates[found.id];
  if (given === undefined) throw new Error(`profile ${profile.id} has no ${symbol}`);
  return given;
}

function lookupCall(args: readonly Expr[], setting: Setting, moment: Moment): number {
  const [first, ...rest] = args;
  if (first?.type !== 'name') throw new Error('lookup needs the name of a table');
  const table = setting.document.tables.find((each) => each.symbol === first.name);
  if (!table) throw new Error(`no table ${first.name}`);
  return look(
    table,
    rest.map((key) => value(key, setting, moment)),
  );
}

/** Value of a table at one or two keys; outside its points the ends hold. */
export function look(table: Table, keys: readonly number[]): number {
  const [rows, columns] = table.keys;
  const width = columns ? columns.points.length : 1;
  const down = place(rows?.points ?? [], keys[0] ?? Number.NaN, table.interpolation);
  const across = columns
    ? place(columns.points, keys[1] ?? Number.NaN, table.interpolation)
    : { index: 0, next: 0, part: 0 };
  const at = (i: number, j: number): number => table.values[i * width + j] as number;
  const upper = mix(at(down.index, across.index), at(down.index, across.next), across.part);
  const lower = mix(at(down.next, across.index), at(down.next, across.next), across.part);
  return mix(upper, lower, down.part);
}

const mix = (a: number, b: number, part: number): number => a + (b - a) * part;

/** The point at or below the key, the one after, and the part of the way between them. */
function place(points: readonly number[], key: number, interpolation: 'step' | 'linear') {
  let index = 0;
  while (index + 1 < points.length && (points[index + 1] as number) <= key) index++;
  const here = points[index] as number;
  const next = Math.min(index + 1, points.length - 1);
  if (interpolation === 'step' || next === index || key <= here)
    return { index, next: index, part: 0 };
  return { index, next, part: (key - here) / ((points[next] as number) - here) };
}
