import { useEffect, useMemo } from 'react';
import { useLocation, useNavigate } from 'react-router-dom';
import { useConnection } from '../../store/connection.ts';
import { useLiveAnswer } from '../../store/live-answer.ts';
import { type Session, type SessionState, useSessionState } from '../../store/session.ts';
import { type OpenedSession, SessionContext } from './session-context.ts';
import { useUndoKeys } from './use-undo-keys.ts';
import { Workbench } from './workbench.tsx';

interface OpenedAppraisalProps {
  readonly session: Session;
  /** How the address names it: by its id, or by an example's name. */
  readonly address: string;
}

export function OpenedAppraisal({ session, address }: OpenedAppraisalProps) {
  const state = useSessionState(session);
  const live = useLiveAnswer(state.document, state.step);
  const { issues } = live;
  const readOnly = useReadOnly(state);
  useOwnAddress(address, state.appraisal?.id);
  useUndoKeys(session);
  const opened = useMemo<OpenedSession>(
    () => ({
      document: state.document,
      issues,
      state,
      session,
      readOnly,
      edit: (edits, label, group) =>
        void session.edit(edits, label, group === undefined ? {} : { group }),
      undo: () => void session.undo(),
      redo: () => void session.redo(),
    }),
    [state, issues, session, readOnly],
  );
  return (
    <SessionContext value={opened}>
      <Workbench slug={state.appraisal?.id ?? address} live={live} />
    </SessionContext>
  );
}

function useReadOnly({ work }: SessionState): boolean {
  const connection = useConnection();
  return connection === 'outdated' || (work.status === 'failed' && work.code === 'store.deleted');
}

/** A worked example that has been edited has an address of its own from then on. */
function useOwnAddress(address: string, id: string | undefined): void {
  const navigate = useNavigate();
  const { pathname } = useLocation();
  useEffect(() => {
    if (id === undefined || id === address) return;
    const step = pathname.slice(`/appraisals/${address}`.length);
    void navigate(`/appraisals/${id}${step}`, { replace: true, state: { keepFocus: true } });
  }, [address, id, navigate, pathname]);
}
