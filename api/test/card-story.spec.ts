import type supertest from 'supertest';
import { LedgerService } from '../src/ledger/ledger.service';
import type { Actor } from '../src/common/actor';
import type { OpenInvoiceDto } from '../src/dues/dto/invoice.dto';
import { startTestApp, type TestApp } from './app';
import { startCardService, type CardServiceProcess } from './card-service';
import { invoice, payment, treasurer } from './factories/dues.factory';
import { person, signedInAs } from './factories/person.factory';

const KEYS = { secretKey: 'sk_test_ferrite_row', webhookSecret: 'whsec_test_ferrite_row' };
/** Published test numbers of the card service; the late one is the stand-in's own. */
const PAYS = '4242424242424242';
const DECLINED = '4000000000000002';
const PAYS_LATE = '4000000000001018';
const FAILS_LATE = '4000000000002024';

/** The whole way of a card payment, with the stand-in as a program of its own and the official SDK between. */
describe('paying by card', () => {
  let cards: CardServiceProcess;
  let test: TestApp;
  let ines: Actor;
  let agent: supertest.Agent;
  let raised: OpenInvoiceDto;

  beforeAll(async () => {
    cards = await startCardService(KEYS);
    test = await startTestApp({ STRIPE_API_BASE: cards.baseUrl });
    // The stand-in signs with the time of this machine.
    test.clock.set(new Date());
    await cards.control('webhook', { url: `${test.baseUrl}/api/webhooks/stripe` });
    ines = await treasurer(test);
  });
  beforeEach(async () => {
    const someone = await person(test);
    agent = await signedInAs(test, someone);
    raised = await invoice(test, ines, { personId: someone.id, dueOn: '2999-12-31' });
  });
  afterAll(async () => {
    await test.close();
    await cards.stop();
  });

  const open = async (): Promise<string> =>
    ((await agent.post(`/api/invoices/${raised.id}/checkout`).expect(200)).body as { url: string }).url;
  const pay = (url: string, card: string) =>
    fetch(url, { method: 'POST', redirect: 'manual', body: new URLSearchParams({ card, choice: 'pay' }) });
  const cardPayment = async () =>
    (await agent.get(`/api/invoices/${raised.id}/card-payment`).expect(200)).body as {
      state: string;
      openMinor: number;
      receiptId: string | null;
    };
  const reaches = async (state: string) => {
    for (let tries = 0; tries < 100; tries += 1) {
      if ((await cardPayment()).state === state) return;
      await new Promise((resolve) => setTimeout(resolve, 50));
    }
    throw new Error(`It never became ${state}; it is ${(await cardPayment()).state}.`);
  };

  it('goes from the button to the card page and back, and the invoice is paid with a receipt', async () => {
    const cardMoney = await test.app.get(LedgerService).balance('1030');
    const url = await open();
    expect(await (await fetch(url)).text()).toContain(raised.number);
    const answer = await pay(url, PAYS);
    expect(answer.headers.get('location')).toBe(
      `${test.environment.PUBLIC_URL}/dues?invoice=${raised.id}&card=returned`,
    );
    await reaches('paid');
    const { openMinor, receiptId } = await cardPayment();
    expect(openMinor).toBe(0);
    const { body } = await agent.get(`/api/receipts/${receiptId ?? ''}`).expect(200);
    expect(body).toMatchObject({ method: 'card', amountMinor: 2400, treasurerName: 'Ines Calloway' });
    expect(await test.app.get(LedgerService).balance('1030')).toBe(cardMoney + 2400);
    const balance = await test.app.get(LedgerService).trialBalance(ines);
    expect(balance.debitMinor).toBe(balance.creditMinor);
  });

  it('gives one page for five presses of the button, and asks for what is open', async () => {
    const urls = await Promise.all(Array.from({ length: 5 }, open));
    expect(new Set(urls).size).toBe(1);
    expect(await (await fetch(urls[0] ?? '')).text()).toContain('£24.00');
  });

  it('asks on a new page when a part was paid in the meantime', async () => {
    const first = await open();
    await payment(test, ines, raised, { amountMinor: 1000, receivedOn: '2026-01-01' });
    const second = await open();
    expect(second).not.toBe(first);
    expect(await (await fetch(second)).text()).toContain('£14.00');
    expect((await fetch(first)).status).toBe(410);
  });

  it('takes no money from a declined card, and the same page can be tried again', async () => {
    const url = await open();
    expect((await pay(url, DECLINED)).status).toBe(402);
    expect(await cardPayment()).toMatchObject({ state: 'open', openMinor: 2400 });
    expect(await open()).toBe(url);
    await pay(url, PAYS);
    await reaches('paid');
  });

  it('is not asked a second time while the bank has yet to confirm, and is paid once it has', async () => {
    await cards.control('pause');
    await pay(await open(), PAYS_LATE);
    const again = await agent.post(`/api/invoices/${raised.id}/checkout`).expect(409);
    expect(again.body).toMatchObject({ type: '/problems/card-payment-under-way' });
    await cards.control('confirm-late');
    // The confirmation is delivered before the visit's own end.
    await cards.control('deliver-out-of-order');
    await cards.control('resume');
    await reaches('paid');
    expect((await cardPayment()).openMinor).toBe(0);
    const { body } = await agent.get('/api/dues/mine').expect(200);
    expect(body).toMatchObject({ payments: [{ amountMinor: 2400 }] });
  });

  describe('when no word of it comes', () => {
    beforeEach(() => cards.control('pause'));
    afterEach(() => cards.control('resume'));

    const check = async () =>
      (await agent.post(`/api/invoices/${raised.id}/card-payment/check`).expect(200)).body as {
        state: string;
        receiptId: string | null;
      };

    it('is asked of the card service itself, once for all, and its late word changes nothing', async () => {
      const url = await open();
      expect(await check()).toMatchObject({ state: 'open' });
      await pay(url, PAYS);
      expect(await cardPayment()).toMatchObject({ state: 'open' });
      const answers = await Promise.all([check(), check(), check()]);
      expect(answers.map(({ state }) => state)).toEqual(['paid', 'paid', 'paid']);
      await cards.control('resume');
      await cards.control('deliver-out-of-order');
      const { body } = await agent.get('/api/dues/mine').expect(200);
      expect((body as { payments: unknown[] }).payments).toHaveLength(1);
    });

    it('tells a payment that the bank has yet to confirm from one that it refused', async () => {
      await pay(await open(), FAILS_LATE);
      expect(await check()).toMatchObject({ state: 'confirming' });
      await cards.control('confirm-late');
      expect(await check()).toMatchObject({ state: 'failed' });
    });
  });

  it('gets a new page where the card service has lost the old one', async () => {
    const lost = await open();
    await test.dataSource.query(`UPDATE checkout SET session_id = 'cs_test_lost' WHERE invoice_id = $1`, [
      raised.id,
    ]);
    const fresh = await open();
    expect(fresh).not.toBe(lost);
    expect((await fetch(fresh)).status).toBe(200);
  });

  it('gets a new page where the first answer was lost and the words have changed since', async () => {
    const lost = await open();
    await test.dataSource.query(`UPDATE checkout SET session_id = NULL, url = NULL WHERE invoice_id = $1`, [
      raised.id,
    ]);
    await test.dataSource.query(`UPDATE invoice SET description = 'Dues, put right' WHERE id = $1`, [
      raised.id,
    ]);
    const urls = await Promise.all([open(), open()]);
    expect(new Set(urls).size).toBe(1);
    expect(urls[0]).not.toBe(lost);
    expect(await (await fetch(urls[0] ?? '')).text()).toContain('Dues, put right');
  });

  it('gets a new page for what is open now where the first answer was lost', async () => {
    await open();
    await test.dataSource.query(`UPDATE checkout SET session_id = NULL, url = NULL WHERE invoice_id = $1`, [
      raised.id,
    ]);
    await payment(test, ines, raised, { amountMinor: 1000, receivedOn: '2026-01-01' });
    expect(await (await fetch(await open())).text()).toContain('£14.00');
  });

  it('is refused for an invoice that is paid', async () => {
    await payment(test, ines, raised, { receivedOn: '2026-01-01' });
    const { body } = await agent.post(`/api/invoices/${raised.id}/checkout`).expect(409);
    expect(body).toMatchObject({ type: '/problems/invoice-paid' });
  });

  it('says so when the card service cannot be reached, and takes nothing', async () => {
    const away = await startTestApp({ STRIPE_API_BASE: 'http://127.0.0.1:9' });
    try {
      const someone = await person(away);
      const own = await invoice(away, await treasurer(away), { personId: someone.id });
      const { body } = await (
        await signedInAs(away, someone)
      )
        .post(`/api/invoices/${own.id}/checkout`)
        .expect(409);
      expect(body).toMatchObject({ type: '/problems/card-page-unavailable' });
      await away.dataSource.query(`UPDATE checkout SET session_id = 'cs_test_1' WHERE invoice_id = $1`, [
        own.id,
      ]);
      const asked = await (
        await signedInAs(away, someone)
      )
        .post(`/api/invoices/${own.id}/card-payment/check`)
        .expect(409);
      expect(asked.body).toMatchObject({ type: '/problems/card-service-silent' });
    } finally {
      await away.close();
    }
  });
});
