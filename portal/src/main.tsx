import '@fontsource-variable/merriweather-sans/wght.css';
import { StrictMode } from 'react';
import { createRoot } from 'react-dom/client';
import { createBrowserRouter, RouterProvider } from 'react-router-dom';
import { makeQueryClient } from './api-client/query-client';
import { Providers } from './app/providers';
import { routes } from './app/routes';

const root = document.getElementById('root');
if (!root) throw new Error('index.html has lost its root element');

createRoot(root).render(
  <StrictMode>
    <Providers queryClient={makeQueryClient()}>
      <RouterProvider router={createBrowserRouter(routes)} />
    </Providers>
  </StrictMode>,
);
