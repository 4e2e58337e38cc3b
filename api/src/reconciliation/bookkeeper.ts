import { Injectable } from '@nestjs/common';
import type { EntityManager } from 'typeorm';
import { AwaitingBankService } from '../dues/awaiting-bank.service';
import { InvoicesService } from '../dues/invoices.service';
import { candidatesIn, type Books } from './reconciliation.rules';

/** Reads what the books have for a set of lines: the invoices their references name, the transfers still on their way. */
@Injectable()
export class Bookkeeper {
  constructor(
    private readonly invoices: InvoicesService,
    private readonly awaiting: AwaitingBankService,
  ) {}

  /** What the books have now, without holding anything. */
  async booksFor(manager: EntityManager, lines: readonly { description: string }[]): Promise<Books> {
    const invoices = await this.invoices.byReferences(manager, referencesOn(lines), false);
    const ids = invoices.map(({ id }) => id);
    const waiting = await this.awaiting.transfersFor(manager, ids, false);
    const transfers = waiting.map(({ id, receiptNumber, amountMinor, paid }) => ({
      id,
      receiptNumber,
      amountMinor,
      invoiceIds: paid.map(({ invoiceId }) => invoiceId),
    }));
    return { invoices, transfers };
  }

  /**
   * The same, with invoices and transfers held until the transaction ends: all at once and in order, so that imports
   * cannot block each other. Read after both are held, for a transfer taken back in between opens its invoice again.
   */
  async holdFor(manager: EntityManager, lines: readonly { description: string }[]): Promise<Books> {
    const invoices = await this.invoices.byReferences(manager, referencesOn(lines), true);
    await this.awaiting.transfersFor(
      manager,
      invoices.map(({ id }) => id),
      true,
    );
    return this.booksFor(manager, lines);
  }
}

const referencesOn = (lines: readonly { description: string }[]): string[] => [
  ...new Set(lines.flatMap(({ description }) => candidatesIn(description).flat())),
];
