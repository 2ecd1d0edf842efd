/** Worked examples as the app opens them; jsdom has no files to read them from. */
import hearts from '../../shared/examples/keeping-hearts-well.json' with { type: 'json' };
import malaria from '../../shared/examples/test-before-treating.json' with { type: 'json' };
import type { ModelDocument } from '../../shared/model/document.ts';
import { DocumentError } from '../../shared/model/issue.ts';
import { readDocument } from '../../shared/model/read.ts';

const EXAMPLES = { 'keeping-hearts-well': hearts, 'test-before-treating': malaria } as const;

export function exampleOf(slug: keyof typeof EXAMPLES): ModelDocument {
  const { document, issues } = readDocument(JSON.stringify(EXAMPLES[slug]));
  if (!document) throw new DocumentError(issues);
  return document;
}
