import { screen, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { http, HttpResponse } from 'msw';
import { addDays, clubDay, instantOf } from '../../../lib/club-time';
import { renderPage } from '../../../testing/render';
import { server } from '../../../testing/server';
import type { BuildNight, NightDetail } from '../api/nights';
import BuildNightsPage from './BuildNightsPage';

const NIGHT = '00000000-0000-4000-8000-000000000001';

/** A night of the course in three days, full but for one place. */
function night(change: Partial<NightDetail> = {}): NightDetail {
  const day = addDays(clubDay(), 3);
  return {
    id: NIGHT,
    title: 'Larkmoor Twenty',
    series: { id: 's', title: 'Larkmoor Twenty', rule: 'FREQ=WEEKLY;COUNT=22', number: 15, total: 22 },
    startsAt: instantOf(day, 19 * 60),
    endsAt: instantOf(day, 22 * 60),
    places: 8,
    coming: 7,
    waiting: 0,
    note: '',
    benches: [{ id: 'b', tag: 'Bench 1' }],
    mentors: [{ id: 'm', name: 'Hollis Brandreth' }],
    stages: [],
    mine: null,
    cancelledAt: null,
    cancelledReason: null,
    comingPeople: [],
    waitingPeople: [],
    ...change,
  };
}

const answers = (items: BuildNight[], detail = night()) =>
  server.use(
    http.get('*/api/build-nights', () => HttpResponse.json({ items })),
    http.get('*/api/build-nights/:id', () => HttpResponse.json(detail)),
  );
const open = (at = '/build-nights?view=list') =>
  renderPage(<BuildNightsPage />, { path: '/build-nights', at });

describe('the build nights page', () => {
  it('says who plans when there is nothing yet', async () => {
    answers([]);
    open();
    expect(await screen.findByText('No nights planned')).toBeVisible();
    expect(screen.getByText('Mentors plan them.')).toBeVisible();
    expect(screen.queryByRole('button', { name: 'Plan a series' })).toBeNull();
  });

  it('hatches the days on which nobody opens the workshop, and says what the hatch means', async () => {
    answers([night()]);
    server.use(
      http.get('*/api/club', () =>
        HttpResponse.json({
          timeZone: 'Europe/London',
          openingHours: [{ weekday: 4, opensMinute: 720, closesMinute: 1320 }],
        }),
      ),
    );
    const { container } = open('/build-nights');
    expect(await screen.findByText('Closed')).toBeVisible();
    const hatched = [...container.querySelectorAll('.fr-closed')].map((cell) => cell.className);
    expect(hatched.length).toBeGreaterThan(20);
    expect(hatched.every((name) => !name.includes('fc-day-thu'))).toBe(true);
    expect(container.querySelectorAll('.fc-day-sun.fr-closed').length).toBeGreaterThan(3);
  });

  it('offers to try again when the nights cannot be fetched', async () => {
    server.use(
      http.get('*/api/build-nights', () =>
        HttpResponse.json(
          { type: '/problems/not-allowed', title: 'Not allowed', status: 409 },
          { status: 409 },
        ),
      ),
    );
    open();
    await screen.findByRole('alert');
    answers([night()]);
    await userEvent.click(screen.getByRole('button', { name: 'Try again' }));
    expect(await screen.findByText('Build night 15')).toBeVisible();
  });

  it('says that the last place went a moment before, and which place in line it is', async () => {
    answers([night()]);
    const waiting = night({ coming: 8, waiting: 1, mine: { state: 'waiting', line: 1 } });
    server.use(http.post('*/api/build-nights/:id/coming', () => HttpResponse.json(waiting)));
    open();
    await userEvent.click(await screen.findByRole('button', { name: /Say coming/ }));
    expect(await screen.findByText(/It filled a moment before. You are first in line/)).toBeVisible();
  });

  it('shows the same nights in the month, and the open one below it with its people', async () => {
    const guest = { id: 'p', name: 'Kofi Ampah', saidAt: '2026-10-12T10:00:00Z' };
    answers([night()], night({ coming: 8, waiting: 1, waitingPeople: [guest] }));
    open('/build-nights?view=month');
    expect(await screen.findByText('Night 15')).toBeVisible();
    const panel = await screen.findByRole('region', { name: 'The night that is open' });
    expect(await within(panel).findByText('Larkmoor Twenty, night 15 of 22')).toBeVisible();
    expect(within(panel).getByText('since Mon 12 Oct')).toBeVisible();
    const legend = screen.getByRole('list', { name: 'What the boxes mean' });
    expect(within(legend).getByText(/^Larkmoor Twenty, \w+days$/)).toBeVisible();
  });

  it('names a cancelled night and why, and offers nothing for it', async () => {
    answers([night({ cancelledAt: '2026-10-12T10:00:00Z', cancelledReason: 'No heating.' })]);
    open();
    expect(await screen.findByText('Cancelled')).toBeVisible();
    expect(screen.getByText('No heating.')).toBeVisible();
    expect(screen.queryByRole('button', { name: /Say coming/ })).toBeNull();
  });
});
