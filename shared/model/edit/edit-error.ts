import type { IssueParams, Path } from '../issue.ts';
import type { Place } from './edit.ts';

export type EditCode =
  /** A field or list on the way is not there, or is no such thing. */
  | 'edit.noSuchPlace'
  /** The list has no item with this id (params id). */
  | 'edit.noSuchItem'
  /** The list has an item with this id already (params id). */
  | 'edit.idTaken'
  /** Several items of a broken list have this id (params id): set the list whole. */
  | 'edit.idNotUnique'
  /** An item keeps its id for life (params id). */
  | 'edit.idFixed'
  /** An item of a list cannot be unset, and the document not at all. */
  | 'edit.notAField'
  /** A key that reaches into JavaScript objects (params key). */
  | 'edit.hostileKey'
  /** The value is no plain JSON, or cannot stand where it is put. */
  | 'edit.badValue';

/** An edit that does not fit the document: data for the caller, never a message. */
export class EditError extends Error {
  readonly code: EditCode;
  /** The edit's place, ids in the stead of positions. */
  readonly path: Path;
  readonly params: IssueParams;
  constructor(code: EditCode, at: Place, params: IssueParams = {}) {
    super(code);
    this.name = 'EditError';
    this.code = code;
    this.path = at.map((step) => (typeof step === 'string' ? step : step.id));
    this.params = params;
  }
}
