import { Injectable } from '@nestjs/common';
import { In, IsNull, type EntityManager } from 'typeorm';
import type { PaymentDto } from './dto/payment.dto';
import { PaymentsRepository } from './payments.repository';

const AWAITING = { method: In(['transfer', 'cheque']), bankedOn: IsNull(), takenBackAt: IsNull() };

/** For the reconciliation: transfers and cheques written down that no statement has shown yet. */
@Injectable()
export class AwaitingBankService {
  constructor(private readonly payments: PaymentsRepository) {}

  /** The latest of them, and how many there are in all. */
  async latest(take: number): Promise<{ items: PaymentDto[]; total: number }> {
    const items = await this.payments.find(AWAITING, { skip: 0, take });
    return { items, total: await this.payments.count(AWAITING) };
  }

  /**
   * The transfers that pay one of these invoices. `hold` keeps them until the transaction ends, all at once and in
   * order, so that none is taken back between being found and being matched.
   */
  async transfersFor(
    manager: EntityManager,
    invoiceIds: readonly string[],
    hold: boolean,
  ): Promise<PaymentDto[]> {
    if (invoiceIds.length === 0) return [];
    const found = await manager.query<{ id: string }[]>(
      `SELECT p.id FROM payment p
        WHERE p.method = 'transfer' AND p.banked_on IS NULL AND p.taken_back_at IS NULL
          AND p.id IN (SELECT payment_id FROM payment_allocation WHERE invoice_id = ANY ($1) AND released_at IS NULL)
        ORDER BY p.id ${hold ? 'FOR NO KEY UPDATE OF p' : ''}`,
      [invoiceIds],
    );
    const ids = found.map(({ id }) => id);
    return ids.length === 0
      ? []
      : this.payments.find({ id: In(ids) }, { skip: 0, take: ids.length }, manager);
  }
}
