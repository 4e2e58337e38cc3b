import { duesCheckout, idOf, paidSession, type Scene, startScene } from '../testing/payments';

let scene: Scene;
let newestFirst: string[];
beforeAll(async () => {
  scene = await startScene();
  for (let count = 0; count < 7; count += 1) await scene.stripe.checkout.sessions.create(duesCheckout());
  newestFirst = (await scene.stripe.checkout.sessions.list({ limit: 100 })).data.map(({ id }) => id);
});
afterAll(() => scene.close());

const ids = (list: { data: { id: string }[] }) => list.data.map(({ id }) => id);

describe('lists', () => {
  it('are walked by the SDK over all pages, each entry once', async () => {
    const walked = await scene.stripe.checkout.sessions.list({ limit: 3 }).autoPagingToArray({ limit: 100 });
    expect(walked.map(({ id }) => id)).toEqual(newestFirst);
    expect(new Set(newestFirst).size).toBe(7);
  });

  it('say on the last page that there is no more', async () => {
    const page = await scene.stripe.checkout.sessions.list({ limit: 3, starting_after: newestFirst[3] });
    expect([page.has_more, ids(page)]).toEqual([false, newestFirst.slice(4)]);
  });

  it('go back from an entry', async () => {
    const page = await scene.stripe.checkout.sessions.list({ limit: 2, ending_before: newestFirst[3] });
    expect([page.has_more, ids(page)]).toEqual([true, newestFirst.slice(1, 3)]);
  });

  it('are narrowed by time', async () => {
    const now = Math.floor(Date.now() / 1000);
    const [past, future] = [{ gte: now - 600 }, { gt: now + 600 }];
    expect((await scene.stripe.checkout.sessions.list({ created: past })).data).toHaveLength(7);
    expect((await scene.stripe.checkout.sessions.list({ created: future })).data).toHaveLength(0);
  });

  it('are narrowed by a field and expanded', async () => {
    const session = await paidSession(scene);
    const payment_intent = idOf(session.payment_intent);
    const list = await scene.stripe.checkout.sessions.list({
      payment_intent,
      expand: ['data.payment_intent'],
    });
    expect(list.data).toMatchObject([
      { id: session.id, payment_intent: { id: payment_intent, status: 'succeeded' } },
    ]);
  });

  it.each([{ limit: 0 }, { limit: 101 }, { starting_after: 'cs_test_gone' }, { expand: ['payment_intent'] }])(
    'refuse %j',
    async (params) => {
      await expect(scene.stripe.checkout.sessions.list(params)).rejects.toMatchObject({
        type: 'StripeInvalidRequestError',
        param: Object.keys(params)[0],
      });
    },
  );
});
