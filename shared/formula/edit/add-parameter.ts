/**
 *   addParameter(document, { label, symbol?, unit?, kind?, value? }): Added
 *
 * A new parameter, known for sure until a distribution is chosen, with a source still
 * to be given.
 */
import type { ModelDocument, Parameter } from '../../model/document.ts';
import { type Added, adding, newId } from '../../model/edit/add.ts';
import type { Kind } from '../../model/kinds.ts';
import { freshSymbol } from './symbols.ts';

export interface NewParameter {
  readonly label: string;
  readonly symbol?: string;
  readonly unit?: string;
  readonly kind?: Kind;
  readonly value?: number;
}

export function addParameter(document: ModelDocument, fields: NewParameter): Added {
  const { label, symbol = freshSymbol(document, label), unit = '', kind = 'number' } = fields;
  const value = fields.value ?? NEUTRAL[kind] ?? 0;
  const id = newId(document, 'parameter', label);
  const parameter: Parameter = {
    id,
    symbol,
    label,
    unit,
    kind,
    value,
    distribution: { type: 'fixed' },
    source: { citation: '' },
  };
  return { id, edits: [adding('parameter', parameter)] };
}

/** Values that change nothing where they are put in; 0 for the rest. */
const NEUTRAL: Partial<Record<Kind, number>> = { ratio: 1, utility: 1 };
