import { startTestApp, TEST_NOW, type TestApp } from '../../test/app';
import { cardEvent, checkout, completed, deliver, type CardEvent } from '../../test/factories/card.factory';
import { invoice, treasurer } from '../../test/factories/dues.factory';
import { someoneWith } from '../../test/factories/person.factory';
import type { Actor } from '../common/actor';
import { LedgerService } from '../ledger/ledger.service';
import { Checkout } from './checkout.entity';
import type { OpenInvoiceDto } from './dto/invoice.dto';

describe('events of the card service', () => {
  let test: TestApp;
  let ines: Actor;
  let raised: OpenInvoiceDto;
  let visit: Checkout;

  beforeAll(async () => {
    test = await startTestApp();
    ines = await treasurer(test);
  });
  beforeEach(async () => {
    test.clock.set(TEST_NOW);
    raised = await invoice(test, ines);
    visit = await checkout(test, raised);
  });
  afterAll(() => test.close());

  const count = async (table: string): Promise<number> =>
    (await test.dataSource.query<{ count: number }[]>(`SELECT count(*)::int AS count FROM ${table}`))[0]
      ?.count ?? -1;
  const outcomeOf = async (event: CardEvent): Promise<unknown> => {
    const answer = await deliver(test, event);
    expect(answer.status).toBe(200);
    return ((await answer.json()) as { outcome: string }).outcome;
  };
  const stateOfVisit = async () =>
    (await test.dataSource.getRepository(Checkout).findOneByOrFail({ id: visit.id })).state;
  const payments = () =>
    test.dataSource.query<{ amount_minor: string }[]>(
      'SELECT amount_minor FROM payment WHERE person_id = $1 AND method = $2',
      [raised.personId, 'card'],
    );

  it('pay the invoice, with a receipt and an entry to the card money', async () => {
    const before = await test.app.get(LedgerService).balance('1030');
    expect(await outcomeOf(completed(visit))).toBe('acted');
    expect(await payments()).toEqual([{ amount_minor: '2400' }]);
    expect(await test.app.get(LedgerService).balance('1030')).toBe(before + 2400);
    expect(await stateOfVisit()).toBe('paid');
  });

  it('about a page that is not ours wait for a look, whatever stands where our id would', async () => {
    for (const stranger of ['', '-'.repeat(36), 'not an id', '4f0f5b52-1d9c-4c6e-9a35-0d7f9c1a2b3c'])
      expect(await outcomeOf(completed(visit, { metadata: { checkout: stranger } }))).toBe('needs a look');
    expect(await payments()).toHaveLength(0);
  });

  it('count once, delivered again, and hours later', async () => {
    const event = completed(visit);
    expect(await outcomeOf(event)).toBe('acted');
    test.clock.advance(6 * 3_600_000);
    expect(await outcomeOf(event)).toBe('known');
    expect(await payments()).toHaveLength(1);
  });

  it('count once, told by two events about one visit', async () => {
    expect(await outcomeOf(completed(visit))).toBe('acted');
    expect(await outcomeOf(cardEvent('checkout.session.async_payment_succeeded', visit))).toBe('noted');
    expect(await payments()).toHaveLength(1);
  });

  it('wait while the bank has yet to confirm, then pay', async () => {
    expect(await outcomeOf(completed(visit, { payment_status: 'unpaid' }))).toBe('acted');
    expect(await stateOfVisit()).toBe('confirming');
    expect(await payments()).toHaveLength(0);
    expect(await outcomeOf(cardEvent('checkout.session.async_payment_succeeded', visit))).toBe('acted');
    expect(await payments()).toHaveLength(1);
  });

  it('may come in the wrong order: the confirmation before the visit’s end', async () => {
    expect(await outcomeOf(cardEvent('checkout.session.async_payment_succeeded', visit))).toBe('acted');
    expect(await outcomeOf(completed(visit, { payment_status: 'unpaid' }))).toBe('noted');
    expect(await stateOfVisit()).toBe('paid');
    expect(await payments()).toHaveLength(1);
  });

  it('do not unpay: an expiry that comes after the money changes nothing', async () => {
    await outcomeOf(completed(visit));
    expect(await outcomeOf(cardEvent('checkout.session.expired', visit))).toBe('noted');
    expect(await stateOfVisit()).toBe('paid');
  });

  it('take the money although the visit had run out here: it was paid', async () => {
    expect(await outcomeOf(cardEvent('checkout.session.expired', visit))).toBe('acted');
    expect(await outcomeOf(completed(visit))).toBe('acted');
    expect(await payments()).toHaveLength(1);
  });

  it('say that no money came', async () => {
    await outcomeOf(completed(visit, { payment_status: 'unpaid' }));
    expect(await outcomeOf(cardEvent('checkout.session.async_payment_failed', visit))).toBe('acted');
    expect(await stateOfVisit()).toBe('failed');
    expect(await payments()).toHaveLength(0);
  });

  it.each([
    ['another amount', { amount_total: 2399 }, 'paid with 23.99 GBP'],
    ['another currency', { currency: 'eur' }, 'paid with 24.00 EUR'],
    ['no amount', { amount_total: null }, 'paid with 0.00 GBP'],
  ])('of %s are shown to the treasurer and not applied', async (_what, changes, words) => {
    expect(await outcomeOf(completed(visit, changes))).toBe('needs a look');
    expect(await payments()).toHaveLength(0);
    const { agent } = await someoneWith(test, 'treasurer');
    const { body } = await agent.get('/api/treasury/summary').expect(200);
    const notes = (body as { cardNotes: { note: string }[] }).cardNotes.map(({ note }) => note);
    expect(notes.join('\n')).toContain(`opened for 24.00 GBP and ${words}`);
  });

  it.each([
    ['of a visit that is none of ours', { metadata: { checkout: '7f3c7a52-0000-4000-8000-000000000000' } }],
    ['without our mark', { metadata: {} }],
    ['with a mark that is no id', { metadata: { checkout: `'; DROP TABLE payment; --` } }],
    ['with our mark under another session', { id: 'cs_test_of_somebody_else' }],
  ])('%s write nothing down as paid', async (_what, changes) => {
    expect(await outcomeOf(completed(visit, changes))).toBe('needs a look');
    expect(await payments()).toHaveLength(0);
  });

  it.each([
    [
      'charge.refunded',
      { id: 'ch_1', amount: 2400, amount_refunded: 2400 },
      '24.00 GBP went back to the card for R-',
    ],
    [
      'charge.refunded',
      { id: 'ch_1', amount: 2400, amount_refunded: 1000 },
      '10.00 GBP of 24.00 GBP went back to the card for R-',
    ],
    ['charge.refunded', { id: 'ch_2', metadata: {}, amount: 5, amount_refunded: 5 }, 'for the charge ch_2'],
    [
      'charge.dispute.created',
      { charge: 'ch_3', metadata: {}, amount: 2400, status: 'needs_response' },
      'The cardholder disputes 24.00 GBP for the charge ch_3',
    ],
    [
      'charge.dispute.closed',
      { charge: 'ch_3', metadata: {}, amount: 2400, status: 'lost' },
      'decided against the club',
    ],
    ['refund.failed', { charge: 'ch_3', metadata: {}, amount: 2400 }, 'did not reach the card'],
  ])('that take card money back are shown to the treasurer: %s %#', async (type, changes, words) => {
    await outcomeOf(completed(visit));
    expect(await outcomeOf(cardEvent(type, visit, changes))).toBe('needs a look');
    const { agent } = await someoneWith(test, 'treasurer');
    const { body } = await agent.get('/api/treasury/summary').expect(200);
    const notes = (body as { cardNotes: { note: string }[] }).cardNotes.map(({ note }) => note);
    expect(notes).toContainEqual(expect.stringContaining(words));
    expect(await payments()).toHaveLength(1);
  });

  it('of a kind that nothing here acts on are noted', async () => {
    expect(await outcomeOf(cardEvent('customer.created', visit))).toBe('noted');
    expect(await outcomeOf(cardEvent('payout.paid', visit))).toBe('noted');
  });

  it.each([
    ['a forged signature', { secret: 'whsec_somebody_elses' }],
    ['no signature', { header: '' }],
    ['a signature that is none', { header: 'v1=nonsense' }],
    ['a stale signature', { ageS: 301 }],
    ['a body changed on the way', { body: '{"id":"evt_x","type":"checkout.session.completed"}' }],
    ['a body that is no JSON', { body: '{' }],
    ['an empty body', { body: '' }],
  ])('with %s are refused and write nothing', async (_what, signing) => {
    const before = [await count('payment_event'), await count('entry')];
    const answer = await deliver(test, completed(visit), signing);
    expect(answer.status).toBe(400);
    expect(answer.headers.get('content-type')).toMatch(/problem\+json/);
    expect([await count('payment_event'), await count('entry')]).toEqual(before);
  });

  it('just inside the time allowed are believed', async () => {
    const answer = await deliver(test, completed(visit), { ageS: 299 });
    expect(answer.status).toBe(200);
  });
});
