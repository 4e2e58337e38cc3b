import Stripe from 'stripe';
import { duesCheckout, type Scene, sdk, startScene } from '../testing/payments';

let scene: Scene;
beforeAll(async () => {
  scene = await startScene();
});
afterAll(() => scene.close());

const create = (overrides?: Partial<Stripe.Checkout.SessionCreateParams>, options?: Stripe.RequestOptions) =>
  scene.stripe.checkout.sessions.create(duesCheckout(overrides), options);

const line = (unit_amount: number, currency = 'gbp', quantity = 1) => ({
  quantity,
  price_data: { currency, unit_amount, product_data: { name: 'Dues' } },
});

describe('a checkout session', () => {
  it('opens unpaid, with the total of its lines and the address of the card page', async () => {
    const session = await create({ line_items: [line(4800), line(250, 'gbp', 2)] });
    expect(session).toMatchObject({
      object: 'checkout.session',
      amount_total: 5300,
      currency: 'gbp',
      status: 'open',
      payment_status: 'unpaid',
      payment_intent: null,
      client_reference_id: 'invoice-42',
      metadata: { invoice: '42' },
    });
    expect(session.url).toBe(`${scene.base}/pay/${session.id}`);
    expect(session.lastResponse.requestId).toMatch(/^req_/);
  });

  it('is retrieved as it was created', async () => {
    const session = await create();
    expect(await scene.stripe.checkout.sessions.retrieve(session.id)).toEqual({ ...session });
  });

  it('can be expired once, and has no card page then', async () => {
    const { id } = await create();
    expect(await scene.stripe.checkout.sessions.expire(id)).toMatchObject({ status: 'expired', url: null });
    await expect(scene.stripe.checkout.sessions.expire(id)).rejects.toThrow(
      Stripe.errors.StripeInvalidRequestError,
    );
  });

  it.each(['cs_test_unknown', '__proto__', 'constructor'])('unknown under %s is a typed 404', async (id) => {
    await expect(scene.stripe.checkout.sessions.retrieve(id)).rejects.toMatchObject({
      type: 'StripeInvalidRequestError',
      code: 'resource_missing',
      statusCode: 404,
    });
  });
});

describe('a checkout session is refused', () => {
  it.each<[string, Partial<Stripe.Checkout.SessionCreateParams>, string]>([
    ['without lines', { line_items: [] }, 'line_items'],
    ['with a total of nothing', { line_items: [line(0)] }, 'line_items'],
    ['with two currencies', { line_items: [line(1), line(1, 'eur')] }, 'line_items'],
    ['with a negative price', { line_items: [line(-1)] }, 'line_items[0][price_data][unit_amount]'],
    ['with a broken price', { line_items: [line(1.5)] }, 'line_items[0][price_data][unit_amount]'],
    ['without a place to return to', { success_url: undefined }, 'success_url'],
    ['with a script as a place to return to', { success_url: 'javascript:alert(1)' }, 'success_url'],
    ['with another mode', { mode: 'subscription' }, 'mode'],
    ['with a parameter not known here', { allow_promotion_codes: true }, 'allow_promotion_codes'],
    [
      'with a time to pay of a year',
      { expires_at: Math.floor(Date.now() / 1000) + 31_536_000 },
      'expires_at',
    ],
    ['with overlong metadata', { metadata: { note: 'x'.repeat(501) } }, 'metadata[note]'],
  ])('%s', async (_why, overrides, param) => {
    await expect(create(overrides)).rejects.toMatchObject({
      type: 'StripeInvalidRequestError',
      statusCode: 400,
      param,
    });
  });
});

describe('the key of a request', () => {
  it('gives the first answer again when the same request is repeated', async () => {
    const options = { idempotencyKey: 'invoice-42-first' };
    const [one, two] = [await create({}, options), await create({}, options)];
    expect(two.id).toBe(one.id);
    expect(two.lastResponse.headers['idempotent-replayed']).toBe('true');
  });

  it('is refused for another request', async () => {
    const options = { idempotencyKey: 'invoice-42-second' };
    await create({}, options);
    await expect(create({ client_reference_id: 'invoice-43' }, options)).rejects.toThrow(
      Stripe.errors.StripeIdempotencyError,
    );
  });

  it('can be used again after a refusal', async () => {
    const options = { idempotencyKey: 'invoice-42-third' };
    await expect(create({ line_items: [] }, options)).rejects.toThrow();
    expect((await create({}, options)).status).toBe('open');
  });
});

describe('access', () => {
  it('with the wrong key is a typed authentication error', async () => {
    const stranger = sdk(Number(new URL(scene.base).port), 'sk_test_wrong');
    await expect(stranger.checkout.sessions.list()).rejects.toThrow(Stripe.errors.StripeAuthenticationError);
  });

  it('without a key is refused before anything is read', async () => {
    const response = await fetch(`${scene.base}/v1/checkout/sessions`, {
      method: 'POST',
      body: 'x'.repeat(300_000),
    });
    expect(response.status).toBe(401);
  });

  it('to a path that does not exist is a typed 404', async () => {
    await expect(scene.stripe.customers.list()).rejects.toMatchObject({ statusCode: 404 });
  });
});
