import { idOf, paidSession, type Scene, startScene } from '../testing/payments';

let scene: Scene;
beforeEach(async () => {
  scene = await startScene();
});
afterEach(() => scene.close());

const payOut = async (body?: object) =>
  (await scene.control('payout', body)) as { id: string; amount: number };

describe('a payout', () => {
  // Worked by hand: two payments of 48.00 less 0.92 each, one refunded whole: 9416 - 4800 = 4616.
  it('carries payments less fees and refunds to the bank, and names each', async () => {
    const [first] = [await paidSession(scene), await paidSession(scene)];
    await scene.stripe.refunds.create({ payment_intent: idOf(first.payment_intent) });
    const { id: payout, amount } = await payOut({ arrival_date: 1_796_000_000 });
    expect(amount).toBe(4616);
    const carried = await scene.stripe.balanceTransactions.list({ payout }).autoPagingToArray({ limit: 100 });
    expect(carried.map(({ type, net }) => [type, net])).toEqual([
      ['payout', -4616],
      ['refund', -4800],
      ['charge', 4708],
      ['charge', 4708],
    ]);
    expect(await scene.stripe.payouts.retrieve(payout)).toMatchObject({
      status: 'paid',
      currency: 'gbp',
      arrival_date: 1_796_000_000,
    });
  });

  it('carries nothing twice', async () => {
    await paidSession(scene);
    const first = await payOut();
    await paidSession(scene, 10_000);
    // 100.00 less 1.50 and 0.20.
    expect((await payOut()).amount).toBe(9830);
    const { data } = await scene.stripe.balanceTransactions.list({ payout: first.id, type: 'charge' });
    expect(data).toMatchObject([{ net: 4708, status: 'available' }]);
    expect((await scene.stripe.payouts.list()).data.map(({ amount }) => amount)).toEqual([9830, 4708]);
  });

  it('of an empty balance is refused', async () => {
    expect(await scene.control('payout')).toMatchObject({ error: { code: 'balance_insufficient' } });
    expect(await scene.control('payout', { currency: '../' })).toMatchObject({
      error: { param: 'currency' },
    });
  });

  it('is announced', async () => {
    await paidSession(scene);
    await payOut();
    await scene.receiver.waitFor(6);
    expect(scene.types().slice(4)).toEqual(['payout.created', 'payout.paid']);
  });
});
