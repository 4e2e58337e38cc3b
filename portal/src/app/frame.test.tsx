import { render, screen, waitFor, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { http, HttpResponse } from 'msw';
import { createMemoryRouter, RouterProvider } from 'react-router-dom';
import { makeQueryClient } from '../api-client/query-client';
import type { Me } from '../api-client/session';
import { ME_KEY } from '../api-client/session';
import { addDays, clubDay, instantOf } from '../lib/club-time';
import { dayText } from '../lib/club-time-text';
import { TAMSIN } from '../testing/render';
import { server } from '../testing/server';
import { Providers } from './providers';
import { RequireRole } from './require-role';
import { RequireSession } from './require-session';

const signedOut = () => HttpResponse.json({ type: '/problems/not-signed-in', status: 401 }, { status: 401 });

function open(me: Me | null, at = '/') {
  server.use(
    http.get('*/api/club', () =>
      HttpResponse.json({ name: 'Larkmoor Radio Builders', timeZone: 'Europe/London' }),
    ),
    http.get('*/api/auth/me', () => (me ? HttpResponse.json(me) : signedOut())),
    http.post('*/api/auth/refresh', signedOut),
  );
  const router = createMemoryRouter(
    [
      { path: '/sign-in', element: <p>the sign-in page</p> },
      {
        element: <RequireSession />,
        children: [
          { path: '/', element: <input aria-label="Note" /> },
          { path: '/build', element: <p>the build</p> },
          {
            element: (
              <RequireRole
                role="treasurer"
                page="Treasury"
                forWhom="Treasury is for treasurers."
                instead="Yours are under Dues."
              />
            ),
            children: [{ path: '/treasury', element: <p>the books</p> }],
          },
        ],
      },
    ],
    { initialEntries: [at] },
  );
  const queryClient = makeQueryClient();
  render(
    <Providers queryClient={queryClient}>
      <RouterProvider router={router} />
    </Providers>,
  );
  return { router, queryClient };
}

const pages = async () => (await screen.findAllByRole('navigation', { name: 'Pages' }))[0];

describe('the frame', () => {
  it('sends a stranger to sign-in and remembers the place', async () => {
    const { router } = open(null, '/treasury?month=2026-10');
    await screen.findByText('the sign-in page');
    expect(router.state.location.search).toBe('?next=%2Ftreasury%3Fmonth%3D2026-10');
  });

  it('goes to sign-in when the session ends underneath', async () => {
    const { queryClient, router } = open(TAMSIN, '/build');
    await screen.findByText('the build');
    queryClient.setQueryData(ME_KEY, null);
    await screen.findByText('the sign-in page');
    expect(router.state.location.search).toBe('?next=%2Fbuild');
  });

  it('shows no role page to a member, and a mentor’s under its name', async () => {
    open(TAMSIN);
    expect(await pages()).not.toHaveTextContent('Review queue');
  });

  it('lists role pages under each role', async () => {
    open({ ...TAMSIN, roles: ['member', 'mentor', 'organiser'] });
    expect(await pages()).toHaveTextContent(/OrganiserClub deskMentorReview queue/);
  });

  it('tells who a page is for instead of showing it', async () => {
    open(TAMSIN, '/treasury');
    expect(await screen.findByText('Treasury is for treasurers.')).toBeInTheDocument();
    expect(screen.queryByText('the books')).not.toBeInTheDocument();
  });

  it('follows G and a letter, but never while somebody types', async () => {
    const { router } = open(TAMSIN);
    await userEvent.type(await screen.findByLabelText('Note'), 'gb?');
    expect(screen.getByLabelText('Note')).toHaveValue('gb?');
    expect(router.state.location.pathname).toBe('/');
    (document.activeElement as HTMLElement).blur();
    await userEvent.keyboard('?');
    expect(await screen.findByRole('dialog', { name: 'Keys' })).toBeInTheDocument();
    await userEvent.click(screen.getByRole('button', { name: 'Close' }));
    await waitFor(() => expect(screen.queryByRole('dialog')).not.toBeInTheDocument());
    await userEvent.keyboard('gb');
    await waitFor(() => expect(router.state.location.pathname).toBe('/build'));
  });

  it('leaves the keys alone when the person turned them off', async () => {
    localStorage.setItem('ferrite-letter-keys', 'off');
    const { router } = open(TAMSIN, '/build');
    await screen.findByText('the build');
    await userEvent.keyboard('gt');
    expect(router.state.location.pathname).toBe('/build');
  });

  it('says the news of a page in words under More', async () => {
    const day = addDays(clubDay(), 2);
    const mine = { state: 'coming', line: null };
    const night = { cancelledAt: null, mine, startsAt: instantOf(day, 1140), endsAt: instantOf(day, 1320) };
    server.use(
      http.get('*/api/build-nights', () => HttpResponse.json({ items: [night] })),
      http.get('*/api/groups', () => HttpResponse.json({ items: [{ name: 'Thursday five', mine: true }] })),
      http.get('*/api/instruments', () =>
        HttpResponse.json({ items: [{ condition: 'ready' }, { condition: 'in repair' }] }),
      ),
    );
    open(TAMSIN, '/build');
    await userEvent.click(await screen.findByRole('button', { name: 'More' }));
    const sheet = within(await screen.findByRole('dialog'));
    expect(
      await sheet.findByRole('link', { name: new RegExp(`Build nights ?${dayText(day)}, coming`) }),
    ).toBeVisible();
    expect(await sheet.findByRole('link', { name: /Groups ?Thursday five/ })).toBeVisible();
    expect(await sheet.findByRole('link', { name: /Instruments ?2, one not ready/ })).toBeVisible();
  });

  it('begins with the skip link', async () => {
    open(TAMSIN, '/build');
    await screen.findByText('the build');
    await userEvent.tab();
    expect(screen.getByRole('link', { name: 'Skip to the page' })).toHaveFocus();
  });
});
