import { JsonFile } from '../common/json-file';
import { idOf, paidSession, type Scene, startScene, verified, WEBHOOK_SECRET } from '../testing/payments';
import { newEvent } from './event';
import { readSettings } from './settings';
import type { Payout } from './shapes';
import { Store } from './store';
import { Webhooks } from './webhooks';

let scene: Scene;
beforeEach(async () => {
  scene = await startScene();
});
afterEach(() => scene.close());

const ALL_FOUR = [
  'payment_intent.created',
  'charge.succeeded',
  'payment_intent.succeeded',
  'checkout.session.completed',
];

async function waitUntilDelivered(): Promise<{ attempts: number; type: string }[]> {
  for (;;) {
    const { events } = (await (await fetch(`${scene.base}/control/events`)).json()) as {
      events: { attempts: number; type: string; deliveredAtMs: number | null }[];
    };
    if (events.every((event) => event.deliveredAtMs !== null)) return events;
    await new Promise((resolve) => setTimeout(resolve, 20));
  }
}

describe('events of a payment', () => {
  it('arrive in the order they happened, signed as the SDK checks it', async () => {
    const session = await paidSession(scene);
    await scene.receiver.waitFor(4);
    expect(scene.types()).toEqual(ALL_FOUR);
    const [event] = scene.events().slice(-1);
    expect(event).toMatchObject({
      object: 'event',
      livemode: false,
      data: { object: { id: session.id, payment_status: 'paid' } },
    });
    expect(await scene.stripe.events.retrieve(String(event?.id))).toMatchObject({
      type: 'checkout.session.completed',
    });
  });

  it('fail the SDK’s check when a byte is changed', async () => {
    await paidSession(scene);
    await scene.receiver.waitFor(1);
    const [first] = scene.receiver.received;
    const changed = String(first?.body).replace('gbp', 'eur');
    expect(() => verified(changed, String(first?.signature))).toThrow(/signature/i);
  });

  it('fail the SDK’s check under another secret', async () => {
    await paidSession(scene);
    await scene.receiver.waitFor(1);
    const [first] = scene.receiver.received;
    const check = () =>
      scene.stripe.webhooks.constructEvent(
        String(first?.body),
        String(first?.signature),
        `${WEBHOOK_SECRET}x`,
      );
    expect(check).toThrow(/signature/i);
  });

  it('keep the object as it was when the event happened', async () => {
    const { payment_intent } = await paidSession(scene);
    await scene.stripe.refunds.create({ payment_intent: idOf(payment_intent) });
    const { data } = await scene.stripe.events.list({ type: 'charge.succeeded' });
    expect(data).toMatchObject([{ data: { object: { amount_refunded: 0 } } }]);
  });
});

describe('delivery', () => {
  it('is tried again until it is answered with 2xx, the others meanwhile going on', async () => {
    scene.receiver.answerNextWith(500, 302);
    await paidSession(scene);
    const events = await waitUntilDelivered();
    expect(events.map(({ type }) => type)).toEqual(ALL_FOUR);
    expect(events.map(({ attempts }) => attempts).sort()).toEqual([1, 1, 2, 2]);
    expect(scene.types().slice(2, 4)).toEqual(ALL_FOUR.slice(2, 4));
  });

  it('waits while paused and goes on after', async () => {
    await scene.control('pause');
    await paidSession(scene);
    expect(scene.receiver.received).toHaveLength(0);
    await scene.control('resume');
    await scene.receiver.waitFor(4);
    expect(scene.types()).toEqual(ALL_FOUR);
  });

  it('can be made out of order: newest first, each once', async () => {
    await scene.control('pause');
    await paidSession(scene);
    await scene.control('deliver-out-of-order');
    expect(scene.types()).toEqual(ALL_FOUR.toReversed());
    await scene.control('resume');
    await waitUntilDelivered();
    expect(scene.receiver.received).toHaveLength(4);
  });

  it('can be repeated with the same event id', async () => {
    await paidSession(scene);
    await scene.receiver.waitFor(4);
    const last = String(scene.events().at(-1)?.id);
    expect(await scene.control(`redeliver/${last}`)).toMatchObject({ attempts: 2, lastAnswer: 'HTTP 200' });
    expect(scene.events().at(-1)?.id).toBe(last);
    expect(scene.receiver.received).toHaveLength(5);
  });

  it('can be pointed at an address that is known only later', async () => {
    await scene.control('webhook', { url: 'http://127.0.0.1:9/closed' });
    await paidSession(scene);
    expect(scene.receiver.received).toHaveLength(0);
    await scene.control('webhook', { url: scene.receiver.url });
    expect((await waitUntilDelivered()).length).toBe(4);
  });

  it('of an unknown event is refused', async () => {
    expect(await scene.control('redeliver/evt_gone')).toMatchObject({ error: { code: 'resource_missing' } });
    expect(await scene.control('deliver-out-of-order', { events: 'evt_gone' })).toMatchObject({
      error: { param: 'events' },
    });
  });
});

/** A disk that is full for a moment. */
class FullOnce extends JsonFile {
  private isFull = true;

  override write(): void {
    if (!this.isFull) return;
    this.isFull = false;
    throw new Error('no space left on device');
  }
}

it('goes on sending after one event could not be written down', async () => {
  const said = jest.spyOn(console, 'error').mockImplementation(() => undefined);
  const settings = readSettings({
    ...{ PORT: '1', FAKE_SECRET_KEY: 'sk', FAKE_WEBHOOK_SECRET: WEBHOOK_SECRET },
    ...{ FAKE_WEBHOOK_URL: scene.receiver.url, FAKE_RETRY_FIRST_MS: '10' },
  });
  const webhooks = new Webhooks(new Store(new FullOnce('/nowhere/at-all.json')), settings);
  webhooks.add({ ...newEvent('payout.paid', {} as Payout), id: 'evt_first' });
  await scene.receiver.waitFor(1);
  webhooks.add({ ...newEvent('payout.paid', {} as Payout), id: 'evt_second' });
  await scene.receiver.waitFor(2);
  expect(said).toHaveBeenCalledTimes(1);
  webhooks.stop();
  said.mockRestore();
});
