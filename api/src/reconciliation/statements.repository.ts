import { Injectable } from '@nestjs/common';
import { InjectRepository } from '@nestjs/typeorm';
import { In, IsNull, Repository, type EntityManager } from 'typeorm';
import { notFound } from '../common/common.errors';
import { asMinor } from '../common/minor-units';
import { BankStatement } from './bank-statement.entity';
import type { StatementDto } from './dto/statement.dto';
import type { MarkedLine } from './fingerprint';
import { LineMatch } from './line-match.entity';
import { StatementLine } from './statement-line.entity';

interface Counts {
  statementId: string;
  lineCount: number;
  matchedCount: number;
  unmatchedMinor: string;
}

const LIVE = `EXISTS (SELECT 1 FROM line_match m WHERE m.line_id = l.id AND m.taken_back_at IS NULL)`;

@Injectable()
export class StatementsRepository {
  constructor(@InjectRepository(BankStatement) private readonly statements: Repository<BankStatement>) {}

  /** Latest first. */
  async page(skip: number, take: number): Promise<{ items: StatementDto[]; total: number }> {
    const [statements, total] = await this.statements.findAndCount({
      order: { position: 'DESC' },
      skip,
      take,
    });
    return { items: await this.counted(statements), total };
  }

  async one(id: string): Promise<StatementDto> {
    const statement = await this.statements.findOneBy({ id });
    const [dto] = statement ? await this.counted([statement]) : [];
    if (!dto) throw notFound('statement');
    return dto;
  }

  async last(manager: EntityManager): Promise<BankStatement | undefined> {
    const [last] = await manager.getRepository(BankStatement).find({ order: { position: 'DESC' }, take: 1 });
    return last;
  }

  async linesOf(manager: EntityManager, statementId: string): Promise<StatementLine[]> {
    return manager.getRepository(StatementLine).find({ where: { statementId }, order: { position: 'ASC' } });
  }

  async liveMatches(lineIds: readonly string[]): Promise<Map<string, LineMatch>> {
    const matches = await this.statements.manager
      .getRepository(LineMatch)
      .findBy({ lineId: In([...lineIds]), takenBackAt: IsNull() });
    return new Map(matches.map((match) => [match.lineId, match]));
  }

  /** Which of these lines an earlier file had brought, as `fingerprint:occurrence`. */
  async known(manager: EntityManager, lines: readonly MarkedLine[]): Promise<Set<string>> {
    const rows = await manager.query<{ key: string }[]>(
      `SELECT fingerprint || ':' || occurrence AS key FROM statement_line
        WHERE (fingerprint, occurrence) IN (SELECT * FROM unnest($1::text[], $2::int[]))`,
      [lines.map(({ fingerprint }) => fingerprint), lines.map(({ occurrence }) => occurrence)],
    );
    return new Set(rows.map(({ key }) => key));
  }

  /** Sums around one statement: what earlier ones left unmatched, and what later ones have matched. */
  async around(statementId: string): Promise<{ earlierOpenMinor: number; laterMatchedMinor: number }> {
    const [row] = await this.statements.manager.query<{ earlier: string; later: string }[]>(
      `SELECT coalesce(sum(l.amount_minor) FILTER (WHERE s.position < this.position AND NOT ${LIVE}), 0)::text AS earlier,
              coalesce(sum(l.amount_minor) FILTER (WHERE s.position > this.position AND ${LIVE}), 0)::text AS later
         FROM bank_statement this, bank_statement s JOIN statement_line l ON l.statement_id = s.id
        WHERE this.id = $1`,
      [statementId],
    );
    return { earlierOpenMinor: asMinor(row?.earlier ?? 0), laterMatchedMinor: asMinor(row?.later ?? 0) };
  }

  private async counted(statements: BankStatement[]): Promise<StatementDto[]> {
    if (statements.length === 0) return [];
    const rows = await this.statements.manager.query<Counts[]>(
      `SELECT l.statement_id AS "statementId", count(*)::int AS "lineCount",
              count(*) FILTER (WHERE ${LIVE})::int AS "matchedCount",
              coalesce(sum(l.amount_minor) FILTER (WHERE NOT ${LIVE}), 0)::text AS "unmatchedMinor"
         FROM statement_line l WHERE l.statement_id = ANY ($1) GROUP BY l.statement_id`,
      [statements.map(({ id }) => id)],
    );
    return statements.map((statement) =>
      statementDto(
        statement,
        rows.find(({ statementId }) => statementId === statement.id),
      ),
    );
  }
}

function statementDto(statement: BankStatement, counts: Counts | undefined): StatementDto {
  const { id, fileName, fromOn, toOn, openingMinor, closingMinor, knownLines, importedAt } = statement;
  return {
    id,
    fileName,
    fromOn,
    toOn,
    openingMinor,
    closingMinor,
    lineCount: counts?.lineCount ?? 0,
    matchedCount: counts?.matchedCount ?? 0,
    unmatchedMinor: asMinor(counts?.unmatchedMinor ?? 0),
    knownLines,
    importedAt: importedAt.toISOString(),
  };
}
