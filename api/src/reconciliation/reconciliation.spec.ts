import { randomUUID } from 'node:crypto';
import type supertest from 'supertest';
import type { TestApp } from '../../test/app';
import { startDesk, type Desk } from '../../test/books';
import { invoice, payment } from '../../test/factories/dues.factory';
import { cookiesOf, person, someoneWith } from '../../test/factories/person.factory';
import { statementCsv } from '../../test/factories/statement.factory';
import type { Actor } from '../common/actor';
import { constraintOf } from '../common/constraint';
import { LedgerService } from '../ledger/ledger.service';

describe('reconciliation', () => {
  let desk: Desk;
  let test: TestApp;
  let ines: Actor;
  let agent: supertest.Agent;

  beforeAll(async () => {
    desk = await startDesk();
    ({ test, ines, agent } = desk);
  });
  // Statements follow each other, so each test begins with empty books.
  beforeEach(() => desk.empty());
  afterAll(() => test.close());

  describe('a line', () => {
    it('is settled by hand with two invoices of one person, and the difference moves', async () => {
      const first = await invoice(test, ines);
      const second = await invoice(test, ines, { personId: first.personId, amountMinor: 3600, kind: 'kit' });
      const { id } = await desk.imported(
        statementCsv(0, ['2026-01-10', 'FPI M Ostrow', 6000], ['2026-01-12', 'CHARGE', -650]),
      );
      expect((await desk.show(id)).totals.differenceMinor).toBe(5350);
      const [line, charge] = (await desk.show(id)).lines;
      await desk.match(line?.id ?? '', { invoiceIds: [first.id, second.id] }).expect(200);
      expect((await desk.show(id)).totals.differenceMinor).toBe(-650);
      await desk.match(charge?.id ?? '', { accountCode: '5000' }).expect(200);
      const done = await desk.show(id);
      expect(done.totals).toEqual({
        openingMinor: 0,
        matchedMinor: 5350,
        booksMinor: 5350,
        statementMinor: 5350,
        earlierMinor: 0,
        differenceMinor: 0,
      });
      expect(done.lines[0]).toMatchObject({
        match: { how: 'by hand' },
        reasons: [expect.stringMatching(/^Settled by /)],
      });
    });

    it('that is taken back opens its invoice again and moves the difference back', async () => {
      const raised = await invoice(test, ines);
      const { id } = await desk.imported(statementCsv(0, ['2026-01-10', raised.reference, 2400]));
      const line = await desk.firstLine(id);
      const { body } = await desk.takeBack(line.id).expect(200);
      expect(body).toMatchObject({ state: 'no match', match: null });
      expect((await desk.show(id)).totals.differenceMinor).toBe(2400);
      expect(await desk.ledger('1020')).toBe(0);
      expect(await desk.ledger('1100')).toBe(2400);
      await desk.takeBack(line.id).expect(409);
      await desk.match(line.id, { invoiceIds: [raised.id] }).expect(200);
      expect((await desk.show(id)).totals.differenceMinor).toBe(0);
    });

    it('that is taken back leaves a payment that was written down before', async () => {
      const raised = await invoice(test, ines);
      const told = await payment(test, ines, raised, { method: 'transfer' });
      const { id } = await desk.imported(statementCsv(0, ['2026-01-10', raised.reference, 2400]));
      await agent.post(`/api/payments/${told.id}/take-back`).expect(409);
      await desk.takeBack((await desk.firstLine(id)).id).expect(200);
      const { body } = await agent.get('/api/payments').expect(200);
      expect(body).toMatchObject({ items: [{ id: told.id, isBeingMatched: true, isTakenBack: false }] });
      expect(await desk.ledger('1040')).toBe(2400);
    });

    it('shows a cheque that the bank has paid in', async () => {
      const raised = await invoice(test, ines);
      const cheque = await payment(test, ines, raised, { method: 'cheque' });
      const { id } = await desk.imported(statementCsv(0, ['2026-01-12', 'Cheque 000412', 2400]));
      await desk.match((await desk.firstLine(id)).id, { paymentId: cheque.id }).expect(200);
      expect([await desk.ledger('1010'), await desk.ledger('1020')]).toEqual([0, 2400]);
    });

    it('of a larger amount leaves the rest as credit', async () => {
      const raised = await invoice(test, ines);
      const { id } = await desk.imported(statementCsv(0, ['2026-01-12', 'FPI', 3000]));
      await desk.match((await desk.firstLine(id)).id, { invoiceIds: [raised.id] }).expect(200);
      const { books, totals } = await desk.show(id);
      expect(books.map(({ amountMinor }) => amountMinor)).toEqual([2400, 600]);
      expect(totals.differenceMinor).toBe(0);
    });

    it('is matched once, also by five at the same moment', async () => {
      const cookies = await cookiesOf(test, await person(test, { roles: ['member', 'treasurer'] }));
      const raised = await invoice(test, ines);
      const { id } = await desk.imported(statementCsv(0, ['2026-01-12', 'FPI', 2400]));
      const line = await desk.firstLine(id);
      const answers = await Promise.all(
        Array.from({ length: 5 }, () =>
          fetch(`${test.baseUrl}/api/reconciliation/lines/${line.id}/match`, {
            method: 'POST',
            headers: { cookie: cookies, 'content-type': 'application/json' },
            body: JSON.stringify({ invoiceIds: [raised.id] }),
          }),
        ),
      );
      expect(answers.map(({ status }) => status).sort()).toEqual([200, 409, 409, 409, 409]);
      expect(await desk.ledger('1020')).toBe(2400);
    });

    it('is not settled by a choice that is none, or more than one, or not there', async () => {
      const { id } = await desk.imported(statementCsv(0, ['2026-01-12', 'FPI', 2400]));
      const line = await desk.firstLine(id);
      const choices: [choice: object, status: number][] = [
        [{}, 422],
        [{ accountCode: '5000', paymentId: randomUUID() }, 422],
        [{ invoiceIds: [] }, 422],
        [{ invoiceIds: [randomUUID()] }, 422],
        [{ invoiceIds: ['not an id'] }, 422],
        [{ paymentId: randomUUID() }, 404],
        [{ accountCode: '1020' }, 422],
        [{ accountCode: '9999' }, 422],
        [{ accountCode: 'rent' }, 422],
        [{ accountCode: '5000', note: 'x'.repeat(201) }, 422],
        [{ accountCode: '5000', amountMinor: 1 }, 422],
      ];
      for (const [choice, status] of choices) await desk.match(line.id, choice).expect(status);
      expect((await desk.firstLine(id)).state).toBe('no match');
    });

    it('is not settled by what does not fit', async () => {
      const raised = await invoice(test, ines);
      const other = await invoice(test, ines);
      const cash = await payment(test, ines, raised, { amountMinor: 100 });
      const transfer = await payment(test, ines, raised, { amountMinor: 100, method: 'transfer' });
      const { id } = await desk.imported(
        statementCsv(10_000, ['2026-01-12', 'FPI', 2400], ['2026-01-13', 'OUT', -2400]),
      );
      const [line, out] = (await desk.show(id)).lines;
      const refusals = [
        await desk.match(line?.id ?? '', { paymentId: cash.id }),
        await desk.match(line?.id ?? '', { paymentId: transfer.id }),
        await desk.match(out?.id ?? '', { invoiceIds: [raised.id] }),
        await desk.match(line?.id ?? '', { invoiceIds: [raised.id, other.id] }),
        await desk.match(randomUUID(), { accountCode: '5000' }),
      ];
      expect(refusals.map(({ status }) => status)).toEqual([409, 409, 409, 422, 404]);
    });
  });

  it('shows what an earlier statement has left, as part of the difference', async () => {
    await desk.imported(statementCsv(0, ['2026-01-10', 'A', 100]));
    const { id } = await desk.imported(statementCsv(100, ['2026-01-12', 'C', 300]));
    expect((await desk.show(id)).totals).toMatchObject({
      earlierMinor: 100,
      differenceMinor: 400,
      booksMinor: 0,
    });
  });

  it('leaves a matched later statement out of the books of an earlier one', async () => {
    const first = await desk.imported(statementCsv(0, ['2026-01-10', 'A', 100]));
    const second = await desk.imported(statementCsv(100, ['2026-01-10', 'C', 300]));
    await desk.match((await desk.firstLine(second.id)).id, { accountCode: '4900' }).expect(200);
    expect((await desk.show(first.id)).totals).toMatchObject({ booksMinor: 0, differenceMinor: 100 });
    expect((await desk.show(second.id)).totals).toMatchObject({
      booksMinor: 300,
      earlierMinor: 100,
      differenceMinor: 100,
    });
  });

  it('is kept by the database: no line twice, no match of another amount', async () => {
    const { id } = await desk.imported(statementCsv(0, ['2026-01-10', 'A', 100]));
    const line = await desk.firstLine(id);
    const twice = test.dataSource
      .query(
        `INSERT INTO statement_line (statement_id, position, day, description, amount_minor, balance_minor, fingerprint, occurrence)
         SELECT statement_id, 99, day, description, amount_minor, balance_minor, fingerprint, occurrence FROM statement_line`,
      )
      .catch((error: unknown) => constraintOf(error));
    expect(await twice).toBe('statement_line_counted_once');
    const entryId = await test.dataSource.transaction((manager) =>
      test.app.get(LedgerService).record(manager, {
        occurredOn: '2026-01-10',
        description: 'Of another amount',
        source: { kind: 'journal', id: null },
        sides: [
          { accountCode: '1020', amountMinor: 99 },
          { accountCode: '4900', amountMinor: -99 },
        ],
        madeById: null,
      }),
    );
    const wrong = test.dataSource
      .query(
        `INSERT INTO line_match (line_id, made_payment, entry_id, how, matched_at, matched_by_id) VALUES ($1, false, $2, 'by hand', now(), $3)`,
        [line.id, entryId, ines.personId],
      )
      .catch((error: unknown) => constraintOf(error));
    expect(await wrong).toBe('line_match_moves_the_amount');
  });

  it('is open to treasurers only', async () => {
    const member = (await someoneWith(test, 'mentor', 'steward', 'organiser')).agent;
    const id = randomUUID();
    await member.post('/api/statements').attach('file', Buffer.from('x'), 'x.csv').expect(403);
    await member.get('/api/reconciliation/statements').expect(403);
    await member.get(`/api/reconciliation/statements/${id}`).expect(403);
    await member.post(`/api/reconciliation/lines/${id}/match`).send({ accountCode: '5000' }).expect(403);
    await member.post(`/api/reconciliation/lines/${id}/take-back`).expect(403);
    await agent.get(`/api/reconciliation/statements/${id}`).expect(404);
    await desk.takeBack(id).expect(404);
  });
});
