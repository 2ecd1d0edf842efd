/**
 *   duplicate(document, target, label): Added
 *
 * A copy with an id (and symbol) of its own, right after the first. A strategy's copy
 * has its formulas, rows and payoffs; a state's its row and amounts, though nobody goes
 * there yet; a profile's half of its share. A parameter's copy is drawn by itself.
 */
import type { Distribution, ModelDocument } from '../../model/document.ts';
import { type Added, adding, newId } from '../../model/edit/add.ts';
import { addProfile } from '../../model/edit/add-profile.ts';
import { addStrategy } from '../../model/edit/add-strategy.ts';
import { duplicateState } from '../../model/edit/duplicate-state.ts';
import type { Edit } from '../../model/edit/edit.ts';
import { EditError } from '../../model/edit/edit-error.ts';
import { itemsOf, listOf, type Target, type What } from '../../model/edit/target.ts';
import { marginalIn } from '../../model/edit/ungroup.ts';
import { freshSymbol, isNamed } from './symbols.ts';

/** A parameter is drawn in one group at most, so groups have no copies. */
export type Duplicable = Target & { readonly what: Exclude<What, 'group'> };

/** Throws an EditError (`edit.noSuchItem`) where there is no such thing. */
export function duplicate(document: ModelDocument, target: Duplicable, label: string): Added {
  const { what, id } = target;
  const items = itemsOf(document, what);
  const index = items.findIndex((item) => item.id === id);
  if (index < 0) throw new EditError('edit.noSuchItem', listOf(what), { id });
  const before = items[index + 1]?.id ?? null;
  switch (what) {
    case 'strategy':
      return addStrategy(document, { ...document.strategies[index], label, like: id, before });
    case 'profile':
      return addProfile(document, { label, like: id });
    case 'state':
      return duplicateState(document, id, label);
    default:
      return copied(document, target, label, before);
  }
}

function copied(
  document: ModelDocument,
  target: Duplicable,
  label: string,
  before: string | null,
): Added {
  const { what } = target;
  const item = itemsOf(document, what).find(({ id }) => id === target.id);
  const copy = {
    ...item,
    id: newId(document, what, label),
    label,
    ...(isNamed(target) ? { symbol: freshSymbol(document, label) } : {}),
    ...(what === 'parameter' ? { distribution: distributionOf(document, target.id) } : {}),
  };
  return {
    id: copy.id,
    edits: [adding(what, copy, before), ...valueEdits(document, target, copy.id)],
  };
}

function distributionOf({ parameters, groups }: ModelDocument, id: string): Distribution {
  const distribution = parameters.find((each) => each.id === id)?.distribution ?? { type: 'fixed' };
  if (distribution.type !== 'inGroup') return distribution;
  const group = groups.find((each) => each.id === distribution.group);
  const index = group?.members.indexOf(id) ?? -1;
  return (group && index >= 0 ? marginalIn(group, index) : null) ?? { type: 'fixed' };
}

/** A covariate's copy has its values in every profile. */
function valueEdits({ profiles }: ModelDocument, { what, id }: Duplicable, copy: string): Edit[] {
  if (what !== 'covariate') return [];
  return profiles.map((profile) => {
    const at = ['profiles', { id: profile.id }, 'covariates', copy];
    return { type: 'set', at, value: profile.covariates[id] ?? 0 };
  });
}
