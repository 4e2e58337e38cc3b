import type supertest from 'supertest';
import { startTestApp, type TestApp } from '../../test/app';
import { bench, nightPlan } from '../../test/factories/night.factory';
import { person, someoneWith } from '../../test/factories/person.factory';
import { ClubService } from '../club/club.service';
import type { Person } from '../people/person.entity';
import type { CheckedNightDto } from './dto/planned-nights.dto';

/**
 * A club half a day ahead of UTC, and one that is a half-hour off it. Changes of the clocks in 2026, by the tz database
 * (2026a): Auckland back on 5 April, +13 to +12; St John's forward on 8 March, −3:30 to −2:30.
 */
const CLUBS = [
  {
    zone: 'Pacific/Auckland',
    rule: 'FREQ=WEEKLY;BYDAY=TH;COUNT=2',
    // Thursday 2 April, 08:30 to 10:30: still Wednesday in UTC.
    first: { startsAt: '2026-04-01T19:30:00.000Z', endsAt: '2026-04-01T21:30:00.000Z' },
    second: { startsAt: '2026-04-08T20:30:00.000Z', endsAt: '2026-04-08T22:30:00.000Z' },
    dates: ['2026-04-02', '2026-04-09'],
    words: ['Thu 2 Apr, 08:30 to 10:30', 'Thu 9 Apr, 08:30 to 10:30'],
  },
  {
    zone: 'America/St_Johns',
    rule: 'FREQ=WEEKLY;BYDAY=FR;COUNT=2',
    // Friday 6 March, 22:00 to 00:15: Saturday already in UTC.
    first: { startsAt: '2026-03-07T01:30:00.000Z', endsAt: '2026-03-07T03:45:00.000Z' },
    second: { startsAt: '2026-03-14T00:30:00.000Z', endsAt: '2026-03-14T02:45:00.000Z' },
    dates: ['2026-03-06', '2026-03-13'],
    words: ['Fri 6 Mar, 22:00 to Sat 7 Mar, 00:15', 'Fri 13 Mar, 22:00 to Sat 14 Mar, 00:15'],
  },
];

describe.each(CLUBS)('build nights of a club in $zone', ({ zone, rule, first, second, dates, words }) => {
  let test: TestApp;
  let mentor: { person: Person; agent: supertest.Agent };

  beforeAll(async () => {
    test = await startTestApp();
    const club = test.app.get(ClubService);
    await club.set({ ...(await club.settings()), timeZone: zone });
    mentor = await someoneWith(test, 'mentor');
  });
  afterAll(() => test.close());

  it('keep the hours on its wall through a series, and are dated and said as it reads them', async () => {
    const other = await person(test, { roles: ['member', 'mentor'] });
    const plan = nightPlan({
      ...{ startsAt: first.startsAt, endsAt: first.endsAt, repeat: { rule } },
      mentorIds: [mentor.person.id, other.id],
    });
    const { body: shown } = await mentor.agent.post('/api/build-nights/preview').send(plan).expect(200);
    const checked = (shown as { nights: (CheckedNightDto & { startsAt: string })[] }).nights;
    expect(checked.map(({ date }) => date)).toEqual(dates);
    const { body } = await mentor.agent.post('/api/build-nights').send(plan).expect(201);
    expect((body as { nights: object[] }).nights).toMatchObject([first, second]);
    const [letter] = await test.dataSource.query<{ text: string }[]>(
      'SELECT text FROM mail WHERE "to" = $1',
      [other.email],
    );
    for (const when of words) expect(letter?.text).toContain(when);
  });

  it('name the day of a clash as it reads it, and leave out the date that was struck', async () => {
    const { id } = await bench(test);
    const plan = nightPlan({ startsAt: first.startsAt, endsAt: first.endsAt, benchIds: [id] });
    const greta = await someoneWith(test, 'mentor');
    await greta.agent.post('/api/build-nights').send(plan).expect(201);
    const others = { ...plan, mentorIds: [(await person(test, { roles: ['member', 'mentor'] })).id] };
    const { body } = await greta.agent.post('/api/build-nights').send(others).expect(409);
    expect(body.detail).toBe(`${words[0]?.split(',')[0]} clashes, so nothing was changed.`);
    expect(body.clashes).toMatchObject([{ date: dates[0] }]);
    const series = { ...others, repeat: { rule }, skip: [dates[0]] };
    const { body: made } = await greta.agent.post('/api/build-nights').send(series).expect(201);
    expect((made as { nights: object[] }).nights).toMatchObject([second]);
  });
});
