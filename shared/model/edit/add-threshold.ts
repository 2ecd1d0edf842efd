/**
 *   addThreshold(document, { label, value, source? }): Added
 *
 * One more threshold, in money per unit of the primary outcome; 0 or more.
 */
import type { ModelDocument } from '../document.ts';
import { type Added, adding, newId } from './add.ts';

export interface NewThreshold {
  readonly label: string;
  readonly value: number;
  readonly source?: string;
}

export function addThreshold(document: ModelDocument, fields: NewThreshold): Added {
  const id = newId(document, 'threshold', fields.label);
  return { id, edits: [adding('threshold', { id, ...fields })] };
}
