/**
 *   stepEdits(list, at, id, by): Edit[]
 *
 * Moves an item one place up (-1) or down (1) in its list; no edit at the ends.
 */
import type { Edit, Place } from './edit.ts';

export function stepEdits(
  list: readonly { readonly id: string }[],
  at: Place,
  id: string,
  by: -1 | 1,
): Edit[] {
  const index = list.findIndex((item) => item.id === id);
  const target = index + by;
  if (index < 0 || target < 0 || target >= list.length) return [];
  const before = list[by < 0 ? target : target + 1]?.id ?? null;
  return [{ type: 'move', at, id, before }];
}
