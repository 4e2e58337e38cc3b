import { Injectable } from '@nestjs/common';
import Stripe from 'stripe';
import { Environment } from '../config/environment';

/** A signature older than this is a replay, s. */
const TOLERANCE_S = 300;

export interface CardPage {
  sessionId: string;
  url: string;
}

export type CardSession = Stripe.Checkout.Session;

export interface CardPageRequest {
  checkoutId: string;
  invoiceId: string;
  invoiceNumber: string;
  description: string;
  amountMinor: number;
  currency: string;
  email: string | undefined;
}

/** The card service, spoken to with its own SDK; in development it is a stand-in at STRIPE_API_BASE. */
@Injectable()
export class CardService {
  private readonly stripe: Stripe;

  constructor(private readonly environment: Environment) {
    const { STRIPE_SECRET_KEY, STRIPE_API_BASE } = environment;
    this.stripe = new Stripe(STRIPE_SECRET_KEY, {
      telemetry: false,
      maxNetworkRetries: 2,
      timeout: 10_000,
      ...(STRIPE_API_BASE && reachedAt(new URL(STRIPE_API_BASE))),
    });
  }

  /** Asking again with the same `checkoutId` answers with the same page. */
  async openPage(request: CardPageRequest): Promise<CardPage> {
    const { checkoutId, invoiceId, invoiceNumber, description, amountMinor, currency, email } = request;
    const back = `${this.environment.PUBLIC_URL}/dues?invoice=${invoiceId}`;
    const metadata = { checkout: checkoutId, invoice: invoiceId };
    const name = `${invoiceNumber} ${description}`;
    const session = await this.stripe.checkout.sessions.create(
      {
        mode: 'payment',
        line_items: [
          {
            quantity: 1,
            price_data: {
              currency: currency.toLowerCase(),
              unit_amount: amountMinor,
              product_data: { name },
            },
          },
        ],
        metadata,
        payment_intent_data: { metadata, description: name },
        ...(email && { customer_email: email }),
        success_url: `${back}&card=returned`,
        cancel_url: `${back}&card=left`,
      },
      { idempotencyKey: `checkout-${checkoutId}` },
    );
    if (!session.url) throw new Error(`The card service gave no page for ${session.id}.`);
    return { sessionId: session.id, url: session.url };
  }

  /** With what became of its payment; null when the service knows of no such session. */
  async session(sessionId: string): Promise<CardSession | null> {
    try {
      return await this.stripe.checkout.sessions.retrieve(sessionId, { expand: ['payment_intent'] });
    } catch (error) {
      if (error instanceof Stripe.errors.StripeError && error.code === 'resource_missing') return null;
      throw error;
    }
  }

  async closePage(sessionId: string): Promise<void> {
    await this.stripe.checkout.sessions.expire(sessionId);
  }

  /**
   * The event, when it is signed with our secret and fresh on `now`.
   * @throws Error of the SDK otherwise.
   */
  believe(body: Buffer, signature: string, now: Date): Stripe.Event {
    const { STRIPE_WEBHOOK_SECRET } = this.environment;
    return this.stripe.webhooks.constructEvent(
      body,
      signature,
      STRIPE_WEBHOOK_SECRET,
      TOLERANCE_S,
      undefined,
      now.getTime(),
    );
  }
}

/** Network trouble, or an answer of the service that is not a success. */
export function isCardServiceError(error: unknown): boolean {
  return error instanceof Stripe.errors.StripeError;
}

/** The key of a page was used before, and what is asked for now is not the same: the invoice's words changed since. */
export function isAskedOtherwise(error: unknown): boolean {
  return error instanceof Stripe.errors.StripeIdempotencyError;
}

/** The bank said no after the page was left: the session alone only says that it is not paid. */
export function hasFailed({ payment_intent: intent }: CardSession): boolean {
  return typeof intent === 'object' && intent?.status === 'requires_payment_method';
}

function reachedAt(base: URL): Stripe.StripeConfig {
  const protocol = base.protocol === 'https:' ? 'https' : 'http';
  return { protocol, host: base.hostname, ...(base.port && { port: base.port }) };
}
