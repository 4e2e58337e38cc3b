import { startDesk, type Desk } from '../../test/books';
import { invoice, payment } from '../../test/factories/dues.factory';
import { cookiesOf, person } from '../../test/factories/person.factory';
import { statementCsv } from '../../test/factories/statement.factory';
import { constraintOf } from '../common/constraint';
import { Payment } from '../dues/payment.entity';
import { LedgerService } from '../ledger/ledger.service';
import { PaymentsService } from '../dues/payments.service';
import { StatementImportService } from './statement-import.service';

describe('matching at the same moment as something else', () => {
  let desk: Desk;

  beforeAll(async () => {
    desk = await startDesk();
  });
  beforeEach(() => desk.empty());
  afterAll(() => desk.test.close());

  /** Straight to the services, so that nothing but the database stands between the two. */
  const importing = (csv: string) =>
    desk.test.app
      .get(StatementImportService)
      .import(desk.ines, { originalname: 'january.csv', buffer: Buffer.from(csv) });

  it('never matches a transfer that is taken back in that moment', async () => {
    for (let round = 0; round < 12; round += 1) {
      await desk.empty();
      const raised = await invoice(desk.test, desk.ines);
      const told = await payment(desk.test, desk.ines, raised, { method: 'transfer' });
      const [taken, brought] = await Promise.allSettled([
        desk.test.app.get(PaymentsService).takeBack(desk.ines, told.id),
        importing(statementCsv(0, ['2026-01-10', raised.reference, 2400])),
      ]);
      expect(brought.status).toBe('fulfilled');
      const { takenBackAt, bankedOn } = await desk.test.dataSource
        .getRepository(Payment)
        .findOneByOrFail({ id: told.id });
      expect([takenBackAt !== null, bankedOn !== null]).toEqual(
        taken.status === 'fulfilled' ? [true, false] : [false, true],
      );
      // Either way the line has paid the invoice, and nothing is left on its way.
      expect([await desk.ledger('1020'), await desk.ledger('1040'), await desk.ledger('1100')]).toEqual([
        2400, 0, 0,
      ]);
    }
  });

  it('waits for a take-back that has begun, and then pays the invoice by the line itself', async () => {
    const raised = await invoice(desk.test, desk.ines);
    const told = await payment(desk.test, desk.ines, raised, { method: 'transfer' });
    const other = desk.test.dataSource.createQueryRunner();
    await other.startTransaction();
    await other.query(`SELECT 1 FROM payment WHERE id = $1 FOR NO KEY UPDATE`, [told.id]);
    const brought = importing(statementCsv(0, ['2026-01-10', raised.reference, 2400]));
    await new Promise((resolve) => setTimeout(resolve, 150));
    await other.commitTransaction();
    await other.release();
    expect(await brought).toMatchObject({ matchedCount: 1 });
    expect(await desk.ledger('1040')).toBe(0);
  });

  it('settles two lines by one payment once, and says so to the other', async () => {
    const cookies = await cookiesOf(desk.test, await person(desk.test, { roles: ['member', 'treasurer'] }));
    const raised = await invoice(desk.test, desk.ines);
    const told = await payment(desk.test, desk.ines, raised, { method: 'transfer' });
    const { id } = await desk.imported(
      statementCsv(0, ['2026-01-10', 'ONE', 2400], ['2026-01-11', 'OTHER', 2400]),
    );
    const { lines } = await desk.show(id);
    const answers = await Promise.all(
      lines.map((line) =>
        fetch(`${desk.test.baseUrl}/api/reconciliation/lines/${line.id}/match`, {
          method: 'POST',
          headers: { cookie: cookies, 'content-type': 'application/json' },
          body: JSON.stringify({ paymentId: told.id }),
        }),
      ),
    );
    expect(answers.map(({ status }) => status).sort()).toEqual([200, 409]);
    expect(await desk.ledger('1040')).toBe(0);
  });

  it('is refused by the database for a payment that was taken back', async () => {
    const raised = await invoice(desk.test, desk.ines);
    const told = await payment(desk.test, desk.ines, raised, { method: 'transfer' });
    const { id } = await desk.imported(statementCsv(0, ['2026-01-10', 'ONE', 2400]));
    const line = await desk.firstLine(id);
    await desk.agent.post(`/api/payments/${told.id}/take-back`).expect(200);
    const entryId = await desk.test.dataSource.transaction((manager) =>
      desk.test.app.get(LedgerService).record(manager, {
        occurredOn: '2026-01-10',
        description: 'At the bank',
        source: { kind: 'statement line', id: line.id },
        sides: [
          { accountCode: '1020', amountMinor: 2400 },
          { accountCode: '1040', amountMinor: -2400 },
        ],
        madeById: null,
      }),
    );
    const wrong = await desk.test.dataSource
      .query(
        `INSERT INTO line_match (line_id, payment_id, made_payment, entry_id, how, matched_at, matched_by_id)
         VALUES ($1, $2, false, $3, 'by hand', now(), $4)`,
        [line.id, told.id, entryId, desk.ines.personId],
      )
      .catch((error: unknown) => constraintOf(error));
    expect(wrong).toBe('line_match_of_a_live_payment');
  });
});
