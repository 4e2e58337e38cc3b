import { Injectable } from '@nestjs/common';
import { DataSource, type EntityManager } from 'typeorm';
import { requireRole, type Actor } from '../common/actor';
import { Clock } from '../common/clock';
import { addDays, clubDay, writeDay } from '../common/club-day';
import { fieldError } from '../common/common.errors';
import { translatingConstraints } from '../common/constraint';
import { sumMinor, writeMinor } from '../common/minor-units';
import { retryingOnce } from '../common/retrying';
import { ClubService } from '../club/club.service';
import { ACCOUNTS } from '../ledger/account.entity';
import { LedgerService } from '../ledger/ledger.service';
import { BankStatement } from './bank-statement.entity';
import type { StatementDto } from './dto/statement.dto';
import { marked, type MarkedLine } from './fingerprint';
import { MATCH_REFUSALS, reconciliationProblems } from './reconciliation.errors';
import { SelfMatching } from './self-matching';
import type { StatementFile } from './statement-csv.rules';
import { fileNameOf, readUploaded, type UploadedStatement } from './statement-file';
import { StatementLine } from './statement-line.entity';
import { StatementsRepository } from './statements.repository';

@Injectable()
export class StatementImportService {
  constructor(
    private readonly dataSource: DataSource,
    private readonly statements: StatementsRepository,
    private readonly selfMatching: SelfMatching,
    private readonly ledger: LedgerService,
    private readonly club: ClubService,
    private readonly clock: Clock,
  ) {}

  /**
   * Takes a bank's statement in: all of it or, when a line is wrong, nothing. What carries an exact reference and the
   * exact amount matches by itself.
   * @throws DomainError `statement-unreadable` (422, names the line), `statement-imported-before`,
   *   `statement-does-not-follow` (409), `wrong-kind-of-file` (415)
   */
  async import(actor: Actor, file: UploadedStatement | undefined): Promise<StatementDto> {
    requireRole(actor, 'treasurer');
    if (!file) throw fieldError('file', 'Choose the statement’s file.');
    const { timeZone, currency } = await this.club.settings();
    const fileName = fileNameOf(file);
    const today = clubDay(this.clock.now(), timeZone);
    const read = readUploaded(file, fileName, currency, today);
    const work = () =>
      this.dataSource.transaction((manager) => this.keep(manager, actor, fileName, read, currency));
    const id = await translatingConstraints(() => retryingOnce(work), MATCH_REFUSALS);
    return this.statements.one(id);
  }

  private async keep(
    manager: EntityManager,
    actor: Actor,
    fileName: string,
    file: StatementFile,
    currency: string,
  ): Promise<string> {
    // One import at a time: each opens where the last one closed.
    await manager.query(`SELECT pg_advisory_xact_lock(hashtext('bank_statement'))`);
    const all = marked(file.lines);
    const known = await this.statements.known(manager, all);
    const fresh = all.filter((line) => !known.has(keyOf(line)));
    if (fresh.length === 0)
      throw reconciliationProblems['statement-imported-before'](
        `Every line of ${fileName} was imported before. None is counted twice.`,
      );
    const openingMinor = file.closingMinor - sumMinor(fresh.map(({ amountMinor }) => amountMinor));
    const last = await this.statements.last(manager);
    if (last) follows(last, openingMinor, fresh, currency);
    else await this.open(manager, actor, openingMinor, fresh);
    const statement = await this.write(manager, actor, fileName, { ...file, openingMinor }, fresh, {
      position: (last?.position ?? 0) + 1,
      knownLines: known.size,
    });
    const lines = await this.statements.linesOf(manager, statement.id);
    await this.selfMatching.match(manager, lines, actor.personId, currency);
    return statement.id;
  }

  /** The first statement brings the balance the account had before the books began. */
  private async open(
    manager: EntityManager,
    { personId }: Actor,
    openingMinor: number,
    lines: readonly MarkedLine[],
  ): Promise<void> {
    const inBooks = await this.ledger.balance(ACCOUNTS.currentAccount, undefined, manager);
    const missing = openingMinor - inBooks;
    if (missing === 0) return;
    await this.ledger.record(manager, {
      occurredOn: addDays(lines[0]?.day ?? '', -1),
      description: 'Opening balance of the current account, from its first statement',
      source: { kind: 'opening', id: null },
      sides: [
        { accountCode: ACCOUNTS.currentAccount, amountMinor: missing },
        { accountCode: ACCOUNTS.clubFunds, amountMinor: -missing },
      ],
      madeById: personId,
    });
  }

  private async write(
    manager: EntityManager,
    actor: Actor,
    fileName: string,
    { openingMinor, closingMinor }: StatementFile,
    lines: readonly MarkedLine[],
    rest: { position: number; knownLines: number },
  ): Promise<BankStatement> {
    const repository = manager.getRepository(BankStatement);
    const statement = await repository.save(
      repository.create({
        ...rest,
        fileName,
        fromOn: lines[0]?.day,
        toOn: lines[lines.length - 1]?.day,
        openingMinor,
        closingMinor,
        importedAt: this.clock.now(),
        importedById: actor.personId,
      }),
    );
    const rows = lines.map((line, index) => ({ ...line, statementId: statement.id, position: index + 1 }));
    await manager.getRepository(StatementLine).save(rows, { chunk: 500 });
    return statement;
  }
}

export const keyOf = ({ fingerprint, occurrence }: Pick<MarkedLine, 'fingerprint' | 'occurrence'>): string =>
  `${fingerprint}:${occurrence}`;

function follows(
  last: BankStatement,
  openingMinor: number,
  lines: readonly MarkedLine[],
  currency: string,
): void {
  if (last.closingMinor === openingMinor && (lines[0]?.day ?? '') >= last.toOn) return;
  const write = (minor: number): string => writeMinor(minor, currency);
  throw reconciliationProblems['statement-does-not-follow'](
    `This one opens at ${write(openingMinor)}; the last statement, to ${writeDay(last.toOn)}, closed at ${write(last.closingMinor)}. Import what lies between first. Nothing was kept.`,
  );
}
