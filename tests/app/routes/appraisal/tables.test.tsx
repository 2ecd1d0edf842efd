/** The numbers behind the figures of Uncertainty and Results are the engine's own. */
import { renderHook } from '@testing-library/react';
import { beforeAll, describe, expect, it } from 'vitest';
import { appraise, runDraws } from '../../../../shared/analysis/appraise.ts';
import { byCategory, byProfile, byState } from '../../../../shared/analysis/breakdown/breakdown.ts';
import { incrementalByProfile } from '../../../../shared/analysis/breakdown/by-profile.ts';
import { netBenefitTable } from '../../../../shared/analysis/breakdown/net-benefit-table.ts';
import { traceTable } from '../../../../shared/analysis/breakdown/trace-table.ts';
import { joinBlocks } from '../../../../shared/analysis/psa/draws.ts';
import { prepare } from '../../../../shared/engine/engine.ts';
import { type FigureWords, useFigureWords } from '../../../../src/routes/appraisal/figure-words.ts';
import {
  breakdownTable,
  piecesOf,
} from '../../../../src/routes/appraisal/results/more/breakdowns.tsx';
import { netBenefitFigures } from '../../../../src/routes/appraisal/results/more/net-benefit.tsx';
import { profilesTable } from '../../../../src/routes/appraisal/results/more/profiles.tsx';
import { traceFigures } from '../../../../src/routes/appraisal/results/more/trace.tsx';
import { acceptabilityTable } from '../../../../src/routes/appraisal/uncertainty/acceptability.tsx';
import { drawsTable } from '../../../../src/routes/appraisal/uncertainty/draws-table.tsx';
import { evpiTable } from '../../../../src/routes/appraisal/uncertainty/evpi.tsx';
import { curvesOf } from '../../../../src/store/curves.ts';
import { exampleOf } from '../../example.ts';
import { withWords } from '../../setup.ts';

withWords();

// Fewer is better here: outcomes are turned on the way, and must come out as they were.
const document = exampleOf('test-before-treating');
const settings = { samples: 150, seed: 3, plan: 'plain' } as const;
const engine = prepare(document);
const base = engine.base({ trace: true });
const blocks = runDraws(engine, settings);
const ids = document.strategies.map(({ id }) => id);
const draws = joinBlocks(ids, blocks, document.question.outcome.direction);
const THRESHOLDS = [0, 400, 1_000];

let words: FigureWords;
beforeAll(() => {
  words = renderHook(() => useFigureWords(document, 'tests')).result.current;
});

describe('Uncertainty', () => {
  const curves = curvesOf(draws, THRESHOLDS);
  const said = (threshold: number) => appraise(document, engine, { ...settings, threshold }).psa;

  it('tables the chance of each strategy at each threshold', () => {
    const { columns, rows } = acceptabilityTable(curves, words);
    expect(columns.map(({ head }) => head).slice(1, -1)).toEqual(
      document.strategies.map(({ label }) => label),
    );
    for (const [threshold, ...chances] of rows) {
      expect(chances.slice(0, -1)).toEqual(
        said(Number(threshold))?.strategies.map(({ probabilityBest }) => probabilityBest),
      );
    }
  });

  it('tables the value of perfect information, for all concerned too', () => {
    for (const [threshold, perPerson, error, population] of evpiTable(curves, words).rows) {
      const psa = said(Number(threshold));
      expect(perPerson).toBe(psa?.evpi.perPerson);
      expect(error).toBe(psa?.evpi.standardError);
      expect(population).toBe(psa?.evpi.population ?? undefined);
    }
  });

  it('tables every draw, outcomes in their own direction', () => {
    const { rows } = drawsTable(draws, words);
    expect(rows).toHaveLength(settings.samples);
    const block = blocks[1];
    const at = (block?.from ?? 0) + 3;
    expect(rows[at]).toEqual([
      at + 1,
      ...ids.flatMap((_, s) => [block?.cost[s]?.[3], block?.outcome[s]?.[3]]),
    ]);
  });
});

describe('Results', () => {
  it('tables the trace, which sums to one whole', () => {
    const strategy = ids[1] ?? '';
    const { rows } = traceFigures(traceTable(document, base, strategy), words);
    expect(rows).toHaveLength(base.cycles + 1);
    for (const [cycle, time, ...shares] of rows) {
      expect(time).toBe(Number(cycle) * base.cycleLength);
      const all = shares.slice(0, -1).reduce<number>((sum, share) => sum + Number(share), 0);
      expect(all).toBeCloseTo(1, 12);
    }
  });

  it.each([
    ['category', byCategory],
    ['state', byState],
    ['profile', byProfile],
  ] as const)('splits costs and outcomes by %s into parts that sum to the total', (by, split) => {
    for (const measure of ['cost', 'outcome'] as const) {
      const pieces = piecesOf(split(document, base, measure), by, words);
      const { columns, rows } = breakdownTable(pieces, 'unit', words);
      rows.forEach((row, s) => {
        expect(row).toHaveLength(columns.length);
        const total = Number(row.at(-1));
        const parts = row.slice(1, -1).reduce<number>((sum, part) => sum + Number(part), 0);
        expect(total).toBe(base.strategies[s]?.[measure]);
        expect(Math.abs(parts - total)).toBeLessThan(1e-9 * Math.max(1, Math.abs(total)));
      });
    }
  });

  it('tables net benefits as the base case has them', () => {
    const { rows } = netBenefitFigures(netBenefitTable(document, base, THRESHOLDS), words);
    for (const [threshold, ...values] of rows) {
      const { strategies } = appraise(document, engine, {
        ...settings,
        samples: 0,
        threshold: Number(threshold),
      });
      expect(values.filter((_, i) => i % 2 === 0)).toEqual(strategies.map(({ nmb }) => nmb));
    }
  });

  it('tables who gains in each profile, the whole population first', () => {
    const results = incrementalByProfile(document, base, 400);
    const { rows } = profilesTable(results, words);
    expect(rows).toHaveLength(document.profiles.length + 1);
    expect(rows[0]?.[0]).toBe('Whole population');
    const shares = rows.slice(1).reduce((sum, row) => sum + Number(row[1]), 0);
    expect(shares).toBeCloseTo(1, 12);
  });
});
