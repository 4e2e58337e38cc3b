import { screen, waitFor } from '@testing-library/react';
import { http, HttpResponse } from 'msw';
import { afterEach, describe, expect, it, vi } from 'vitest';
import { aBuild, aCheck, aReading, aStage } from '../../features/builds/testing/build.fixture';
import { DUES_KEY } from '../../features/dues/api/dues';
import { setClubCurrency } from '../../lib/club-currency';
import { clubDay, instantOf } from '../../lib/club-time';
import { asPhone } from '../../testing/as-phone';
import { renderPage, TAMSIN } from '../../testing/render';
import { server } from '../../testing/server';
import TonightPage from './TonightPage';

const empty = { items: [], total: 0, page: 1, perPage: 50 };

/** A quiet day of the club; each test adds its own. */
const open = (me = TAMSIN, ...handlers: Parameters<typeof server.use>) => {
  server.use(
    http.get('*/api/bookings', () => HttpResponse.json([])),
    http.get('*/api/bookings/mine', () => HttpResponse.json([])),
    http.get('*/api/build-nights', () => HttpResponse.json({ items: [] })),
    http.get('*/api/benches', () => HttpResponse.json(empty)),
    http.get('*/api/invoices/mine', () => HttpResponse.json([])),
    http.get('*/api/instruments', () => HttpResponse.json(empty)),
  );
  server.use(...handlers);
  return renderPage(<TonightPage />, { me });
};

describe('tonight', () => {
  afterEach(() => vi.unstubAllGlobals());

  it('leads to the check to go on with, and shows its last reading', async () => {
    const stage = aStage({ checks: [aCheck({ readings: [aReading()] })], cautions: ['load before power'] });
    open(
      TAMSIN,
      http.get('*/api/builds/mine', () => HttpResponse.json([aBuild(stage)])),
    );
    expect(await screen.findByRole('heading', { name: 'Settle the output level at TP9' })).toBeVisible();
    expect(screen.getByText('+0.37')).toBeVisible();
    expect(screen.getByText('± 0.47 dBm')).toBeVisible();
    expect(screen.getByRole('link', { name: 'Open the reading' })).toHaveAttribute(
      'href',
      '/build/build/stages/stage-9?check=output',
    );
    expect(screen.getByText('Before you switch on')).toBeVisible();
  });

  it('says window and last reading in one line on a phone', async () => {
    asPhone();
    const stage = aStage({ checks: [aCheck({ readings: [aReading()] })] });
    open(
      TAMSIN,
      http.get('*/api/builds/mine', () => HttpResponse.json([aBuild(stage)])),
    );
    const next = await screen.findByRole('region', { name: 'Next' });
    expect(next).toHaveTextContent('Window 0.0 to +3.0 dBm, last reading +0.37 ± 0.47');
  });

  it('says what needs a member: a stage sent back, with the mentor’s word', async () => {
    const event = {
      kind: 'sent back' as const,
      by: { id: 'm', name: 'Hollis' },
      at: '2026-10-15T20:00:00Z',
      note: 'R3 is dry.',
    };
    const stage = aStage({ state: 'sent back', events: [event] });
    open(
      TAMSIN,
      http.get('*/api/builds/mine', () => HttpResponse.json([aBuild(stage)])),
    );
    expect(await screen.findByText('Stage 9 Pre-driver was sent back')).toBeVisible();
    expect(screen.getByText('R3 is dry.')).toBeVisible();
  });

  it('shows a mentor first who waits', async () => {
    const review = {
      ...{ buildId: 'b', stageId: 's', stagePosition: 6, stageName: 'IF amplifier', cautions: [] },
      ...{ builder: { id: 'noor', name: 'Noor Ashby' }, planName: 'Larkmoor Twenty', serial: 11 },
      ...{ sentAt: '2026-10-13T20:48:00Z', note: '', timesSentBack: 0, isOwn: false },
    };
    const queue = { items: [review], total: 1, page: 1, perPage: 100, lastSignOffAt: null };
    open(
      { ...TAMSIN, roles: ['member', 'mentor'] },
      http.get('*/api/reviews', () => HttpResponse.json(queue)),
    );
    expect(await screen.findByText('One stage waiting for a mentor')).toBeVisible();
  });

  it('says when the next night is where there is none tonight, and where to begin without a build', async () => {
    open();
    expect(await screen.findByText('You have no build yet')).toBeVisible();
    expect(await screen.findByText('No night is planned yet.')).toBeVisible();
    expect(screen.queryByText('Needs you')).toBeNull();
  });

  it('still opens the next step when the evening cannot be fetched', async () => {
    const broken = () =>
      HttpResponse.json({ type: 'x', title: 'x', status: 422, detail: 'No.' }, { status: 422 });
    open(
      TAMSIN,
      http.get('*/api/bookings', broken),
      http.get('*/api/builds/mine', () => HttpResponse.json([aBuild()])),
    );
    expect(await screen.findByRole('link', { name: 'Open the reading' })).toBeVisible();
    expect(await screen.findByRole('alert')).toBeVisible();
  });

  it('shows two invoices alike as two, in the club’s currency, and follows what is changed on the dues page', async () => {
    setClubCurrency('JPY');
    const alike = (id: string) => ({ id, description: 'Kit, 3 of 4', openMinor: 3600, dueOn: '2026-11-30' });
    let invoices = [alike('one'), alike('other')];
    const { queryClient } = open(
      TAMSIN,
      http.get('*/api/invoices/mine', () => HttpResponse.json(invoices)),
    );
    expect(await screen.findAllByText('3,600 JPY, due Mon 30 Nov.')).toHaveLength(2);
    const links = screen.getAllByRole('link', { name: 'Pay: Kit, 3 of 4' });
    expect(links.map((link) => link.getAttribute('href'))).toEqual([
      '/dues?invoice=one',
      '/dues?invoice=other',
    ]);
    invoices = [];
    await queryClient.invalidateQueries({ queryKey: DUES_KEY });
    await waitFor(() => expect(screen.queryByText('Needs you')).toBeNull());
    setClubCurrency('GBP');
  });

  it('follows a booking that is cancelled in the bench book', async () => {
    const begin = clubDay();
    const bench = { id: 'b3', tag: 'Bench 3', name: 'Bench 3', kind: 'bench' };
    let bookings = [
      {
        ...{ id: 'k', kind: 'session', mine: true, personId: TAMSIN.id, personName: 'Tamsin Ardley' },
        ...{ startsAt: instantOf(begin, 19 * 60), endsAt: instantOf(begin, 21 * 60), resources: [bench] },
      },
    ];
    const { queryClient } = open(
      TAMSIN,
      http.get('*/api/bookings', () => HttpResponse.json(bookings)),
    );
    expect(await screen.findByText('Yours until 21:00')).toBeVisible();
    bookings = [];
    await queryClient.invalidateQueries({ queryKey: ['bookings'] });
    await waitFor(() => expect(screen.queryByText('Yours until 21:00')).toBeNull());
  });
});
