import { screen, waitFor, within } from '@testing-library/react';
import { http, HttpResponse } from 'msw';
import { describe, expect, it } from 'vitest';
import { addDays, clubDay } from '../../../lib/club-time';
import { renderPage, TAMSIN } from '../../../testing/render';
import { server } from '../../../testing/server';
import type { Summary } from '../api/treasury';
import TreasuryPage from './TreasuryPage';

const LENA = { id: '0b6f1c1e-5f0e-4f0b-9d39-0c6a4f6f7f11', name: 'Lena Quist', roles: ['member'] };
const FULL = {
  id: '1c6f1c1e-5f0e-4f0b-9d39-0c6a4f6f7f12',
  name: 'full',
  amountMinor: 2400,
  months: 3,
};

const summary = (overrides: Partial<Summary> = {}): Summary => ({
  asOf: '2026-12-01T12:00:00Z',
  today: '2026-12-01',
  currency: 'GBP',
  dues: {
    description: 'Dues, December to February',
    dueOn: '2026-12-31',
    raisedMinor: 87600,
    paidMinor: 62400,
    count: 44,
    paidCount: 30,
  },
  holdings: {
    currentAccountMinor: 329135,
    inThisMonthMinor: 31200,
    outThisMonthMinor: -12640,
    cashBoxMinor: 6200,
    chequesInHandMinor: 0,
    cardMoneyMinor: 19992,
    transfersOnTheWayMinor: 0,
  },
  aged: [],
  openCount: 0,
  openMinor: 0,
  lateMinor: 0,
  latePeople: 0,
  creditMinor: 0,
  cardNotes: [],
  ...overrides,
});

const empty = { items: [], total: 0, openMinor: 0, page: 1, perPage: 25 };
const refusal = (status: number, problem: object) => HttpResponse.json(problem, { status });

function show(overrides: Partial<Summary> = {}) {
  server.use(
    http.get('*/api/treasury/summary', () => HttpResponse.json(summary(overrides))),
    http.get('*/api/invoices', () => HttpResponse.json(empty)),
    http.get('*/api/reconciliation/statements', () => HttpResponse.json(empty)),
    http.get('*/api/people', () => HttpResponse.json({ ...empty, items: [LENA], total: 1 })),
    http.get('*/api/tiers', () => HttpResponse.json([FULL])),
    http.get('*/api/tiers/people', () =>
      HttpResponse.json({
        ...empty,
        total: 2,
        items: [
          { personId: LENA.id, personName: 'Lena Quist', tierId: null, tierName: null, coming: null },
          {
            ...{ personId: TAMSIN.id, personName: 'Tamsin Ardley', tierId: FULL.id, tierName: 'full' },
            coming: { tierName: 'junior', fromOn: '2027-01-01' },
          },
        ],
      }),
    ),
  );
  return renderPage(<TreasuryPage />, { me: { ...TAMSIN, roles: ['member', 'treasurer'] } });
}

const choose = async (user: ReturnType<typeof show>['user'], field: HTMLElement, option: string) => {
  await user.click(field);
  await user.click(await screen.findByRole('option', { name: option }));
};

