/**
 * What a schema cannot say: that the parts of a document fit each other. Takes a
 * document whose shape is sound; looks at no formula's text (see shared/formula).
 */
import { checkGroups } from './check/groups.ts';
import { checkIds } from './check/ids.ts';
import { lookupsOf } from './check/lookups.ts';
import { checkMovements } from './check/movements.ts';
import { checkPayoffs } from './check/payoffs.ts';
import { checkProfiles } from './check/profiles.ts';
import { checkQuestion } from './check/question.ts';
import { checkScenarios } from './check/scenarios.ts';
import { checkSize } from './check/size.ts';
import { checkStart, checkStates } from './check/states.ts';
import { checkTables } from './check/tables.ts';
import { checkVariables } from './check/variables.ts';
import type { ModelDocument } from './document.ts';
import type { Issue } from './issue.ts';

/** Errors and warnings on how a document's parts refer to each other, in document order. */
export function checkReferences(document: ModelDocument): Issue[] {
  const lookups = lookupsOf(document);
  return [
    ...checkIds(document),
    ...checkQuestion(lookups),
    ...checkProfiles(lookups),
    ...checkGroups(lookups),
    ...checkTables(lookups),
    ...checkVariables(lookups),
    ...checkStates(lookups),
    ...checkStart(lookups),
    ...checkMovements(lookups),
    ...checkPayoffs(lookups),
    ...checkScenarios(lookups),
    ...checkSize(lookups),
  ];
}
