/**
 * Speed and memory as ratios against a plain baseline in the same run.
 *
 *   npm run bench            for people
 *   npm run bench -- --json  for machines: headline {ms, handWrittenMs, ratio}
 *
 * The bench model runs from its document through the general engine; drawing is
 * left out on both sides, and both must give the same totals. Absolute times mean
 * nothing but beside each other.
 */
import { execFileSync } from 'node:child_process';
import { readFileSync } from 'node:fs';
import { drawParameters } from '../shared/engine/draw/draw.ts';
import { prepare } from '../shared/engine/engine.ts';
import type { ModelDocument } from '../shared/model/document.ts';
import { readDocument } from '../shared/model/read.ts';
import { handWritten } from './bench-handwritten.ts';

const SAMPLES = 1_000;
const ROUNDS = 40;
const WARM_UP = 10;
const MEMORY_DRAWS = 10_000;

function load(path: string): ModelDocument {
  const { document, issues } = readDocument(readFileSync(path, 'utf8'));
  if (!document) throw new Error(issues.map(({ code }) => code).join(', '));
  return document;
}

function median(values: readonly number[]): number {
  const sorted = [...values].sort((a, b) => a - b);
  return sorted[Math.floor(sorted.length / 2)] as number;
}

/** Times both in turn, so that a slow moment of the machine meets both. */
function race(one: () => unknown, other: () => unknown): [number, number] {
  const times: [number[], number[]] = [[], []];
  for (let round = 0; round < WARM_UP + ROUNDS; round++) {
    [one, other].forEach((run, which) => {
      const begun = performance.now();
      run();
      if (round >= WARM_UP) times[which as 0 | 1].push(performance.now() - begun);
    });
  }
  return [median(times[0]), median(times[1])];
}

function headline() {
  const document = load('tests/fixtures/bench-model.json');
  const settings = { samples: SAMPLES, seed: 1, plan: 'plain' } as const;
  const { parameters, groups, profiles, strategies } = document;
  const values = drawParameters(parameters, groups, settings, 0, SAMPLES);
  const bySymbol = Object.fromEntries(
    parameters.map(({ id, symbol }) => [symbol, values.get(id) as Float64Array]),
  );
  const people = profiles.map(({ covariates, share }) => ({
    age: covariates.start_age as number,
    female: covariates.female as number,
    share,
  }));
  const engine = prepare(document);
  const fast = () => engine.simulate(values, 0, SAMPLES);
  const plain = () => handWritten(bySymbol, people, SAMPLES);
  const difference = largestDifference(fast(), plain());
  if (difference > 1e-12) throw new Error(`the two disagree by ${difference}`);
  const [ms, handWrittenMs] = race(fast, plain);
  const cohortCycles = strategies.length * profiles.length * 25 * SAMPLES;
  return {
    ms,
    handWrittenMs,
    ratio: ms / handWrittenMs,
    nanosecondsPerCohortCycle: (ms * 1e6) / cohortCycles,
    largestRelativeDifference: difference,
  };
}

type Columns = {
  readonly cost: readonly Float64Array[];
  readonly outcome: readonly Float64Array[];
};

function largestDifference(got: Columns, want: Columns): number {
  let largest = 0;
  for (const key of ['cost', 'outcome'] as const) {
    got[key].forEach((column, s) => {
      column.forEach((value, i) => {
        const other = want[key][s]![i] as number;
        largest = Math.max(largest, Math.abs(value - other) / Math.abs(other));
      });
    });
  }
  return largest;
}

/** Peak memory of 10,000 draws of the largest example, in a process of its own. */
function memory() {
  const args = ['--import', 'tsx', 'scripts/bench-memory.ts', String(MEMORY_DRAWS)];
  return JSON.parse(execFileSync(process.execPath, args, { encoding: 'utf8' })) as {
    peakMegabytes: number;
    baselineMegabytes: number;
  };
}

const result = {
  headline: headline(),
  memory: { example: 'keeping-hearts-well', draws: MEMORY_DRAWS, ...memory() },
};
if (process.argv.includes('--json')) {
  console.log(JSON.stringify(result, null, 2));
} else {
  const { ms, handWrittenMs, ratio } = result.headline;
  const { peakMegabytes, baselineMegabytes } = result.memory;
  console.log(`Bench model, ${SAMPLES} draws, drawing excluded (medians of ${ROUNDS} in turn)`);
  console.log(`  general engine     ${ms.toFixed(2)} ms`);
  console.log(`  hand-written loop  ${handWrittenMs.toFixed(2)} ms`);
  console.log(`  ratio              ${ratio.toFixed(2)} (bound: 5)`);
  console.log(`keeping-hearts-well, ${MEMORY_DRAWS} draws`);
  console.log(`  peak memory        ${peakMegabytes.toFixed(0)} MB (bound: 300)`);
  console.log(`  before the run     ${baselineMegabytes.toFixed(0)} MB`);
}