describe('the treasury', () => {
  it('names and counts dues by their newest run', async () => {
    show();
    expect(await screen.findByText('Dues in, December to February')).toBeVisible();
    expect(screen.getByText('£624.00')).toBeVisible();
    expect(screen.getByText('30 of 44 invoices, 252.00 to come by 31 Dec')).toBeVisible();
  });

  it('says so where no dues were raised yet', async () => {
    show({ dues: null });
    expect(await screen.findByText('No dues were raised yet.')).toBeVisible();
  });

  it('shows what the card service told of money that the books do not show', async () => {
    const note = '24.00 GBP went back to the card for R-0298 from Lena Quist. The books do not show it.';
    show({ cardNotes: [{ id: 'evt_1', receivedAt: '2026-12-01T12:00:00Z', note }] });
    expect(await screen.findByText(new RegExp(note))).toBeVisible();
  });

  it('raises an invoice, in the minor units of what was typed', async () => {
    const sent: unknown[] = [];
    server.use(
      http.post('*/api/invoices', async ({ request }) => {
        sent.push(await request.json());
        return HttpResponse.json({ number: 'K-0101', amountMinor: 3650, personName: 'Lena Quist' });
      }),
    );
    const { user } = show();
    await user.click(await screen.findByRole('button', { name: 'Raise an invoice' }));
    const drawer = await screen.findByRole('complementary', { name: 'Raise an invoice' });
    await choose(user, within(drawer).getByRole('combobox', { name: 'To' }), 'Lena Quist');
    await user.click(within(drawer).getByRole('button', { name: 'Kit' }));
    await user.type(within(drawer).getByLabelText('In words'), 'Kit, 3 of 4');
    await user.type(within(drawer).getByLabelText('Amount'), '36.5');
    await user.click(within(drawer).getByRole('button', { name: 'Raise the invoice' }));
    expect(await screen.findByText('£36.50 to Lena Quist raised, K-0101.')).toBeVisible();
    expect(sent).toEqual([
      {
        personId: LENA.id,
        kind: 'kit',
        description: 'Kit, 3 of 4',
        amountMinor: 3650,
        dueOn: addDays(clubDay(), 30),
      },
    ]);
  });

  it('keeps what was typed for an invoice: when it is closed, and when it is refused', async () => {
    const detail = 'The due day is past. Choose today or a later day.';
    server.use(
      http.post('*/api/invoices', () =>
        refusal(422, { title: 'x', status: 422, detail, errors: [{ pointer: '#/dueOn', detail }] }),
      ),
    );
    const { user } = show();
    await user.click(await screen.findByRole('button', { name: 'Raise an invoice' }));
    await choose(user, await screen.findByRole('combobox', { name: 'To' }), 'Lena Quist');
    await user.type(screen.getByLabelText('In words'), 'Toroids');
    await user.type(screen.getByLabelText('Amount'), '12');
    await user.click(screen.getByRole('button', { name: 'Raise the invoice' }));
    await waitFor(() => expect(screen.getByLabelText('Due on')).toHaveAccessibleDescription(detail));
    await user.click(screen.getByRole('button', { name: 'Close Raise an invoice' }));
    await user.click(screen.getByRole('button', { name: 'Raise an invoice' }));
    expect(await screen.findByLabelText('In words')).toHaveValue('Toroids');
    expect(screen.getByText(/^Kept from /)).toBeVisible();
  });

  it('lists tiers, and who is on which now and next', async () => {
    const { user } = show();
    await user.click(await screen.findByRole('button', { name: 'Tiers' }));
    expect(await screen.findByRole('list', { name: 'Tiers' })).toHaveTextContent('Full£24.00for 3 months');
    const people = await screen.findByRole('list', { name: 'Who is on which' });
    await waitFor(() => expect(people).toHaveTextContent('Lena QuistNone'));
    expect(people).toHaveTextContent('Tamsin ArdleyFullJunior from 1 Jan');
  });

  it('adds a tier, and says on the name that it is taken', async () => {
    const sent: unknown[] = [];
    const detail = 'There is a tier called full.';
    server.use(
      http.post('*/api/tiers', async ({ request }) => {
        sent.push(await request.json());
        return refusal(409, { type: '/problems/tier-name-taken', title: 'x', status: 409, detail });
      }),
    );
    const { user } = show();
    await user.click(await screen.findByRole('button', { name: 'Tiers' }));
    const form = within(await screen.findByRole('form', { name: 'Add a tier' }));
    await user.type(form.getByLabelText('Name'), 'full');
    await user.type(form.getByLabelText('Amount'), '24');
    await user.click(form.getByRole('button', { name: 'Add the tier' }));
    await waitFor(() => expect(form.getByLabelText('Name')).toHaveAccessibleDescription(detail));
    expect(sent).toEqual([{ name: 'full', amountMinor: 2400, months: 3 }]);
    expect(form.getByLabelText('Amount')).toHaveValue('24');
  });

  it('gives a member a tier from a day on', async () => {
    const sent: unknown[] = [];
    server.use(
      http.post('*/api/tiers/assignments', async ({ request }) => {
        sent.push(await request.json());
        return new HttpResponse(null, { status: 204 });
      }),
    );
    const { user } = show();
    await user.click(await screen.findByRole('button', { name: 'Tiers' }));
    const form = await screen.findByRole('form', { name: 'Give a member a tier' });
    await choose(user, within(form).getByRole('combobox', { name: 'Member' }), 'Lena Quist');
    await choose(user, within(form).getByRole('combobox', { name: 'Tier' }), 'Full');
    await user.click(within(form).getByRole('button', { name: 'Give the tier' }));
    await waitFor(() => expect(sent).toEqual([{ personId: LENA.id, tierId: FULL.id, fromOn: clubDay() }]));
    expect(await screen.findByText(/^Full tier from /)).toBeVisible();
  });
});
