import type { ModelDocument } from '../document.ts';
import { applyEdits } from './apply.ts';
import type { Edit } from './edit.ts';

/** Steps that each go on from the document that the ones before them leave, as one edit. */
export function inTurn(
  document: ModelDocument,
  ...steps: readonly ((document: ModelDocument) => readonly Edit[])[]
): Edit[] {
  let current = document;
  return steps.flatMap((step) => {
    const edits = step(current);
    current = applyEdits(current, edits).document;
    return [...edits];
  });
}
