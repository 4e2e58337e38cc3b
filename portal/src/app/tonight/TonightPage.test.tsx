import { screen } from '@testing-library/react';
import { http, HttpResponse } from 'msw';
import { describe, expect, it } from 'vitest';
import { aBuild, aCheck, aReading, aStage } from '../../features/builds/testing/build.fixture';
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
  it('leads to the check to go on with, and shows its last reading', async () => {
    const stage = aStage({ checks: [aCheck({ readings: [aReading()] })], cautions: ['load before power'] });
    open(
      TAMSIN,
      http.get('*/api/builds/mine', () => HttpResponse.json([aBuild(stage)])),
    );
    expect(await screen.findByRole('heading', { name: 'Settle the output level at TP9' })).toBeVisible();
    expect(screen.getByText('+0.37 ± 0.47 dBm')).toBeVisible();
    expect(screen.getByRole('link', { name: 'Open the reading' })).toHaveAttribute(
      'href',
      '/build/build/stages/stage-9?check=output',
    );
    expect(screen.getByText('Before you switch on')).toBeVisible();
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
});
