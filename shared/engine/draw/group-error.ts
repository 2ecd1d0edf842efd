/** The error of a group that cannot be drawn. */
import type { Group } from '../../model/document.ts';
import { DocumentError, error } from '../../model/issue.ts';

export function groupError(code: string, group: Group, params = {}): DocumentError {
  return new DocumentError([error(code, ['groups', group.id], { group: group.label, ...params })]);
}
