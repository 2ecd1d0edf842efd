/**
 * The engine against the plain reference simulator on seeded random models, to 1e-9
 * relative: totals, profiles, payoffs and trace of the base case, and totals of
 * some draws. `REFERENCE_SEED` and `REFERENCE_MODELS` choose other models.
 */
import { describe, expect, it } from 'vitest';
import { drawParameters } from '../../shared/engine/draw/draw.ts';
import { type Engine, prepare } from '../../shared/engine/engine.ts';
import type { ModelDocument } from '../../shared/model/document.ts';
import { differences, differs, sizes } from './compare.ts';
import { randomModel } from './random-model.ts';
import { baseValues, simulate } from './simulate.ts';

const FIRST = Number(process.env.REFERENCE_SEED ?? 1);
const MODELS = Number(process.env.REFERENCE_MODELS ?? 300);
const BATCH = 20;
const PLANS = ['plain', 'lhs', 'sobol'] as const;

function baseDisagreements(engine: Engine, document: ModelDocument): string[] {
  const run = engine.base({ trace: true });
  const want = simulate(document, baseValues(document));
  const codes = run.problems.map(({ code }) => code);
  return [...codes, ...differences(document, run.strategies, want)];
}

/** Three draws from the middle of a plan. */
function drawDisagreements(engine: Engine, document: ModelDocument, seed: number): string[] {
  const settings = { samples: 12, seed, plan: PLANS[seed % 3] as (typeof PLANS)[number] };
  const [from, to] = [5, 8];
  const block = engine.draws(settings, from, to);
  const { parameters, groups } = document;
  const drawn = drawParameters(parameters, groups, settings, from, to);
  const found = block.problems.map(({ code }) => code);
  for (let draw = 0; draw < to - from; draw++) {
    const values = Object.fromEntries(
      parameters.map(({ id, symbol, value }) => [symbol, drawn.get(id)?.[draw] ?? value]),
    );
    const want = simulate(document, values);
    const size = sizes(document, want);
    want.forEach((run, s) => {
      for (const measure of ['cost', 'outcome'] as const) {
        const got = block[measure][s]?.[draw];
        if (differs(got, run[measure], size[measure])) {
          found.push(`draw ${from + draw} ${run.id} ${measure}: ${got}, want ${run[measure]}`);
        }
      }
    });
  }
  return found;
}

describe('engine and reference agree', () => {
  for (let first = FIRST; first < FIRST + MODELS; first += BATCH) {
    const last = Math.min(first + BATCH, FIRST + MODELS) - 1;
    it(`on random models of seeds ${first} to ${last}`, { timeout: 120_000 }, () => {
      for (let seed = first; seed <= last; seed++) {
        const document = randomModel(seed);
        const engine = prepare(document);
        expect(baseDisagreements(engine, document), `seed ${seed}, base case`).toEqual([]);
        expect(drawDisagreements(engine, document, seed), `seed ${seed}, draws`).toEqual([]);
      }
    });
  }
});
