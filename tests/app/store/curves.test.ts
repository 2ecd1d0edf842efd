import { expect, it } from 'vitest';
import { appraise, runDraws } from '../../../shared/analysis/appraise.ts';
import { joinBlocks } from '../../../shared/analysis/psa/draws.ts';
import { prepare } from '../../../shared/engine/engine.ts';
import { curvesAt, curvesOf, personsAffected } from '../../../src/store/curves.ts';
import { tinyDocument } from '../../fixtures/tiny-document.ts';

const document = tinyDocument();
const settings = { samples: 200, seed: 7, plan: 'plain' } as const;
const engine = prepare(document);
const draws = joinBlocks(
  document.strategies.map(({ id }) => id),
  runDraws(engine, settings),
  document.question.outcome.direction,
);

it('gives at each threshold what the command line gives there', () => {
  const thresholds = [0, 700, 1_500];
  const curves = curvesOf(draws, thresholds);
  thresholds.forEach((threshold, i) => {
    const { psa } = appraise(document, engine, { ...settings, threshold });
    expect(curves.acceptability.map(({ probabilities }) => probabilities[i])).toEqual(
      psa?.strategies.map(({ probabilityBest }) => probabilityBest),
    );
    expect(curves.losses.map(({ losses }) => losses[i])).toEqual(
      psa?.strategies.map(({ expectedLoss }) => expectedLoss),
    );
    expect(curves.evpi[i]?.perPerson).toBe(psa?.evpi.perPerson);
  });
});

it('works them out once for the same draws and thresholds', () => {
  expect(curvesOf(draws, [0, 100])).toBe(curvesOf(draws, [0, 100]));
  expect(curvesOf(draws, [0, 100])).not.toBe(curvesOf(draws, [0, 200]));
});

it('reads the same at one threshold', () => {
  expect(curvesAt(draws, 700).frontier[0]).toEqual(curvesOf(draws, [0, 700]).frontier[1]);
});

it('says nothing of a population that the question does not name', () => {
  expect(personsAffected({ ...document.question, beneficiaries: undefined })).toBeNull();
  const beneficiaries = { label: 'All', incidence: 10, prevalent: 5, years: 1, discountRate: 0.03 };
  // One year, counted at its start: 5 + 10.
  expect(personsAffected({ ...document.question, beneficiaries })).toBe(15);
});
