import { Injectable } from '@nestjs/common';
import { DataSource, IsNull, type EntityManager } from 'typeorm';
import { requireRole, type Actor } from '../common/actor';
import { fieldError, notFound } from '../common/common.errors';
import { translatingConstraints } from '../common/constraint';
import { writeMinor } from '../common/minor-units';
import { skipOf, type PageQueryDto } from '../common/paging.dto';
import { ClubService } from '../club/club.service';
import { InvoicesService } from '../dues/invoices.service';
import { TillService } from '../dues/till.service';
import { ACCOUNTS } from '../ledger/account.entity';
import { LedgerService } from '../ledger/ledger.service';
import { BookItems } from './book-items';
import { Bookkeeper } from './bookkeeper';
import type { MatchLineDto } from './dto/match-line.dto';
import type { StatementDetailDto, StatementLineDto, StatementsPageDto } from './dto/statement.dto';
import { LineMatch } from './line-match.entity';
import { Matcher, type Because } from './matcher';
import { reconciliationProblems } from './reconciliation.errors';
import { findByReference, totals, type Books } from './reconciliation.rules';
import { StatementLine } from './statement-line.entity';
import { StatementsRepository } from './statements.repository';

@Injectable()
export class ReconciliationService {
  constructor(
    private readonly dataSource: DataSource,
    private readonly statements: StatementsRepository,
    private readonly items: BookItems,
    private readonly books: Bookkeeper,
    private readonly matcher: Matcher,
    private readonly till: TillService,
    private readonly invoices: InvoicesService,
    private readonly ledger: LedgerService,
    private readonly club: ClubService,
  ) {}

  async list(actor: Actor, query: PageQueryDto): Promise<StatementsPageDto> {
    requireRole(actor, 'treasurer');
    const { page, perPage } = query;
    return { ...(await this.statements.page(skipOf(query), perPage)), page, perPage };
  }

  /** The statement beside the books, and what still keeps them apart. */
  async show(actor: Actor, statementId: string): Promise<StatementDetailDto> {
    requireRole(actor, 'treasurer');
    const statement = await this.statements.one(statementId);
    const { currency } = await this.club.settings();
    const { manager } = this.dataSource;
    const lines = await this.statements.linesOf(manager, statementId);
    const matches = await this.statements.liveMatches(lines.map(({ id }) => id));
    const unmatched = lines.filter(({ id }) => !matches.has(id));
    const books = await this.books.booksFor(manager, unmatched, false);
    const accounts = await this.ledger.settlingAccounts();
    const { earlierOpenMinor, laterMatchedMinor } = await this.statements.around(statementId);
    const inBooks = await this.ledger.balance(ACCOUNTS.currentAccount);
    const judged = lines.map(({ id, amountMinor }) => ({ amountMinor, isMatched: matches.has(id) }));
    return {
      ...statement,
      currency,
      lines: lines.map((line) => lineDto(line, matches.get(line.id), books, currency)),
      ...(await this.items.of(lines, matches, accounts)),
      totals: totals(statement, judged, inBooks - laterMatchedMinor, earlierOpenMinor),
      accounts: accounts.map(({ code, name }) => ({ code, name })),
    };
  }

  /**
   * Settles a line by hand.
   * @throws DomainError `line-matched-before`, `match-does-not-fit` (409)
   */
  async match(actor: Actor, lineId: string, choice: MatchLineDto): Promise<StatementLineDto> {
    requireRole(actor, 'treasurer');
    checkOneChoice(choice);
    const { currency } = await this.club.settings();
    await translatingConstraints(
      () => this.dataSource.transaction((manager) => this.settle(manager, actor, lineId, choice, currency)),
      {
        line_match_line_once: matchedBefore,
        line_match_payment_once: () =>
          reconciliationProblems['match-does-not-fit']('That payment stands for another line already.'),
      },
    );
    return this.line(lineId, currency);
  }

  /** Takes a match back: its entry is reversed, and so is the payment the match made. */
  async takeBack(actor: Actor, lineId: string): Promise<StatementLineDto> {
    requireRole(actor, 'treasurer');
    const { currency } = await this.club.settings();
    await this.dataSource.transaction(async (manager) => {
      await this.hold(manager, lineId);
      const match = await manager.getRepository(LineMatch).findOneBy({ lineId, takenBackAt: IsNull() });
      if (!match)
        throw reconciliationProblems['line-not-matched']('There is no match on this line to take back.');
      await this.matcher.takeBack(manager, match, actor.personId);
    });
    return this.line(lineId, currency);
  }

  private async settle(
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
    if (choice.invoiceIds) return this.settleByInvoices(manager, line, choice.invoiceIds, because);
    if (choice.paymentId) return this.settleByPayment(manager, line, choice.paymentId, because, currency);
    return this.settleByAccount(manager, line, choice, because);
  }

  private async settleByInvoices(
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

  private async settleByPayment(
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

  private async settleByAccount(
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

  private async hold(manager: EntityManager, lineId: string): Promise<StatementLine> {
    const line = await manager
      .getRepository(StatementLine)
      .findOne({ where: { id: lineId }, lock: { mode: 'for_no_key_update' } });
    if (!line) throw notFound('line');
    return line;
  }

  private async line(lineId: string, currency: string): Promise<StatementLineDto> {
    const { manager } = this.dataSource;
    const line = await manager.getRepository(StatementLine).findOneByOrFail({ id: lineId });
    const match = (await this.statements.liveMatches([lineId])).get(lineId);
    return lineDto(line, match, await this.books.booksFor(manager, [line], false), currency);
  }
}

function checkOneChoice({ invoiceIds, paymentId, accountCode }: MatchLineDto): void {
  const chosen = [invoiceIds, paymentId, accountCode].filter((one) => one !== undefined);
  if (chosen.length !== 1)
    throw fieldError('invoiceIds', 'Name the invoices, or one payment, or one account; one of the three.');
}

const matchedBefore = (): Error =>
  reconciliationProblems['line-matched-before']('The line is matched already. Take that back first.');

function lineDto(
  line: StatementLine,
  match: LineMatch | undefined,
  books: Books,
  currency: string,
): StatementLineDto {
  const { id, day, description, amountMinor } = line;
  const said = { id, day, description, amountMinor };
  if (!match)
    return {
      ...said,
      state: 'no match',
      reasons: findByReference(line, books, currency).reasons,
      match: null,
    };
  const { how, matchedAt, paymentId, reasons } = match;
  return {
    ...said,
    state: 'matched',
    reasons,
    match: { how, matchedAt: matchedAt.toISOString(), paymentId },
  };
}
