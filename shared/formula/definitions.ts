/** The variables of a document as definitions, with a scenario's own formulas in place. */
import type { ModelDocument, Scenario, StrategyFormula } from '../model/document.ts';
import type { Path } from '../model/issue.ts';
import type { Kind } from '../model/kinds.ts';

export interface Definition {
  readonly id: string;
  readonly symbol: string;
  readonly formula: StrategyFormula;
  /** Kind that the author gives it; undefined where it is to be inferred. */
  readonly kind: Kind | undefined;
  /** Place of `formula` in the document. */
  readonly path: Path;
}

/** Place of the text that `formulaFor` picks for a strategy. */
export function formulaPath(formula: StrategyFormula, path: Path, strategyId: string): Path {
  if (typeof formula === 'string') return path;
  const own = Object.hasOwn(formula.byStrategy, strategyId);
  return own ? [...path, 'byStrategy', strategyId] : [...path, 'otherwise'];
}

/** One text of a formula by strategy, with the strategies that it is for. */
export interface FormulaText {
  readonly text: string;
  readonly path: Path;
  readonly strategies: readonly string[];
}

/** The texts of a formula that holds for `strategies`, each with its place. */
export function textsOf(
  formula: StrategyFormula,
  path: Path,
  strategies: readonly string[],
): FormulaText[] {
  if (typeof formula === 'string') return [{ text: formula, path, strategies }];
  const { byStrategy, otherwise } = formula;
  const texts: FormulaText[] = Object.entries(byStrategy).map(([id, text]) => {
    return { text, path: [...path, 'byStrategy', id], strategies: [id] };
  });
  if (otherwise !== undefined) {
    const rest = strategies.filter((id) => !Object.hasOwn(byStrategy, id));
    texts.push({ text: otherwise, path: [...path, 'otherwise'], strategies: rest });
  }
  return texts;
}

/** Variables in document order; those that the scenario overrides with its formulas. */
export function definitionsIn(document: ModelDocument, scenario?: Scenario): Definition[] {
  const definitions = document.variables.map(({ id, symbol, formula, kind }, index): Definition => {
    return { id, symbol, formula, kind, path: ['variables', index, 'formula'] };
  });
  if (!scenario) return definitions;
  const overridden = overridesOf(scenario, document.scenarios.indexOf(scenario));
  return definitions.map((definition) => {
    const override = overridden.get(definition.id);
    return override ? { ...definition, ...override } : definition;
  });
}

function overridesOf(
  scenario: Scenario,
  at: number,
): Map<string, Pick<Definition, 'formula' | 'path'>> {
  const overridden = new Map<string, Pick<Definition, 'formula' | 'path'>>();
  scenario.overrides.forEach((override, index) => {
    if (override.type !== 'variable') return;
    const path = ['scenarios', at, 'overrides', index, 'formula'];
    overridden.set(override.variable, { formula: override.formula, path });
  });
  return overridden;
}
