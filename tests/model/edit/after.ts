/** Documents after edits, and what is wrong with them, for the tests of operations. */
import { expect } from 'vitest';
import { checkModel } from '../../../shared/engine/check.ts';
import { EXAMPLE_SLUGS, type ExampleSlug } from '../../../shared/examples/slugs.ts';
import { digestOf } from '../../../shared/model/digest.ts';
import type { ModelDocument } from '../../../shared/model/document.ts';
import { applyEdits } from '../../../shared/model/edit/apply.ts';
import type { Edit } from '../../../shared/model/edit/edit.ts';
import { checkDocument } from '../../../shared/model/read.ts';
import { exampleOf } from '../../examples/load.ts';
import { tinyDocument } from '../../fixtures/tiny-document.ts';

/** Applied; that the inverse restores the first digest is asserted on the way. */
export function applied(document: ModelDocument, edits: readonly Edit[]): ModelDocument {
  const { document: changed, inverse } = applyEdits(document, edits);
  expect(digestOf(applyEdits(changed, inverse).document)).toBe(digestOf(document));
  return changed;
}

/** Codes of the errors of shape, references, formulas and distributions. */
export function errorsOf(document: ModelDocument): string[] {
  const { document: read, issues } = checkDocument(document);
  const all = read ? checkModel(read) : issues;
  return all
    .filter(({ severity }) => severity === 'error')
    .map(({ code, path }) => `${code} ${path.join('.')}`);
}

/** Applied, and sound. */
export function soundAfter(document: ModelDocument, edits: readonly Edit[]): ModelDocument {
  const changed = applied(document, edits);
  expect(errorsOf(changed)).toEqual([]);
  return changed;
}

/** The tiny document and the worked examples, by name. */
export const DOCUMENTS: readonly [string, ModelDocument][] = [
  ['tiny', tinyDocument()],
  ...EXAMPLE_SLUGS.map((slug: ExampleSlug): [string, ModelDocument] => [slug, exampleOf(slug)]),
];

/** The same numbers but for the order of sums: to a relative 1e-9. */
export function expectNear(values: readonly number[], expected: readonly number[]): void {
  expect(values).toHaveLength(expected.length);
  for (const [index, value] of values.entries()) {
    const off = Math.abs(value - expected[index]!);
    expect(off).toBeLessThanOrEqual(1e-9 * Math.abs(expected[index]!));
  }
}
