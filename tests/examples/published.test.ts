/**
 * Source: Chancellor et al. 1997, PharmacoEconomics 12:54-66, as worked in Briggs,
 * Claxton and Sculpher 2006 (inputs and published results from memory). Published:
 * 44,663 and 7.991 life years; 50,602 and 8.937; 6,276 a life year. The further digits
 * and the trace are tests/golden/cohort.json (base R, see its README).
 */
import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { incremental } from '../../shared/analysis/incremental.ts';
import { expectClose } from '../engine/close.ts';
import { asking, baseOf, exampleOf, runOf } from './load.ts';

interface Published {
  readonly trace_mono: number[][];
  readonly trace_combination: number[][];
  readonly results: {
    readonly convention: string;
    readonly mono: { readonly cost: number; readonly ly: number };
    readonly combination: { readonly cost: number; readonly ly: number };
    readonly icer: number;
  }[];
}

const golden = JSON.parse(
  readFileSync(new URL('../golden/cohort.json', import.meta.url), 'utf8'),
) as { published_example: Published };
const published = golden.published_example;
const document = exampleOf('hiv-combination-therapy');

function icerOf(base: ReturnType<typeof baseOf>): number | null | undefined {
  const options = base.strategies.map(({ id, cost, outcome }) => ({ id, cost, health: outcome }));
  return incremental(options).find(({ id }) => id === 'combination')?.icer;
}

describe('HIV combination therapy', () => {
  const base = baseOf(document);

  it('gives the published totals', () => {
    const [mono, combination] = [runOf(base, 'mono'), runOf(base, 'combination')];
    expect(mono.cost).toBeCloseTo(44_663.45, 2);
    expect(mono.outcome).toBeCloseTo(7.99121, 5);
    expect(combination.cost).toBeCloseTo(50_601.65, 2);
    expect(combination.outcome).toBeCloseTo(8.93739, 5);
    expect(icerOf(base)).toBeCloseTo(6_275.96, 2);
    expect(Math.round(icerOf(base) ?? 0)).toBe(6_276);
  });

  it('follows the trace of the golden data', () => {
    const wanted = { mono: published.trace_mono, combination: published.trace_combination };
    for (const [id, trace] of Object.entries(wanted)) {
      trace.forEach((row, k) => {
        row.forEach((share, i) => {
          expectClose(runOf(base, id).trace?.[k]?.[i] ?? Number.NaN, share, 1e-12, `${id} ${k}`);
        });
      });
    }
  });

  it.each(['start', 'end', 'trapezoid', 'simpson'] as const)(
    'counted by %s, agrees with R',
    (way) => {
      const want = published.results.find(({ convention }) => convention === way);
      const counted = baseOf(asking(document, { counting: way }));
      for (const id of ['mono', 'combination'] as const) {
        expectClose(runOf(counted, id).cost, want?.[id].cost ?? Number.NaN, 1e-10, `${id} cost`);
        expectClose(runOf(counted, id).outcome, want?.[id].ly ?? Number.NaN, 1e-10, `${id} years`);
      }
    },
  );
});
