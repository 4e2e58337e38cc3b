import { screen, waitFor, within } from '@testing-library/react';
import { delay, http, HttpResponse } from 'msw';
import { describe, expect, it } from 'vitest';
import { renderPage, TAMSIN } from '../../../testing/render';
import { server } from '../../../testing/server';
import type { Review } from '../api/reviews';
import { aBuild, aCheck, aReading, aStage } from '../testing/build.fixture';
import ReviewPage from './ReviewPage';

const HOLLIS = {
  ...TAMSIN,
  id: 'hollis',
  name: 'Hollis Brandreth',
  roles: ['member' as const, 'mentor' as const],
};

const aReview = (overrides: Partial<Review> = {}): Review => ({
  ...{ buildId: 'build', stageId: 'stage-9', stagePosition: 9, stageName: 'Pre-driver', cautions: [] },
  ...{ builder: { id: 'noor', name: 'Noor Ashby' }, planName: 'Larkmoor Twenty', serial: 11 },
  ...{ sentAt: '2026-10-13T20:48:00Z', note: 'Two turns off.', timesSentBack: 0, isOwn: false },
  ...overrides,
});
const seen = { id: 'm', by: { id: 'hollis', name: 'Hollis Brandreth' }, at: '2026-10-15T18:00:00Z' };
const eyes = (isSettled: boolean) =>
  aCheck({
    id: 'eyes',
    position: 2,
    kind: "mentor's eyes",
    title: 'Looked at the joints',
    method: null,
    isSettled,
    mark: isSettled ? seen : null,
  });

const open = (reviews: Review[], isSettled = true) => {
  const level = aCheck({ isSettled: true, readings: [aReading({ value: 1.5, verdict: 'pass' })] });
  const stage = aStage({
    state: 'with mentor',
    checks: [level, eyes(isSettled)],
    missingToSignOff: isSettled ? 0 : 1,
  });
  const build = aBuild(stage, { builder: { id: 'noor', name: 'Noor Ashby' } });
  const page = {
    items: reviews,
    total: reviews.length,
    page: 1,
    perPage: 100,
    lastSignOffAt: '2026-10-14T20:00:00Z',
  };
  server.use(
    http.get('*/api/reviews', () => HttpResponse.json(page)),
    http.get('*/api/builds/:buildId', () => HttpResponse.json(build)),
  );
  return renderPage(<ReviewPage />, { me: HOLLIS, at: '/review', path: '/review' });
};

describe('the review queue', () => {
  it('shows who waits, the evidence and the builder’s word', async () => {
    open([aReview({ timesSentBack: 1 })]);
    expect(await screen.findByText('“Two turns off.”')).toBeVisible();
    expect(screen.getByText('Sent back once, returned')).toBeVisible();
    expect(screen.getByRole('row', { name: /Output level at TP9/ })).toHaveTextContent('+1.5 ± 0.5 dBm');
  });

  it('says what is still to tick before it offers the signature', async () => {
    open([aReview()], false);
    expect(await screen.findByText(/One box still to tick. Signing off fixes/)).toBeVisible();
    expect(screen.getByRole('button', { name: 'Sign off stage 9' })).toHaveAttribute('aria-disabled', 'true');
  });

  it('signs off after asking, with the note', async () => {
    const sent: unknown[] = [];
    const { user } = open([aReview()]);
    server.use(
      http.post('*/api/builds/build/stages/stage-9/sign-off', async ({ request }) => {
        sent.push(await request.json());
        return HttpResponse.json(aStage({ state: 'signed off' }));
      }),
    );
    await user.type(await screen.findByLabelText('Note to Noor'), 'Nice.');
    await user.click(screen.getByRole('button', { name: 'Sign off stage 9' }));
    await user.click(within(await screen.findByRole('dialog')).getByRole('button', { name: 'Sign off' }));
    await waitFor(() => expect(sent).toEqual([{ note: 'Nice.' }]));
    expect(await screen.findByText('Stage 9 of Noor Ashby signed off.')).toBeVisible();
  });

  it('says it was signed, and drops the note, also when the queue has moved on before', async () => {
    const { user } = open([aReview()]);
    server.use(
      http.post('*/api/builds/build/stages/stage-9/sign-off', () => {
        server.use(
          http.get('*/api/reviews', () =>
            HttpResponse.json({ items: [], total: 0, page: 1, perPage: 100, lastSignOffAt: null }),
          ),
          // The build comes later than the queue, so the decision is gone before the sign-off has wholly ended.
          http.get('*/api/builds/:buildId', async () => {
            await delay(300);
            return HttpResponse.json(aBuild(aStage({ state: 'signed off' })));
          }),
        );
        return HttpResponse.json(aStage({ state: 'signed off' }));
      }),
    );
    await user.type(await screen.findByLabelText('Note to Noor'), 'Nice.');
    await user.click(screen.getByRole('button', { name: 'Sign off stage 9' }));
    await user.click(within(await screen.findByRole('dialog')).getByRole('button', { name: 'Sign off' }));
    expect(await screen.findByText(/Nothing waiting/)).toBeVisible();
    expect(await screen.findByText('Stage 9 of Noor Ashby signed off.')).toBeVisible();
    expect(Object.keys(localStorage).filter((key) => key.includes('review:'))).toEqual([]);
  });

  it('does not send back without a word', async () => {
    const { user } = open([aReview()]);
    await user.click(await screen.findByRole('button', { name: 'Send back' }));
    expect(await screen.findByText('Say what to do before it is sent again.')).toBeVisible();
  });

  it('moves by J and K, and not while a note is typed', async () => {
    const { user } = open([
      aReview(),
      aReview({ stageId: 'stage-9', buildId: 'other', builder: { id: 'bea', name: 'Bea Thistlewood' } }),
    ]);
    await screen.findByText('Your decision');
    await user.keyboard('j');
    expect(screen.getByRole('button', { name: /Bea Thistlewood/ })).toHaveAttribute('aria-current', 'true');
    await user.keyboard('k');
    expect(screen.getByRole('button', { name: /Noor Ashby/ })).toHaveAttribute('aria-current', 'true');
    await user.type(await screen.findByLabelText(/Note to/), 'jj');
    expect(screen.getByRole('button', { name: /Noor Ashby/ })).toHaveAttribute('aria-current', 'true');
  });

  it('offers no decision on the mentor’s own stage', async () => {
    open([aReview({ isOwn: true })]);
    expect(await screen.findByText(/signed off by another mentor/)).toBeVisible();
    expect(screen.queryByRole('button', { name: /Sign off/ })).toBeNull();
  });

  it('says when nothing waits, and when the last one was signed', async () => {
    open([]);
    expect(await screen.findByText('Nothing waiting.')).toBeVisible();
    expect(screen.getByText('Last sign-off Wed 14 Oct.')).toBeVisible();
  });
});
