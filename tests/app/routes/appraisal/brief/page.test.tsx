import { render, screen } from '@testing-library/react';
import { createMemoryRouter, Outlet, RouterProvider } from 'react-router-dom';
import { expect, it } from 'vitest';
import { error, type Issue } from '../../../../../shared/model/issue.ts';
import { Component } from '../../../../../src/routes/appraisal/brief/page.tsx';
import { tinyDocument } from '../../../../fixtures/tiny-document.ts';
import { withWords } from '../../../setup.ts';

withWords();

function open(issues: readonly Issue[]) {
  const context = {
    ...{ slug: 'tiny', document: tinyDocument(), issues },
    ...{ result: null, language: 'en' },
  };
  const router = createMemoryRouter([
    {
      path: '/',
      element: <Outlet context={context} />,
      children: [{ index: true, Component }],
    },
  ]);
  return render(<RouterProvider router={router} />).container;
}

it('a broken model has no page: what is broken is said instead', async () => {
  const page = open([error('run.brokeDown'), error('analysis.notFinite')]);
  await screen.findByText('There is no page to print');
  expect(page.textContent).toContain('The model has 2 errors');
  expect(page.querySelector('.sheet')).toBeNull();
  expect(screen.queryByRole('button', { name: 'Print the page' })).toBeNull();
});

it('waits for the first answer', async () => {
  open([]);
  expect((await screen.findByRole('status')).textContent).toContain('being drafted');
});
