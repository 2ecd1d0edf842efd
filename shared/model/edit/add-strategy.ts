/**
 *   addStrategy(document, { label, description?, like?, before? }): Added
 *
 * A new strategy begins as the twin of another (`like`; the comparator where absent):
 * the same movements, formulas and payoffs, so that the model runs at once.
 */
import type { ModelDocument, StrategyFormula } from '../document.ts';
import { type Added, adding, newId } from './add.ts';
import type { Edit, Place } from './edit.ts';
import { formulaEdits } from './formula-sites.ts';

export interface NewStrategy {
  readonly label: string;
  readonly description?: string;
  /** Id of the strategy to begin from. */
  readonly like?: string;
  /** Id of the strategy that it goes before; last where null or absent. */
  readonly before?: string | null;
}

export function addStrategy(
  document: ModelDocument,
  { like, before, ...fields }: NewStrategy,
): Added {
  const id = newId(document, 'strategy', fields.label);
  const twin = like ?? document.question.comparator;
  const edits = [
    adding('strategy', { ...fields, id }, before),
    ...limitedTo(document).flatMap(([at, list]) => joined(at, list, twin, id)),
    ...formulaEdits(document, (formula) => withTwin(formula, twin, id)),
  ];
  return { id, edits };
}

/** Lists of strategies that rows and payoffs are limited to. */
function limitedTo({ movements, payoffs }: ModelDocument): [Place, readonly string[]][] {
  const rows = movements.type === 'rows' ? movements.rows : [];
  return [
    ...rows.flatMap(({ id, strategies }) => listed(['movements', 'rows', { id }], strategies)),
    ...payoffs.flatMap(({ id, strategies }) => listed(['payoffs', { id }], strategies)),
  ];
}

function listed(at: Place, list: readonly string[] | undefined): [Place, readonly string[]][] {
  return list ? [[[...at, 'strategies'], list]] : [];
}

function joined(at: Place, list: readonly string[], twin: string, id: string): Edit[] {
  return list.includes(twin) ? [{ type: 'set', at, value: [...list, id] }] : [];
}

function withTwin(formula: StrategyFormula, twin: string, id: string): StrategyFormula {
  if (typeof formula === 'string' || !Object.hasOwn(formula.byStrategy, twin)) return formula;
  const own = formula.byStrategy[twin] as string;
  return { ...formula, byStrategy: { ...formula.byStrategy, [id]: own } };
}
