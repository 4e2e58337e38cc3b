import { Injectable } from '@nestjs/common';
import type Stripe from 'stripe';
import { DataSource, type EntityManager } from 'typeorm';
import { Clock } from '../common/clock';
import { CardEvents } from './card-events';
import { CardService } from './card-service';
import type { WebhookDto } from './dto/webhook.dto';
import { duesProblems } from './dues.errors';
import { PaymentEvent } from './payment-event.entity';

/** Called by the card service, which proves itself by its signature; nobody is signed in here. */
@Injectable()
export class WebhooksService {
  constructor(
    private readonly dataSource: DataSource,
    private readonly cards: CardService,
    private readonly events: CardEvents,
    private readonly clock: Clock,
  ) {}

  /**
   * Claims the event and acts on it in one transaction, so that it counts once however often it is delivered, and
   * again later when acting on it failed.
   * @throws DomainError `webhook-not-believed` (400) and writes nothing.
   */
  async receive(body: Buffer | undefined, signature: string | undefined): Promise<WebhookDto> {
    const event = this.believe(body, signature);
    return this.dataSource.transaction(async (manager) => {
      if (!(await this.claim(manager, event))) return { received: event.id, outcome: 'known' };
      const { outcome, note } = await this.events.act(manager, event);
      await manager.getRepository(PaymentEvent).update({ id: event.id }, { outcome, note });
      return { received: event.id, outcome };
    });
  }

  private believe(body: Buffer | undefined, signature: string | undefined): Stripe.Event {
    try {
      return this.cards.believe(body ?? Buffer.alloc(0), signature ?? '', this.clock.now());
    } catch {
      throw duesProblems['webhook-not-believed'](
        'The signature is missing, wrong or too old. Nothing was written.',
      );
    }
  }

  private async claim(manager: EntityManager, { id, type }: Stripe.Event): Promise<boolean> {
    const claimed = await manager.query<{ id: string }[]>(
      `INSERT INTO payment_event (id, type, received_at) VALUES ($1, $2, $3) ON CONFLICT DO NOTHING RETURNING id`,
      [id, type, this.clock.now()],
    );
    return claimed.length === 1;
  }
}
