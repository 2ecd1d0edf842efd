/**
 * One strategy as the incremental analysis sees it. `health` is the primary outcome
 * with more being better (see direction.ts), per person; `cost` is money per person.
 */
import { DocumentError, error } from '../model/issue.ts';

export interface Option {
  readonly id: string;
  readonly cost: number;
  readonly health: number;
}

/**
 * Refuses numbers that nothing can be concluded from.
 * @throws DocumentError `analysis.notFinite` with `strategy` and `quantity` of each.
 */
export function requireFinite(options: readonly Option[]): void {
  const issues = options.flatMap((option) =>
    (['cost', 'health'] as const)
      .filter((quantity) => !Number.isFinite(option[quantity]))
      .map((quantity) => error('analysis.notFinite', [], { strategy: option.id, quantity })),
  );
  if (issues.length > 0) throw new DocumentError(issues);
}
