/** Everything that can be said about a document without running it. */
import { checkFormulas } from '../formula/check.ts';
import type { ModelDocument } from '../model/document.ts';
import { hasErrors, type Issue } from '../model/issue.ts';
import { checkReferences } from '../model/references.ts';
import { checkDistribution } from './distributions/check.ts';
import { checkGroups } from './distributions/check-groups.ts';

/** References first: formulas and distributions are only read where those hold. */
export function checkModel(document: ModelDocument): Issue[] {
  const references = checkReferences(document);
  if (hasErrors(references)) return references;
  const distributions = document.parameters.flatMap((parameter, index) =>
    checkDistribution(parameter, ['parameters', index]),
  );
  return [...references, ...checkFormulas(document), ...distributions, ...checkGroups(document)];
}
