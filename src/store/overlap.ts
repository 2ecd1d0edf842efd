/** Whether two sets of edits touch the same thing, so that one would cover the other. */
import type { Edit, Place } from '../../shared/model/edit/edit.ts';

export function overlap(ours: readonly Edit[], theirs: readonly Edit[]): boolean {
  return ours.some((our) =>
    theirs.some((their) => {
      // Places in a list's order can be taken by two without loss.
      if (our.type === 'move' && their.type === 'move') return false;
      return within(placeOf(our), placeOf(their));
    }),
  );
}

/** What an edit reaches: the field, or the item that it adds, moves or takes away. */
function placeOf(edit: Edit): Place {
  if (edit.type === 'set' || edit.type === 'unset') return edit.at;
  return [...edit.at, { id: edit.type === 'insert' ? edit.item.id : edit.id }];
}

/** One lies within the other. */
function within(a: Place, b: Place): boolean {
  const length = Math.min(a.length, b.length);
  for (let i = 0; i < length; i++) {
    if (nameOf(a[i]) !== nameOf(b[i])) return false;
  }
  return true;
}

/** A field's name and an item's id are told apart. */
function nameOf(step: Place[number] | undefined): string {
  return typeof step === 'object' ? `#${step.id}` : `.${step}`;
}
