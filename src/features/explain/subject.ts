/** What can be taken apart. Ids are those of the document. */
import type { Path } from '../../../shared/model/issue.ts';

export type Subject =
  /** A strategy's cost or outcome: the payoffs that it sums. */
  | {
      readonly what: 'total';
      readonly strategy: string;
      readonly measure: 'cost' | 'outcome';
    }
  /** One payoff, cycle by cycle. */
  | { readonly what: 'payoff'; readonly strategy: string; readonly payoff: string }
  /** Who is in a state at a boundary of cycles, and where they came from. */
  | {
      readonly what: 'occupancy';
      readonly strategy: string;
      readonly state: string;
      readonly cycle: number;
    }
  | { readonly what: 'parameter'; readonly parameter: string }
  /** A formula, where it stands and as it holds for the strategy. */
  | {
      readonly what: 'formula';
      readonly strategy: string;
      readonly path: Path;
      readonly text: string;
      /** Cycle to begin with; the first where absent. */
      readonly cycle?: number;
    };
