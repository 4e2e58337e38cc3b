import { Injectable } from '@nestjs/common';
import type { EntityManager } from 'typeorm';
import { Clock } from '../common/clock';
import { asMinor, sumMinor } from '../common/minor-units';
import { ACCOUNTS } from '../ledger/account.entity';
import { LedgerService } from '../ledger/ledger.service';
import { PaymentAllocation } from './payment-allocation.entity';

interface Remainder {
  paymentId: string;
  receiptNumber: string;
  leftMinor: number;
}

/** What payments leave over once their invoices are paid. */
@Injectable()
export class CreditService {
  constructor(
    private readonly ledger: LedgerService,
    private readonly clock: Clock,
  ) {}

  async of(manager: EntityManager, personId: string): Promise<number> {
    return sumMinor((await this.remainders(manager, personId)).map(({ leftMinor }) => leftMinor));
  }

  /** Pays a new invoice from what is left of older payments, oldest first; each use is an entry of its own. */
  async useFor(
    manager: EntityManager,
    invoice: { id: string; number: string; personId: string; openMinor: number },
    today: string,
    madeById: string | null,
  ): Promise<void> {
    let { openMinor } = invoice;
    for (const { paymentId, receiptNumber, leftMinor } of await this.remainders(
      manager,
      invoice.personId,
      true,
    )) {
      const amountMinor = Math.min(leftMinor, openMinor);
      if (amountMinor === 0) return;
      const creditEntryId = await this.ledger.record(manager, {
        occurredOn: today,
        description: `Credit from ${receiptNumber} used for ${invoice.number}`,
        source: { kind: 'credit used', id: invoice.id },
        sides: [
          { accountCode: ACCOUNTS.membersInCredit, amountMinor },
          { accountCode: ACCOUNTS.membersOwe, amountMinor: -amountMinor },
        ],
        madeById,
      });
      const allocation = { paymentId, invoiceId: invoice.id, amountMinor, creditEntryId };
      await manager.getRepository(PaymentAllocation).insert({ ...allocation, allocatedAt: this.clock.now() });
      openMinor -= amountMinor;
    }
  }

  /** `hold` locks the payments, so that one remainder is not used for two invoices at once. */
  private async remainders(manager: EntityManager, personId: string, hold = false): Promise<Remainder[]> {
    if (hold)
      await manager.query(
        `SELECT id FROM payment WHERE person_id = $1 AND taken_back_at IS NULL ORDER BY id FOR NO KEY UPDATE`,
        [personId],
      );
    const rows = await manager.query<(Remainder & { leftMinor: string })[]>(
      `SELECT p.id AS "paymentId", p.receipt_number AS "receiptNumber",
              (p.amount_minor - coalesce(sum(a.amount_minor), 0))::text AS "leftMinor"
         FROM payment p
         LEFT JOIN payment_allocation a ON a.payment_id = p.id AND a.released_at IS NULL
        WHERE p.person_id = $1 AND p.taken_back_at IS NULL
        GROUP BY p.id HAVING p.amount_minor > coalesce(sum(a.amount_minor), 0)
        ORDER BY p.received_on, p.receipt_number`,
      [personId],
    );
    return rows.map((row) => ({ ...row, leftMinor: asMinor(row.leftMinor) }));
  }
}
