import { randomUUID } from 'node:crypto';
import type supertest from 'supertest';
import { TEST_NOW, type TestApp } from '../../test/app';
import { startDesk, type Desk } from '../../test/books';
import { invoice, payment } from '../../test/factories/dues.factory';
import { person, signedInAs, someoneWith } from '../../test/factories/person.factory';
import type { Actor } from '../common/actor';
import { isCreditorReference } from '../common/creditor-reference.rules';
import { LedgerService } from '../ledger/ledger.service';
import type { PeopleOnTiersPageDto } from './dto/tier.dto';
import { TiersService } from './tiers.service';

const DAY = 86_400_000;

describe('dues', () => {
  let desk: Desk;
  let test: TestApp;
  let ines: Actor;
  let agent: supertest.Agent;
  let treasurerId: string;
  let outsider: supertest.Agent;

  beforeAll(async () => {
    desk = await startDesk();
    ({ test, ines, agent, treasurerId } = desk);
    outsider = (await someoneWith(test, 'mentor', 'steward', 'organiser')).agent;
  });
  beforeEach(() => test.clock.set(TEST_NOW));
  afterAll(() => test.close());

  const owedInBooks = () => desk.ledger('1100');

  describe('an invoice', () => {
    it('has a number, a sound reference, and is owed in the books', async () => {
      const before = await owedInBooks();
      const someone = await person(test);
      const raised = await invoice(test, ines, { personId: someone.id });
      expect(raised).toMatchObject({ amountMinor: 2400, openMinor: 2400, state: 'open', daysLate: 0 });
      expect(raised.number).toMatch(/^D-\d{4}$/);
      expect(raised.reference).toContain(`LRB${raised.number.replace('-', '')}`);
      expect(isCreditorReference(raised.referencePrinted)).toBe(true);
      expect(await owedInBooks()).toBe(before + 2400);
      const agent = await signedInAs(test, someone);
      const { body } = await agent.get('/api/invoices/mine').expect(200);
      expect(body).toEqual([
        expect.objectContaining({ id: raised.id, number: raised.number, openMinor: 2400 }),
      ]);
    });

    it('is late the day after its day, by the club’s clock and not the server’s', async () => {
      const someone = await person(test);
      await invoice(test, ines, { personId: someone.id, dueOn: '2026-06-30', description: 'Summer' });
      // In summer the club is an hour ahead of UTC: 23:30 UTC is the next day there.
      test.clock.set(new Date('2026-06-30T22:30:00Z'));
      const before = await (await signedInAs(test, someone)).get('/api/invoices/mine').expect(200);
      expect(before.body).toMatchObject([{ state: 'open', daysLate: 0 }]);
      test.clock.set(new Date('2026-06-30T23:30:00Z'));
      const after = await (await signedInAs(test, someone)).get('/api/invoices/mine').expect(200);
      expect(after.body).toMatchObject([{ state: 'late', daysLate: 1 }]);
    });

    it('is shown to its own person and to no other', async () => {
      const raised = await invoice(test, ines);
      const { agent } = await someoneWith(test);
      const { body } = await agent.get('/api/invoices/mine').expect(200);
      expect(body).toEqual([]);
      await agent.post(`/api/invoices/${raised.id}/checkout`).expect(404);
      await agent.get(`/api/invoices/${raised.id}/card-payment`).expect(404);
    });

    it('is counted in the treasurer’s pages, with the sum left to pay on all of them', async () => {
      await invoice(test, ines);
      await invoice(test, ines);
      const { body } = await agent.get('/api/invoices?state=open&perPage=1').expect(200);
      expect(body).toMatchObject({ page: 1, perPage: 1 });
      expect((body as { items: unknown[] }).items).toHaveLength(1);
      expect((body as { total: number }).total).toBeGreaterThan(1);
      const beyond = await agent.get('/api/invoices?state=open&page=999').expect(200);
      expect(beyond.body).toMatchObject({ items: [], total: (body as { total: number }).total });
    });

    it.each([
      ['a due day that is past', { dueOn: '2026-01-14' }, '#/dueOn'],
      ['a due day that is none', { dueOn: '2026-02-30' }, '#/dueOn'],
      ['nothing to pay', { amountMinor: 0 }, '#/amountMinor'],
      ['less than nothing', { amountMinor: -1 }, '#/amountMinor'],
      ['half a penny', { amountMinor: 12.5 }, '#/amountMinor'],
      ['an amount in words', { amountMinor: '24.00' }, '#/amountMinor'],
      ['no number at all', { amountMinor: Number.NaN }, '#/amountMinor'],
      ['an endless amount', { amountMinor: 1e308 }, '#/amountMinor'],
      ['an unknown kind', { kind: 'present' }, '#/kind'],
      ['an overlong description', { description: 'x'.repeat(121) }, '#/description'],
      ['an empty description', { description: '  ' }, '#/description'],
      ['nobody', { personId: randomUUID() }, '#/personId'],
      ['an unknown field', { number: 'D-9999' }, '#/number'],
    ])('is refused for %s, and nothing is written', async (_what, change, pointer) => {
      const before = await owedInBooks();
      const fair = {
        personId: treasurerId,
        kind: 'dues',
        description: 'Dues',
        amountMinor: 2400,
        dueOn: '2026-01-31',
      };
      const { body } = await agent
        .post('/api/invoices')
        .send({ ...fair, ...change })
        .expect(422);
      expect(body).toMatchObject({ type: '/problems/invalid-input', errors: [{ pointer }] });
      expect(await owedInBooks()).toBe(before);
    });
  });

  describe('a receipt', () => {
    it('says from whom, for what, how and by whom it was taken', async () => {
      const someone = await person(test, { name: 'Tamsin Ardley' });
      const own = await invoice(test, ines, { personId: someone.id });
      const taken = await payment(test, ines, own);
      const agent = await signedInAs(test, someone);
      const { body } = await agent.get(`/api/receipts/${taken.id}`).expect(200);
      expect(body).toMatchObject({
        personName: 'Tamsin Ardley',
        treasurerName: 'Ines Calloway',
        clubName: 'Larkmoor Radio Builders',
        clubAddress: 'Millbeck Hall, Larkmoor',
        amountMinor: 2400,
        method: 'cash',
      });
    });

    it('is not shown to somebody else', async () => {
      const taken = await payment(test, ines, await invoice(test, ines));
      const { agent } = await someoneWith(test);
      await agent.get(`/api/receipts/${taken.id}`).expect(404);
      await agent.get(`/api/receipts/${randomUUID()}`).expect(404);
    });
  });

  describe('a member’s own page', () => {
    it('knows tier, credit, payments and where a transfer goes', async () => {
      const someone = await person(test);
      const tier = await test.app
        .get(TiersService)
        .create(ines, { name: 'full', amountMinor: 2400, months: 3 });
      await test.app
        .get(TiersService)
        .assign(ines, { personId: someone.id, tierId: tier.id, fromOn: '2026-01-15' });
      await payment(test, ines, await invoice(test, ines, { personId: someone.id }), { amountMinor: 2500 });
      const agent = await signedInAs(test, someone);
      const { body } = await agent.get('/api/dues/mine').expect(200);
      expect(body).toMatchObject({
        tier: { name: 'full', amountMinor: 2400, months: 3 },
        creditMinor: 100,
        payments: [{ amountMinor: 2500, creditMinor: 100 }],
        bank: { accountName: 'Larkmoor Radio Builders', accountNumber: '00-41-17 3006 4417' },
      });
      expect(Object.values(body as object).join()).not.toContain('password');
    });

    it('shows the tier of the day, not one to come', async () => {
      const someone = await person(test);
      const tiers = test.app.get(TiersService);
      const tier = await tiers.create(ines, { name: 'junior', amountMinor: 600, months: 3 });
      await tiers.assign(ines, { personId: someone.id, tierId: tier.id, fromOn: '2026-01-16' });
      const agent = await signedInAs(test, someone);
      expect((await agent.get('/api/dues/mine').expect(200)).body).toMatchObject({ tier: null });
      test.clock.advance(DAY);
      const next = await signedInAs(test, someone);
      expect((await next.get('/api/dues/mine').expect(200)).body).toMatchObject({ tier: { name: 'junior' } });
    });
  });

  describe('the treasurer’s page', () => {
    it('shows four figures whose parts add up to the ledger’s', async () => {
      const { body } = await agent.get('/api/treasury/summary').expect(200);
      const ledger = test.app.get(LedgerService);
      expect(body).toMatchObject({
        today: '2026-01-15',
        currency: 'GBP',
        dues: { description: 'Dues, January to March', dueOn: '2026-01-31' },
        holdings: {
          cashBoxMinor: await ledger.balance('1000'),
          chequesInHandMinor: await ledger.balance('1010'),
          currentAccountMinor: await ledger.balance('1020'),
        },
      });
      const { aged, openMinor } = body as { aged: { openMinor: number }[]; openMinor: number };
      expect(aged.reduce((sum, band) => sum + band.openMinor, 0)).toBe(openMinor);
      expect(openMinor).toBe(await owedInBooks());
    });
  });

  describe('tiers', () => {
    it('have names of their own', async () => {
      const tier = { name: 'household', amountMinor: 4000, months: 3 };
      await agent.post('/api/tiers').send(tier).expect(201);
      await agent.post('/api/tiers').send(tier).expect(409);
      const { body } = await agent.get('/api/tiers').expect(200);
      expect(body).toEqual(expect.arrayContaining([expect.objectContaining(tier)]));
    });

    it('show who is on which, today and next, by name', async () => {
      const tiers = test.app.get(TiersService);
      const family = await tiers.create(ines, { name: 'family', amountMinor: 4000, months: 3 });
      const student = await tiers.create(ines, { name: 'student', amountMinor: 500, months: 3 });
      const someone = await person(test, { name: 'Aaron Aaronson' });
      const list = async () =>
        ((await agent.get('/api/tiers/people?perPage=1').expect(200)).body as PeopleOnTiersPageDto).items[0];
      expect(await list()).toMatchObject({ personName: 'Aaron Aaronson', tierId: null, coming: null });
      for (const [tierId, fromOn] of [
        [family.id, '2025-03-01'],
        [student.id, '2026-01-15'],
        [family.id, '2026-02-01'],
        [student.id, '2026-05-01'],
      ] as const)
        await tiers.assign(ines, { personId: someone.id, tierId, fromOn });
      expect(await list()).toMatchObject({
        tierName: 'student',
        coming: { tierName: 'family', fromOn: '2026-02-01' },
      });
    });

    it('are not given to nobody, nor is a tier that is none', async () => {
      const fromOn = '2026-01-01';
      const nobody = { personId: randomUUID(), tierId: randomUUID(), fromOn };
      await agent.post('/api/tiers/assignments').send(nobody).expect(422);
      await agent
        .post('/api/tiers/assignments')
        .send({ ...nobody, personId: treasurerId })
        .expect(422);
    });
  });

  it.each([
    ['get', '/api/invoices'],
    ['post', '/api/invoices'],
    ['get', '/api/payments'],
    ['post', '/api/payments'],
    ['post', `/api/payments/${randomUUID()}/take-back`],
    ['get', '/api/tiers'],
    ['get', '/api/tiers/people'],
    ['post', '/api/tiers'],
    ['post', '/api/tiers/assignments'],
    ['get', '/api/treasury/summary'],
  ] as const)('keeps %s %s to treasurers', async (method, path) => {
    const { body } = await outsider[method](path).expect(403);
    expect(body).toMatchObject({ type: '/problems/not-allowed' });
    await test.http()[method](path).expect(401);
  });

  it('checks the role in the use case itself, not at the door alone', async () => {
    const member: Actor = { ...ines, roles: ['member'] };
    await expect(invoice(test, member)).rejects.toMatchObject({ code: 'not-allowed' });
    const raised = await invoice(test, ines);
    await expect(payment(test, member, raised)).rejects.toMatchObject({ code: 'not-allowed' });
  });
});
