import { useEffect, useMemo, useState } from 'react';
import { useTranslation } from 'react-i18next';
import { useLocation, useNavigate } from 'react-router-dom';
import type { ModelDocument } from '../../../shared/model/document.ts';
import { useConnection } from '../../store/connection.ts';
import { type Levers, type Override, withLevers } from '../../store/levers.ts';
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
  const levers = useLevers();
  const document = useLevered(state.document, levers);
  // All moves of levers are one step after the model's own: "was" is the model as it is.
  const step = document === state.document ? state.step : state.step + 0.5;
  const live = useLiveAnswer(document, step);
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
      <Workbench slug={state.appraisal?.id ?? address} live={live} levers={levers} />
    </SessionContext>
  );
}

function useLevers(): Levers {
  const [overrides, set] = useState<readonly Override[]>([]);
  return useMemo(() => ({ overrides, set }), [overrides]);
}

/** The draft with the levers in force; the draft itself where there are none. */
function useLevered(document: ModelDocument, { overrides }: Levers): ModelDocument {
  const { t } = useTranslation();
  const reason = t('levers.reason');
  return useMemo(() => withLevers(document, overrides, reason), [document, overrides, reason]);
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
