/**
 *   addTable(document, { label, symbol?, keys, values?, interpolation? }): Added
 *
 * A new table to look values up in; all 0 where no values are given.
 */
import type { ModelDocument, Table } from '../../model/document.ts';
import { type Added, adding, newId } from '../../model/edit/add.ts';
import { freshSymbol } from './symbols.ts';

export interface NewTable {
  readonly label: string;
  readonly symbol?: string;
  /** One or two, each a list of strictly rising points. */
  readonly keys: Table['keys'];
  /** Row by row: the second key varies fastest. */
  readonly values?: readonly number[];
  readonly interpolation?: Table['interpolation'];
}

export function addTable(document: ModelDocument, fields: NewTable): Added {
  const { label, symbol = freshSymbol(document, label), keys, interpolation = 'step' } = fields;
  const size = keys.reduce((product, { points }) => product * points.length, 1);
  const values = [...(fields.values ?? new Array<number>(size).fill(0))];
  const id = newId(document, 'table', label);
  return {
    id,
    edits: [adding('table', { id, symbol, label, keys, values, interpolation } as Table)],
  };
}
