import { Injectable, Logger } from '@nestjs/common';
import { DataSource, In } from 'typeorm';
import { requireMember, type Actor } from '../common/actor';
import { Clock } from '../common/clock';
import { clubDay } from '../common/club-day';
import { notFound } from '../common/common.errors';
import { ClubService } from '../club/club.service';
import { PeopleService } from '../people/people.service';
import { CardService, isAskedOtherwise, isCardServiceError } from './card-service';
import { Checkout } from './checkout.entity';
import type { CardPaymentDto, CheckoutDto } from './dto/checkout.dto';
import { duesProblems } from './dues.errors';
import { openOf } from './dues.rules';
import { InvoicesRepository, type InvoiceRow } from './invoices.repository';
import { Payment } from './payment.entity';

@Injectable()
export class CheckoutService {
  private readonly logger = new Logger(CheckoutService.name);

  constructor(
    private readonly dataSource: DataSource,
    private readonly invoices: InvoicesRepository,
    private readonly cards: CardService,
    private readonly people: PeopleService,
    private readonly club: ClubService,
    private readonly clock: Clock,
  ) {}

  /**
   * The page on which the person pays what is open on their invoice. Two presses get one page.
   * @throws DomainError `invoice-paid`, `card-payment-under-way`, `card-page-unavailable` (409)
   */
  async open(actor: Actor, invoiceId: string): Promise<CheckoutDto> {
    requireMember(actor);
    const { currency } = await this.club.settings();
    const invoice = await this.ownInvoice(actor, invoiceId);
    try {
      return { url: await this.pageFor(invoice, currency) };
    } catch (error) {
      if (!isCardServiceError(error)) throw error;
      this.logger.warn({ err: error, invoiceId }, 'The card service did not give a page');
      throw duesProblems['card-page-unavailable'](
        'The card page cannot be reached just now. No money was taken. Try again in a minute, or pay by transfer.',
      );
    }
  }

  /** What became of the person's last visit to the card page, for the page they come back to. */
  async cardPayment(actor: Actor, invoiceId: string): Promise<CardPaymentDto> {
    requireMember(actor);
    const invoice = await this.ownInvoice(actor, invoiceId);
    const last = await this.dataSource
      .getRepository(Checkout)
      .findOne({ where: { invoiceId }, order: { openedAt: 'DESC' } });
    const payment =
      last?.sessionId && last.state === 'paid'
        ? await this.dataSource.getRepository(Payment).findOneBy({ cardSessionId: last.sessionId })
        : null;
    return { state: last?.state ?? 'none', openMinor: openOf(invoice), receiptId: payment?.id ?? null };
  }

  private async ownInvoice(actor: Actor, invoiceId: string): Promise<InvoiceRow> {
    const { timeZone } = await this.club.settings();
    const search = { ids: [invoiceId], personId: actor.personId };
    const [invoice] = await this.invoices.find(search, clubDay(this.clock.now(), timeZone));
    if (!invoice) throw notFound('invoice');
    return invoice;
  }

  /** For this feature: the visit has no page any more. Only a live one ends so. */
  async expire(checkoutId: string): Promise<void> {
    await this.dataSource
      .getRepository(Checkout)
      .update(
        { id: checkoutId, state: In(['open', 'confirming']) },
        { state: 'expired', changedAt: this.clock.now() },
      );
  }

  /** A visit whose page was asked for in other words before can never have it; then there is one new visit. */
  private async pageFor(invoice: InvoiceRow, currency: string, isSecondTry = false): Promise<string> {
    await this.closeStale(invoice, currency);
    const checkout = await this.claim(invoice.id, currency);
    if (checkout.url) return checkout.url;
    try {
      return await this.openPage(checkout, invoice);
    } catch (error) {
      if (isSecondTry || !isAskedOtherwise(error)) throw error;
      await this.expire(checkout.id);
      return this.pageFor(invoice, currency, true);
    }
  }

  private async closeStale(invoice: InvoiceRow, currency: string): Promise<void> {
    const live = await this.live(invoice.id);
    if (live?.state === 'confirming') throw underWay(invoice);
    if (live && !(await this.isOffered(live, invoice, currency))) await this.expire(live.id);
    if (openOf(invoice) === 0)
      throw duesProblems['invoice-paid'](`${invoice.number} is paid. There is nothing open on it.`);
  }

  /** A page that was used, has run out, is gone, or asks for another amount than is open now is not offered again. */
  private async isOffered(live: Checkout, invoice: InvoiceRow, currency: string): Promise<boolean> {
    const isRight = live.amountMinor === openOf(invoice) && live.currency === currency;
    if (!live.sessionId) return isRight;
    const session = await this.cards.session(live.sessionId);
    if (session?.status === 'complete') throw underWay(invoice);
    if (session?.status !== 'open') return false;
    if (!isRight) await this.cards.closePage(live.sessionId);
    return isRight;
  }

  /** The one live visit of the invoice: the one that is there, or a new one. The index lets one of two through. */
  private async claim(invoiceId: string, currency: string): Promise<Checkout> {
    const now = this.clock.now();
    const { timeZone } = await this.club.settings();
    return this.dataSource.transaction(async (manager) => {
      const [invoice] = await this.invoices.lock(manager, [invoiceId], clubDay(now, timeZone));
      const amountMinor = invoice ? openOf(invoice) : 0;
      const checkouts = manager.getRepository(Checkout);
      const live = await checkouts.findOneBy({ invoiceId, state: In(['open', 'confirming']) });
      if (live) return live;
      if (amountMinor === 0) throw duesProblems['invoice-paid']('There is nothing open on this invoice.');
      const opened = {
        invoiceId,
        amountMinor,
        currency,
        state: 'open' as const,
        openedAt: now,
        changedAt: now,
      };
      return checkouts.save(checkouts.create({ ...opened, sessionId: null, url: null }));
    });
  }

  private async openPage(checkout: Checkout, invoice: InvoiceRow): Promise<string> {
    const person = (await this.people.byIds([invoice.personId])).get(invoice.personId);
    const { sessionId, url } = await this.cards.openPage({
      checkoutId: checkout.id,
      invoiceId: invoice.id,
      invoiceNumber: invoice.number,
      description: invoice.description,
      amountMinor: checkout.amountMinor,
      currency: checkout.currency,
      email: person?.email,
    });
    await this.dataSource.getRepository(Checkout).update({ id: checkout.id }, { sessionId, url });
    return url;
  }

  private live(invoiceId: string): Promise<Checkout | null> {
    return this.dataSource
      .getRepository(Checkout)
      .findOneBy({ invoiceId, state: In(['open', 'confirming']) });
  }
}

const underWay = ({ number }: InvoiceRow): Error =>
  duesProblems['card-payment-under-way'](
    `A card payment for ${number} was made and is being confirmed. No money is taken twice.`,
  );
