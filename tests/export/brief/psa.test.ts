import { expect, it } from 'vitest';
import { appraise, runDraws } from '../../../shared/analysis/appraise.ts';
import { joinBlocks } from '../../../shared/analysis/psa/draws.ts';
import { prepare } from '../../../shared/engine/engine.ts';
import { briefPsa } from '../../../shared/export/brief/psa.ts';
import { exampleOf } from '../../examples/load.ts';

it('has the numbers of the command line', () => {
  const document = exampleOf('keeping-hearts-well');
  const engine = prepare(document);
  const settings = { samples: 250, seed: 2, plan: 'plain', threshold: 1_500 } as const;
  const ids = document.strategies.map(({ id }) => id);
  const { direction } = document.question.outcome;
  const draws = joinBlocks(ids, runDraws(engine, settings), direction);
  const psa = briefPsa(document, draws, settings.threshold);
  const want = appraise(document, engine, settings).psa!;
  expect(psa.samples).toBe(want.samples);
  expect(psa.evpi).toEqual({
    perPerson: want.evpi.perPerson,
    population: want.evpi.population,
  });
  expect(psa.strategies).toEqual(
    want.strategies.map(({ id, probabilityBest, expectedLoss }) => ({
      ...{ id, probabilityBest, expectedLoss },
    })),
  );
});
