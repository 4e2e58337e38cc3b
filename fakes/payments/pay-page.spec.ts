import type Stripe from 'stripe';
import { duesCheckout, idOf, type Scene, startScene, submitCard } from '../testing/payments';

let scene: Scene;
beforeEach(async () => {
  scene = await startScene();
});
afterEach(() => scene.close());

const open = (overrides?: Partial<Stripe.Checkout.SessionCreateParams>) =>
  scene.stripe.checkout.sessions.create(duesCheckout(overrides));

const reread = (session: Stripe.Checkout.Session) =>
  scene.stripe.checkout.sessions.retrieve(session.id, {
    expand: ['payment_intent.latest_charge.balance_transaction'],
  });

describe('the card page', () => {
  it('says that no money moves, what is paid for, and how much', async () => {
    const text = await (await fetch(String((await open()).url))).text();
    expect(text).toContain('Stand-in card page. No money moves.');
    expect(text).toContain('Dues 2027');
    expect(text).toContain('£48.00');
  });

  it('shows markup in a line as text', async () => {
    const product_data = { name: '<img src=x onerror=alert(1)>"&' };
    const session = await open({
      line_items: [{ price_data: { currency: 'gbp', unit_amount: 100, product_data } }],
    });
    const text = await (await fetch(String(session.url))).text();
    expect(text).not.toContain('<img');
    expect(text).toContain('&lt;img src=x onerror=alert(1)&gt;&quot;&amp;');
  });

  it('takes a good card, sends the payer on, and the money is in the balance less the fee', async () => {
    const session = await open();
    const response = await submitCard(String(session.url), '4242 4242 4242 4242');
    expect(response.status).toBe(303);
    expect(response.headers.get('location')).toBe(`http://portal.example/dues?session=${session.id}`);
    expect(await reread(session)).toMatchObject({
      status: 'complete',
      payment_status: 'paid',
      url: null,
      payment_intent: {
        status: 'succeeded',
        amount_received: 4800,
        metadata: { invoice: '42' },
        latest_charge: {
          paid: true,
          balance_transaction: { amount: 4800, fee: 92, net: 4708, type: 'charge' },
        },
      },
    });
  });

  it('sends the payer back with nothing paid', async () => {
    const session = await open();
    const response = await submitCard(String(session.url), '4242', 'back');
    expect([response.status, response.headers.get('location')]).toEqual([303, 'http://portal.example/dues']);
    expect(await reread(session)).toMatchObject({ status: 'open', payment_intent: null });
  });

  it('keeps a declined payment open, with what was typed, and takes a good card after it', async () => {
    const session = await open();
    const declined = await submitCard(String(session.url), '4000 0000 0000 0002');
    expect(declined.status).toBe(402);
    const text = await declined.text();
    expect(text).toContain('Your card was declined.');
    expect(text).toContain('value="4000 0000 0000 0002"');
    const first = await reread(session);
    expect(first).toMatchObject({
      status: 'open',
      payment_intent: {
        status: 'requires_payment_method',
        last_payment_error: { decline_code: 'generic_decline' },
      },
    });
    await submitCard(String(session.url), '4242424242424242');
    const second = await reread(session);
    expect(second).toMatchObject({ payment_status: 'paid', payment_intent: { last_payment_error: null } });
    expect(idOf(second.payment_intent)).toBe(idOf(first.payment_intent));
  });

  it('asks again for a number that cannot be a card, and no attempt is counted', async () => {
    const session = await open();
    const response = await submitCard(String(session.url), '4242 "><b>');
    expect(response.status).toBe(422);
    const text = await response.text();
    expect(text).toContain('Check the card number.');
    expect(text).toContain('value="4242 &quot;&gt;&lt;b&gt;"');
    expect(await reread(session)).toMatchObject({ payment_intent: null });
  });

  it('takes the money once when pay is pressed twice at the same time', async () => {
    const session = await open();
    const press = () => submitCard(String(session.url), '4242424242424242');
    const answers = await Promise.all([press(), press(), press()]);
    expect(answers.map(({ status }) => status).sort()).toEqual([303, 409, 409]);
    expect((await scene.stripe.balanceTransactions.list()).data).toHaveLength(1);
  });

  it('closes with the session', async () => {
    const session = await open();
    await scene.stripe.checkout.sessions.expire(session.id);
    expect((await submitCard(String(session.url), '4242424242424242')).status).toBe(410);
    expect((await fetch(`${scene.base}/pay/cs_test_unknown`)).status).toBe(404);
  });
});

describe('a slow card', () => {
  it('completes the session unpaid, and pays it when the bank has answered', async () => {
    const session = await open();
    expect((await submitCard(String(session.url), '4000 0000 0000 1018')).status).toBe(303);
    const early = await reread(session);
    expect(early).toMatchObject({
      status: 'complete',
      payment_status: 'unpaid',
      payment_intent: { status: 'processing' },
    });
    expect(await scene.control('confirm-late')).toEqual({ sessions: [session.id] });
    expect(await reread(session)).toMatchObject({
      payment_status: 'paid',
      payment_intent: { status: 'succeeded' },
    });
    await scene.receiver.waitFor(6);
    expect(scene.types()).toEqual([
      'payment_intent.created',
      'payment_intent.processing',
      'checkout.session.completed',
      'charge.succeeded',
      'payment_intent.succeeded',
      'checkout.session.async_payment_succeeded',
    ]);
  });

  it('may fail late: nothing is paid', async () => {
    const session = await open();
    await submitCard(String(session.url), '4000 0000 0000 2024');
    await scene.control('confirm-late');
    expect(await reread(session)).toMatchObject({ payment_status: 'unpaid' });
    await scene.receiver.waitFor(6);
    expect(scene.types().at(-1)).toBe('checkout.session.async_payment_failed');
  });
});

describe('a slow card left alone', () => {
  it('is confirmed by itself after the time set', async () => {
    const quick = await startScene({ lateMs: 30 });
    const session = await quick.stripe.checkout.sessions.create(duesCheckout());
    await submitCard(String(session.url), '4000 0000 0000 1018');
    await quick.receiver.waitFor(6);
    expect((await quick.stripe.checkout.sessions.retrieve(session.id)).payment_status).toBe('paid');
    await quick.close();
  });
});
