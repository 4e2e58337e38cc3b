import type supertest from 'supertest';
import { startTestApp, TEST_NOW, type TestApp } from './app';
import { bench } from './factories/bench.factory';
import { someoneWith } from './factories/person.factory';

const THURSDAY = 4;
const HOUR = 60;
const day = (weekday: number, opens: number, closes: number): object => ({
  weekday,
  opensMinute: opens * HOUR,
  closesMinute: closes * HOUR,
});

describe('opening hours', () => {
  let test: TestApp;
  let member: { agent: supertest.Agent };
  let organiser: typeof member;

  beforeAll(async () => {
    test = await startTestApp();
    [member, organiser] = await Promise.all([someoneWith(test), someoneWith(test, 'organiser')]);
  });
  beforeEach(() => test.clock.set(TEST_NOW));
  afterAll(() => test.close());

  const put = (days: unknown, who = organiser) => who.agent.put('/api/club/opening-hours').send({ days });
  const shown = async (): Promise<unknown> =>
    ((await test.http().get('/api/club').expect(200)).body as { openingHours: unknown }).openingHours;

  it('are given by an organiser as a whole week and shown to everybody, Monday first', async () => {
    expect(await shown()).toEqual([]);
    await put([day(6, 10, 20), day(1, 12, 22)]).expect(204);
    expect(await shown()).toEqual([day(1, 12, 22), day(6, 10, 20)]);
    await put([day(7, 0, 24)]).expect(204);
    expect(await shown()).toEqual([day(7, 0, 24)]);
  });

  it('are refused to anybody else', async () => {
    const before = await shown();
    await put([day(1, 1, 2)], member).expect(403);
    await put([day(1, 1, 2)], { agent: test.http() }).expect(401);
    expect(await shown()).toEqual(before);
  });

  it.each([
    ['a day that closes before it opens', [day(1, 20, 8)], '#/days/0/closesMinute'],
    ['a day named twice', [day(1, 8, 20), day(1, 9, 10)], '#/days'],
    ['an eighth day', [day(8, 8, 20)], '#/days/0/weekday'],
    ['minutes past midnight', [day(1, 8, 25)], '#/days/0/closesMinute'],
    ['half a minute', [{ weekday: 1, opensMinute: 0.5, closesMinute: 60 }], '#/days/0/opensMinute'],
    ['what is no day', [null], '#/days'],
    ['what is no list', 'always', '#/days'],
  ])('refuse %s, and keep the week as it was', async (_case, days, pointer) => {
    await put([day(2, 9, 17)]).expect(204);
    const { body } = await put(days).expect(422);
    const pointers = (body as { errors: { pointer: string }[] }).errors.map((error) => error.pointer);
    expect(pointers).toContain(pointer);
    expect(await shown()).toEqual([day(2, 9, 17)]);
  });

  it('come out as one of the two weeks when two organisers write at once', async () => {
    const [short, long] = [[day(1, 8, 9)], [1, 2, 3, 4, 5, 6, 7].map((weekday) => day(weekday, 8, 20))];
    const answers = await Promise.all([short, long, short, long].map((week) => put(week)));
    expect(answers.map(({ status }) => status)).toEqual([204, 204, 204, 204]);
    expect([short, long]).toContainEqual(await shown());
  });

  describe('beside a booking', () => {
    const at = (hour: number): string => new Date(Date.UTC(2026, 0, 15, hour)).toISOString();
    const book = (resourceIds: string[], from: number, to: number) =>
      member.agent.post('/api/bookings').send({ resourceIds, startsAt: at(from), endsAt: at(to) });
    const nearestFree = async (id: string, from: number, to: number): Promise<unknown> => {
      await book([id], from, to).expect(201);
      return ((await book([id], from, to).expect(409)).body as { nearestFree: unknown }).nearestFree;
    };

    it('do not refuse one outside of them, for somebody with a key may be there', async () => {
      await put([day(THURSDAY, 18, 22)]).expect(204);
      await book([(await bench(test)).id], 14, 16).expect(201);
    });

    it('hold the nearest free times that are offered', async () => {
      await put([day(THURSDAY, 16, 22)]).expect(204);
      // The Thursdays two weeks around; the first before it is past.
      expect(await nearestFree((await bench(test)).id, 16, 18)).toEqual([
        { startsAt: at(18), endsAt: at(20) },
        { startsAt: at(16 + 7 * 24), endsAt: at(18 + 7 * 24) },
        { startsAt: at(16 + 14 * 24), endsAt: at(18 + 14 * 24) },
      ]);
    });

    it('give way when nothing free lies in them', async () => {
      await put([day(THURSDAY, 16, 17)]).expect(204);
      expect(await nearestFree((await bench(test)).id, 16, 18)).toContainEqual({
        startsAt: at(14),
        endsAt: at(16),
      });
    });
  });
});
