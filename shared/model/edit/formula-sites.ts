/**
 * Every strategy formula of a document, by place, whether it parses or not.
 *
 *   formulaPlaces(document): FormulaPlace[]
 *   formulaEdits(document, change): Edit[]   changes many of them at once
 */
import type { ModelDocument, Scenario, StrategyFormula } from '../document.ts';
import { formulaFor } from '../strategy-formula.ts';
import type { Edit, Json, Place } from './edit.ts';

/** What a formula belongs to. */
export type Owner = 'variable' | 'start' | 'curve' | 'cell' | 'amount' | 'payoff';

export interface FormulaPlace {
  readonly owner: Owner;
  /** Of the formula itself. */
  readonly at: Place;
  readonly formula: StrategyFormula;
  /** Strategies that it is limited to; undefined for all. */
  readonly strategies: readonly string[] | undefined;
}

/** Formulas outside scenarios, in document order. */
export function formulaPlaces(document: ModelDocument): FormulaPlace[] {
  return [...variables(document), ...start(document), ...movements(document), ...payoffs(document)];
}

interface Holder {
  readonly id: string;
  readonly formula: StrategyFormula;
}

function within(
  owner: Owner,
  list: Place,
  holders: readonly Holder[],
  strategies?: readonly string[],
): FormulaPlace[] {
  return holders.map(({ id, formula }) => {
    return { owner, at: [...list, { id }, 'formula'], formula, strategies };
  });
}

function variables(document: ModelDocument): FormulaPlace[] {
  return within('variable', ['variables'], document.variables);
}

function start(document: ModelDocument): FormulaPlace[] {
  return within('start', ['start', 'shares'], document.start.shares);
}

function movements({ movements }: ModelDocument): FormulaPlace[] {
  if (movements.type === 'survival') {
    return within('curve', ['movements', 'curves'], movements.curves);
  }
  return movements.rows.flatMap(({ id, cells, strategies }) =>
    within('cell', ['movements', 'rows', { id }, 'cells'], cells, strategies),
  );
}

function payoffs(document: ModelDocument): FormulaPlace[] {
  return document.payoffs.flatMap((payoff) => {
    const { id, strategies } = payoff;
    if (payoff.type !== 'state') return within('payoff', ['payoffs'], [payoff], strategies);
    return within('amount', ['payoffs', { id }, 'amounts'], payoff.amounts, strategies);
  });
}

/** A formula as it should be; the same (or an equal one) where nothing changes. */
export type FormulaChange = (
  formula: StrategyFormula,
  strategies: readonly string[] | undefined,
) => StrategyFormula;

/** Edits that put `change` into force in every formula, those of scenarios included. */
export function formulaEdits(document: ModelDocument, change: FormulaChange): Edit[] {
  const own = formulaPlaces(document).flatMap(({ at, formula, strategies }): Edit[] => {
    const changed = change(formula, strategies);
    return isSame(formula, changed) ? [] : [{ type: 'set', at, value: changed as Json }];
  });
  return [...own, ...document.scenarios.flatMap((scenario) => overrideEdits(scenario, change))];
}

/** Overrides have no ids: their list is set whole. */
function overrideEdits(scenario: Scenario, change: FormulaChange): Edit[] {
  let isChanged = false;
  const overrides = scenario.overrides.map((override) => {
    if (override.type !== 'variable') return override;
    const formula = change(override.formula, undefined);
    if (isSame(override.formula, formula)) return override;
    isChanged = true;
    return { ...override, formula };
  });
  const at: Place = ['scenarios', { id: scenario.id }, 'overrides'];
  return isChanged ? [{ type: 'set', at, value: overrides as Json }] : [];
}

function isSame(a: StrategyFormula, b: StrategyFormula): boolean {
  if (typeof a === 'string' || typeof b === 'string') return a === b;
  const ids = Object.keys(a.byStrategy);
  return (
    a.otherwise === b.otherwise &&
    ids.length === Object.keys(b.byStrategy).length &&
    ids.every((id) => formulaFor(a, id) === formulaFor(b, id))
  );
}

/** The formula with each of its texts changed. */
export function mapTexts(
  formula: StrategyFormula,
  change: (text: string) => string,
): StrategyFormula {
  if (typeof formula === 'string') return change(formula);
  const texts = Object.entries(formula.byStrategy).map(([id, text]) => [id, change(text)]);
  const changed = { ...formula, byStrategy: Object.fromEntries(texts) as Record<string, string> };
  const { otherwise } = formula;
  return otherwise === undefined ? changed : { ...changed, otherwise: change(otherwise) };
}

/**
 * One formula made of several. Where any differs by strategy so does the result, for
 * each of `strategies` that all of them have a text for.
 */
export function combined(
  formulas: readonly StrategyFormula[],
  strategies: readonly string[],
  combine: (texts: readonly string[]) => string,
): StrategyFormula {
  const texts = formulas.filter((formula) => typeof formula === 'string');
  if (texts.length === formulas.length) return combine(texts);
  const byStrategy = strategies.flatMap((id) => {
    const own = formulas.flatMap((formula) => formulaFor(formula, id) ?? []);
    return own.length < formulas.length ? [] : [[id, combine(own)] as const];
  });
  return { byStrategy: Object.fromEntries(byStrategy) };
}
