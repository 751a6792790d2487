import { QueryClientProvider } from '@tanstack/react-query';
import { StrictMode } from 'react';
import { createRoot } from 'react-dom/client';
import { createBrowserRouter, RouterProvider } from 'react-router-dom';
import { queryClient } from './api/query';
import './index.css';
import { watchSession } from './layouts/watch-session';
import { startLanguage } from './lib/i18n';
import { applyTheme } from './lib/theme';
import { routes } from './routes';

applyTheme();
const router = createBrowserRouter(routes);
watchSession(router);
await startLanguage();

const root = document.getElementById('root');
if (!root) throw new Error('index.html has no #root');
createRoot(root).render(
  <StrictMode>
    <QueryClientProvider client={queryClient}>
      <RouterProvider router={router} />
    </QueryClientProvider>
  </StrictMode>,
);
