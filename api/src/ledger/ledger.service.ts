import { Injectable } from '@nestjs/common';
import { InjectRepository } from '@nestjs/typeorm';
import { Repository, type EntityManager } from 'typeorm';
import { requireRole, type Actor } from '../common/actor';
import { Clock } from '../common/clock';
import { clubDay } from '../common/club-day';
import { notFound } from '../common/common.errors';
import { asMinor } from '../common/minor-units';
import { ClubService } from '../club/club.service';
import { Account } from './account.entity';
import { trialBalanceDto, type TrialBalanceDto } from './dto/trial-balance.dto';
import { Entry, type SourceKind } from './entry.entity';
import { ledgerProblems } from './ledger.errors';
import { checkSides, reversed, sidesOf, trialBalance, type AccountBalance, type Side } from './ledger.rules';
import { Posting } from './posting.entity';

export interface NewEntry {
  occurredOn: string;
  description: string;
  source: { kind: SourceKind; id: string | null };
  /** Sides of nothing are left out. */
  sides: Side[];
  madeById: string | null;
}

export interface Movement {
  inMinor: number;
  outMinor: number;
}

@Injectable()
export class LedgerService {
  constructor(
    @InjectRepository(Account) private readonly accounts: Repository<Account>,
    private readonly club: ClubService,
    private readonly clock: Clock,
  ) {}

  /** For other features, inside their transaction. @returns the entry's id */
  async record(manager: EntityManager, entry: NewEntry): Promise<string> {
    return this.write(manager, entry, null);
  }

  /**
   * For other features: takes an entry back by its mirror image, dated the same day so that balances of that day hold.
   * @throws DomainError `entry-reversed-before` (409)
   */
  async reverse(manager: EntityManager, entryId: string, madeById: string | null): Promise<string> {
    const entry = await manager.getRepository(Entry).findOneBy({ id: entryId });
    if (!entry) throw notFound('entry');
    if (await manager.getRepository(Entry).existsBy({ reversesId: entryId }))
      throw ledgerProblems['entry-reversed-before'](`“${entry.description}” was taken back before.`);
    const sides = await manager.getRepository(Posting).findBy({ entryId });
    const mirror: NewEntry = {
      occurredOn: entry.occurredOn,
      description: `Taken back: ${entry.description}`,
      source: { kind: 'correction', id: entry.sourceId },
      sides: reversed(sides),
      madeById,
    };
    return this.write(manager, mirror, entryId);
  }

  /** For other features: the balance of an account, up to and with a day. Debit balances are positive. */
  async balance(accountCode: string, upTo?: string, manager?: EntityManager): Promise<number> {
    const balances = await this.balances(upTo, manager);
    return balances.find(({ code }) => code === accountCode)?.balanceMinor ?? 0;
  }

  /** For other features: every account with its balance, by code. */
  async balances(upTo?: string, manager?: EntityManager): Promise<AccountBalance[]> {
    const rows = await (manager ?? this.accounts.manager).query<
      (AccountBalance & { balanceMinor: string })[]
    >(
      `SELECT a.code, a.name, a.kind, coalesce(sum(p.amount_minor), 0)::text AS "balanceMinor"
         FROM account a
         LEFT JOIN (posting p JOIN entry e ON e.id = p.entry_id AND ($1::date IS NULL OR e.occurred_on <= $1))
           ON p.account_code = a.code
        GROUP BY a.code ORDER BY a.code`,
      [upTo ?? null],
    );
    return rows.map((row) => ({ ...row, balanceMinor: asMinor(row.balanceMinor) }));
  }

  /** For other features: what came into an account and what left it in a stretch of days; corrections cancel out. */
  async movement(accountCode: string, from: string, to: string): Promise<Movement> {
    const [row] = await this.accounts.manager.query<{ in: string; out: string }[]>(
      `SELECT coalesce(sum(p.amount_minor) FILTER (WHERE p.amount_minor > 0), 0)::text AS "in",
              coalesce(sum(p.amount_minor) FILTER (WHERE p.amount_minor < 0), 0)::text AS "out"
         FROM posting p JOIN entry e ON e.id = p.entry_id
        WHERE p.account_code = $1 AND e.occurred_on BETWEEN $2 AND $3 AND e.source_kind <> 'opening'
          AND e.reverses_id IS NULL AND NOT EXISTS (SELECT 1 FROM entry r WHERE r.reverses_id = e.id)`,
      [accountCode, from, to],
    );
    return { inMinor: asMinor(row?.in), outMinor: asMinor(row?.out) };
  }

  /** For other features: the accounts that may stand against a statement line by hand. */
  async settlingAccounts(manager?: EntityManager): Promise<Account[]> {
    const accounts = manager?.getRepository(Account) ?? this.accounts;
    return accounts.find({ where: { settlesLines: true }, order: { code: 'ASC' } });
  }

  async trialBalance(actor: Actor, on?: string): Promise<TrialBalanceDto> {
    requireRole(actor, 'treasurer');
    const { timeZone } = await this.club.settings();
    const asOn = on ?? clubDay(this.clock.now(), timeZone);
    return trialBalanceDto(asOn, trialBalance(await this.balances(asOn)));
  }

  private async write(manager: EntityManager, entry: NewEntry, reversesId: string | null): Promise<string> {
    const sides = sidesOf(...entry.sides);
    checkSides(sides);
    const { occurredOn, description, source, madeById } = entry;
    const { id } = await manager.getRepository(Entry).save({
      occurredOn,
      description,
      sourceKind: source.kind,
      sourceId: source.id,
      reversesId,
      postingCount: sides.length,
      madeById,
      recordedAt: this.clock.now(),
    });
    await manager
      .getRepository(Posting)
      .insert(sides.map(({ accountCode, amountMinor }) => ({ entryId: id, accountCode, amountMinor })));
    return id;
  }
}
