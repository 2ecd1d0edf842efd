import { act, renderHook, waitFor } from '@testing-library/react';
import { afterEach, describe, expect, it } from 'vitest';
import { AppDatabase, database } from '../../../src/store/database.ts';
import {
  closeSessions,
  openAppraisal,
  openedSession,
  showDocument,
  useOpenAppraisal,
} from '../../../src/store/open-sessions.ts';
import { useSessionState } from '../../../src/store/session.ts';
import { tinyDocument } from '../../fixtures/tiny-document.ts';
import { madeAppraisal, openTab, setTitle } from './support.ts';

afterEach(closeSessions);

const EXAMPLE = 'keeping-hearts-well';

describe('the sessions of a tab', () => {
  it('are one for each address', async () => {
    const db = openTab();
    const id = await madeAppraisal(db);
    const [one, two] = await Promise.all([openAppraisal(id, db), openAppraisal(id, db)]);
    expect(one).not.toBeNull();
    expect(two).toBe(one);
    expect(openedSession(id, db)).toBe(one);
    expect(await openAppraisal('nobody', db)).toBeNull();
  });

  it('show an example, which moves to an address of its own at the first edit', async () => {
    const db = openTab();
    const shown = await openAppraisal(EXAMPLE, db);
    expect(await openAppraisal(EXAMPLE, db)).toBe(shown);
    await shown?.edit(setTitle('Mine'), 'Title');
    const id = shown?.getState().appraisal?.id ?? '';
    expect(openedSession(id, db)).toBe(shown);
    const fresh = await openAppraisal(EXAMPLE, db);
    expect(fresh).not.toBe(shown);
    expect(fresh?.getState().appraisal).toBeNull();
    expect(fresh?.getState().document.question.title).not.toBe('Mine');
  });

  it('are let go when nobody looks, but never with work that is not kept', async () => {
    const db = openTab();
    const first = await madeAppraisal(db);
    await openAppraisal(first, db);
    const closed = new AppDatabase('barred');
    closed.close();
    const origin = { document: tinyDocument(), source: 'file' } as const;
    const stuck = showDocument('stuck', origin, closed);
    await stuck.edit(setTitle('Unkept'), 'Title');
    for (let i = 0; i < 10; i++) await openAppraisal(await madeAppraisal(db), db);
    expect(openedSession(first, db)).toBeNull();
    expect(openedSession('stuck', closed)).toBe(stuck);
  });

  it('are opened by a page, which follows the edits', async () => {
    const id = await madeAppraisal(database());
    const { result } = renderHook(() => useOpenAppraisal(id));
    expect(result.current.status).toBe('opening');
    await waitFor(() => expect(result.current.status).toBe('open'));
    if (result.current.status !== 'open') throw new Error('open');
    const { session } = result.current;
    const state = renderHook(() => useSessionState(session));
    await act(() => session.edit(setTitle('Seen'), 'Title'));
    expect(state.result.current.document.question.title).toBe('Seen');
    const missing = renderHook(() => useOpenAppraisal('nobody'));
    await waitFor(() => expect(missing.result.current.status).toBe('missing'));
    await closeSessions();
    await database().delete();
  });
});
