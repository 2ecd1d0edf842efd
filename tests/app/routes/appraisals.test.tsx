import { fireEvent, render, screen } from '@testing-library/react';
import { createMemoryRouter, RouterProvider } from 'react-router-dom';
import { describe, expect, it } from 'vitest';
import { Component as Appraisals } from '../../../src/routes/appraisals/page.tsx';
import { tinyDocument } from '../../fixtures/tiny-document.ts';
import { withWords } from '../setup.ts';

withWords();

function open() {
  const router = createMemoryRouter([
    { path: '/', Component: Appraisals },
    { path: '/appraisals/:slug/results', element: <p>opened</p> },
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

describe('a file of the reader’s own', () => {
  it('is opened where nothing is wrong with it', async () => {
    const router = open();
    choose(JSON.stringify(tinyDocument()));
    await screen.findByText('opened');
    expect(router.state.location.pathname).toBe('/appraisals/file/results');
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
  });

  it('is refused with the place of what is wrong, by its name', async () => {
    const document = tinyDocument();
    open();
    const parameters = document.parameters.map((parameter) => ({
      ...parameter,
      distribution: { type: 'inGroup', group: 'nowhere' },
    }));
    choose(JSON.stringify({ ...document, parameters }));
    expect((await screen.findAllByText(/There is no group nowhere/)).length).toBeGreaterThan(0);
    expect(screen.getByText(/Probability of dying in a year/)).toBeTruthy();
  });
});
