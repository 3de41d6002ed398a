// Before any contract is made.
import './app/contentPolicy.ts';
import { StrictMode } from 'react';
import { createRoot } from 'react-dom/client';
import { RouterProvider } from 'react-router-dom';
import { reportClientError } from './api/clientErrors.ts';
import { Providers } from './app/Providers.tsx';
import { router } from './router.tsx';
import './styles.css';
import './board.css';

window.addEventListener('error', (event) => reportClientError(event.error, location.pathname));
window.addEventListener('unhandledrejection', (event) =>
  reportClientError(event.reason, location.pathname),
);

const root = document.getElementById('root');
if (root)
  createRoot(root).render(
    <StrictMode>
      <Providers>
        <RouterProvider router={router} />
      </Providers>
    </StrictMode>,
  );
