/** Where a formula stands in a document, and whether its kind and its constants fit there. */
import type { Payoff, Question, Row } from '../model/document.ts';
import { error, type Issue, warning } from '../model/issue.ts';
import type { Kind } from '../model/kinds.ts';
import type { Expr } from './expr.ts';
import { FUNCTIONS } from './functions.ts';
import { type Inferred, isMoney } from './kind-algebra.ts';
import { MEANING } from './meaning.ts';
import { mismatchIssue, severityOf } from './mismatch.ts';
import { boundsOf, rangeOf } from './ranges.ts';

export type Place =
  /** A quantity of one kind: a movement's cell, a share, a curve, a cost, a variable. */
  | { readonly type: 'kind'; readonly kind: Kind }
  /** Units of the primary outcome. */
  | { readonly type: 'outcome'; readonly per: 'year' | 'cycle' | 'once' };

/** What of the question decides whether a kind fits. */
export interface Setting {
  readonly measure: Question['outcome']['measure'];
  /** Years. At 1, a year's cost is a cycle's. */
  readonly cycleLength: number;
}

export const cellPlace: Readonly<Record<Row['basis'], Place>> = {
  probabilities: { type: 'kind', kind: 'probability' },
  rates: { type: 'kind', kind: 'rate' },
  logit: { type: 'kind', kind: 'logOdds' },
};

export function payoffPlace(payoff: Payoff): Place {
  const per = payoff.type === 'state' ? payoff.per : 'once';
  if (payoff.measure === 'outcome') return { type: 'outcome', per };
  const kinds = { year: 'costPerYear', cycle: 'costPerCycle', once: 'costOnce' } as const;
  return { type: 'kind', kind: kinds[per] };
}

/** In a yearly model a cycle's amount and a year's are the same. */
function sameInYearlyModel(wanted: Kind, got: Kind, { cycleLength }: Setting): boolean {
  const flows: readonly Kind[] = ['costPerYear', 'costPerCycle'];
  const events: readonly Kind[] = ['rate', 'perCycle'];
  if (cycleLength !== 1) return false;
  return [flows, events].some((kinds) => kinds.includes(wanted) && kinds.includes(got));
}

function checkKindPlace(wanted: Kind, got: Inferred, expr: Expr, setting: Setting): Issue[] {
  const severity = severityOf(wanted, got);
  if (!severity || sameInYearlyModel(wanted, got.kind, setting)) return [];
  return [mismatchIssue(severity, wanted, got.kind, expr.at)];
}

/** The weight that a measure counts by the year, and the one that it would count upside down. */
const WEIGHTS: Partial<Record<Setting['measure'], { wanted: Kind; wrong: Kind }>> = {
  qaly: { wanted: 'utility', wrong: 'disabilityWeight' },
  daly: { wanted: 'disabilityWeight', wrong: 'utility' },
};

function checkOutcomePlace(
  per: 'year' | 'cycle' | 'once',
  got: Inferred,
  expr: Expr,
  { measure, cycleLength }: Setting,
): Issue[] {
  if (got.scaled) return [];
  if (isMoney(got.kind) || got.kind === 'logOdds') {
    return [error('formula.notAnOutcome', [], { measure, got: got.kind }, expr.at)];
  }
  const weights = WEIGHTS[measure];
  if (got.kind === weights?.wrong) {
    return [mismatchIssue('error', weights.wanted, got.kind, expr.at)];
  }
  if (per === 'cycle' && cycleLength !== 1 && got.kind === weights?.wanted) {
    return [warning('formula.yearlyWeightPerCycle', [], { measure, got: got.kind }, expr.at)];
  }
  return [];
}

/** The number that an expression without names comes to, or undefined. */
export function constantValue(expr: Expr): number | undefined {
  if (expr.type === 'number') return expr.value;
  if (expr.type === 'name') return undefined;
  const fn = FUNCTIONS.get(expr.fn);
  if (!fn || expr.args.length < fn.min || expr.args.length > fn.max) return undefined;
  const args = expr.args.map(constantValue);
  const isConstant = (arg: number | undefined): arg is number => arg !== undefined;
  return args.every(isConstant) ? MEANING.get(expr.fn)?.(...args) : undefined;
}

/** What a formula may come to, as far as `if` shows. */
function outcomesOf(expr: Expr): readonly Expr[] {
  if (expr.type !== 'call' || expr.fn !== 'if') return [expr];
  return expr.args.slice(1).flatMap(outcomesOf);
}

/** The kind whose range a constant must keep to, where there is one. */
function rangeKind(place: Place, { measure }: Setting): Kind | undefined {
  if (place.type === 'kind') return place.kind;
  return place.per === 'year' ? WEIGHTS[measure]?.wanted : undefined;
}

function checkConstants(expr: Expr, place: Place, setting: Setting): Issue[] {
  const kind = rangeKind(place, setting);
  if (kind === undefined) return [];
  const { low, high } = rangeOf(kind);
  return outcomesOf(expr).flatMap((part) => {
    const value = constantValue(part);
    if (value === undefined || (value >= low && value <= high)) return [];
    const params = { kind, value, ...boundsOf({ low, high }) };
    return [error('formula.constantOutsideRange', [], params, part.at)];
  });
}

/**
 * Whether an expression of a kind fits where it stands. Issues, with place:
 * mismatches as in mismatch.ts; `formula.notAnOutcome` (money or log odds counted as
 * outcome; params measure, got); `formula.yearlyWeightPerCycle` (a utility or
 * disability weight, by nature a year's, counted each cycle unmultiplied; measure,
 * got); `formula.constantOutsideRange` (kind, value, low and high
 * where bounded).
 */
export function checkPlace(expr: Expr, got: Inferred, place: Place, setting: Setting): Issue[] {
  const constants = checkConstants(expr, place, setting);
  if (place.type === 'outcome') {
    return [...checkOutcomePlace(place.per, got, expr, setting), ...constants];
  }
  return [...checkKindPlace(place.kind, got, expr, setting), ...constants];
}
