import type { StrategyFormula } from './document.ts';

/** The formula that holds for a strategy: its own, else the fallback, else none. */
export function formulaFor(formula: StrategyFormula, strategyId: string): string | undefined {
  if (typeof formula === 'string') return formula;
  const { byStrategy, otherwise } = formula;
  return Object.hasOwn(byStrategy, strategyId) ? byStrategy[strategyId] : otherwise;
}
