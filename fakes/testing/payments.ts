import Stripe from 'stripe';
import { LOOPBACK } from '../common/listen';
import { startPayments } from '../payments/server';
import type { Settings } from '../payments/settings';
import { startReceiver } from './receiver';

const SECRET_KEY = 'sk_test_stand_in';
export const WEBHOOK_SECRET = 'whsec_stand_in';

/** A running stand-in with a webhook endpoint and the official SDK pointed at it. */
export async function startScene(overrides: Partial<Settings> = {}) {
  const receiver = await startReceiver();
  const service = await startPayments({
    port: 0,
    secretKey: SECRET_KEY,
    webhookSecret: WEBHOOK_SECRET,
    webhookUrl: receiver.url,
    fee: { basisPoints: 150, fixedMinor: 20 },
    lateMs: 60_000,
    retryFirstMs: 20,
    ...overrides,
  });
  const base = `http://${LOOPBACK}:${service.port}`;
  return {
    base,
    receiver,
    stripe: sdk(service.port),
    events: () => receiver.received.map((one) => verified(one.body, one.signature)),
    types: () => receiver.received.map((one) => verified(one.body, one.signature).type),
    control: (path: string, body?: object) => control(base, path, body),
    close: async () => {
      await service.close();
      await receiver.close();
    },
  };
}

export type Scene = Awaited<ReturnType<typeof startScene>>;

export const sdk = (port: number, key = SECRET_KEY) =>
  new Stripe(key, { host: LOOPBACK, port, protocol: 'http', telemetry: false, maxNetworkRetries: 1 });

/** Throws when the signature does not fit: the SDK's own check. */
export const verified = (body: string, signature: string) =>
  sdk(1).webhooks.constructEvent(body, signature, WEBHOOK_SECRET);

export const duesCheckout = (
  overrides: Partial<Stripe.Checkout.SessionCreateParams> = {},
): Stripe.Checkout.SessionCreateParams => ({
  mode: 'payment',
  success_url: 'http://portal.example/dues?session={CHECKOUT_SESSION_ID}',
  cancel_url: 'http://portal.example/dues',
  client_reference_id: 'invoice-42',
  customer_email: 'tamsin@larkmoor.example',
  metadata: { invoice: '42' },
  payment_intent_data: { metadata: { invoice: '42' }, description: 'Dues' },
  line_items: [
    { quantity: 1, price_data: { currency: 'gbp', unit_amount: 4800, product_data: { name: 'Dues 2027' } } },
  ],
  ...overrides,
});

export const submitCard = (url: string, card: string, choice = 'pay') =>
  fetch(url, { method: 'POST', body: new URLSearchParams({ card, choice }), redirect: 'manual' });

/** The id behind a link that may have been expanded. */
export const idOf = (link: string | { id: string } | null) =>
  typeof link === 'string' ? link : String(link?.id);

/** Opens a session and pays it with a good card. */
export async function paidSession(scene: Scene, amountMinor = 4800) {
  const price_data = { currency: 'gbp', unit_amount: amountMinor, product_data: { name: 'Dues' } };
  const session = await scene.stripe.checkout.sessions.create(
    duesCheckout({ line_items: [{ quantity: 1, price_data }] }),
  );
  await submitCard(session.url ?? '', '4242 4242 4242 4242');
  return scene.stripe.checkout.sessions.retrieve(session.id);
}

async function control(base: string, path: string, body: object = {}): Promise<unknown> {
  const headers = { 'content-type': 'application/json' };
  const response = await fetch(`${base}/control/${path}`, {
    method: 'POST',
    headers,
    body: JSON.stringify(body),
  });
  return response.json();
}
