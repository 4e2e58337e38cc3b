import { randomUUID } from 'node:crypto';
import type supertest from 'supertest';
import { TEST_NOW, type TestApp } from '../../test/app';
import { startDesk, type Desk } from '../../test/books';
import { invoice, payment, paymentFor } from '../../test/factories/dues.factory';
import { person } from '../../test/factories/person.factory';
import type { Actor } from '../common/actor';
import { constraintOf } from '../common/constraint';
import { LedgerService } from '../ledger/ledger.service';
import type { OpenInvoiceDto } from './dto/invoice.dto';

describe('payments', () => {
  let desk: Desk;
  let test: TestApp;
  let ines: Actor;
  let agent: supertest.Agent;
  let treasurerId: string;

  beforeAll(async () => {
    desk = await startDesk();
    ({ test, ines, agent, treasurerId } = desk);
  });
  beforeEach(() => test.clock.set(TEST_NOW));
  afterAll(() => test.close());

  const owedInBooks = () => desk.ledger('1100');
  const openOnInvoices = async () => {
    const { body } = await agent.get('/api/invoices?state=open').expect(200);
    return (body as { openMinor: number }).openMinor;
  };

  describe('a payment', () => {
    let raised: OpenInvoiceDto;

    beforeEach(async () => {
      raised = await invoice(test, ines);
    });

    it.each([
      ['cash', '1000'],
      ['cheque', '1010'],
      ['transfer', '1040'],
    ] as const)(
      'by %s pays the invoice, bears a receipt, and lies in its account',
      async (method, account) => {
        const ledger = test.app.get(LedgerService);
        const before = await ledger.balance(account);
        const taken = await payment(test, ines, raised, { method });
        expect(taken.receiptNumber).toMatch(/^R-\d{4}$/);
        expect(taken.paid).toEqual([
          {
            invoiceId: raised.id,
            invoiceNumber: raised.number,
            description: raised.description,
            amountMinor: 2400,
          },
        ]);
        expect(taken.isBeingMatched).toBe(method !== 'cash');
        expect(await ledger.balance(account)).toBe(before + 2400);
        expect(await owedInBooks()).toBe(await openOnInvoices());
      },
    );

    it('of a part leaves the rest open', async () => {
      await payment(test, ines, raised, { amountMinor: 1000 });
      const { body } = await agent.get(`/api/invoices?personId=${raised.personId}`).expect(200);
      expect(body).toMatchObject({ items: [{ state: 'part paid', paidMinor: 1000, openMinor: 1400 }] });
    });

    it('of too much leaves credit, which pays the next invoice first', async () => {
      const taken = await payment(test, ines, raised, { amountMinor: 3000 });
      expect(taken).toMatchObject({ amountMinor: 3000, creditMinor: 600 });
      const next = await invoice(test, ines, { personId: raised.personId, amountMinor: 1000 });
      expect(next).toMatchObject({ state: 'part paid', paidMinor: 600, openMinor: 400 });
      expect(await owedInBooks()).toBe(await openOnInvoices());
      const again = await invoice(test, ines, { personId: raised.personId, amountMinor: 1000 });
      expect(again).toMatchObject({ state: 'open', paidMinor: 0 });
    });

    it('pays several invoices in the order named', async () => {
      const second = await invoice(test, ines, { personId: raised.personId, amountMinor: 3600, kind: 'kit' });
      expect(second.number).toMatch(/^K-/);
      const invoiceIds = [second.id, raised.id];
      const taken = await payment(test, ines, raised, { amountMinor: 5000, invoiceIds });
      const shares = Object.fromEntries(taken.paid.map((share) => [share.invoiceNumber, share.amountMinor]));
      expect(shares).toEqual({ [second.number]: 3600, [raised.number]: 1400 });
    });

    it('can be taken on account, without an invoice', async () => {
      const taken = await payment(test, ines, raised, { invoiceIds: [] });
      expect(taken).toMatchObject({ paid: [], creditMinor: 2400 });
    });

    it('is told to the payer by letter, once', async () => {
      const someone = await person(test);
      const own = await invoice(test, ines, { personId: someone.id });
      const taken = await payment(test, ines, own);
      const letters = await test.dataSource.query<{ subject: string; text: string }[]>(
        'SELECT subject, text FROM mail WHERE "to" = $1',
        [someone.email],
      );
      expect(letters).toHaveLength(1);
      expect(letters[0]?.subject).toBe(`Receipt ${taken.receiptNumber} for 24.00 GBP`);
      expect(letters[0]?.text).toContain(`${own.number}  Dues, January to March: 24.00`);
    });

    it('taken back opens the invoice again and leaves both entries in the books', async () => {
      const ledger = test.app.get(LedgerService);
      const before = await ledger.balance('1000');
      const taken = await payment(test, ines, raised);
      const { body } = await agent.post(`/api/payments/${taken.id}/take-back`).expect(200);
      expect(body).toMatchObject({ isTakenBack: true, paid: [] });
      expect(await ledger.balance('1000')).toBe(before);
      expect(await owedInBooks()).toBe(await openOnInvoices());
      await agent.post(`/api/payments/${taken.id}/take-back`).expect(409);
      await agent.get(`/api/receipts/${taken.id}`).expect(404);
      await payment(test, ines, raised);
    });

    it('taken back whose credit was used gives that back too', async () => {
      const taken = await payment(test, ines, raised, { amountMinor: 3000 });
      const next = await invoice(test, ines, { personId: raised.personId, amountMinor: 600 });
      expect(next.state).toBe('paid');
      await agent.post(`/api/payments/${taken.id}/take-back`).expect(200);
      expect(await owedInBooks()).toBe(await openOnInvoices());
      const { body } = await agent.get('/api/treasury/summary').expect(200);
      expect((body as { creditMinor: number }).creditMinor).toBe(
        -(await test.app.get(LedgerService).balance('2100')),
      );
    });

    it.each([
      ['a day to come', { receivedOn: '2026-01-16' }, '#/receivedOn'],
      ['a day before the books', { receivedOn: '1999-12-31' }, '#/receivedOn'],
      ['a card', { method: 'card' }, '#/method'],
      ['nothing', { amountMinor: 0 }, '#/amountMinor'],
      ['an endless amount', { amountMinor: 1e12 }, '#/amountMinor'],
      ['an invoice twice', { invoiceIds: ['d', 'd'] }, '#/invoiceIds'],
      ['an invoice that is none', { invoiceIds: [randomUUID()] }, '#/invoiceIds'],
      ['no key', { clientKey: undefined }, '#/clientKey'],
      ['an overlong note', { note: 'x'.repeat(201) }, '#/note'],
      ['an unknown field', { receiptNumber: 'R-0001' }, '#/receiptNumber'],
    ])('is refused for %s', async (_what, change, pointer) => {
      const { body } = await agent
        .post('/api/payments')
        .send({ ...paymentFor(raised), ...change })
        .expect(422);
      expect(body).toMatchObject({ errors: [{ pointer }] });
    });

    it('is refused for another person’s invoice', async () => {
      const { body } = await agent
        .post('/api/payments')
        .send(paymentFor({ personId: treasurerId, id: raised.id }))
        .expect(422);
      expect(body).toMatchObject({ errors: [{ pointer: '#/invoiceIds' }] });
    });

    it('answers the same key with the payment already taken, and another payment under it with a refusal', async () => {
      const form = paymentFor(raised);
      const first = await agent.post('/api/payments').send(form).expect(201);
      const second = await agent.post('/api/payments').send(form).expect(201);
      expect(second.body).toEqual(first.body);
      await agent
        .post('/api/payments')
        .send({ ...form, amountMinor: 100 })
        .expect(409)
        .expect(({ body }) => expect(body).toMatchObject({ type: '/problems/payment-key-used' }));
    });

    it('is kept by the database from paying an invoice twice over, or another person’s', async () => {
      const taken = await payment(test, ines, raised, { invoiceIds: [], amountMinor: 9000 });
      const other = await invoice(test, ines);
      const allocate = (invoiceId: string, amount: number) =>
        test.dataSource
          .query(
            `INSERT INTO payment_allocation (payment_id, invoice_id, amount_minor, allocated_at) VALUES ($1, $2, $3, now())`,
            [taken.id, invoiceId, amount],
          )
          .catch((error: unknown) => constraintOf(error));
      expect(await allocate(raised.id, 2401)).toBe('invoice_not_overpaid');
      expect(await allocate(other.id, 1)).toBe('payment_allocation_same_person');
      const small = await payment(test, ines, raised, { invoiceIds: [], amountMinor: 1 });
      const overspent = await test.dataSource
        .query(
          `INSERT INTO payment_allocation (payment_id, invoice_id, amount_minor, allocated_at) VALUES ($1, $2, 2, now())`,
          [small.id, raised.id],
        )
        .catch((error: unknown) => constraintOf(error));
      expect(overspent).toBe('payment_not_overspent');
    });
  });
});
