import { Injectable } from '@nestjs/common';
import { DataSource, IsNull, type EntityManager } from 'typeorm';
import { requireRole, type Actor } from '../common/actor';
import { fieldError } from '../common/common.errors';
import { translatingConstraints } from '../common/constraint';
import { skipOf, type PageQueryDto } from '../common/paging.dto';
import { retryingOnce } from '../common/retrying';
import { ClubService } from '../club/club.service';
import { ACCOUNTS } from '../ledger/account.entity';
import { LedgerService } from '../ledger/ledger.service';
import { BookItems } from './book-items';
import { Bookkeeper } from './bookkeeper';
import type { MatchLineDto } from './dto/match-line.dto';
import type { StatementDetailDto, StatementLineDto, StatementsPageDto } from './dto/statement.dto';
import { LineMatch } from './line-match.entity';
import { LineSettler } from './line-settler';
import { Matcher } from './matcher';
import { MATCH_REFUSALS, reconciliationProblems } from './reconciliation.errors';
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
    private readonly settler: LineSettler,
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
    const books = await this.books.booksFor(manager, unmatched);
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
    const work = () =>
      this.dataSource.transaction((manager) => this.settler.settle(manager, actor, lineId, choice, currency));
    await translatingConstraints(() => retryingOnce(work), MATCH_REFUSALS);
    return this.line(lineId, currency);
  }

  /** Takes a match back: its entry is reversed, and so is the payment the match made. */
  async takeBack(actor: Actor, lineId: string): Promise<StatementLineDto> {
    requireRole(actor, 'treasurer');
    const { currency } = await this.club.settings();
    const work = async (manager: EntityManager): Promise<void> => {
      await this.settler.hold(manager, lineId);
      const match = await manager.getRepository(LineMatch).findOneBy({ lineId, takenBackAt: IsNull() });
      if (!match)
        throw reconciliationProblems['line-not-matched']('There is no match on this line to take back.');
      await this.matcher.takeBack(manager, match, actor.personId);
    };
    await retryingOnce(() => this.dataSource.transaction(work));
    return this.line(lineId, currency);
  }

  private async line(lineId: string, currency: string): Promise<StatementLineDto> {
    const { manager } = this.dataSource;
    const line = await manager.getRepository(StatementLine).findOneByOrFail({ id: lineId });
    const match = (await this.statements.liveMatches([lineId])).get(lineId);
    return lineDto(line, match, await this.books.booksFor(manager, [line]), currency);
  }
}

function checkOneChoice({ invoiceIds, paymentId, accountCode }: MatchLineDto): void {
  const chosen = [invoiceIds, paymentId, accountCode].filter((one) => one !== undefined);
  if (chosen.length !== 1)
    throw fieldError('invoiceIds', 'Name the invoices, or one payment, or one account; one of the three.');
}

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
