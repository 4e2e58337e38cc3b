import { startTestApp, type TestApp } from '../../test/app';
import { invoice, payment, treasurer } from '../../test/factories/dues.factory';
import { someoneWith } from '../../test/factories/person.factory';
import type { Actor } from '../common/actor';
import { constraintOf } from '../common/constraint';
import { LedgerService } from '../ledger/ledger.service';
import type { OpenInvoiceDto } from './dto/invoice.dto';
import { Invoice } from './invoice.entity';
import { Payment } from './payment.entity';

/** By SQL, past every line of our own code. */
describe('money, as the database keeps it', () => {
  let test: TestApp;
  let ines: Actor;
  let raised: OpenInvoiceDto;

  beforeAll(async () => {
    test = await startTestApp();
    ines = await treasurer(test);
  });
  beforeEach(async () => {
    raised = await invoice(test, ines);
  });
  afterAll(() => test.close());

  const broken = (sql: string, parameters: unknown[] = []): Promise<unknown> =>
    test.dataSource.query(sql, parameters).then(
      () => 'nothing was broken',
      (error: unknown) => constraintOf(error) ?? error,
    );

  it.each([
    ['amount_minor = amount_minor + 1'],
    [`kind = 'kit'`],
    [`number = 'D-9999'`],
    [`issued_on = issued_on - 1`],
    ['person_id = (SELECT id FROM person WHERE id <> person_id LIMIT 1)'],
  ])('an invoice keeps what was billed: %s', async (change) => {
    expect(await broken(`UPDATE invoice SET ${change} WHERE id = $1`, [raised.id])).toBe(
      'invoice_stays_as_written',
    );
  });

  it('an invoice may be due later, and is not deleted', async () => {
    expect(await broken(`UPDATE invoice SET due_on = due_on + 7 WHERE id = $1`, [raised.id])).toBe(
      'nothing was broken',
    );
    expect(await broken(`DELETE FROM invoice WHERE id = $1`, [raised.id])).toBe('invoice_is_not_deleted');
  });

  it.each([
    ['amount_minor = 1'],
    [`method = 'cheque'`],
    [`receipt_number = 'R-9999'`],
    ['received_on = received_on - 1'],
  ])('a payment keeps what was received: %s', async (change) => {
    const { id } = await payment(test, ines, raised);
    expect(await broken(`UPDATE payment SET ${change} WHERE id = $1`, [id])).toBe('payment_stays_as_written');
    expect(await broken(`DELETE FROM payment WHERE id = $1`, [id])).toBe('payment_is_not_deleted');
  });

  it('a share keeps its amount, and is given up only with its payment', async () => {
    const { id } = await payment(test, ines, raised);
    expect(await broken(`UPDATE payment_allocation SET amount_minor = 1 WHERE payment_id = $1`, [id])).toBe(
      'payment_allocation_stays_as_written',
    );
    expect(
      await broken(`UPDATE payment_allocation SET released_at = now() WHERE payment_id = $1`, [id]),
    ).toBe('payment_allocation_given_up_with_its_payment');
  });

  it('a payment is not taken back without its entry, nor while it pays an invoice', async () => {
    const { id } = await payment(test, ines, raised);
    const takeBack = `UPDATE payment SET taken_back_at = now() WHERE id = $1`;
    expect(await broken(takeBack, [id])).toBe('payment_taken_back_in_the_books');
    const { entryId } = await test.dataSource.getRepository(Payment).findOneByOrFail({ id });
    const both = test.dataSource
      .transaction(async (manager) => {
        await test.app.get(LedgerService).reverse(manager, entryId, null);
        await manager.query(takeBack, [id]);
      })
      .catch((error: unknown) => constraintOf(error));
    expect(await both).toBe('payment_taken_back_frees_invoices');
  });

  it('what was taken back stays taken back, and its shares with it', async () => {
    const { agent } = await someoneWith(test, 'treasurer');
    const { id } = await payment(test, ines, raised);
    await agent.post(`/api/payments/${id}/take-back`).expect(200);
    expect(await broken(`UPDATE payment SET taken_back_at = NULL WHERE id = $1`, [id])).toBe(
      'payment_ends_for_good',
    );
    expect(await broken(`UPDATE payment_allocation SET released_at = NULL WHERE payment_id = $1`, [id])).toBe(
      'payment_allocation_ends_for_good',
    );
  });

  it('an entry is not reversed while its invoice or its payment stands', async () => {
    const { id } = await payment(test, ines, raised);
    const paid = await test.dataSource.getRepository(Payment).findOneByOrFail({ id });
    const billed = await test.dataSource.getRepository(Invoice).findOneByOrFail({ id: raised.id });
    for (const { entryId } of [paid, billed]) {
      const reversing = test.dataSource
        .transaction((manager) => test.app.get(LedgerService).reverse(manager, entryId, null))
        .catch((error: unknown) => constraintOf(error));
      expect(await reversing).toBe('entry_reversed_with_its_money');
    }
  });

  /** An entry of the right form and of an amount of one's choosing. */
  const entryOf = (accountCode: string, amountMinor: number, against = '1100') =>
    test.dataSource.transaction((manager) =>
      test.app.get(LedgerService).record(manager, {
        occurredOn: '2026-01-15',
        description: 'By hand',
        source: { kind: 'journal', id: null },
        sides: [
          { accountCode, amountMinor },
          { accountCode: against, amountMinor: -amountMinor },
        ],
        madeById: null,
      }),
    );

  it('an invoice is not of another amount, nor of another account, than its entry', async () => {
    const write = (entryId: string, number: string) =>
      broken(
        `INSERT INTO invoice (number, kind, person_id, description, amount_minor, issued_on, due_on, reference, entry_id, raised_at)
         VALUES ($1, 'dues', $2, 'x', 2400, '2026-01-15', '2026-01-15', $3, $4, now())`,
        [number, raised.personId, `RF00${number.replace('-', '')}`, entryId],
      );
    expect(await write(await entryOf('1100', 2399, '4000'), 'X-1')).toBe('invoice_in_the_books');
    expect(await write(await entryOf('1100', 2400, '4020'), 'X-2')).toBe('invoice_in_the_books');
    expect(await write(await entryOf('1100', 2400, '4000'), 'X-3')).toBe('nothing was broken');
  });

  it('a payment is not of another amount, nor lies elsewhere, than its entry says', async () => {
    const write = (entryId: string, number: string) =>
      broken(
        `INSERT INTO payment (receipt_number, person_id, method, amount_minor, received_on, entry_id, recorded_at)
         VALUES ($1, $2, 'cash', 2400, '2026-01-15', $3, now())`,
        [number, raised.personId, entryId],
      );
    expect(await write(await entryOf('1000', 2399, '2100'), 'X-1')).toBe('payment_in_the_books');
    expect(await write(await entryOf('1010', 2400, '2100'), 'X-2')).toBe('payment_in_the_books');
    // It says that 24.00 paid an invoice, and there is no share.
    expect(await write(await entryOf('1000', 2400, '1100'), 'X-3')).toBe('payment_in_the_books');
    expect(await write(await entryOf('1000', 2400, '2100'), 'X-4')).toBe('nothing was broken');
  });

  it('a share of credit has an entry of its own amount', async () => {
    const own = await invoice(test, ines, { personId: raised.personId, amountMinor: 9900 });
    const { id } = await payment(test, ines, raised, { amountMinor: 5000 });
    const add = (creditEntryId: string | null) =>
      broken(
        `INSERT INTO payment_allocation (payment_id, invoice_id, amount_minor, allocated_at, credit_entry_id)
         VALUES ($1, $2, 100, now(), $3)`,
        [id, own.id, creditEntryId],
      );
    expect(await add(null)).toBe('payment_in_the_books');
    expect(await add(await entryOf('2100', 99))).toBe('payment_allocation_in_the_books');
    expect(await add(await entryOf('2100', 100))).toBe('nothing was broken');
  });
});
