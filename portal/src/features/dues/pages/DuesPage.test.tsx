import { act, fireEvent, screen, waitFor, within } from '@testing-library/react';
import { http, HttpResponse } from 'msw';
import { afterEach, describe, expect, it, vi } from 'vitest';
import { addDays, clubDay } from '../../../lib/club-time';
import { renderPage } from '../../../testing/render';
import { server } from '../../../testing/server';
import type { Invoice, MyDues, Receipt } from '../api/dues';
import DuesPage from './DuesPage';

const ID = '0b6f1c1e-5f0e-4f0b-9d39-0c6a4f6f7f11';
const PAYMENT = '1c6f1c1e-5f0e-4f0b-9d39-0c6a4f6f7f12';

const invoice = (overrides: Partial<Invoice> = {}): Invoice => ({
  id: ID,
  number: 'D-0421',
  kind: 'dues',
  description: 'Dues, October to December',
  amountMinor: 2400,
  paidMinor: 0,
  openMinor: 2400,
  issuedOn: clubDay(),
  dueOn: addDays(clubDay(), 10),
  state: 'open',
  daysLate: 0,
  reference: 'RF43LRBD0421',
  referencePrinted: 'RF43 LRBD 0421',
  ...overrides,
});

const receipt: Receipt = {
  id: PAYMENT,
  receiptNumber: 'R-0298',
  personId: ID,
  personName: 'Tamsin Ardley',
  method: 'card',
  amountMinor: 8400,
  receivedOn: '2026-07-03',
  note: '',
  isBeingMatched: false,
  isTakenBack: false,
  paid: [
    { invoiceId: ID, invoiceNumber: 'D-0362', description: 'Dues, July to September', amountMinor: 8400 },
  ],
  creditMinor: 0,
  clubName: 'Larkmoor Radio Builders',
  clubAddress: 'Millbeck Hall, Larkmoor',
  currency: 'GBP',
  treasurerName: 'Ines Calloway',
};

const dues = (overrides: Partial<MyDues> = {}): MyDues => ({
  tier: { id: ID, name: 'full', amountMinor: 2400, months: 3 },
  currency: 'GBP',
  creditMinor: 0,
  payments: [],
  bank: { accountName: 'Larkmoor Radio Builders', accountNumber: '00-41-17 3006 4417' },
  treasurerName: 'Ines Calloway',
  contactEmail: 'treasurer@larkmoor.example',
  ...overrides,
});

function show(invoices: Invoice[], mine: MyDues = dues(), at = '/dues') {
  server.use(
    http.get('*/api/invoices/mine', () => HttpResponse.json(invoices)),
    http.get('*/api/dues/mine', () => HttpResponse.json(mine)),
    http.get('*/api/receipts/:id', () => HttpResponse.json(receipt)),
  );
  return renderPage(<DuesPage />, { at });
}

