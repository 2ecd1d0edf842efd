/**
 * The engine from the command line: a model document in, one JSON object out.
 * It runs the same shared code as the app.
 */
import { existsSync, readFileSync, statSync, writeFileSync } from 'node:fs';
import { fileURLToPath } from 'node:url';
import { type Appraisal, appraise } from '../analysis/appraise.ts';
import { drawParameters } from '../engine/draw/draw.ts';
import { prepare } from '../engine/engine.ts';
import type { ModelDocument } from '../model/document.ts';
import { DocumentError, error } from '../model/issue.ts';
import { MAX_BYTES } from '../model/limits.ts';
import { readDocument } from '../model/read.ts';
import { applyScenario } from '../model/scenario.ts';
import { thresholdInForce } from '../model/threshold.ts';
import { drawsCsv } from './draws-csv.ts';
import { type Options, parseOptions, USAGE } from './options.ts';
import { wordsOf } from './words.ts';

const EXAMPLES = new URL('../examples/', import.meta.url);

/** Text of the document that the options name. */
function textOf({ file, example }: Options): string {
  const path = example === null ? (file as string) : examplePath(example);
  if (!existsSync(path)) throw new DocumentError([error('command.noSuchFile', [], { path })]);
  const { size } = statSync(path);
  if (size > MAX_BYTES) {
    throw new DocumentError([error('document.tooLarge', [], { maximum: MAX_BYTES })]);
  }
  return readFileSync(path, 'utf8');
}

function examplePath(slug: string): string {
  if (!/^[a-z0-9-]+$/.test(slug)) {
    throw new DocumentError([error('command.noSuchExample', [], { slug })]);
  }
  return fileURLToPath(new URL(`${slug}.json`, EXAMPLES));
}

function documentOf(options: Options): ModelDocument {
  const { document, issues } = readDocument(textOf(options));
  if (!document) throw new DocumentError(issues);
  if (options.scenario === null) return document;
  if (!document.scenarios.some(({ id }) => id === options.scenario)) {
    throw new DocumentError([error('command.noSuchScenario', [], { id: options.scenario })]);
  }
  return applyScenario(document, options.scenario);
}

function run(options: Options): Appraisal {
  const document = documentOf(options);
  const { analysis, question } = document;
  const samples = options.samples ?? analysis.samples;
  const sampling = {
    samples,
    seed: options.seed ?? analysis.seed,
    plan: options.plan ?? analysis.plan,
  };
  const engine = prepare(document);
  const appraisal = appraise(document, engine, {
    ...sampling,
    threshold: options.threshold ?? thresholdInForce(question),
    trace: options.trace,
  });
  if (options.draws !== null && samples > 0) {
    const values = drawParameters(document.parameters, document.groups, sampling, 0, samples);
    const draws = engine.simulate(values, 0, samples);
    writeFileSync(options.draws, drawsCsv(document, values, draws));
  }
  return appraisal;
}

/** @returns the exit code: 0, or 2 where there is no result */
export function main(args: readonly string[]): number {
  const { options, issues } = parseOptions(args);
  if (!options) return fail(new DocumentError(issues), true);
  if (options.help) {
    process.stdout.write(`${USAGE}\n`);
    return 0;
  }
  try {
    process.stdout.write(`${JSON.stringify(run(options), null, 2)}\n`);
    return 0;
  } catch (thrown) {
    if (thrown instanceof DocumentError) return fail(thrown, false);
    throw thrown;
  }
}

function fail({ issues }: DocumentError, usage: boolean): number {
  for (const issue of issues) process.stderr.write(`${wordsOf(issue)}\n`);
  if (usage) process.stderr.write(`\n${USAGE}\n`);
  return 2;
}

if (process.argv[1] === fileURLToPath(import.meta.url)) {
  process.exitCode = main(process.argv.slice(2));
}
