import type supertest from 'supertest';
import { startTestApp, TEST_NOW, type TestApp } from '../../test/app';
import { bench, night, nightPlan, stage } from '../../test/factories/night.factory';
import { person, someoneWith } from '../../test/factories/person.factory';
import type { Person } from '../people/person.entity';
import type { BuildNightDto } from './dto/build-night.dto';
import type { CheckedNightDto } from './dto/planned-nights.dto';

/** As they arrive: instants are text on the wire. */
type Made = Omit<BuildNightDto, 'startsAt' | 'endsAt'> & { startsAt: string; endsAt: string };

const madeIn = (response: { body: unknown }): Made[] => (response.body as { nights: Made[] }).nights;
const checkedIn = (response: { body: unknown }): CheckedNightDto[] =>
  (response.body as { nights: CheckedNightDto[] }).nights;

const WEEKLY = 'FREQ=WEEKLY;BYDAY=TU;COUNT=3';

describe('planning build nights', () => {
  let test: TestApp;
  let mentor: { person: Person; agent: supertest.Agent };

  beforeAll(async () => {
    test = await startTestApp();
  });
  beforeEach(async () => {
    test.clock.set(TEST_NOW);
    // Every case has a mentor of its own, so that no case stands in another's way.
    mentor = await someoneWith(test, 'mentor');
  });
  afterAll(() => test.close());

  const schedule = (body: object) => mentor.agent.post('/api/build-nights').send(body);
  const preview = (body: object) => mentor.agent.post('/api/build-nights/preview').send(body);
  const nightsInDatabase = async (): Promise<number> => {
    const [row] = await test.dataSource.query<{ count: number }[]>(
      'SELECT count(*)::integer AS count FROM build_night',
    );
    return row?.count ?? 0;
  };

  it('schedules one night with its benches, mentors, stages and places', async () => {
    const [first, second] = [await bench(test), await bench(test)];
    const preDriver = await stage(test, 'Pre-driver');
    const other = await person(test, { name: 'Greta Sorley', roles: ['member', 'mentor'] });
    const plan = nightPlan({
      benchIds: [first.id, second.id],
      mentorIds: [mentor.person.id, other.id],
      stageIds: [preDriver.id],
      note: 'Bring your cores.',
    });
    const nights = madeIn(await schedule(plan).expect(201));
    expect(nights).toHaveLength(1);
    expect(nights[0]).toMatchObject({
      title: 'Winding evening',
      series: null,
      startsAt: '2026-01-20T19:30:00.000Z',
      endsAt: '2026-01-20T21:30:00.000Z',
      places: 8,
      coming: 0,
      waiting: 0,
      note: 'Bring your cores.',
      benches: [
        { id: first.id, tag: first.tag },
        { id: second.id, tag: second.tag },
      ],
      stages: [{ id: preDriver.id, position: 9, name: 'Pre-driver' }],
      mine: { state: 'on duty', line: null },
      cancelledAt: null,
    });
    expect(nights[0]?.mentors).toHaveLength(2);
  });

  it('puts whoever schedules it on duty when no mentor is named', async () => {
    const made = await night(mentor.agent);
    expect(made.mentors.map(({ id }) => id)).toEqual([mentor.person.id]);
  });

  it('keeps 19:30 on the wall across the change of the clocks', async () => {
    const nights = madeIn(
      await schedule(
        nightPlan({
          startsAt: '2026-03-18T19:30:00Z',
          endsAt: '2026-03-18T21:30:00Z',
          repeat: { rule: 'FREQ=WEEKLY;BYDAY=WE;COUNT=3' },
        }),
      ).expect(201),
    );
    expect(nights.map(({ startsAt }) => startsAt)).toEqual([
      '2026-03-18T19:30:00.000Z',
      '2026-03-25T19:30:00.000Z',
      '2026-04-01T18:30:00.000Z',
    ]);
    expect(nights.map(({ endsAt }) => endsAt)).toEqual([
      '2026-03-18T21:30:00.000Z',
      '2026-03-25T21:30:00.000Z',
      '2026-04-01T20:30:00.000Z',
    ]);
  });

  it('numbers the nights of a series and leaves out the days it is told to', async () => {
    const plan = nightPlan({ repeat: { rule: 'FREQ=WEEKLY;COUNT=4' }, skip: ['2026-01-27', '2030-01-01'] });
    const nights = madeIn(await schedule(plan).expect(201));
    const series = nights.map(({ series }) => series);
    expect(series).toEqual([
      expect.objectContaining({ number: 1, total: 3, rule: 'FREQ=WEEKLY;COUNT=4' }),
      expect.objectContaining({ number: 2, total: 3 }),
      expect.objectContaining({ number: 3, total: 3 }),
    ]);
    const days = nights.map(({ startsAt }) => startsAt.slice(0, 10));
    expect(days).toEqual(['2026-01-20', '2026-02-03', '2026-02-10']);
  });

  it('names each date on which a bench is taken, by whom, and the benches that are free instead', async () => {
    const [first, second] = [await bench(test), await bench(test)];
    const other = await someoneWith(test, 'mentor');
    await night(other.agent, {
      title: 'Vector clearance',
      startsAt: '2026-01-27T19:00:00Z',
      endsAt: '2026-01-27T21:00:00Z',
      benchIds: [first.id],
    });
    const nights = checkedIn(
      await preview(nightPlan({ repeat: { rule: WEEKLY }, benchIds: [first.id] })).expect(200),
    );
    expect(nights.map(({ date, verdict }) => [date, verdict])).toEqual([
      ['2026-01-20', 'clear'],
      ['2026-01-27', 'clash'],
      ['2026-02-03', 'clear'],
    ]);
    const clashing = nights[1];
    expect(clashing?.clashes).toEqual([
      { kind: 'bench', detail: `${first.tag} is taken by Vector clearance, 19:00 to 21:00.` },
    ]);
    expect(clashing?.remedy.benchIds).toHaveLength(1);
    expect(clashing?.remedy.benchIds).not.toContain(first.id);
    expect(second.id).not.toBe(first.id);
  });

  it('says when a mentor is on duty elsewhere, and who could be asked', async () => {
    const busy = await someoneWith(test, 'mentor');
    await test.dataSource.query(`UPDATE person SET name = 'Greta Sorley' WHERE id = $1`, [busy.person.id]);
    await night(busy.agent, {
      title: 'Licence evening',
      startsAt: '2026-01-20T19:00:00Z',
      endsAt: '2026-01-20T21:00:00Z',
    });
    const nights = checkedIn(await preview(nightPlan({ mentorIds: [busy.person.id] })).expect(200));
    expect(nights[0]).toMatchObject({
      verdict: 'clash',
      clashes: [{ kind: 'mentor', detail: 'Greta Sorley is on Licence evening until 21:00.' }],
    });
    expect(nights[0]?.remedy.mentorIds).toHaveLength(1);
    expect(nights[0]?.remedy.mentorIds).not.toContain(busy.person.id);
  });

  it('makes nothing while one date clashes, and names the dates in the refusal', async () => {
    const taken = await bench(test);
    const other = await someoneWith(test, 'mentor');
    await night(other.agent, {
      startsAt: '2026-01-27T20:00:00Z',
      endsAt: '2026-01-27T22:00:00Z',
      benchIds: [taken.id],
    });
    const before = await nightsInDatabase();
    const plan = nightPlan({ repeat: { rule: WEEKLY }, benchIds: [taken.id] });
    const { body } = await schedule(plan).expect(409);
    expect(body).toMatchObject({
      type: '/problems/night-clash',
      detail: 'Tue 27 Jan clashes, so nothing was changed.',
      clashes: [{ date: '2026-01-27', clashes: [{ kind: 'bench' }] }],
    });
    expect(await nightsInDatabase()).toBe(before);
    await schedule({ ...plan, skip: ['2026-01-27'] }).expect(201);
    expect(await nightsInDatabase()).toBe(before + 2);
  });

  it('takes other benches and mentors for one date of a series', async () => {
    const [first, second] = [await bench(test), await bench(test)];
    const other = await someoneWith(test, 'mentor');
    await night(other.agent, {
      startsAt: '2026-01-27T19:30:00Z',
      endsAt: '2026-01-27T21:30:00Z',
      benchIds: [first.id],
    });
    const plan = nightPlan({
      repeat: { rule: WEEKLY },
      benchIds: [first.id],
      instead: [{ date: '2026-01-27', benchIds: [second.id] }],
    });
    const nights = madeIn(await schedule(plan).expect(201));
    const benches = nights.map((made) => made.benches[0]?.id);
    expect(benches).toEqual([first.id, second.id, first.id]);
  });

  it('takes a night that begins when another ends', async () => {
    const shared = await bench(test);
    await night(mentor.agent, { benchIds: [shared.id] });
    const after = { startsAt: '2026-01-20T21:30:00Z', endsAt: '2026-01-20T22:30:00Z' };
    await schedule(nightPlan({ ...after, benchIds: [shared.id] })).expect(201);
  });

  it('lets one of twenty mentors who plan the same bench and time at once have it, and tells the others why', async () => {
    const wanted = await bench(test);
    const mentors = await Promise.all(Array.from({ length: 20 }, () => someoneWith(test, 'mentor')));
    const answers = await Promise.allSettled(
      mentors.map(({ agent }) =>
        agent
          .post('/api/build-nights')
          .send(nightPlan({ repeat: { rule: WEEKLY }, benchIds: [wanted.id] }))
          .then(({ status, body }) => ({ status, type: body.type as string })),
      ),
    );
    const settled = answers.map((answer) => (answer.status === 'fulfilled' ? answer.value : undefined));
    expect(settled.filter((answer) => answer?.status === 201)).toHaveLength(1);
    expect(settled.filter((answer) => answer?.type === '/problems/night-clash')).toHaveLength(19);
  });

  it('lets a mentor be put on duty once at a time, however many plan it at once', async () => {
    const wanted = await person(test, { roles: ['member', 'mentor'] });
    const planners = await Promise.all(Array.from({ length: 12 }, () => someoneWith(test, 'mentor')));
    const statuses = await Promise.all(
      planners.map(({ agent }, index) =>
        agent
          .post('/api/build-nights')
          .send(
            nightPlan({
              repeat: { rule: WEEKLY },
              mentorIds: index % 2 ? [wanted.id, mentor.person.id] : [mentor.person.id, wanted.id],
            }),
          )
          .then(({ status }) => status),
      ),
    );
    expect(statuses.filter((status) => status === 201)).toHaveLength(1);
    expect(statuses.filter((status) => status === 409)).toHaveLength(11);
  });

  it('refuses planning by somebody who is no mentor', async () => {
    const { agent } = await someoneWith(test, 'steward', 'organiser');
    await agent.post('/api/build-nights').send(nightPlan()).expect(403);
    await agent.post('/api/build-nights/preview').send(nightPlan()).expect(403);
    await test.http().post('/api/build-nights').send(nightPlan()).expect(401);
  });

  it('previews a plan that is half typed', async () => {
    const { startsAt, endsAt } = nightPlan();
    const nights = checkedIn(await preview({ startsAt, endsAt }).expect(200));
    expect(nights).toEqual([expect.objectContaining({ date: '2026-01-20', verdict: 'clear' })]);
  });
});
