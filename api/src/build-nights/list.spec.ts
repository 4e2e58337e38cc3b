import type supertest from 'supertest';
import { startTestApp, type TestApp } from '../../test/app';
import { bench, night, nightPlan, stage } from '../../test/factories/night.factory';
import { someoneWith } from '../../test/factories/person.factory';
import type { BuildNightDto } from './dto/build-night.dto';

const ID = '00000000-0000-4000-8000-000000000000';

describe('listing build nights', () => {
  let test: TestApp;
  let mentor: supertest.Agent;
  let member: supertest.Agent;

  beforeAll(async () => {
    test = await startTestApp();
    mentor = (await someoneWith(test, 'mentor')).agent;
    member = (await someoneWith(test)).agent;
  });
  afterAll(() => test.close());

  const list = (from: string, to: string) => member.get('/api/build-nights').query({ from, to });

  it('answers with every night that touches the stretch, earliest first, to the minute', async () => {
    const rule = 'FREQ=WEEKLY;COUNT=6';
    const times = { startsAt: '2026-05-05T18:30:00Z', endsAt: '2026-05-05T20:30:00Z' };
    await mentor
      .post('/api/build-nights')
      .send(nightPlan({ ...times, repeat: { rule } }))
      .expect(201);
    const days = async (from: string, to: string) => {
      const { body } = await list(from, to).expect(200);
      const { items } = body as { items: { startsAt: string }[] };
      return items.map(({ startsAt }) => startsAt.slice(0, 10));
    };
    expect(await days('2026-05-05T20:30:00Z', '2026-05-12T18:30:00Z')).toEqual([]);
    expect(await days('2026-05-05T20:29:00Z', '2026-05-12T18:31:00Z')).toEqual(['2026-05-05', '2026-05-12']);
  });

  it('asks the database as often for many nights as for one', async () => {
    const queries = jest.spyOn(
      Object.getPrototypeOf(test.dataSource.createQueryRunner()) as { query: () => unknown },
      'query',
    );
    const asked = async (from: string, to: string) => {
      queries.mockClear();
      const { body } = await list(from, to).expect(200);
      return { nights: (body.items as unknown[]).length, queries: queries.mock.calls.length };
    };
    const full = { benchIds: [(await bench(test)).id], stageIds: [(await stage(test)).id] };
    const [rule, times] = [
      'FREQ=WEEKLY;COUNT=12',
      { startsAt: '2026-08-04T18:30:00Z', endsAt: '2026-08-04T20:30:00Z' },
    ];
    await mentor
      .post('/api/build-nights')
      .send(nightPlan({ ...times, ...full, repeat: { rule } }))
      .expect(201);
    const one = await asked('2026-08-04T00:00:00Z', '2026-08-05T00:00:00Z');
    const many = await asked('2026-08-01T00:00:00Z', '2026-11-01T00:00:00Z');
    queries.mockRestore();
    expect([one.nights, many.nights]).toEqual([1, 12]);
    expect(one.queries).toBeGreaterThan(0);
    expect(many.queries).toBe(one.queries);
  });

  it('shows how the person who asks stands to each night, and nobody else’s standing', async () => {
    const made = await night(mentor, { places: 1 });
    const second = (await someoneWith(test)).agent;
    await second.post(`/api/build-nights/${made.id}/coming`).expect(200);
    await member.post(`/api/build-nights/${made.id}/coming`).expect(200);
    const seen = async (agent: supertest.Agent) => {
      const query = { from: '2026-01-20T00:00:00Z', to: '2026-01-21T00:00:00Z' };
      const { body } = await agent.get('/api/build-nights').query(query).expect(200);
      return (body as { items: BuildNightDto[] }).items[0];
    };
    expect(await seen(member)).toMatchObject({ coming: 1, waiting: 1, mine: { state: 'waiting', line: 1 } });
    expect(await seen(second)).toMatchObject({
      coming: 1,
      waiting: 1,
      mine: { state: 'coming', line: null },
    });
    expect(await seen(mentor)).toMatchObject({ mine: { state: 'on duty', line: null } });
    expect(await seen((await someoneWith(test)).agent)).toMatchObject({ mine: null });
  });

  it.each([
    ['no beginning', { to: '2026-02-01T00:00:00Z' }, '#/from'],
    ['a reversed stretch', { from: '2026-02-01T00:00:00Z', to: '2026-01-01T00:00:00Z' }, '#/to'],
    ['an empty stretch', { from: '2026-02-01T00:00:00Z', to: '2026-02-01T00:00:00Z' }, '#/to'],
    ['more than 100 days', { from: '2026-01-01T00:00:00Z', to: '2026-04-12T00:00:00Z' }, '#/to'],
    ['a day for an instant', { from: '2026-01-01', to: '2026-01-12T00:00:00Z' }, '#/from'],
    ['an unknown filter', { from: '2026-01-01T00:00:00Z', to: '2026-01-12T00:00:00Z', by: 'x' }, '#/by'],
  ])('refuses %s', async (_what, query, pointer) => {
    const { body } = await member.get('/api/build-nights').query(query).expect(422);
    expect(body.errors[0].pointer).toBe(pointer);
  });

  it('answers 404 for a night that is not there, 400 to no id, and 401 to a stranger', async () => {
    await member.get(`/api/build-nights/${ID}`).expect(404);
    await member.get('/api/build-nights/thursday').expect(400);
    await test.http().get(`/api/build-nights/${ID}`).expect(401);
    await test.http().get('/api/build-nights').expect(401);
  });
});
