/** What the engine gave as options of the incremental analysis: outcomes turned to health. */
import type { Totals } from '../../engine/results.ts';
import type { ModelDocument } from '../../model/document.ts';
import { toHealth } from '../direction.ts';
import type { Option } from '../option.ts';

type Result = Pick<Totals, 'cost' | 'outcome'> & { readonly id: string };

export function optionsOf({ question }: ModelDocument, results: readonly Result[]): Option[] {
  return results.map(({ id, cost, outcome }) => ({
    id,
    cost,
    health: toHealth(outcome, question.outcome.direction),
  }));
}
