import { randomUUID } from 'node:crypto';
import { Injectable } from '@nestjs/common';
import { IsNull, type EntityManager } from 'typeorm';
import { Clock } from '../common/clock';
import { clubDay } from '../common/club-day';
import { fieldError, notFound } from '../common/common.errors';
import { ClubService } from '../club/club.service';
import { ACCOUNTS } from '../ledger/account.entity';
import { LedgerService } from '../ledger/ledger.service';
import { duesProblems } from './dues.errors';
import { openOf, spread } from './dues.rules';
import { InvoicesRepository, type InvoiceRow } from './invoices.repository';
import { nextNumber } from './numbers';
import { PaymentAllocation } from './payment-allocation.entity';
import { Payment, type Method } from './payment.entity';

/** Where the money lies until it is known to be in the bank. */
const LIES_IN: Record<Method, string> = {
  cash: ACCOUNTS.cashBox,
  cheque: ACCOUNTS.chequesInHand,
  card: ACCOUNTS.cardMoney,
  transfer: ACCOUNTS.transfersOnTheWay,
};

export interface NewPayment {
  personId: string;
  method: Method;
  amountMinor: number;
  receivedOn: string;
  invoiceIds: readonly string[];
  note: string;
  takenById: string | null;
  clientKey: string | null;
  cardSessionId: string | null;
}

/** Writes money down: payment, shares and entry together, whoever it came through. */
@Injectable()
export class TillService {
  constructor(
    private readonly invoices: InvoicesRepository,
    private readonly ledger: LedgerService,
    private readonly club: ClubService,
    private readonly clock: Clock,
  ) {}

  /**
   * For this and other features, inside their transaction. Invoices are paid in the order named and never above what
   * is open on them at that moment; what is left over is the person's credit.
   * @returns the payment's id
   */
  async record(manager: EntityManager, payment: NewPayment): Promise<string> {
    const { timeZone } = await this.club.settings(manager);
    const today = clubDay(this.clock.now(), timeZone);
    const invoices = inOrder(payment, await this.invoices.lock(manager, payment.invoiceIds, today));
    const open = invoices.map((invoice) => ({ id: invoice.id, openMinor: openOf(invoice) }));
    const { shares, leftMinor } = spread(payment.amountMinor, open);
    const { invoiceIds: _, ...columns } = payment;
    const id = randomUUID();
    const receiptNumber = await nextNumber(manager, 'receipt');
    const numbers = invoices.filter((invoice) => shares.some((share) => share.invoiceId === invoice.id));
    const entryId = await this.ledger.record(manager, {
      occurredOn: payment.receivedOn,
      description: `${receiptNumber} by ${payment.method}${wordsFor(numbers)}`,
      source: { kind: 'payment', id },
      sides: [
        { accountCode: LIES_IN[payment.method], amountMinor: payment.amountMinor },
        { accountCode: ACCOUNTS.membersOwe, amountMinor: leftMinor - payment.amountMinor },
        { accountCode: ACCOUNTS.membersInCredit, amountMinor: -leftMinor },
      ],
      madeById: payment.takenById,
    });
    const recordedAt = this.clock.now();
    await manager.getRepository(Payment).insert({ ...columns, id, receiptNumber, entryId, recordedAt });
    if (shares.length > 0)
      await manager
        .getRepository(PaymentAllocation)
        .insert(shares.map((share) => ({ ...share, paymentId: id, allocatedAt: recordedAt })));
    return id;
  }

  /** For this and other features: holds a live payment until the transaction ends. */
  async hold(manager: EntityManager, paymentId: string): Promise<Payment> {
    const payment = await manager
      .getRepository(Payment)
      .findOne({ where: { id: paymentId }, lock: { mode: 'for_no_key_update' } });
    if (!payment) throw notFound('payment');
    if (payment.takenBackAt)
      throw duesProblems['payment-taken-back-before'](`${payment.receiptNumber} was taken back before.`);
    return payment;
  }

  /** For this and other features: undoes a held payment; its entries are reversed and its invoices open again. */
  async takeBack(manager: EntityManager, payment: Payment, madeById: string | null): Promise<void> {
    const allocations = manager.getRepository(PaymentAllocation);
    const live = await allocations.findBy({ paymentId: payment.id, releasedAt: IsNull() });
    for (const { creditEntryId } of live)
      if (creditEntryId) await this.ledger.reverse(manager, creditEntryId, madeById);
    await this.ledger.reverse(manager, payment.entryId, madeById);
    const now = this.clock.now();
    await allocations.update({ paymentId: payment.id, releasedAt: IsNull() }, { releasedAt: now });
    await manager.getRepository(Payment).update({ id: payment.id }, { takenBackAt: now });
  }

  /** For the reconciliation: the bank has shown it on this day, or (null) the match was taken back. */
  async setBanked(manager: EntityManager, paymentId: string, bankedOn: string | null): Promise<void> {
    await manager.getRepository(Payment).update({ id: paymentId }, { bankedOn });
  }

  /** For the reconciliation: the account a payment's money lies in until the bank shows it. */
  accountOf(method: Method): string {
    return LIES_IN[method];
  }
}

/** @throws DomainError when an invoice is not there or is somebody else's (422) */
function inOrder({ invoiceIds, personId }: NewPayment, found: InvoiceRow[]): InvoiceRow[] {
  return invoiceIds.map((id) => {
    const invoice = found.find((one) => one.id === id);
    if (!invoice || invoice.personId !== personId)
      throw fieldError('invoiceIds', 'One of the invoices is not this person’s.');
    return invoice;
  });
}

const wordsFor = (invoices: InvoiceRow[]): string =>
  invoices.length === 0 ? ', on account' : ` for ${invoices.map(({ number }) => number).join(', ')}`;
