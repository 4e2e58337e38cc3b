import { Injectable, Logger } from '@nestjs/common';
import { DataSource, In, type EntityManager } from 'typeorm';
import { requireMember, type Actor } from '../common/actor';
import { Clock } from '../common/clock';
import { CardEvents } from './card-events';
import { CardService, isCardServiceError, type CardSession } from './card-service';
import { Checkout } from './checkout.entity';
import { CheckoutService } from './checkout.service';
import type { CardPaymentDto } from './dto/checkout.dto';
import { duesProblems } from './dues.errors';
import { PaymentEvent } from './payment-event.entity';

/** Asks the card service itself what became of a visit, where its own word of it has not come. */
@Injectable()
export class CardCheckService {
  private readonly logger = new Logger(CardCheckService.name);

  constructor(
    private readonly dataSource: DataSource,
    private readonly checkout: CheckoutService,
    private readonly cards: CardService,
    private readonly events: CardEvents,
    private readonly clock: Clock,
  ) {}

  /**
   * Writes down what the last visit to the card page has come to, as its event would have.
   * @throws DomainError `card-service-silent` (409)
   */
  async check(actor: Actor, invoiceId: string): Promise<CardPaymentDto> {
    requireMember(actor);
    const known = await this.checkout.cardPayment(actor, invoiceId);
    if (known.state !== 'open' && known.state !== 'confirming') return known;
    const live = await this.dataSource
      .getRepository(Checkout)
      .findOneBy({ invoiceId, state: In(['open', 'confirming']) });
    if (live?.sessionId) await this.reconcile(live.id, await this.ask(live.sessionId));
    return this.checkout.cardPayment(actor, invoiceId);
  }

  private async ask(sessionId: string): Promise<CardSession | null> {
    try {
      return await this.cards.session(sessionId);
    } catch (error) {
      if (!isCardServiceError(error)) throw error;
      this.logger.warn({ err: error, sessionId }, 'The card service did not say what became of a visit');
      throw duesProblems['card-service-silent'](
        'The card service does not answer just now. No money is taken twice. Try again in a while.',
      );
    }
  }

  private async reconcile(checkoutId: string, session: CardSession | null): Promise<void> {
    if (!session) return this.checkout.expire(checkoutId);
    await this.dataSource.transaction(async (manager) => {
      const { outcome, note } = await this.events.actOnSession(manager, session);
      if (outcome === 'needs a look') await this.tell(manager, session.id, note);
    });
  }

  /** The treasurer sees it among what the card service told; once, however often it is asked. */
  private async tell(manager: EntityManager, sessionId: string, note: string): Promise<void> {
    await manager
      .getRepository(PaymentEvent)
      .createQueryBuilder()
      .insert()
      .values({
        id: `asked-${sessionId}`,
        type: 'asked for',
        receivedAt: this.clock.now(),
        outcome: 'needs a look',
        note,
      })
      .orIgnore()
      .execute();
  }
}
