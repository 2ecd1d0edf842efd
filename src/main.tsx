import './styles/app.css';
import { QueryClient, QueryClientProvider } from '@tanstack/react-query';
import { StrictMode } from 'react';
import { createRoot } from 'react-dom/client';
import { RouterProvider } from 'react-router-dom';
import { startWords } from './i18n/i18n.ts';
import { startUpdates } from './pwa/updates.ts';
import { createRouter } from './router.tsx';
import { getSettings } from './store/settings.ts';
import { followTheme } from './store/theme.ts';

const queries = new QueryClient({
  defaultOptions: {
    // Everything is read on this device: being offline is no reason to wait.
    queries: { networkMode: 'always', staleTime: Number.POSITIVE_INFINITY, retry: false },
  },
});

function start(): void {
  const root = document.getElementById('root');
  if (!root) return;
  createRoot(root).render(
    <StrictMode>
      <QueryClientProvider client={queries}>
        <RouterProvider router={createRouter()} />
      </QueryClientProvider>
    </StrictMode>,
  );
  startUpdates();
}

followTheme();
startWords(getSettings().language).then(start);
