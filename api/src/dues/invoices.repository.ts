import { Injectable } from '@nestjs/common';
import { InjectRepository } from '@nestjs/typeorm';
import { In, Repository, type EntityManager } from 'typeorm';
import { asMinor } from '../common/minor-units';
import type { InvoiceFilter } from './dto/invoice.dto';
import type { DuesRunDto } from './dto/treasury.dto';
import { Invoice, type InvoiceKind } from './invoice.entity';

/** An invoice with what has been paid on it. */
export interface InvoiceRow {
  id: string;
  number: string;
  kind: InvoiceKind;
  personId: string;
  description: string;
  amountMinor: number;
  paidMinor: number;
  issuedOn: string;
  dueOn: string;
  reference: string;
}

export interface InvoiceSearch {
  ids?: readonly string[];
  references?: readonly string[];
  personId?: string;
  state?: InvoiceFilter;
}

const PAID = `coalesce((SELECT sum(a.amount_minor) FROM payment_allocation a
                WHERE a.invoice_id = i.id AND a.released_at IS NULL), 0)`;

const WHERE = `($1::uuid[] IS NULL OR i.id = ANY ($1))
  AND ($2::uuid IS NULL OR i.person_id = $2)
  AND CASE $3 WHEN 'open' THEN i.amount_minor > i.paid_minor
              WHEN 'late' THEN i.amount_minor > i.paid_minor AND i.due_on < $4
              WHEN 'paid' THEN i.amount_minor = i.paid_minor
              ELSE true END
  AND ($5::text[] IS NULL OR i.reference = ANY ($5))`;

const FROM = `(SELECT i.*, ${PAID} AS paid_minor FROM invoice i) i`;

@Injectable()
export class InvoicesRepository {
  constructor(@InjectRepository(Invoice) private readonly invoices: Repository<Invoice>) {}

  /** Those due first come first. `page` is left out where one person or one set of ids bounds the answer. */
  async find(
    search: InvoiceSearch,
    today: string,
    page?: { skip: number; take: number },
    manager?: EntityManager,
  ): Promise<InvoiceRow[]> {
    const rows = await (manager ?? this.invoices.manager).query<InvoiceRow[]>(
      `SELECT i.id, i.number, i.kind, i.person_id AS "personId", i.description,
              i.amount_minor::text AS "amountMinor", i.paid_minor::text AS "paidMinor",
              i.issued_on::text AS "issuedOn", i.due_on::text AS "dueOn", i.reference
         FROM ${FROM} WHERE ${WHERE} ORDER BY i.due_on, i.number LIMIT $6 OFFSET $7`,
      [...parameters(search, today), page?.take ?? null, page?.skip ?? 0],
    );
    return rows.map((row) => ({
      ...row,
      amountMinor: asMinor(row.amountMinor),
      paidMinor: asMinor(row.paidMinor),
    }));
  }

  async totals(search: InvoiceSearch, today: string): Promise<{ total: number; openMinor: number }> {
    const [row] = await this.invoices.manager.query<{ total: number; open: string }[]>(
      `SELECT count(*)::int AS total, coalesce(sum(i.amount_minor - i.paid_minor), 0)::text AS open
         FROM ${FROM} WHERE ${WHERE}`,
      parameters(search, today),
    );
    return { total: row?.total ?? 0, openMinor: asMinor(row?.open ?? 0) };
  }

  /**
   * The dues raised last, as one run. A run is told by its words, within half a year because the same words come back
   * every year; an invoice raised by itself is not one as long as there is another.
   */
  async newestRun(): Promise<DuesRunDto | undefined> {
    const [run] = await this.invoices.manager.query<DuesRunDto[]>(
      `SELECT description, max(due_on)::text AS "dueOn", count(*)::int AS count,
              sum(amount_minor)::text AS "raisedMinor", sum(paid_minor)::text AS "paidMinor",
              count(*) FILTER (WHERE amount_minor = paid_minor)::int AS "paidCount"
         FROM (SELECT i.*, max(issued_on) OVER (PARTITION BY description) AS newest
                 FROM ${FROM} WHERE kind = 'dues') i
        WHERE issued_on > newest - interval '6 months'
        GROUP BY description ORDER BY count(*) > 1 DESC, max(issued_on) DESC, count(*) DESC LIMIT 1`,
    );
    return run && { ...run, raisedMinor: asMinor(run.raisedMinor), paidMinor: asMinor(run.paidMinor) };
  }

  /**
   * Holds these invoices until the transaction ends, always in the same order, so that two payments queue up instead
   * of blocking each other. Then reads what is open on them.
   */
  async lock(manager: EntityManager, ids: readonly string[], today: string): Promise<InvoiceRow[]> {
    if (ids.length === 0) return [];
    await manager.getRepository(Invoice).find({
      where: { id: In([...ids]) },
      select: { id: true },
      order: { id: 'ASC' },
      lock: { mode: 'for_no_key_update' },
    });
    return this.find({ ids }, today, undefined, manager);
  }
}

function parameters(search: InvoiceSearch, today: string): unknown[] {
  const { ids = null, personId = null, state = 'any', references = null } = search;
  return [ids, personId, state, today, references];
}
