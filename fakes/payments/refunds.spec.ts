import { duesCheckout, idOf, paidSession, type Scene, startScene } from '../testing/payments';

let scene: Scene;
beforeAll(async () => {
  scene = await startScene();
});
afterAll(() => scene.close());

const payment = async () => idOf((await paidSession(scene)).payment_intent);

describe('a refund', () => {
  it('gives the whole payment back, and the fee is kept', async () => {
    const payment_intent = await payment();
    const refund = await scene.stripe.refunds.create({
      payment_intent,
      expand: ['balance_transaction', 'charge'],
    });
    expect(refund).toMatchObject({
      amount: 4800,
      status: 'succeeded',
      balance_transaction: { amount: -4800, fee: 0, net: -4800, type: 'refund' },
      charge: { amount_refunded: 4800, refunded: true },
    });
    expect(await scene.stripe.refunds.retrieve(refund.id)).toMatchObject({ payment_intent, amount: 4800 });
  });

  it('may be of a part, and of the rest, and no more', async () => {
    const payment_intent = await payment();
    const refund = (amount: number) => scene.stripe.refunds.create({ payment_intent, amount });
    await refund(1800);
    await expect(refund(3001)).rejects.toMatchObject({ param: 'amount', statusCode: 400 });
    await refund(3000);
    await expect(refund(1)).rejects.toMatchObject({ code: 'charge_already_refunded' });
  });

  it('is made once when the request is repeated under its key', async () => {
    const payment_intent = await payment();
    const refund = () =>
      scene.stripe.refunds.create({ payment_intent, amount: 100 }, { idempotencyKey: 'refund-7' });
    expect((await refund()).id).toBe((await refund()).id);
    expect((await scene.stripe.refunds.list({ payment_intent })).data).toHaveLength(1);
  });

  it.each([
    [{}, 'payment_intent'],
    [{ payment_intent: 'pi_gone' }, 'payment_intent'],
    [{ charge: 'ch_gone' }, 'charge'],
  ])('of %j is refused', async (params, param) => {
    await expect(scene.stripe.refunds.create(params)).rejects.toMatchObject({ param });
  });

  it('of nothing paid is refused', async () => {
    const session = await scene.stripe.checkout.sessions.create(duesCheckout());
    const form = new URLSearchParams({ card: '4000 0000 0000 0002', choice: 'pay' });
    await fetch(String(session.url), { method: 'POST', body: form });
    const { payment_intent } = await scene.stripe.checkout.sessions.retrieve(session.id);
    await expect(scene.stripe.refunds.create({ payment_intent: idOf(payment_intent) })).rejects.toThrow(
      /has not succeeded/,
    );
  });
});
