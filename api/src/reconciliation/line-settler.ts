import { Injectable } from '@nestjs/common';
import { IsNull, type EntityManager } from 'typeorm';
import type { Actor } from '../common/actor';
import { fieldError, notFound } from '../common/common.errors';
import { writeMinor } from '../common/minor-units';
import { InvoicesService } from '../dues/invoices.service';
import { TillService } from '../dues/till.service';
import { LedgerService } from '../ledger/ledger.service';
import type { MatchLineDto } from './dto/match-line.dto';
import { LineMatch } from './line-match.entity';
import { Matcher, type Because } from './matcher';
import { matchedBefore, reconciliationProblems } from './reconciliation.errors';
import { StatementLine } from './statement-line.entity';

/** Settles one line by a person's choice: invoices, a payment written down before, or an account. */
@Injectable()
export class LineSettler {
  constructor(
    private readonly matcher: Matcher,
    private readonly till: TillService,
    private readonly invoices: InvoicesService,
    private readonly ledger: LedgerService,
  ) {}

  async settle(
    manager: EntityManager,
    actor: Actor,
    lineId: string,
    choice: MatchLineDto,
    currency: string,
  ): Promise<void> {
    const line = await this.hold(manager, lineId);
    if (await manager.getRepository(LineMatch).existsBy({ lineId, takenBackAt: IsNull() }))
      throw matchedBefore();
    const because: Because = {
      how: 'by hand',
      reasons: [`Settled by ${actor.name}`],
      matchedById: actor.personId,
    };
    if (choice.invoiceIds) return this.byInvoices(manager, line, choice.invoiceIds, because);
    if (choice.paymentId) return this.byPayment(manager, line, choice.paymentId, because, currency);
    return this.byAccount(manager, line, choice, because);
  }

  async hold(manager: EntityManager, lineId: string): Promise<StatementLine> {
    const line = await manager
      .getRepository(StatementLine)
      .findOne({ where: { id: lineId }, lock: { mode: 'for_no_key_update' } });
    if (!line) throw notFound('line');
    return line;
  }

  private async byInvoices(
    manager: EntityManager,
    line: StatementLine,
    invoiceIds: string[],
    because: Because,
  ): Promise<void> {
    if (line.amountMinor < 0)
      throw reconciliationProblems['match-does-not-fit']('Money that went out pays no invoice.');
    const found = await this.invoices.hold(manager, invoiceIds);
    const personIds = [...new Set(found.map(({ personId }) => personId))];
    const [personId] = personIds;
    if (!personId || found.length < invoiceIds.length)
      throw fieldError('invoiceIds', 'There is no such invoice.');
    if (personIds.length > 1) throw fieldError('invoiceIds', 'They are invoices of different people.');
    if (found.every(({ openMinor }) => openMinor === 0))
      throw reconciliationProblems['match-does-not-fit']('Nothing is open on that invoice any more.');
    await this.matcher.toInvoices(manager, line, { personId, invoiceIds }, because);
  }

  private async byPayment(
    manager: EntityManager,
    line: StatementLine,
    paymentId: string,
    because: Because,
    currency: string,
  ): Promise<void> {
    const payment = await this.till.hold(manager, paymentId);
    if (payment.method !== 'transfer' && payment.method !== 'cheque')
      throw reconciliationProblems['match-does-not-fit'](
        'Only a transfer or a cheque stands for a line of its own.',
      );
    if (payment.amountMinor !== line.amountMinor)
      throw reconciliationProblems['match-does-not-fit'](
        `${payment.receiptNumber} is ${writeMinor(payment.amountMinor, currency)}; the line is ${writeMinor(line.amountMinor, currency)}.`,
      );
    await this.matcher.toPayment(manager, line, { ...payment, madePayment: false }, because);
  }

  private async byAccount(
    manager: EntityManager,
    line: StatementLine,
    { accountCode = '', note = '' }: MatchLineDto,
    because: Because,
  ): Promise<void> {
    const accounts = await this.ledger.settlingAccounts(manager);
    const account = accounts.find(({ code }) => code === accountCode);
    if (!account) throw fieldError('accountCode', 'No line can be settled against that account.');
    await this.matcher.toAccount(manager, line, { code: account.code, note }, because);
  }
}
