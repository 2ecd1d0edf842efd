import { createBrowserRouter, Navigate } from 'react-router-dom';
import { Crashed } from './routes/crashed.tsx';
import { NotFound } from './routes/not-found.tsx';
import { Root, RootLoading } from './routes/root.tsx';

export function createRouter() {
  return createBrowserRouter([
    {
      Component: Root,
      ErrorBoundary: Crashed,
      HydrateFallback: RootLoading,
      children: [
        { index: true, lazy: () => import('./routes/appraisals/page.tsx') },
        { path: 'settings', lazy: () => import('./routes/settings/page.tsx') },
        {
          path: 'appraisals/:slug',
          lazy: () => import('./routes/appraisal/layout.tsx'),
          children: [
            { index: true, element: <Navigate to="results" replace /> },
            { path: 'question', lazy: () => import('./routes/appraisal/question/page.tsx') },
            { path: 'evidence', lazy: () => import('./routes/appraisal/evidence/page.tsx') },
            { path: 'model/:section?', lazy: () => import('./routes/appraisal/model/page.tsx') },
            { path: 'results', lazy: () => import('./routes/appraisal/results/page.tsx') },
            {
              path: 'uncertainty',
              lazy: () => import('./routes/appraisal/uncertainty/page.tsx'),
            },
            { path: 'brief', lazy: () => import('./routes/appraisal/brief/page.tsx') },
            { path: 'history', lazy: () => import('./routes/appraisal/history/page.tsx') },
            { path: '*', Component: NotFound },
          ],
        },
        { path: '*', Component: NotFound },
      ],
    },
  ]);
}
