import { randomBytes } from 'node:crypto';
import Stripe from 'stripe';
import { Checkout } from '../../src/dues/checkout.entity';
import type { OpenInvoiceDto } from '../../src/dues/dto/invoice.dto';
import type { TestApp } from '../app';

const sdk = new Stripe('sk_test_only_signs');
const newId = (prefix: string): string => `${prefix}_${randomBytes(12).toString('hex')}`;

/** A live visit to the card page for what is open on the invoice, as the checkout writes it down. */
export async function checkout(
  test: TestApp,
  { id: invoiceId, openMinor: amountMinor }: Pick<OpenInvoiceDto, 'id' | 'openMinor'>,
): Promise<Checkout> {
  const checkouts = test.dataSource.getRepository(Checkout);
  const at = test.clock.now();
  const sessionId = newId('cs_test');
  return checkouts.save(
    checkouts.create({
      invoiceId,
      amountMinor,
      currency: 'GBP',
      sessionId,
      url: `https://cards.example/${sessionId}`,
      state: 'open',
      openedAt: at,
      changedAt: at,
    }),
  );
}

export interface CardEvent {
  id: string;
  type: string;
  data: { object: Record<string, unknown> };
}

/** What the card service sends about a visit; only what is read here. */
export function cardEvent(type: string, visit: Checkout, changes: Record<string, unknown> = {}): CardEvent {
  const object = {
    id: visit.sessionId,
    object: 'checkout.session',
    amount_total: visit.amountMinor,
    currency: visit.currency.toLowerCase(),
    payment_status: 'paid',
    status: 'complete',
    metadata: { checkout: visit.id, invoice: visit.invoiceId },
    ...changes,
  };
  return { id: newId('evt'), type, data: { object } };
}

export const completed = (visit: Checkout, changes: Record<string, unknown> = {}): CardEvent =>
  cardEvent('checkout.session.completed', visit, changes);

interface Signing {
  secret?: string;
  /** Seconds before the club's clock at which it was signed. */
  ageS?: number;
  /** In place of the signed body. */
  body?: string;
  header?: string;
}

/** Posts an event as the card service does: signed over the very bytes sent. */
export function deliver(test: TestApp, event: CardEvent, signing: Signing = {}): Promise<Response> {
  const payload = JSON.stringify({ object: 'event', created: 0, ...event });
  const timestamp = Math.floor(test.clock.now().getTime() / 1000) - (signing.ageS ?? 0);
  const secret = signing.secret ?? test.environment.STRIPE_WEBHOOK_SECRET;
  const signed = sdk.webhooks.generateTestHeaderString({ payload, secret, timestamp });
  return fetch(`${test.baseUrl}/api/webhooks/stripe`, {
    method: 'POST',
    headers: {
      'content-type': 'application/json; charset=utf-8',
      'stripe-signature': signing.header ?? signed,
    },
    body: signing.body ?? payload,
  });
}
