import { configure, screen, waitFor, within } from '@testing-library/react';
import { http, HttpResponse } from 'msw';
import { beforeEach, describe, expect, it, vi } from 'vitest';
import type { components } from '../../../api-client/schema';
import { asPhone } from '../../../testing/as-phone';
import { renderPage, TAMSIN } from '../../../testing/render';
import { server } from '../../../testing/server';
import BenchBookPage from './BenchBookPage';

type Schemas = components['schemas'];

// Whole pages on a shared machine: patience, not precision.
vi.setConfig({ testTimeout: 30_000 });
configure({ asyncUtilTimeout: 8000 });

const BENCH: Schemas['BenchDto'] = { id: 'b3', tag: 'Bench 3', name: 'Middle row', position: 3 };
const analyzer = (overrides: Partial<Schemas['InstrumentDto']> = {}): Schemas['InstrumentDto'] => ({
  id: 'i31',
  tag: 'FR-031',
  name: 'Spectrum analyzer',
  position: 1,
  kind: { id: 'k1', name: 'Spectrum analyzer', needsClearance: true, needsCalibration: true },
  condition: 'ready',
  conditionNote: '',
  calibrationDueOn: '2026-12-09',
  damageLevelDbm: 20,
  amplitudeAccuracyDb: 0.8,
  figures: { amplitudeAccuracyDb: 0.8 },
  myClearance: { grantedOn: '2026-01-01', until: null },
  mayBook: true,
  reasons: [],
  ...overrides,
});
const VECTOR = analyzer({
  id: 'i14',
  tag: 'FR-014',
  name: 'Vector analyzer',
  position: 2,
  mayBook: false,
  myClearance: null,
  reasons: [
    { code: 'not cleared', reason: 'Clearance needed.', remedy: 'Ask a steward to clear you on it.' },
  ],
});
const booking = (overrides: Partial<Schemas['BookingDto']> = {}): Schemas['BookingDto'] => ({
  id: 'k1',
  kind: 'session',
  title: '',
  personId: 'lena',
  personName: 'Lena Quist',
  mine: false,
  groupId: null,
  groupName: null,
  resources: [{ id: 'b3', kind: 'bench', tag: 'Bench 3', name: 'Middle row' }],
  startsAt: '2026-10-17T13:00:00Z',
  endsAt: '2026-10-17T15:00:00Z',
  madeAt: '2026-10-15T12:12:00Z',
  checkId: null,
  mayCancel: false,
  ...overrides,
});

const page = <T,>(items: T[]) => HttpResponse.json({ items, total: items.length, page: 1, perPage: 200 });

