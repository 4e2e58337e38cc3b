import { Injectable } from '@nestjs/common';
import type { EntityManager } from 'typeorm';
import { InvoicesService } from '../dues/invoices.service';
import { PaymentsService } from '../dues/payments.service';
import { candidatesIn, type Books } from './reconciliation.rules';

/** Reads what the books have for a set of lines: the invoices their references name, the transfers still on their way. */
@Injectable()
export class Bookkeeper {
  constructor(
    private readonly invoices: InvoicesService,
    private readonly payments: PaymentsService,
  ) {}

  /** `hold` keeps the invoices until the transaction ends, all at once and in order, so that imports cannot block each other. */
  async booksFor(
    manager: EntityManager,
    lines: readonly { description: string }[],
    hold: boolean,
  ): Promise<Books> {
    const references = [...new Set(lines.flatMap(({ description }) => candidatesIn(description).flat()))];
    const invoices = await this.invoices.byReferences(manager, references, hold);
    const waiting = await this.payments.awaitingBank(manager);
    const transfers = waiting
      .filter(({ method }) => method === 'transfer')
      .map(({ id, receiptNumber, amountMinor, paid }) => ({
        id,
        receiptNumber,
        amountMinor,
        invoiceIds: paid.map(({ invoiceId }) => invoiceId),
      }));
    return { invoices, transfers };
  }
}
