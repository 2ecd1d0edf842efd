import { fireEvent, render, screen, waitFor, within } from '@testing-library/react';
import Dexie from 'dexie';
import { IDBKeyRange, indexedDB } from 'fake-indexeddb';
import { createMemoryRouter, RouterProvider } from 'react-router-dom';
import { afterEach, describe, expect, it } from 'vitest';
import { Component as Appraisals } from '../../../src/routes/appraisals/page.tsx';
import { createAppraisal, listAppraisals } from '../../../src/store/appraisals.ts';
import { database } from '../../../src/store/database.ts';
import { closeSessions, openAppraisal } from '../../../src/store/open-sessions.ts';
import { tinyDocument } from '../../fixtures/tiny-document.ts';
import { withWords } from '../setup.ts';

// Whatever was imported first: Dexie looks for the browser's own when it loads.
Object.assign(Dexie.dependencies, { indexedDB, IDBKeyRange });

withWords();
afterEach(async () => {
  await closeSessions();
  await Promise.all(database().tables.map((table) => table.clear()));
});

function open() {
  const router = createMemoryRouter([
    { path: '/', Component: Appraisals },
    { path: '/appraisals/:slug/:step', element: <p>opened</p> },
  ]);
  render(<RouterProvider router={router} />);
  return router;
}

function choose(text: string, name = 'model.json') {
  const picker = document.querySelector('input[type=file]');
  if (!picker) throw new Error('no file picker');
  // jsdom's files cannot be read as browsers' can.
  const file = Object.assign(new File([text], name), { text: async () => text });
  fireEvent.change(picker, { target: { files: [file] } });
}

const click = (name: string | RegExp) => fireEvent.click(screen.getByRole('button', { name }));

describe('the list', () => {
  it('shows each worked example with its decision and what its data are', async () => {
    open();
    const link = await screen.findByRole('link', { name: 'Keeping hearts well' });
    const entry = link.closest('li');
    expect(entry?.textContent).toContain('rheumatic heart disease');
    expect(entry?.textContent).toContain('Invented data');
    expect(entry?.textContent).toContain('4 strategies');
    expect(screen.getByText('Published example')).toBeTruthy();
  });
});

describe('an appraisal of one’s own', () => {
  async function begun(): Promise<string> {
    const document = tinyDocument();
    const question = { ...document.question, title: 'Mine' };
    const { id } = await createAppraisal({ document: { ...document, question }, source: 'empty' });
    open();
    await screen.findByRole('link', { name: 'Mine' });
    return id;
  }

  it('begins from a template and opens at its question', async () => {
    const router = open();
    click(/^Two states/);
    await screen.findByText('opened');
    const [made] = await listAppraisals();
    expect(made?.source).toBe('template:two-state');
    expect(router.state.location.pathname).toBe(`/appraisals/${made?.id}/question`);
  });

  it('is renamed, as an edit of its question', async () => {
    const id = await begun();
    click('Rename: Mine');
    fireEvent.change(screen.getByRole('textbox', { name: 'New title' }), {
      target: { value: 'Ours' },
    });
    click('Rename');
    await screen.findByRole('link', { name: 'Ours' });
    const session = await openAppraisal(id);
    expect(session?.getState().document.question.title).toBe('Ours');
    expect(session?.getState().undo).not.toBeNull();
  });

  it('is copied beside the first', async () => {
    await begun();
    click('Duplicate: Mine');
    await screen.findByRole('link', { name: 'Mine (copy)' });
    expect(screen.getByRole('link', { name: 'Mine' })).toBeTruthy();
  });

  it('is deleted, and brought back', async () => {
    const id = await begun();
    click('Delete: Mine');
    await waitFor(() => expect(screen.queryByRole('link', { name: 'Mine' })).toBeNull());
    const notice = screen.getByText(/Deleted: Mine/);
    fireEvent.click(within(notice).getByRole('button', { name: 'Undo' }));
    await screen.findByRole('link', { name: 'Mine' });
    expect((await listAppraisals()).map((row) => row.id)).toEqual([id]);
  });
});

describe('a file of the reader’s own', () => {
  it('becomes an appraisal where nothing is wrong with it', async () => {
    const router = open();
    choose(JSON.stringify(tinyDocument()));
    await screen.findByText('opened');
    const [made] = await listAppraisals();
    expect(router.state.location.pathname).toBe(`/appraisals/${made?.id}/results`);
  });

  it('is taken in to be mended where its references alone are broken', async () => {
    open();
    const tiny = tinyDocument();
    const parameters = tiny.parameters.map((parameter) => ({
      ...parameter,
      distribution: { type: 'inGroup', group: 'nowhere' },
    }));
    choose(JSON.stringify({ ...tiny, parameters }));
    await screen.findByText('opened');
    expect((await listAppraisals())[0]?.source).toBe('file');
  });

  it.each([
    ['breaks off', '{"format": "steelyard/mo', /not a whole JSON file/],
    ['is something else', '{"format": "another"}', /not a Steelyard model/],
    [
      'lacks what it needs',
      JSON.stringify({ ...tinyDocument(), strategies: [] }),
      /1 items or more/,
    ],
  ])('that %s is refused with the reason', async (_, text, reason) => {
    open();
    choose(text, 'mine.json');
    await screen.findByText(reason);
    expect(screen.getByText(/mine\.json was not opened/)).toBeTruthy();
    expect(await listAppraisals()).toEqual([]);
  });
});
