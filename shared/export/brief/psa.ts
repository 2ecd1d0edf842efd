/** What the brief needs to know of the probabilistic analysis, at one threshold. */
import { affectedPopulation } from '../../analysis/population.ts';
import type { Draws } from '../../analysis/psa/draws.ts';
import { evpi } from '../../analysis/psa/evpi.ts';
import { sweep } from '../../analysis/psa/sweep.ts';
import type { ModelDocument } from '../../model/document.ts';

/** As in `AppraisedPsa`, which can be given as it is. */
export interface BriefPsa {
  readonly samples: number;
  readonly strategies: readonly {
    readonly id: string;
    /** Share of the draws in which it is best. */
    readonly probabilityBest: number;
    /** Money per person; the lowest is that of the best on the mean of the draws. */
    readonly expectedLoss: number;
  }[];
  readonly evpi: {
    /** Money per person. */
    readonly perPerson: number;
    /** Money for all whom the decision affects; null where the question does not say. */
    readonly population: number | null;
  };
}

/**
 * From the draws that the app keeps; the same numbers as the command line's.
 * @throws DocumentError see `requireDraws`
 */
export function briefPsa({ question }: ModelDocument, draws: Draws, threshold: number): BriefPsa {
  const swept = sweep(draws, [threshold]);
  const point = swept.points[0] as (typeof swept.points)[number];
  const perPerson = evpi(swept)[0]?.perPerson as number;
  const { beneficiaries } = question;
  return {
    samples: swept.draws,
    strategies: draws.strategies.map((id, index) => ({
      id,
      probabilityBest: point.probability[index] as number,
      expectedLoss: point.expectedLoss[index] as number,
    })),
    evpi: {
      perPerson,
      population: beneficiaries
        ? perPerson * affectedPopulation(beneficiaries, 'startOfYear')
        : null,
    },
  };
}
