import { Injectable } from '@nestjs/common';
import type { EntityManager } from 'typeorm';
import { Clock } from '../common/clock';
import type { Method } from '../dues/payment.entity';
import { TillService } from '../dues/till.service';
import { ACCOUNTS } from '../ledger/account.entity';
import { LedgerService } from '../ledger/ledger.service';
import { LineMatch, type MatchedHow } from './line-match.entity';
import type { StatementLine } from './statement-line.entity';

/** Who matched, how, and why. */
export interface Because {
  how: MatchedHow;
  reasons: string[];
  matchedById: string;
}

/** Writes a match: the line's amount moves to the current account from where it lay. */
@Injectable()
export class Matcher {
  constructor(
    private readonly till: TillService,
    private readonly ledger: LedgerService,
    private readonly clock: Clock,
  ) {}

  /** Money nobody had written down: the payment is made now, and taken back with the match. */
  async toInvoices(
    manager: EntityManager,
    line: StatementLine,
    invoices: { personId: string; invoiceIds: readonly string[] },
    because: Because,
  ): Promise<void> {
    const paymentId = await this.till.record(manager, {
      ...invoices,
      method: 'transfer',
      amountMinor: line.amountMinor,
      receivedOn: line.day,
      note: '',
      takenById: because.matchedById,
      clientKey: null,
      cardSessionId: null,
    });
    await this.toPayment(manager, line, { id: paymentId, method: 'transfer', madePayment: true }, because);
  }

  async toPayment(
    manager: EntityManager,
    line: StatementLine,
    payment: { id: string; method: Method; madePayment: boolean },
    because: Because,
  ): Promise<void> {
    const entryId = await this.enter(manager, line, this.till.accountOf(payment.method), because);
    await this.till.setBanked(manager, payment.id, line.day);
    const behind = { paymentId: payment.id, madePayment: payment.madePayment, accountCode: null, note: '' };
    await this.write(manager, line, entryId, behind, because);
  }

  async toAccount(
    manager: EntityManager,
    line: StatementLine,
    account: { code: string; note: string },
    because: Because,
  ): Promise<void> {
    const entryId = await this.enter(manager, line, account.code, because);
    const behind = { paymentId: null, madePayment: false, accountCode: account.code, note: account.note };
    await this.write(manager, line, entryId, behind, because);
  }

  async takeBack(manager: EntityManager, match: LineMatch, takenBackById: string): Promise<void> {
    await this.ledger.reverse(manager, match.entryId, takenBackById);
    if (match.paymentId) {
      await this.till.setBanked(manager, match.paymentId, null);
      if (match.madePayment) {
        const payment = await this.till.hold(manager, match.paymentId);
        await this.till.takeBack(manager, payment, takenBackById);
      }
    }
    const takenBackAt = this.clock.now();
    await manager.getRepository(LineMatch).update({ id: match.id }, { takenBackAt, takenBackById });
  }

  private enter(
    manager: EntityManager,
    line: StatementLine,
    fromAccount: string,
    { matchedById }: Because,
  ): Promise<string> {
    return this.ledger.record(manager, {
      occurredOn: line.day,
      description: `At the bank: ${line.description}`,
      source: { kind: 'statement line', id: line.id },
      sides: [
        { accountCode: ACCOUNTS.currentAccount, amountMinor: line.amountMinor },
        { accountCode: fromAccount, amountMinor: -line.amountMinor },
      ],
      madeById: matchedById,
    });
  }

  private async write(
    manager: EntityManager,
    { id: lineId }: StatementLine,
    entryId: string,
    behind: Pick<LineMatch, 'paymentId' | 'madePayment' | 'accountCode' | 'note'>,
    because: Because,
  ): Promise<void> {
    const matchedAt = this.clock.now();
    await manager.getRepository(LineMatch).insert({ lineId, entryId, ...behind, ...because, matchedAt });
  }
}
