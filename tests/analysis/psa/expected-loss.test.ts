import { describe, expect, it } from 'vitest';
import { evpi } from '../../../shared/analysis/psa/evpi.ts';
import { expectedLoss } from '../../../shared/analysis/psa/expected-loss.ts';
import { sweep } from '../../../shared/analysis/psa/sweep.ts';
import { expectClose } from '../close.ts';
import { csvDraws } from './samples.ts';

describe('expectedLoss', () => {
  // Source: base R 4.2.2 on tests/golden/voi_psa.csv:
  // nb <- 30000 * qaly - cost; colMeans(pmax(nb1, nb2, nb3) - nb)
  it('agrees with R', () => {
    const want = [2507.8280344399996, 2015.6414455800002, 2273.3496193399997];
    expectedLoss(sweep(csvDraws(), [30_000])).forEach(({ losses }, s) => {
      expectClose(losses[0], want[s] as number, 1e-10);
    });
  });

  it('has the EVPI for its lowest', () => {
    const swept = sweep(csvDraws(), [0, 5_000, 20_000, 35_000, 90_000]);
    const curves = expectedLoss(swept);
    evpi(swept).forEach(({ perPerson }, i) => {
      expect(perPerson).toBe(Math.min(...curves.map(({ losses }) => losses[i] as number)));
    });
  });
});