describe('Dues', () => {
  it('shows the sum owed, the card button and the values of a transfer', async () => {
    show([invoice()]);
    expect(await screen.findByRole('button', { name: 'Pay £24.00 by card' })).toBeVisible();
    expect(screen.getByText('RF43 LRBD 0421')).toBeVisible();
    expect(screen.getByText('00-41-17 3006 4417')).toBeVisible();
  });

  it('copies the reference without its spaces and says so', async () => {
    const { user } = show([invoice()]);
    await user.click(await screen.findByRole('button', { name: 'Copy reference' }));
    expect(await navigator.clipboard.readText()).toBe('RF43LRBD0421');
    expect(screen.getAllByText('Copied').length).toBeGreaterThan(0);
  });

  it('says when nothing is owed, and until when', async () => {
    show([invoice({ dueOn: addDays(clubDay(), 60) })]);
    expect(await screen.findByText(/^Nothing owed until /)).toBeVisible();
    expect(screen.getByText('Dues, October to December')).toBeVisible();
  });

  it('opens an invoice that is coming up to be paid early', async () => {
    const { user } = show([invoice({ dueOn: addDays(clubDay(), 60) })]);
    await user.click(await screen.findByRole('button', { name: 'Dues, October to December' }));
    expect(await screen.findByRole('button', { name: 'Pay £24.00 by card' })).toBeVisible();
  });

  it('raises a banner over the page when something is late, and leaves the page open', async () => {
    show([invoice({ dueOn: addDays(clubDay(), -23), daysLate: 23, state: 'late' })]);
    expect(await screen.findByText('£24.00 is past due')).toBeVisible();
    expect(screen.getByText('Owed, 23 days past due')).toBeVisible();
    expect(screen.getByRole('button', { name: 'Pay £24.00 by card' })).toBeVisible();
  });

  it('lists what was paid, with a receipt in figures and words, or that it is being matched', async () => {
    const waiting = {
      ...receipt,
      id: ID,
      receiptNumber: 'R-0377',
      method: 'transfer' as const,
      isBeingMatched: true,
    };
    show([], dues({ payments: [waiting, receipt] }));
    const paid = await screen.findByRole('table', { name: 'Paid' });
    expect(within(paid).getByText('Being matched')).toBeVisible();
    expect(within(paid).getByRole('button', { name: 'R-0298' })).toBeVisible();
    expect(await screen.findByText('Eighty-four pounds')).toBeVisible();
  });

  it('says what a failed checkout means, and that no money was taken', async () => {
    const { user } = show([invoice()]);
    const detail = 'The card page cannot be reached just now. No money was taken.';
    server.use(
      http.post('*/api/invoices/:id/checkout', () =>
        HttpResponse.json(
          {
            type: '/problems/card-page-unavailable',
            title: 'The card page cannot be opened',
            status: 409,
            detail,
          },
          { status: 409 },
        ),
      ),
    );
    await user.click(await screen.findByRole('button', { name: 'Pay £24.00 by card' }));
    expect(await screen.findByRole('alert')).toHaveTextContent('No money was taken');
  });

  it('checks after coming back from the card page, then says that it is paid', async () => {
    let asked = 0;
    server.use(
      http.get('*/api/invoices/:id/card-payment', () => {
        asked += 1;
        const state = asked > 1 ? 'paid' : 'open';
        return HttpResponse.json({ state, openMinor: 0, receiptId: asked > 1 ? PAYMENT : null });
      }),
    );
    show([], dues(), `/dues?invoice=${ID}&card=returned`);
    expect(await screen.findByText(/No money is taken twice/)).toBeVisible();
    expect(await screen.findByText('Paid by card.', {}, { timeout: 3000 })).toBeVisible();
    expect(screen.getByRole('button', { name: 'See the receipt' })).toBeVisible();
  });

  describe('when the card service’s word does not come', () => {
    afterEach(() => vi.useRealTimers());

    /** Comes back from the card page and waits, with a clock of the test's own. */
    const waitAtThePage = (check: () => Response | Promise<Response>) => {
      const asked: number[] = [];
      let checks = 0;
      vi.useFakeTimers({ toFake: ['setTimeout', 'clearTimeout', 'setInterval', 'clearInterval', 'Date'] });
      const begin = Date.now();
      server.use(
        http.get('*/api/invoices/:id/card-payment', () => {
          asked.push(Math.round((Date.now() - begin) / 1000));
          return HttpResponse.json({ state: 'open', openMinor: 2400, receiptId: null });
        }),
        http.post('*/api/invoices/:id/card-payment/check', () => {
          checks += 1;
          return check();
        }),
      );
      show([], dues(), `/dues?invoice=${ID}&card=returned`);
      const wait = async (seconds: number) => {
        for (let second = 0; second < seconds; second += 1)
          await act(() => vi.advanceTimersByTimeAsync(1000));
      };
      return { asked, wait, checks: () => checks };
    };

    it('asks at growing distances, then has the card service asked once, and stops with plain words', async () => {
      const { asked, wait, checks } = waitAtThePage(() =>
        HttpResponse.json({ state: 'open', openMinor: 2400, receiptId: null }),
      );
      await wait(60);
      expect(checks()).toBe(0);
      await wait(120);
      expect(checks()).toBe(1);
      expect(asked).toHaveLength(7);
      const distances = asked.slice(1).map((at, index) => at - (asked[index] ?? 0));
      expect(
        distances.every((distance, index) => index === 0 || distance > (distances[index - 1] ?? 0)),
      ).toBe(true);
      expect(screen.getByText(/The card service has no payment for this invoice yet/)).toBeVisible();
      fireEvent.click(screen.getByRole('button', { name: 'Try again' }));
      await wait(3);
      expect(checks()).toBe(2);
    });

    it('shows what the card service itself says', async () => {
      const { wait } = waitAtThePage(() =>
        HttpResponse.json({ state: 'paid', openMinor: 0, receiptId: PAYMENT }),
      );
      await wait(80);
      expect(screen.getByText('Paid by card.')).toBeVisible();
    });

    it('says that the card service does not answer, and that nothing is taken twice', async () => {
      const { wait } = waitAtThePage(() =>
        HttpResponse.json({ type: '/problems/card-service-silent', status: 409 }, { status: 409 }),
      );
      await wait(80);
      expect(screen.getByText(/The card service does not answer just now/)).toHaveTextContent(
        'No money is taken twice',
      );
    });
  });

  it('says plainly that the card was not charged', async () => {
    server.use(
      http.get('*/api/invoices/:id/card-payment', () =>
        HttpResponse.json({ state: 'failed', openMinor: 2400, receiptId: null }),
      ),
    );
    show([invoice()], dues(), `/dues?invoice=${ID}&card=returned`);
    expect(await screen.findByText(/The card was not charged/)).toBeVisible();
  });

  it('offers to try again when the dues cannot be read', async () => {
    server.use(
      http.get('*/api/dues/mine', () =>
        HttpResponse.json({ title: 'Something went wrong' }, { status: 500 }),
      ),
      http.get('*/api/invoices/mine', () => HttpResponse.json([])),
    );
    const { user } = renderPage(<DuesPage />);
    const again = await screen.findByRole('button', { name: 'Try again' });
    server.use(http.get('*/api/dues/mine', () => HttpResponse.json(dues())));
    await user.click(again);
    expect(await screen.findByText('Nothing owed')).toBeVisible();
  });

  it('prints the receipt', async () => {
    const print = vi.spyOn(window, 'print').mockImplementation(() => undefined);
    const { user } = show([], dues({ payments: [receipt] }));
    await user.click(await screen.findByRole('button', { name: 'Print' }));
    await waitFor(() => expect(print).toHaveBeenCalled());
  });
});
