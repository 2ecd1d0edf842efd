/** The appraisal at work, for every step that reads or edits it. */
import { createContext, useContext } from 'react';
import type { ModelDocument } from '../../../shared/model/document.ts';
import type { Edit } from '../../../shared/model/edit/edit.ts';
import type { Issue } from '../../../shared/model/issue.ts';
import type { Session, SessionState } from '../../store/session.ts';

export interface OpenedSession {
  /** The draft as it stands, broken or not: a new object after every edit. */
  readonly document: ModelDocument;
  /** What is wrong with it, errors and warnings, with paths by position; a moment behind. */
  readonly issues: readonly Issue[];
  /** Undo, redo, state of the work, the appraisal's row. */
  readonly state: SessionState;
  /** For what is rarer: versions, going back, notices. */
  readonly session: Session;
  /** Edits would be lost: another tab deleted the appraisal, or holds the database. */
  readonly readOnly: boolean;
  /**
   * Puts edits into force at once and journals them. Edits that do not fit are left out.
   * @param label what was done, in the reader's language, for undo
   * @param group edits that follow each other with the same group (the keystrokes in one
   *   field) are undone together
   */
  readonly edit: (edits: readonly Edit[], label: string, group?: string) => void;
  readonly undo: () => void;
  readonly redo: () => void;
}

export const SessionContext = createContext<OpenedSession | null>(null);

/** @throws Error outside an appraisal */
export function useSession(): OpenedSession {
  const opened = useContext(SessionContext);
  if (!opened) throw new Error('no appraisal is open here');
  return opened;
}
