import { render } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import type { ReactNode } from 'react';
import { createMemoryRouter, RouterProvider } from 'react-router-dom';
import { makeQueryClient } from '../api-client/query-client';
import type { Me } from '../api-client/session';
import { ME_KEY } from '../api-client/session';
import { Providers } from '../app/providers';
import { DraftOwner } from '../shared-ui/draft-owner';

export const TAMSIN: Me = {
  id: '6b1f0a52-7d2c-4c1e-9d0e-2f6a3f7b9c01',
  name: 'Tamsin Ardley',
  email: 'member@larkmoor.example',
  roles: ['member'],
  sharedDevice: false,
};

interface Options {
  /** Who is signed in; null for nobody. */
  me?: Me | null;
  /** Address shown, with its query. */
  at?: string;
  /** Route pattern when the page reads parameters: '/build/:buildId'. */
  path?: string;
}

/** Renders with theme, queries, router and a signed-in person, as the frame would. */
export function renderPage(page: ReactNode, { me = TAMSIN, at = '/', path = '*' }: Options = {}) {
  const queryClient = makeQueryClient();
  queryClient.setDefaultOptions({ queries: { ...queryClient.getDefaultOptions().queries, retry: false } });
  queryClient.setQueryData(ME_KEY, me);
  const router = createMemoryRouter(
    [
      { path, element: <DraftOwner value={me?.id ?? 'nobody'}>{page}</DraftOwner> },
      ...(path === '*' ? [] : [{ path: '*', element: null }]),
    ],
    { initialEntries: [at] },
  );
  const view = render(
    <Providers queryClient={queryClient}>
      <RouterProvider router={router} />
    </Providers>,
  );
  return { ...view, user: userEvent.setup(), router, queryClient };
}
