/**
 *   removeProfile(document, id): Edit[] | null
 *
 * The others take over its share, each in proportion to its own. Null where it is the
 * only one.
 */
import type { ModelDocument } from '../document.ts';
import { shareEdits } from './add-profile.ts';
import type { Edit } from './edit.ts';

export function removeProfile({ profiles }: ModelDocument, id: string): Edit[] | null {
  const others = profiles.filter((profile) => profile.id !== id);
  if (others.length === 0) return null;
  const left = others.reduce((sum, { share }) => sum + share, 0);
  const shareOf = ({ share }: { readonly share: number }) =>
    left > 0 ? share / left : 1 / others.length;
  return [{ type: 'remove', at: ['profiles'], id }, ...shareEdits(others, shareOf)];
}