describe('the Bench book', () => {
  let bookings: Schemas['BookingDto'][];
  let sent: unknown[];

  beforeEach(() => {
    vi.useFakeTimers({ now: new Date('2026-10-15T12:12:00Z'), toFake: ['Date'] });
    bookings = [];
    sent = [];
    server.use(
      http.get('*/api/benches', () => page([BENCH])),
      http.get('*/api/instruments', () => page([analyzer(), VECTOR])),
      http.get('*/api/bookings', () => HttpResponse.json(bookings)),
      http.get('*/api/groups/mine', () => HttpResponse.json([])),
      http.get('*/api/builds/mine', () => HttpResponse.json([])),
      http.post('*/api/bookings', async ({ request }) => {
        sent.push(await request.json());
        return HttpResponse.json(booking({ mine: true, mayCancel: true }), { status: 201 });
      }),
    );
    return () => {
      vi.useRealTimers();
      vi.unstubAllGlobals();
    };
  });
  const refuseWith = (status: number, body: object) =>
    server.use(
      http.post('*/api/bookings', async ({ request }) => {
        sent.push(await request.json());
        return HttpResponse.json(body, { status, headers: { 'content-type': 'application/problem+json' } });
      }),
    );
  const openForm = async (at = '/bench-book') => {
    const view = renderPage(<BenchBookPage />, { at });
    await view.user.click(await screen.findByRole('button', { name: 'Book a bench' }));
    return view;
  };
  const retype = async (user: ReturnType<typeof renderPage>['user'], label: string, text: string) => {
    const field = screen.getByLabelText(label);
    await user.clear(field);
    await user.type(field, text);
  };

  it('says of a half hour of a lane who has it until when, or that it is free', async () => {
    bookings = [booking({ startsAt: '2026-10-15T13:00:00Z', endsAt: '2026-10-15T13:30:00Z' })];
    renderPage(<BenchBookPage />, { at: '/bench-book?show=Bench%203' });
    const taken = 'Thu 15 Oct 14:00, Bench 3, Lena Quist until 14:30';
    expect(await screen.findByRole('gridcell', { name: taken })).toBeInTheDocument();
    expect(screen.getByRole('gridcell', { name: 'Thu 15 Oct 14:30, Bench 3, free' })).toBeInTheDocument();
    expect(screen.getByRole('heading', { level: 1 })).toHaveTextContent('12 to 18 October');
  });

  it('has one tab stop in the lanes: arrows move, Shift stretches, N fills the form', async () => {
    const { user } = renderPage(<BenchBookPage />, { at: '/bench-book' });
    const grid = await screen.findByRole('grid');
    grid.focus();
    const active = () => document.getElementById(grid.getAttribute('aria-activedescendant') ?? '')?.ariaLabel;
    expect(active()).toBe('Thu 15 Oct 14:00, Bench 3, free');
    await user.keyboard('{ArrowRight}{ArrowRight}{ArrowDown}');
    expect(active()).toBe('Fri 16 Oct 14:30, Bench 3, free');
    await user.keyboard('{Shift>}{ArrowDown}{ArrowDown}{/Shift}n');
    expect(await screen.findByLabelText('From')).toHaveValue('14:30');
    expect(screen.getByLabelText('To')).toHaveValue('16:00');
    expect(screen.getByLabelText('Day')).toHaveValue('2026-10-16');
  });

  it('opens a booking from its cell by Enter, and says whose it is', async () => {
    bookings = [booking({ startsAt: '2026-10-15T13:00:00Z', endsAt: '2026-10-15T15:00:00Z' })];
    const { user } = renderPage(<BenchBookPage />, { at: '/bench-book' });
    (await screen.findByRole('grid')).focus();
    await user.keyboard('{Enter}');
    const drawer = await screen.findByRole('complementary', { name: 'Lena Quist' });
    expect(drawer).toHaveTextContent('Thu 15 Oct, 14:00 to 16:00');
    expect(within(drawer).queryByRole('button', { name: /Cancel/ })).not.toBeInTheDocument();
  });

  it('shows the same week as a list, and the choice is in the address', async () => {
    bookings = [booking()];
    const { user, router } = renderPage(<BenchBookPage />, { at: '/bench-book' });
    await user.click(await screen.findByRole('button', { name: 'Table' }));
    const row = await screen.findByRole('row', {
      name: /Sat 17 Oct, 14:00 to 16:00.*Lena Quist.*Bench 3.*2 h/,
    });
    expect(row).toBeInTheDocument();
    expect(router.state.location.search).toBe('?view=list');
  });

  it('books bench and instrument together, in the club’s wall time', async () => {
    const { user } = await openForm();
    await user.click(await screen.findByRole('checkbox', { name: /FR-031/ }));
    await retype(user, 'From', '14:00');
    await retype(user, 'To', '16:30');
    await user.click(screen.getByRole('button', { name: 'Book 14:00 to 16:30' }));
    await waitFor(() => expect(sent).toHaveLength(1));
    expect(sent[0]).toEqual({
      resourceIds: ['b3', 'i31'],
      startsAt: '2026-10-15T13:00:00Z',
      endsAt: '2026-10-15T15:30:00Z',
    });
    expect(await screen.findByText(/^Booked Bench 3/)).toBeInTheDocument();
  });

  it('lets nobody tick an instrument they may not use, and says why in its row', async () => {
    await openForm();
    const row = await screen.findByRole('checkbox', { name: /FR-014/ });
    expect(row).toBeDisabled();
    expect(row).toHaveAccessibleDescription('Clearance needed. Ask a steward to clear you on it.');
  });

  it('keeps the form after a lost race, names who has it, and books a free time by one press', async () => {
    const { user } = await openForm();
    const free = { startsAt: '2026-10-15T15:00:00Z', endsAt: '2026-10-15T17:00:00Z' };
    const detail = 'Bench 3 went to Lena Quist, Thu 15 Oct, 14:00 to 16:00.';
    refuseWith(409, {
      type: '/problems/booking-overlap',
      status: 409,
      title: 'x',
      detail,
      nearestFree: [free],
    });
    await retype(user, 'From', '14:00');
    await retype(user, 'To', '16:00');
    await user.click(screen.getByRole('button', { name: 'Book 14:00 to 16:00' }));
    const alert = await screen.findByRole('alert');
    expect(alert).toHaveTextContent(`The booking was not made. ${detail} Your times are still in the form.`);
    expect(screen.getByLabelText('From')).toHaveValue('14:00');
    await user.click(screen.getByRole('button', { name: 'Book Thu 15 Oct, 16:00 to 18:00' }));
    await waitFor(() => expect(sent).toHaveLength(2));
    expect(sent[1]).toMatchObject({ resourceIds: ['b3'], ...free });
  });

  it('puts the API’s words at the field and at the instrument they are about', async () => {
    const { user } = await openForm();
    await user.click(await screen.findByRole('checkbox', { name: /FR-031/ }));
    refuseWith(422, {
      type: '/problems/not-bookable',
      detail: 'all',
      errors: [
        { pointer: '#/endsAt', detail: 'Choose an earlier end.' },
        { pointer: '#/resourceIds/1', detail: 'FR-031 is in repair.' },
      ],
    });
    await user.click(screen.getByRole('button', { name: /^Book \d/ }));
    expect(await screen.findByText('Choose an earlier end.')).toBeInTheDocument();
    expect(screen.getByRole('checkbox', { name: /FR-031/ })).toHaveAccessibleDescription(
      'FR-031 is in repair.',
    );
  });

  it('refuses an end before the start without asking the server', async () => {
    const { user } = await openForm();
    await retype(user, 'From', '16:00');
    await retype(user, 'To', '14:00');
    await user.click(screen.getByRole('button', { name: 'Book' }));
    expect(await screen.findByText(/It ends before it has begun/)).toBeInTheDocument();
    expect(sent).toEqual([]);
  });

  it('keeps what was typed when the page is left, and says from when it is', async () => {
    const { user, unmount } = await openForm();
    await retype(user, 'From', '17:15');
    unmount();
    await openForm();
    expect(screen.getByLabelText('From')).toHaveValue('17:15');
    expect(screen.getByText('Kept from 13:12')).toBeInTheDocument();
  });

  it('gives the focus back to the button that opened the form, when it is closed', async () => {
    const { user } = await openForm();
    await user.keyboard('{Escape}');
    expect(await screen.findByRole('button', { name: 'Book a bench' })).toHaveFocus();
  });

  it('comes filled in from the check that needs an instrument', async () => {
    const { user } = renderPage(<BenchBookPage />, { at: '/bench-book?check=c9&need=Spectrum%20analyzer' });
    expect(await screen.findByRole('checkbox', { name: /FR-031/ })).toBeChecked();
    await user.click(screen.getByRole('button', { name: /^Book \d/ }));
    await waitFor(() => expect(sent[0]).toMatchObject({ checkId: 'c9', resourceIds: ['b3', 'i31'] }));
  });

  it('cancels one’s own booking without asking and offers to undo it', async () => {
    const mine = booking({ id: 'mine', mine: true, mayCancel: true, personName: TAMSIN.name });
    bookings = [mine];
    const cancelled: string[] = [];
    server.use(
      http.delete('*/api/bookings/:id', ({ params }) => {
        cancelled.push(String(params.id));
        bookings = [];
        return new HttpResponse(null, { status: 204 });
      }),
    );
    const { user } = renderPage(<BenchBookPage />, { at: '/bench-book?view=list' });
    await user.click(await screen.findByRole('button', { name: /Sat 17 Oct/ }));
    await user.click(await screen.findByRole('button', { name: 'Cancel the booking' }));
    expect(await screen.findByText('An open week')).toBeInTheDocument();
    expect(cancelled).toEqual(['mine']);
    await user.click(screen.getByRole('button', { name: 'Undo' }));
    await waitFor(() => expect(sent).toMatchObject([{ resourceIds: ['b3'], startsAt: mine.startsAt }]));
  });

  describe('of a club that is open on Thursdays and Saturdays', () => {
    const hours = [
      { weekday: 4, opensMinute: 720, closesMinute: 1320 },
      { weekday: 6, opensMinute: 600, closesMinute: 1200 },
    ];
    beforeEach(() =>
      server.use(
        http.get('*/api/club', () =>
          HttpResponse.json({ timeZone: 'Europe/London', currency: 'GBP', openingHours: hours }),
        ),
      ),
    );
    const closed = 'The workshop is closed at that time. Agree with an organiser who opens it.';

    it('hatches what is closed, says it of each half hour, and draws no hour outside', async () => {
      const { user } = renderPage(<BenchBookPage />, { at: '/bench-book?day=2026-10-16' });
      const grid = await screen.findByRole('grid');
      await waitFor(() => expect(grid).toHaveAttribute('aria-rowcount', String(24 + 2)));
      expect(screen.getAllByTestId('closed-hours')).toHaveLength(5 + 1 + 1);
      grid.focus();
      await user.keyboard('{ArrowRight}{ArrowRight}');
      const words = 'Fri 16 Oct 14:00, Bench 3, free, the workshop is closed';
      expect(screen.getByRole('gridcell', { name: words })).toBeInTheDocument();
    });

    it('says before the button that nobody opens then, and still books: some have a key', async () => {
      const { user } = await openForm('/bench-book?day=2026-10-17');
      expect(screen.getByLabelText('Day')).toHaveValue('2026-10-17');
      expect(screen.queryByText(closed)).not.toBeInTheDocument();
      await retype(user, 'From', '19:00');
      await retype(user, 'To', '21:00');
      expect(screen.getByText(closed)).toBeVisible();
      await user.click(screen.getByRole('button', { name: 'Book 19:00 to 21:00' }));
      await waitFor(() => expect(sent).toHaveLength(1));
    });
  });

  it('fills the form in beside the lanes on a phone, which stay in use above it', async () => {
    asPhone();
    const { user } = await openForm('/bench-book?day=2026-10-17');
    const sheet = screen.getByRole('complementary', { name: 'Book a bench' });
    expect(within(sheet).getByRole('heading', { name: 'Bench 3, Sat 17 October' })).toBeVisible();
    expect(screen.getByRole('grid')).toBeInTheDocument();
    await user.click(screen.getByRole('button', { name: 'Friday 16 October' }));
    expect(within(sheet).getByRole('heading', { name: 'Bench 3, Fri 16 October' })).toBeVisible();
    await user.click(within(sheet).getByRole('button', { name: 'Full height' }));
    expect(within(sheet).getByRole('button', { name: 'Half high' })).toBeInTheDocument();
    await user.click(within(sheet).getByRole('button', { name: 'Close Book a bench' }));
    expect(sheet).not.toBeInTheDocument();
  });

  it('says so when the week cannot be loaded, with a way to try again', async () => {
    server.use(http.get('*/api/bookings', () => HttpResponse.json({}, { status: 422 })));
    const { user } = renderPage(<BenchBookPage />, { at: '/bench-book' });
    const again = await screen.findByRole('button', { name: 'Try again' });
    server.use(http.get('*/api/bookings', () => HttpResponse.json([])));
    await user.click(again);
    expect(await screen.findByRole('grid')).toBeInTheDocument();
  });
});
