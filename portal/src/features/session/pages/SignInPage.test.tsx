import { screen, waitFor } from '@testing-library/react';
import { http, HttpResponse } from 'msw';
import { renderPage, TAMSIN } from '../../../testing/render';
import { server } from '../../../testing/server';
import { placeToReturnTo } from '../components/place-to-return-to';
import SignInPage from './SignInPage';

const CLUB = {
  name: 'Larkmoor Radio Builders',
  address: 'Millbeck Hall',
  contactEmail: 'desk@larkmoor.example',
  timeZone: 'Europe/London',
  currency: 'GBP',
  demoAccounts: [{ email: 'member@larkmoor.example', role: 'member' }],
};
const noMatch = () =>
  new HttpResponse(
    JSON.stringify({ type: '/problems/wrong-email-or-password', title: 'No match', status: 401, detail: '' }),
    {
      status: 401,
      headers: { 'content-type': 'application/problem+json' },
    },
  );

const open = (club = CLUB) => {
  server.use(http.get('*/api/club', () => HttpResponse.json(club)));
  return renderPage(<SignInPage />, {
    me: null,
    at: '/sign-in?next=%2Fdues%3Fyear%3D2026',
    path: '/sign-in',
  });
};

describe('the sign-in page', () => {
  it('returns to the place that asked for it', async () => {
    const sent: unknown[] = [];
    server.use(
      http.post('*/api/auth/sign-in', async ({ request }) => {
        sent.push(await request.json());
        return new HttpResponse(null, { status: 204 });
      }),
      http.get('*/api/auth/me', () => HttpResponse.json(TAMSIN)),
    );
    const { user, router } = open();
    await user.type(screen.getByLabelText('Email address'), 'member@larkmoor.example');
    await user.type(screen.getByLabelText('Password'), 'larkmoor-demo');
    await user.click(screen.getByRole('checkbox', { name: /shared bench tablet/ }));
    await user.click(screen.getByRole('button', { name: 'Sign in' }));
    await waitFor(() =>
      expect(router.state.location.pathname + router.state.location.search).toBe('/dues?year=2026'),
    );
    expect(sent).toEqual([
      { email: 'member@larkmoor.example', password: 'larkmoor-demo', sharedDevice: true },
    ]);
  });

  it('keeps the email when the password is wrong, and stands ready for another try', async () => {
    server.use(http.post('*/api/auth/sign-in', noMatch));
    const { user } = open();
    await user.type(screen.getByLabelText('Email address'), 'member@larkmoor.example');
    await user.type(screen.getByLabelText('Password'), 'wrong{Enter}');
    expect(await screen.findByRole('alert')).toHaveTextContent(
      'That email and password do not match. Your email is kept.',
    );
    expect(screen.getByLabelText('Email address')).toHaveValue('member@larkmoor.example');
    expect(screen.getByLabelText('Password')).toHaveValue('');
    expect(screen.getByLabelText('Password')).toHaveFocus();
  });

  it('keeps both fields when there is no connection', async () => {
    server.use(http.post('*/api/auth/sign-in', () => HttpResponse.error()));
    const { user } = open();
    await user.type(screen.getByLabelText('Email address'), 'member@larkmoor.example');
    await user.type(screen.getByLabelText('Password'), 'larkmoor-demo{Enter}');
    expect(await screen.findByText('No connection.')).toBeInTheDocument();
    expect(screen.getByLabelText('Password')).toHaveValue('larkmoor-demo');
  });

  it('asks for what is missing before it sends anything', async () => {
    const { user } = open();
    await user.click(screen.getByRole('button', { name: 'Sign in' }));
    expect(await screen.findByText('Type your email address')).toBeInTheDocument();
    expect(screen.getByText('Type your password')).toBeInTheDocument();
  });

  it('shows the password on request', async () => {
    const { user } = open();
    const eye = screen.getByRole('button', { name: 'Show the password' });
    expect(screen.getByLabelText('Password')).toHaveAttribute('type', 'password');
    await user.click(eye);
    expect(screen.getByLabelText('Password')).toHaveAttribute('type', 'text');
  });

  it('lists accounts in the demo club only', async () => {
    const { user, unmount } = open();
    await user.click(await screen.findByRole('button', { name: 'Member' }));
    expect(screen.getByLabelText('Email address')).toHaveValue('member@larkmoor.example');
    unmount();
    open({ ...CLUB, demoAccounts: [] });
    expect(await screen.findByText('desk@larkmoor.example')).toBeInTheDocument();
    expect(screen.queryByText('Demo club')).not.toBeInTheDocument();
  });
});

describe('the way back', () => {
  it.each([
    ['/dues?year=2026', '/dues?year=2026'],
    ['https://elsewhere.example/', '/'],
    ['//elsewhere.example/', '/'],
    ['/\\elsewhere.example', '/'],
    [null, '/'],
  ])('%s leads to %s, never to another site', (next, place) => expect(placeToReturnTo(next)).toBe(place));
});
