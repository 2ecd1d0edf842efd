/**
 *   removeStrategy(document, id): Edit[] | null
 *
 * A strategy goes with its own formulas, and with the rows and payoffs that are for it
 * alone; another becomes the comparator where it was. Null where it is the only one.
 */
import type { ModelDocument, StrategyFormula } from '../document.ts';
import type { Edit, Place } from './edit.ts';
import { formulaEdits } from './formula-sites.ts';
import { inTurn } from './in-turn.ts';
import { rowPlace } from './rows.ts';

export function removeStrategy(document: ModelDocument, id: string): Edit[] | null {
  const next = document.strategies.find((strategy) => strategy.id !== id);
  if (!next) return null;
  return inTurn(
    document,
    (current) => limitedLists(current, id),
    (current) => formulaEdits(current, (formula) => without(formula, id)),
    ({ question }) =>
      question.comparator === id
        ? [{ type: 'set', at: ['question', 'comparator'], value: next.id }]
        : [],
    () => [{ type: 'remove', at: ['strategies'], id }],
  );
}

interface Limited {
  readonly id: string;
  readonly strategies?: readonly string[];
}

function limitedLists({ movements, payoffs }: ModelDocument, strategy: string): Edit[] {
  const rows: readonly Limited[] = movements.type === 'rows' ? movements.rows : [];
  return [
    ...rows.flatMap((row) => narrowed(row, ['movements', 'rows'], rowPlace(row.id), strategy)),
    ...payoffs.flatMap((payoff) =>
      narrowed(payoff, ['payoffs'], ['payoffs', { id: payoff.id }], strategy),
    ),
  ];
}

/** What is for nobody any more goes: an empty list would not be sound. */
function narrowed({ id, strategies }: Limited, list: Place, at: Place, strategy: string): Edit[] {
  if (!strategies?.includes(strategy)) return [];
  const left = strategies.filter((each) => each !== strategy);
  if (left.length === 0) return [{ type: 'remove', at: list, id }];
  return [{ type: 'set', at: [...at, 'strategies'], value: left }];
}

function without(formula: StrategyFormula, strategy: string): StrategyFormula {
  if (typeof formula === 'string' || !Object.hasOwn(formula.byStrategy, strategy)) return formula;
  const { [strategy]: _, ...byStrategy } = formula.byStrategy;
  if (Object.keys(byStrategy).length === 0 && formula.otherwise !== undefined) {
    return formula.otherwise;
  }
  return { ...formula, byStrategy };
}
