/** The worked examples as documents, read the one way in, for the tests of this folder. */
import { readFileSync } from 'node:fs';
import { prepare } from '../../shared/engine/engine.ts';
import type { BaseRun, StrategyRun } from '../../shared/engine/results.ts';
import type { ExampleSlug } from '../../shared/examples/slugs.ts';
import type { ModelDocument } from '../../shared/model/document.ts';
import { DocumentError } from '../../shared/model/issue.ts';
import { readDocument } from '../../shared/model/read.ts';

export const EXAMPLES = new URL('../../shared/examples/', import.meta.url);

export function textOf(slug: ExampleSlug): string {
  return readFileSync(new URL(`${slug}.json`, EXAMPLES), 'utf8');
}

export function exampleOf(slug: ExampleSlug): ModelDocument {
  const { document, issues } = readDocument(textOf(slug));
  if (!document) throw new DocumentError(issues);
  return document;
}

/** Base case with its trace. */
export function baseOf(document: ModelDocument): BaseRun {
  return prepare(document).base({ trace: true });
}

export function runOf(base: BaseRun, id: string): StrategyRun {
  const run = base.strategies.find((each) => each.id === id);
  if (!run) throw new RangeError(`strategy ${id}`);
  return run;
}

/** The document with some parameters at other values. */
export function withValues(
  document: ModelDocument,
  values: Readonly<Record<string, number>>,
): ModelDocument {
  for (const id of Object.keys(values)) {
    if (!document.parameters.some((each) => each.id === id)) throw new RangeError(id);
  }
  const parameters = document.parameters.map((each) => ({
    ...each,
    value: values[each.id] ?? each.value,
  }));
  return { ...document, parameters };
}

/** The document with part of its question changed. */
export function asking(
  document: ModelDocument,
  change: Partial<ModelDocument['question']>,
): ModelDocument {
  return { ...document, question: { ...document.question, ...change } };
}

/** The document with other discount rates. */
export function discounting(
  document: ModelDocument,
  rates: { readonly costs?: number; readonly outcomes?: number },
): ModelDocument {
  return asking(document, { discounting: { ...document.question.discounting, ...rates } });
}
