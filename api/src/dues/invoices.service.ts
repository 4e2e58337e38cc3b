import { randomUUID } from 'node:crypto';
import { Injectable } from '@nestjs/common';
import { DataSource, type EntityManager } from 'typeorm';
import { requireMember, requireRole, type Actor } from '../common/actor';
import { Clock } from '../common/clock';
import { clubDay } from '../common/club-day';
import { fieldError } from '../common/common.errors';
import { translatingConstraints } from '../common/constraint';
import { skipOf } from '../common/paging.dto';
import { ClubService, type ClubSettings } from '../club/club.service';
import { ACCOUNTS } from '../ledger/account.entity';
import { LedgerService } from '../ledger/ledger.service';
import { PeopleService } from '../people/people.service';
import { creditorReference } from '../common/creditor-reference.rules';
import { CreditService } from './credit.service';
import {
  invoiceDto,
  type InvoiceDto,
  type InvoicesPageDto,
  type ListInvoicesQueryDto,
  type OpenInvoiceDto,
  type RaiseInvoiceDto,
} from './dto/invoice.dto';
import { initialsOf, openOf } from './dues.rules';
import { Invoice, type InvoiceKind } from './invoice.entity';
import { InvoicesRepository, type InvoiceRow } from './invoices.repository';
import { nextNumber } from './numbers';

const INCOME: Record<InvoiceKind, string> = {
  dues: ACCOUNTS.dues,
  'course fee': ACCOUNTS.courseFees,
  kit: ACCOUNTS.kits,
};

/** An invoice as the reconciliation sees it. */
export interface HeldInvoice {
  id: string;
  number: string;
  reference: string;
  personId: string;
  openMinor: number;
}

@Injectable()
export class InvoicesService {
  constructor(
    private readonly dataSource: DataSource,
    private readonly invoices: InvoicesRepository,
    private readonly credit: CreditService,
    private readonly ledger: LedgerService,
    private readonly people: PeopleService,
    private readonly club: ClubService,
    private readonly clock: Clock,
  ) {}

  /** The person's own, paid ones too, those due first first. */
  async mine(actor: Actor): Promise<InvoiceDto[]> {
    requireMember(actor);
    const today = await this.today();
    const invoices = await this.invoices.find({ personId: actor.personId }, today);
    return invoices.map((invoice) => invoiceDto(invoice, today));
  }

  async list(actor: Actor, query: ListInvoicesQueryDto): Promise<InvoicesPageDto> {
    requireRole(actor, 'treasurer');
    const today = await this.today();
    const { page, perPage, state, personId } = query;
    const search = { state, personId };
    const found = await this.invoices.find(search, today, { skip: skipOf(query), take: perPage });
    const totals = await this.invoices.totals(search, today);
    return { items: await this.named(found, today), ...totals, page, perPage };
  }

  /** Raises an invoice today. Credit the person has on account pays it first. */
  async raise(actor: Actor, invoice: RaiseInvoiceDto): Promise<OpenInvoiceDto> {
    requireRole(actor, 'treasurer');
    const settings = await this.club.settings();
    const today = clubDay(this.clock.now(), settings.timeZone);
    if (invoice.dueOn < today) throw fieldError('dueOn', 'The due day is past. Choose today or a later day.');
    const id = await translatingConstraints(
      () => this.dataSource.transaction((manager) => this.write(manager, actor, invoice, today, settings)),
      { invoice_to_person: () => fieldError('personId', 'There is no such person.') },
    );
    const [raised] = await this.named(await this.invoices.find({ ids: [id] }, today), today);
    if (!raised) throw new Error(`The invoice ${id} was raised and is not there.`);
    return raised;
  }

  /** For the reconciliation: everything left to pay, those due first first. */
  async allOpen(): Promise<OpenInvoiceDto[]> {
    const today = await this.today();
    return this.named(await this.invoices.find({ state: 'open' }, today), today);
  }

  /** For the reconciliation: these invoices, held until the transaction ends. */
  async hold(manager: EntityManager, ids: readonly string[]): Promise<HeldInvoice[]> {
    return (await this.invoices.lock(manager, ids, await this.today(manager))).map(held);
  }

  /** For the reconciliation: the invoices that bear these references, paid ones too. */
  async byReferences(
    manager: EntityManager,
    references: readonly string[],
    hold: boolean,
  ): Promise<HeldInvoice[]> {
    if (references.length === 0) return [];
    const found = await this.invoices.find({ references }, await this.today(manager), undefined, manager);
    if (!hold) return found.map(held);
    return this.hold(
      manager,
      found.map(({ id }) => id),
    );
  }

  private async write(
    manager: EntityManager,
    actor: Actor,
    invoice: RaiseInvoiceDto,
    today: string,
    settings: ClubSettings,
  ): Promise<string> {
    const { personId, kind, description, amountMinor, dueOn } = invoice;
    const id = randomUUID();
    const number = await nextNumber(manager, kind);
    const reference = creditorReference(`${initialsOf(settings.name)}${number.replace('-', '')}`);
    const entryId = await this.ledger.record(manager, {
      occurredOn: today,
      description: `${number} raised: ${description}`,
      source: { kind: 'invoice', id },
      sides: [
        { accountCode: ACCOUNTS.membersOwe, amountMinor },
        { accountCode: INCOME[kind], amountMinor: -amountMinor },
      ],
      madeById: actor.personId,
    });
    await manager.getRepository(Invoice).insert({
      id,
      number,
      kind,
      personId,
      description,
      amountMinor,
      issuedOn: today,
      dueOn,
      reference,
      entryId,
      raisedAt: this.clock.now(),
    });
    await this.credit.useFor(
      manager,
      { id, number, personId, openMinor: amountMinor },
      today,
      actor.personId,
    );
    return id;
  }

  private async named(invoices: InvoiceRow[], today: string): Promise<OpenInvoiceDto[]> {
    const people = await this.people.byIds(invoices.map(({ personId }) => personId));
    return invoices.map((invoice) => ({
      ...invoiceDto(invoice, today),
      personId: invoice.personId,
      personName: people.get(invoice.personId)?.name ?? '',
    }));
  }

  private async today(manager?: EntityManager): Promise<string> {
    const { timeZone } = await this.club.settings(manager);
    return clubDay(this.clock.now(), timeZone);
  }
}

function held(invoice: InvoiceRow): HeldInvoice {
  const { id, number, reference, personId } = invoice;
  return { id, number, reference, personId, openMinor: openOf(invoice) };
}
