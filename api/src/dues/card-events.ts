import { Injectable } from '@nestjs/common';
import type Stripe from 'stripe';
import type { EntityManager } from 'typeorm';
import { Clock } from '../common/clock';
import { clubDay } from '../common/club-day';
import { isId } from '../common/id';
import { writeMinor } from '../common/minor-units';
import { ClubService } from '../club/club.service';
import { hasFailed, type CardSession } from './card-service';
import { Checkout, type CheckoutState } from './checkout.entity';
import { Invoice } from './invoice.entity';
import type { EventOutcome } from './payment-event.entity';
import { Payment } from './payment.entity';
import { PaymentsRepository } from './payments.repository';
import { ReceiptMail } from './receipt-mail';
import { takenBackByCard, type TakenBackByCard } from './refund-notes';
import { TillService } from './till.service';

interface Outcome {
  outcome: EventOutcome;
  note: string;
}

const noted = (note: string): Outcome => ({ outcome: 'noted', note });
const needsALook = (note: string): Outcome => ({ outcome: 'needs a look', note });

/** What an event of the card service does to our books. Events come late, twice and in any order. */
@Injectable()
export class CardEvents {
  constructor(
    private readonly till: TillService,
    private readonly payments: PaymentsRepository,
    private readonly receipts: ReceiptMail,
    private readonly club: ClubService,
    private readonly clock: Clock,
  ) {}

  async act(manager: EntityManager, event: Stripe.Event): Promise<Outcome> {
    if (event.type === 'checkout.session.completed' && event.data.object.payment_status !== 'paid')
      return this.move(manager, event.data.object, 'confirming');
    if (
      event.type === 'checkout.session.completed' ||
      event.type === 'checkout.session.async_payment_succeeded'
    )
      return this.settle(manager, event.data.object);
    if (event.type === 'checkout.session.async_payment_failed')
      return this.move(manager, event.data.object, 'failed');
    if (event.type === 'checkout.session.expired') return this.move(manager, event.data.object, 'expired');
    const back = takenBackByCard(event);
    if (back) return needsALook(back.note(await this.paidBy(manager, back)));
    return noted('Nothing here acts on this kind of event.');
  }

  /** The same from the session itself, asked for where no event has come. */
  async actOnSession(manager: EntityManager, session: CardSession): Promise<Outcome> {
    if (session.status === 'expired') return this.move(manager, session, 'expired');
    if (session.status !== 'complete') return noted('Nobody has paid there yet.');
    if (session.payment_status === 'paid') return this.settle(manager, session);
    return this.move(manager, session, hasFailed(session) ? 'failed' : 'confirming');
  }

  /** In words: the receipt of what a charge had paid, or the charge itself where it is none of ours. */
  private async paidBy(manager: EntityManager, { chargeId, metadata }: TakenBackByCard): Promise<string> {
    const checkout = await this.find(manager, metadata.checkout);
    const payment =
      checkout?.sessionId && (await this.payments.one({ cardSessionId: checkout.sessionId }, manager));
    return payment ? `${payment.receiptNumber} from ${payment.personName}` : `the charge ${chargeId}`;
  }

  private async settle(manager: EntityManager, session: CardSession): Promise<Outcome> {
    const checkout = await this.hold(manager, session);
    if (!checkout) return needsALook(`Paid on a card page that is not one of ours: ${session.id}.`);
    if (await manager.getRepository(Payment).existsBy({ cardSessionId: session.id }))
      return noted('Its payment was written down before.');
    const wrong = mismatch(session, checkout);
    if (wrong) return needsALook(wrong);
    const invoice = await manager.getRepository(Invoice).findOneByOrFail({ id: checkout.invoiceId });
    await this.write(manager, checkout, invoice, session.id);
    return { outcome: 'acted', note: `${invoice.number} paid by card.` };
  }

  private async write(
    manager: EntityManager,
    checkout: Checkout,
    invoice: Invoice,
    cardSessionId: string,
  ): Promise<void> {
    const { timeZone } = await this.club.settings(manager);
    const id = await this.till.record(manager, {
      personId: invoice.personId,
      method: 'card',
      amountMinor: checkout.amountMinor,
      receivedOn: clubDay(this.clock.now(), timeZone),
      invoiceIds: [invoice.id],
      note: '',
      takenById: null,
      clientKey: null,
      cardSessionId,
    });
    await this.set(manager, checkout, 'paid');
    const payment = await this.payments.one({ id }, manager);
    if (payment) await this.receipts.queue(manager, payment);
  }

  /** Only a live visit moves: an event that comes after the money changes nothing. */
  private async move(manager: EntityManager, session: CardSession, state: CheckoutState): Promise<Outcome> {
    const checkout = await this.hold(manager, session);
    if (!checkout) return noted(`No card page of ours: ${session.id}.`);
    const isLive = checkout.state === 'open' || checkout.state === 'confirming';
    if (!isLive) return noted(`It came after the end: the visit is ${checkout.state}.`);
    await this.set(manager, checkout, state);
    return { outcome: 'acted', note: `The visit is ${state}.` };
  }

  /** By the id we gave the service: its own session id may not be written down yet when the event is quick. */
  private async hold(manager: EntityManager, session: CardSession): Promise<Checkout | null> {
    const checkout = await this.find(manager, session.metadata?.checkout, { mode: 'for_no_key_update' });
    if (!checkout || (checkout.sessionId !== null && checkout.sessionId !== session.id)) return null;
    if (checkout.sessionId === null)
      await manager.getRepository(Checkout).update({ id: checkout.id }, { sessionId: session.id });
    return checkout;
  }

  private async find(
    manager: EntityManager,
    id = '',
    lock?: { mode: 'for_no_key_update' },
  ): Promise<Checkout | null> {
    if (!isId(id)) return null;
    return manager.getRepository(Checkout).findOne({ where: { id }, ...(lock && { lock }) });
  }

  private async set(manager: EntityManager, { id }: Checkout, state: CheckoutState): Promise<void> {
    await manager.getRepository(Checkout).update({ id }, { state, changedAt: this.clock.now() });
  }
}

function mismatch(session: CardSession, { amountMinor, currency }: Checkout): string | undefined {
  const paid = session.amount_total ?? 0;
  const paidIn = (session.currency ?? '').toUpperCase();
  if (paid === amountMinor && paidIn === currency) return undefined;
  const asked = `${writeMinor(amountMinor, currency)} ${currency}`;
  const came = /^[A-Z]{3}$/.test(paidIn) ? `${writeMinor(paid, paidIn)} ${paidIn}` : String(paid);
  return `${session.id} was opened for ${asked} and paid with ${came}. Nothing was written down as paid.`;
}
