/**
 *   removalOf(document, target): Removal
 *   removalOf(document, target, { replace: true }): Removal
 *
 * What removing a thing takes. What formulas use is not removed from under them: the
 * answer says where it is used, and whether its value can take its place (`replace`).
 */
import type { ModelDocument } from '../../model/document.ts';
import type { Edit, Json } from '../../model/edit/edit.ts';
import { formulaEdits } from '../../model/edit/formula-sites.ts';
import { inTurn } from '../../model/edit/in-turn.ts';
import { referencesTo } from '../../model/edit/references-to.ts';
import { removeProfile } from '../../model/edit/remove-profile.ts';
import { removeState } from '../../model/edit/remove-state.ts';
import { removeStrategy } from '../../model/edit/remove-strategy.ts';
import { itemsOf, listOf, type Target } from '../../model/edit/target.ts';
import { dissolveGroup, leaveGroups } from '../../model/edit/ungroup.ts';
import type { Use } from '../../model/edit/use.ts';
import { replacementOf } from './replacement.ts';
import { isNamed, type Named } from './symbols.ts';
import { formulaUses } from './uses.ts';

export type Removal =
  | {
      readonly possible: true;
      /** To be applied as one. */
      readonly edits: Edit[];
      /** What goes, or is changed, along with it. */
      readonly along: Use[];
    }
  | {
      readonly possible: false;
      /** `lastOne`: a model needs one of them. `inUse`: by the formulas in `uses`. */
      readonly why: 'unknown' | 'lastOne' | 'inUse';
      readonly uses: Use[];
      /** Whether `replace` would do: its value takes its place in each of them. */
      readonly replaceable: boolean;
    };

export function removalOf(
  document: ModelDocument,
  target: Target,
  { replace = false }: { readonly replace?: boolean } = {},
): Removal {
  if (!itemsOf(document, target.what).some(({ id }) => id === target.id)) return refused('unknown');
  if (isNamed(target)) return namedRemoval(document, target, replace);
  const edits = unnamedEdits(document, target);
  if (!edits) return refused('lastOne');
  return { possible: true, edits, along: referencesTo(document, target) };
}

function refused(why: 'unknown' | 'lastOne'): Removal {
  return { possible: false, why, uses: [], replaceable: false };
}

const gone = ({ what, id }: Target): Edit => ({ type: 'remove', at: listOf(what), id });

function unnamedEdits(document: ModelDocument, target: Target): Edit[] | null {
  const { what, id } = target;
  switch (what) {
    case 'strategy':
      return removeStrategy(document, id);
    case 'state':
      return removeState(document, id);
    case 'profile':
      return removeProfile(document, id);
    case 'group':
      return dissolveGroup(document, id);
    case 'threshold':
      return thresholdEdits(document, target);
    default:
      return [gone(target)];
  }
}

function thresholdEdits({ question }: ModelDocument, target: Target): Edit[] | null {
  if (question.thresholds.length === 1) return null;
  if (question.thresholdInForce !== target.id) return [gone(target)];
  return [gone(target), { type: 'unset', at: ['question', 'thresholdInForce'] }];
}

function namedRemoval(document: ModelDocument, named: Named, replace: boolean): Removal {
  // An override of the variable itself goes along; what it says is nobody's use.
  const bare = inTurn(document, (current) => referenceEdits(current, named));
  const along = referencesTo(document, named);
  const uses = formulaUses(document, named).filter(({ place }) => !isOwn(place, named));
  if (uses.length === 0) return { possible: true, edits: [...bare, gone(named)], along };
  const change = replacementOf(document, named);
  const inUse: Removal = { possible: false, why: 'inUse', uses, replaceable: change !== null };
  if (!replace || !change) return inUse;
  const edits = inTurn(
    document,
    (current) => referenceEdits(current, named),
    (current) => formulaEdits(current, change),
    () => [gone(named)],
  );
  return { possible: true, edits, along: [...uses, ...along] };
}

function isOwn(place: Use['place'], { what, id }: Named): boolean {
  const [list, item] = place;
  return what === 'variable' && list === 'variables' && typeof item === 'object' && item.id === id;
}

function referenceEdits(document: ModelDocument, { what, id }: Named): Edit[] {
  switch (what) {
    case 'parameter':
      return [...leaveGroups(document, id), ...withoutOverrides(document, what, id)];
    case 'variable':
      return withoutOverrides(document, what, id);
    case 'covariate':
      return document.profiles.map((profile) => {
        return { type: 'unset', at: ['profiles', { id: profile.id }, 'covariates', id] };
      });
    case 'table':
      return [];
  }
}

function withoutOverrides(
  { scenarios }: ModelDocument,
  type: 'parameter' | 'variable',
  id: string,
): Edit[] {
  return scenarios.flatMap(({ id: scenario, overrides }): Edit[] => {
    const left = overrides.filter((each) => each.type !== type || each[type] !== id);
    if (left.length === overrides.length) return [];
    return [{ type: 'set', at: ['scenarios', { id: scenario }, 'overrides'], value: left as Json }];
  });
}
