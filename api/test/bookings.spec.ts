import type supertest from 'supertest';
import { GroupsService } from '../src/groups/groups.service';
import { ClearancesService } from '../src/instruments/clearances.service';
import { InstrumentCareService } from '../src/instruments/instrument-care.service';
import { bench, instrument, kind, tomorrowAt } from './factories/bench.factory';
import { someoneWith } from './factories/person.factory';
import { startTestApp, TEST_NOW, type TestApp } from './app';

const NOBODY = '5f0e0000-0000-4000-8000-000000000000';

interface Refusal {
  detail: string;
  refused: { resourceId: string; reasons: { code: string }[] }[];
}

describe('booking benches and instruments', () => {
  let test: TestApp;
  let me: { person: { id: string; name: string }; agent: supertest.Agent };
  let other: typeof me;
  let steward: typeof me;

  beforeAll(async () => {
    test = await startTestApp();
    [me, other, steward] = await Promise.all([
      someoneWith(test),
      someoneWith(test),
      someoneWith(test, 'steward'),
    ]);
  });
  beforeEach(() => test.clock.set(TEST_NOW));
  afterAll(() => test.close());

  const actorOf = ({ person }: typeof me, ...roles: ('member' | 'steward')[]) => ({
    personId: person.id,
    name: person.name,
    roles,
  });
  const wish = (resourceIds: string[], more: object = {}) => ({
    resourceIds,
    startsAt: tomorrowAt(14),
    endsAt: tomorrowAt(16),
    ...more,
  });
  const book = (resourceIds: string[], more: object = {}, who = me) =>
    who.agent.post('/api/bookings').send(wish(resourceIds, more));
  const rows = async (): Promise<number> => {
    const [{ count }] = await test.dataSource.query<[{ count: string }]>('SELECT count(*) FROM booking_item');
    return Number(count);
  };
  const clear = (kindId: string, until?: string) =>
    test.app
      .get(ClearancesService)
      .grant(actorOf(steward, 'member', 'steward'), { personId: me.person.id, kindId, until });

  it('books a bench and an instrument together and answers with what was booked', async () => {
    const [desk, generator] = [await bench(test), await instrument(test)];
    const { body } = await book([generator.id, desk.id]).expect(201);
    expect(body).toMatchObject({
      kind: 'session',
      personName: 'Some One',
      mine: true,
      mayCancel: true,
      startsAt: tomorrowAt(14),
      endsAt: tomorrowAt(16),
      groupId: null,
      checkId: null,
    });
    expect(body.resources).toMatchObject([
      { id: desk.id, kind: 'bench' },
      { id: generator.id, kind: 'instrument' },
    ]);
  });

  it('lets one booking begin where another ends', async () => {
    const { id } = await bench(test);
    await book([id]).expect(201);
    await book([id], { startsAt: tomorrowAt(16), endsAt: tomorrowAt(17) }, other).expect(201);
  });

  it('refuses an overlap of one minute and books nothing of it, the free bench neither', async () => {
    const [taken, free] = [await bench(test), await bench(test)];
    await book([taken.id]).expect(201);
    const before = await rows();
    const late = { startsAt: tomorrowAt(15, 59), endsAt: tomorrowAt(17) };
    const { body } = await book([free.id, taken.id], late, other).expect(409);
    expect(body).toMatchObject({
      type: '/problems/booking-overlap',
      title: 'The booking was not made',
      takenBy: [{ resourceId: taken.id, resourceTag: taken.tag, by: 'Some One', startsAt: tomorrowAt(14) }],
    });
    expect(await rows()).toBe(before);
  });

  it('says who has it, and to whoever has it already that it is their own', async () => {
    const { id, tag } = await bench(test);
    await book([id]).expect(201);
    const detailFor = async (who?: typeof other): Promise<unknown> =>
      ((await book([id], {}, who).expect(409)).body as { detail: unknown }).detail;
    expect(await detailFor(other)).toContain(`${tag} went to Some One, Fri 16 Jan, 14:00 to 16:00.`);
    expect(await detailFor()).toContain(`You already have ${tag} then, Fri 16 Jan, 14:00 to 16:00.`);
  });

  describe('nearest free times', () => {
    const nearest = async (resourceIds: string[], more: object = {}): Promise<unknown[]> => {
      const { body } = await book(resourceIds, more).expect(409);
      return body.nearestFree as unknown[];
    };
    const at = (from: number, to: number) => ({ startsAt: tomorrowAt(from), endsAt: tomorrowAt(to) });

    it('lie before and after the wanted time, the nearest first, for all that is wanted together', async () => {
      const [desk, generator] = [await bench(test), await instrument(test)];
      await book([desk.id], at(13, 16), other).expect(201);
      await book([generator.id], at(16, 17), other).expect(201);
      // Together they are free until 13 and from 17: 14 to 16 moves 3 h either way; the third is the same time a day earlier.
      expect(await nearest([desk.id, generator.id], at(14, 16))).toEqual([
        at(11, 13),
        at(17, 19),
        at(-10, -8),
      ]);
    });

    it('are each as long as wanted: a shorter gap is passed over', async () => {
      const { id } = await bench(test);
      await book([id], at(12, 14), other).expect(201);
      await book([id], at(15, 17), other).expect(201);
      const [first, second] = await nearest([id], at(13, 15));
      expect([first, second]).toEqual([at(10, 12), at(17, 19)]);
    });

    it('can be booked as they are', async () => {
      const { id } = await bench(test);
      await book([id], at(8, 20), other).expect(201);
      const free = await nearest([id], at(10, 12));
      expect(free).toHaveLength(3);
      for (const span of free) await book([id], span as object).expect(201);
    });

    it('do not lie in the past: they begin with the next quarter of an hour', async () => {
      test.clock.set(new Date('2026-01-16T13:03:00Z'));
      const { id } = await bench(test);
      await book([id], at(14, 16), other).expect(201);
      const free = await nearest([id], { startsAt: tomorrowAt(14), endsAt: tomorrowAt(14, 45) });
      expect(free[0]).toEqual({ startsAt: tomorrowAt(13, 15), endsAt: tomorrowAt(14) });
    });

    it('do not lie behind the end of a calibration', async () => {
      const { id } = await instrument(test, { calibrationDueOn: '2026-01-16' }, { needsCalibration: true });
      await book([id], at(12, 18), other).expect(201);
      for (const span of await nearest([id], at(16, 18)))
        expect((span as { endsAt: string }).endsAt <= tomorrowAt(24)).toBe(true);
    });

    it('are none when two weeks to both sides are full', async () => {
      const { id } = await bench(test);
      await test.dataSource.query(
        `WITH head AS (
           INSERT INTO booking (kind, title, person_id, starts_at, ends_at, made_at)
           VALUES ('build night', 'Hall closed', $1, '2026-01-01Z', '2026-03-01Z', '2026-01-01Z') RETURNING *)
         INSERT INTO booking_item (booking_id, resource_id, starts_at, ends_at)
         SELECT id, $2, starts_at, ends_at FROM head`,
        [other.person.id, id],
      );
      const { body } = await book([id]).expect(409);
      expect(body.nearestFree).toEqual([]);
      expect(body.detail).toBe(
        `${String(body.takenBy[0].resourceTag)} is held for Hall closed, Thu 1 Jan, 00:00 to Sun 1 Mar, 00:00. ` +
          'Choose another bench or instrument. Nothing was booked.',
      );
    });
  });

  describe('an instrument that may not be used', () => {
    const reasonsOf = async (resourceIds: string[], more: object = {}): Promise<Refusal> => {
      const before = await rows();
      const { body } = await book(resourceIds, more).expect(422);
      expect(await rows()).toBe(before);
      return body as Refusal;
    };

    it('is refused in repair, with the steward’s words, the place in the list and a remedy; its bench too', async () => {
      const [desk, broken] = [await bench(test), await instrument(test)];
      await test.app
        .get(InstrumentCareService)
        .changeCondition(actorOf(steward, 'member', 'steward'), broken.id, {
          condition: 'in repair',
          note: 'Waiting on a part',
        });
      const body = await reasonsOf([desk.id, broken.id]);
      expect(body).toMatchObject({
        type: '/problems/not-bookable',
        errors: [{ pointer: '#/resourceIds/1' }],
        refused: [{ resourceId: broken.id, reasons: [{ code: 'in repair' }] }],
      });
      expect(body.detail).toContain(`${broken.tag} is in repair: Waiting on a part.`);
      await book([desk.id]).expect(201);
    });

    it('is refused out of use', async () => {
      const { id } = await instrument(test);
      const change = { condition: 'out of use' as const, note: 'Gone for scrap' };
      const actor = actorOf(steward, 'member', 'steward');
      await test.app.get(InstrumentCareService).changeCondition(actor, id, change);
      expect((await reasonsOf([id])).refused).toMatchObject([{ reasons: [{ code: 'out of use' }] }]);
    });

    it('is refused past its calibration on the day of use, though it is good today', async () => {
      const { id } = await instrument(test, { calibrationDueOn: '2026-01-15' }, { needsCalibration: true });
      expect((await reasonsOf([id])).refused).toMatchObject([{ reasons: [{ code: 'calibration past' }] }]);
      const today = { startsAt: '2026-01-15T20:00:00Z', endsAt: '2026-01-16T00:00:00Z' };
      await book([id], today).expect(201);
      const overMidnight = { startsAt: '2026-01-15T18:00:00Z', endsAt: '2026-01-16T00:30:00Z' };
      await reasonsOf([id], overMidnight);
    });

    it('is refused to somebody not cleared on its kind, and open to them once they are', async () => {
      const analyzer = await kind(test, { needsClearance: true });
      const { id } = await instrument(test, { kindId: analyzer.id });
      expect((await reasonsOf([id])).refused).toMatchObject([{ reasons: [{ code: 'not cleared' }] }]);
      await clear(analyzer.id);
      await book([id]).expect(201);
    });

    it('is refused when the clearance ends before the day, or was taken back', async () => {
      const analyzer = await kind(test, { needsClearance: true });
      const { id } = await instrument(test, { kindId: analyzer.id });
      await clear(analyzer.id, '2026-01-15');
      expect((await reasonsOf([id])).refused).toMatchObject([{ reasons: [{ code: 'clearance past' }] }]);
      const renewed = await clear(analyzer.id, '2026-01-16');
      await book([id]).expect(201);
      await steward.agent.delete(`/api/clearances/${renewed.id}`).expect(204);
      await reasonsOf([id], { startsAt: tomorrowAt(17), endsAt: tomorrowAt(18) });
    });
  });

  describe('bad input', () => {
    it.each([
      ['no bench or instrument', { resourceIds: [] }, '#/resourceIds'],
      ['no list', { resourceIds: NOBODY }, '#/resourceIds'],
      ['nine of them', { resourceIds: Array(9).fill(NOBODY) }, '#/resourceIds'],
      ['a null among them', { resourceIds: [null] }, '#/resourceIds'],
      ['a thing that is no id', { resourceIds: ['Bench 3'] }, '#/resourceIds'],
      ['one twice', { resourceIds: [NOBODY, NOBODY] }, '#/resourceIds'],
      ['one twice in two spellings', { resourceIds: [NOBODY, NOBODY.toUpperCase()] }, '#/resourceIds'],
      ['one the club does not have', { resourceIds: [NOBODY] }, '#/resourceIds/0'],
      ['an unknown field', { confirmed: true }, '#/confirmed'],
      ['a start without offset', { startsAt: '2026-01-16T14:00:00' }, '#/startsAt'],
      ['a start that is a number', { startsAt: 1768572000 }, '#/startsAt'],
      ['a leap second', { startsAt: '2026-01-16T14:00:60Z' }, '#/startsAt'],
      ['a day that is none', { startsAt: '2026-02-30T14:00:00Z' }, '#/startsAt'],
      ['an overlong time', { startsAt: `2026-01-16T14:00:00.${'0'.repeat(60)}Z` }, '#/startsAt'],
      ['no end', { endsAt: undefined }, '#/endsAt'],
      [
        'times in the past',
        { startsAt: '2026-01-14T14:00:00Z', endsAt: '2026-01-14T16:00:00Z' },
        '#/startsAt',
      ],
      ['the year 1', { startsAt: '0001-01-01T00:00:00Z' }, '#/startsAt'],
      ['reversed times', { endsAt: tomorrowAt(13) }, '#/endsAt'],
      ['no length', { endsAt: tomorrowAt(14) }, '#/endsAt'],
      ['thirteen hours', { startsAt: tomorrowAt(8), endsAt: tomorrowAt(21) }, '#/endsAt'],
      [
        'half a year and more ahead',
        { startsAt: '2026-07-20T10:00:00Z', endsAt: '2026-07-20T11:00:00Z' },
        '#/startsAt',
      ],
      ['a group that is no id', { groupId: 7 }, '#/groupId'],
      ['a check the plan does not have', { checkId: NOBODY }, '#/checkId'],
    ])('names the field: %s', async (_what, more, pointer) => {
      const { id } = await bench(test);
      const before = await rows();
      const { body } = await book([id], more).expect(422);
      expect(body.errors).toEqual(
        expect.arrayContaining([expect.objectContaining({ pointer, detail: expect.stringMatching(/\S/) })]),
      );
      expect(await rows()).toBe(before);
    });

    it('refuses a bench that is no longer offered', async () => {
      const { id } = await bench(test);
      await test.dataSource.query('UPDATE resource SET retired_at = now() WHERE id = $1', [id]);
      const { body } = await book([id]).expect(422);
      expect(body).toMatchObject({ errors: [{ pointer: '#/resourceIds/0' }] });
    });

    it('refuses somebody else’s group and takes one’s own', async () => {
      const groups = test.app.get(GroupsService);
      const [own, foreign] = [
        await groups.form({ name: 'Tuesday group', about: '', memberIds: [me.person.id] }),
        await groups.form({ name: 'Thursday group', about: '', memberIds: [other.person.id] }),
      ];
      const { id } = await bench(test);
      const refused = await book([id], { groupId: foreign.id }).expect(422);
      expect(refused.body).toMatchObject({ errors: [{ pointer: '#/groupId' }] });
      const { body } = await book([id], { groupId: own.id }).expect(201);
      expect(body).toMatchObject({ groupId: own.id, groupName: 'Tuesday group' });
    });

    it.each([
      ['no end', { from: tomorrowAt(0) }, '#/to'],
      ['reversed', { from: tomorrowAt(5), to: tomorrowAt(4) }, '#/to'],
      ['63 days', { from: '2026-01-01T00:00:00Z', to: '2026-03-05T00:00:00Z' }, '#/to'],
      ['the year 1', { from: '0001-01-01T00:00:00Z', to: '0001-01-02T00:00:00Z' }, '#/from'],
      ['a day without a time', { from: '2026-01-01', to: '2026-01-02' }, '#/from'],
      ['an unknown field', { from: tomorrowAt(0), to: tomorrowAt(4), page: 2 }, '#/page'],
      ['a bench that is no id', { from: tomorrowAt(0), to: tomorrowAt(4), resourceId: 'x' }, '#/resourceId'],
    ])('refuses a list with %s', async (_what, query, pointer) => {
      const { body } = await me.agent.get('/api/bookings').query(query).expect(422);
      expect(body.errors).toEqual(expect.arrayContaining([expect.objectContaining({ pointer })]));
    });

    it('is open to nobody who is not signed in', async () => {
      await test
        .http()
        .get('/api/bookings')
        .query({ from: tomorrowAt(0), to: tomorrowAt(4) })
        .expect(401);
      await test.http().get('/api/bookings/mine').expect(401);
      await test
        .http()
        .post('/api/bookings')
        .send(wish([NOBODY]))
        .expect(401);
      await test.http().delete(`/api/bookings/${NOBODY}`).expect(401);
    });
  });
});
