import { startTestApp, type TestApp } from '../../test/app';
import { checkout, completed, deliver } from '../../test/factories/card.factory';
import { invoice, paymentFor, treasurer } from '../../test/factories/dues.factory';
import { cookiesOf, person } from '../../test/factories/person.factory';
import type { Actor } from '../common/actor';
import { LedgerService } from '../ledger/ledger.service';
import type { TakePaymentDto } from './dto/payment.dto';

describe('money at the same moment', () => {
  let test: TestApp;
  let ines: Actor;
  let cookies: string;

  beforeAll(async () => {
    test = await startTestApp();
    ines = await treasurer(test);
    cookies = await cookiesOf(test, await person(test, { roles: ['member', 'treasurer'] }));
  });
  afterAll(() => test.close());

  /** Real sockets, so that the requests meet in the database and not in a queue of the test's. */
  const take = (form: TakePaymentDto) =>
    fetch(`${test.baseUrl}/api/payments`, {
      method: 'POST',
      headers: { 'content-type': 'application/json', cookie: cookies },
      body: JSON.stringify(form),
    });
  const rows = async (sql: string, parameter: string) =>
    (await test.dataSource.query<{ count: number }[]>(sql, [parameter]))[0]?.count;
  const paidOn = (invoiceId: string) =>
    rows(
      `SELECT coalesce(sum(amount_minor), 0)::int AS count FROM payment_allocation WHERE invoice_id = $1 AND released_at IS NULL`,
      invoiceId,
    );

  it('takes one payment for twelve presses of the button', async () => {
    const raised = await invoice(test, ines);
    const form = paymentFor(raised);
    const answers = await Promise.all(Array.from({ length: 12 }, () => take(form)));
    expect(answers.map(({ status }) => status)).toEqual(Array(12).fill(201));
    const receipts = await Promise.all(answers.map(async (one) => ((await one.json()) as { id: string }).id));
    expect(new Set(receipts).size).toBe(1);
    expect(
      await rows('SELECT count(*)::int AS count FROM payment WHERE person_id = $1', raised.personId),
    ).toBe(1);
  });

  it('counts one event once, delivered twenty times at once', async () => {
    const raised = await invoice(test, ines);
    const visit = await checkout(test, raised);
    const event = completed(visit);
    const answers = await Promise.all(Array.from({ length: 20 }, () => deliver(test, event)));
    expect(answers.map(({ status }) => status)).toEqual(Array(20).fill(200));
    const outcomes = await Promise.all(
      answers.map(async (one) => ((await one.json()) as { outcome: string }).outcome),
    );
    expect(outcomes.filter((outcome) => outcome === 'acted')).toHaveLength(1);
    expect(outcomes.filter((outcome) => outcome === 'known')).toHaveLength(19);
    expect(
      await rows('SELECT count(*)::int AS count FROM payment WHERE person_id = $1', raised.personId),
    ).toBe(1);
  });

  it('never pays an invoice above its amount when cash and card come together; what is over is credit', async () => {
    for (let round = 0; round < 5; round += 1) {
      const raised = await invoice(test, ines);
      const event = completed(await checkout(test, raised));
      const [cash, card] = await Promise.all([take(paymentFor(raised)), deliver(test, event)]);
      expect([cash.status, card.status]).toEqual([201, 200]);
      expect(await paidOn(raised.id)).toBe(2400);
      expect(
        await rows('SELECT count(*)::int AS count FROM payment WHERE person_id = $1', raised.personId),
      ).toBe(2);
    }
    expect(await test.app.get(LedgerService).balance('2100')).toBe(-5 * 2400);
  });

  it('pays two invoices from many sides without blocking or overpaying', async () => {
    const someone = await person(test);
    const first = await invoice(test, ines, { personId: someone.id });
    const second = await invoice(test, ines, { personId: someone.id });
    const orders = [
      [first.id, second.id],
      [second.id, first.id],
    ];
    const answers = await Promise.all(
      Array.from({ length: 10 }, (_, index) =>
        take(paymentFor(first, { amountMinor: 1000, invoiceIds: orders[index % 2] })),
      ),
    );
    expect(answers.map(({ status }) => status)).toEqual(Array(10).fill(201));
    expect(await paidOn(first.id)).toBe(2400);
    expect(await paidOn(second.id)).toBe(2400);
  });

  it('gives every receipt and every invoice a number of its own', async () => {
    const raised = await Promise.all(Array.from({ length: 10 }, () => invoice(test, ines)));
    expect(new Set(raised.map(({ number }) => number)).size).toBe(10);
  });
});
