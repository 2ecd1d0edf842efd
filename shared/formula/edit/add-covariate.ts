/**
 *   addCovariate(document, { label, symbol?, unit?, value? }): Added
 *
 * A new covariate, of the same value (0 where none is given) in every profile.
 */
import type { ModelDocument } from '../../model/document.ts';
import { type Added, adding, newId } from '../../model/edit/add.ts';
import type { Edit } from '../../model/edit/edit.ts';
import { freshSymbol } from './symbols.ts';

export interface NewCovariate {
  readonly label: string;
  readonly symbol?: string;
  readonly unit?: string;
  readonly value?: number;
}

export function addCovariate(document: ModelDocument, fields: NewCovariate): Added {
  const { label, symbol = freshSymbol(document, label), value = 0, ...rest } = fields;
  const id = newId(document, 'covariate', label);
  const inProfiles = document.profiles.map((profile): Edit => {
    return { type: 'set', at: ['profiles', { id: profile.id }, 'covariates', id], value };
  });
  return { id, edits: [adding('covariate', { id, symbol, label, ...rest }), ...inProfiles] };
}
