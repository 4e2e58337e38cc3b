import type supertest from 'supertest';
import { bench, instrument, kind } from './factories/bench.factory';
import { someoneWith } from './factories/person.factory';
import { startTestApp, TEST_NOW, type TestApp } from './app';

const NOBODY = '5f0e0000-0000-4000-8000-000000000000';

describe('instruments', () => {
  let test: TestApp;
  let member: { person: { id: string; name: string }; agent: supertest.Agent };
  let steward: typeof member;

  beforeAll(async () => {
    test = await startTestApp();
    [member, steward] = await Promise.all([someoneWith(test), someoneWith(test, 'steward')]);
  });
  beforeEach(() => test.clock.set(TEST_NOW));
  afterAll(() => test.close());

  const show = async (id: string, query: object = {}, who = member): Promise<object> =>
    (await who.agent.get(`/api/instruments/${id}`).query(query).expect(200)).body as object;
  const change = (path: string, body: object, who = steward) =>
    who.agent.post(`/api/instruments/${path}`).send(body);

  it('lists the benches in the order they stand, without the ones no longer offered', async () => {
    const [first, gone, last] = [await bench(test), await bench(test), await bench(test)];
    await test.dataSource.query('UPDATE resource SET retired_at = now() WHERE id = $1', [gone.id]);
    const { body } = await member.agent.get('/api/benches').query({ perPage: 200 }).expect(200);
    const ids = (body.items as { id: string }[]).map(({ id }) => id);
    expect(ids).toEqual([first.id, last.id]);
    expect(body).toMatchObject({ total: 2, page: 1, perPage: 200 });
  });

  it('lists instruments with what may be known of them, and of one kind when asked', async () => {
    const analyzer = await kind(test, { needsCalibration: true });
    const { id, tag } = await instrument(test, {
      kindId: analyzer.id,
      calibrationDueOn: '2026-12-09',
      damageLevelDbm: 20,
      amplitudeAccuracyDb: 0.8,
      figures: { flatnessDb: 0.7 },
    });
    await instrument(test);
    const { body } = await member.agent.get('/api/instruments').query({ kindId: analyzer.id }).expect(200);
    expect(body).toMatchObject({ total: 1 });
    expect(body.items).toEqual([
      expect.objectContaining({
        ...{ id, tag, condition: 'ready', calibrationDueOn: '2026-12-09' },
        ...{ damageLevelDbm: 20, amplitudeAccuracyDb: 0.8, mayBook: true, reasons: [], myClearance: null },
        figures: { amplitudeAccuracyDb: 0.8, flatnessDb: 0.7 },
        kind: expect.objectContaining({ id: analyzer.id, needsCalibration: true }),
      }),
    ]);
  });

  it('judges for the day asked about', async () => {
    const due = { calibrationDueOn: '2026-01-20' };
    const { id } = await instrument(test, due, { needsCalibration: true });
    expect(await show(id)).toMatchObject({ mayBook: true });
    expect(await show(id, { on: '2026-01-21' })).toMatchObject({
      mayBook: false,
      reasons: [{ code: 'calibration past' }],
    });
  });

  it('pages long lists and refuses a page too long', async () => {
    const { body } = await member.agent.get('/api/instruments').query({ perPage: 1, page: 2 }).expect(200);
    expect(body.items).toHaveLength(1);
    await member.agent.get('/api/instruments').query({ perPage: 201 }).expect(422);
  });

  it('asks the database as often for many instruments as for one', async () => {
    let queries = 0;
    test.dataSource.subscribers.push({ beforeQuery: () => void (queries += 1) });
    const count = async (): Promise<number> => {
      queries = 0;
      await member.agent.get('/api/instruments').query({ perPage: 200 }).expect(200);
      return queries;
    };
    const before = await count();
    expect(before).toBeGreaterThan(0);
    for (let more = 0; more < 5; more += 1) await instrument(test);
    expect(await count()).toBe(before);
  });

  describe('a steward’s care', () => {
    it('changes the condition with a note, and the history says who, when, from what to what, and why', async () => {
      const { id } = await instrument(test);
      await change(`${id}/condition`, { condition: 'in repair', note: 'No count under 5 MHz' }).expect(204);
      test.clock.advance(60_000);
      await change(`${id}/condition`, { condition: 'ready', note: 'New prescaler' }).expect(204);
      expect(await show(id)).toMatchObject({
        condition: 'ready',
        conditionNote: 'New prescaler',
        mayBook: true,
      });
      const { body } = await member.agent.get(`/api/instruments/${id}/history`).expect(200);
      const [changedBy, changed] = ['Some One', 'condition'];
      expect(body.items).toMatchObject([
        { changedBy, changed, before: 'in repair', after: 'ready', note: 'New prescaler' },
        { changedBy, changed, before: 'ready', after: 'in repair', changedAt: TEST_NOW.toISOString() },
      ]);
    });

    it('changes the last day of the calibration, and the history keeps the one before', async () => {
      const { id } = await instrument(test, {}, { needsCalibration: true });
      await change(`${id}/calibration`, { dueOn: '2027-01-14', note: 'Within 0.6 dB' }).expect(204);
      expect(await show(id)).toMatchObject({ calibrationDueOn: '2027-01-14', mayBook: true });
      const { body } = await member.agent.get(`/api/instruments/${id}/history`).expect(200);
      expect(body.items).toMatchObject([{ changed: 'calibration', before: null, after: '2027-01-14' }]);
    });

    it('is refused to members, mentors, treasurers and organisers', async () => {
      const { id } = await instrument(test);
      const others = await Promise.all(
        (['mentor', 'treasurer', 'organiser'] as const).map((role) => someoneWith(test, role)),
      );
      for (const who of [member, ...others]) {
        await change(`${id}/condition`, { condition: 'out of use', note: 'x' }, who).expect(403);
        await change(`${id}/calibration`, { dueOn: '2026-02-01', note: 'x' }, who).expect(403);
      }
      expect(await show(id)).toMatchObject({ condition: 'ready', calibrationDueOn: null });
    });

    it.each([
      ['condition', { condition: 'broken', note: 'x' }, '#/condition'],
      ['condition', { condition: 'ready', note: '  ' }, '#/note'],
      ['condition', { condition: 'ready', note: 'x'.repeat(501) }, '#/note'],
      ['condition', { condition: 'ready', note: 'a\u0000b' }, '#/note'],
      ['condition', { condition: 'ready', note: 'x', tag: 'FR-001' }, '#/tag'],
      ['calibration', { dueOn: '2026-02-30', note: 'x' }, '#/dueOn'],
      ['calibration', { dueOn: '2026-02-01T00:00:00Z', note: 'x' }, '#/dueOn'],
      ['calibration', { dueOn: '0000-01-01', note: 'x' }, '#/dueOn'],
      ['calibration', { dueOn: '2026-01-14', note: 'x' }, '#/dueOn'],
      ['calibration', { dueOn: '2036-06-01', note: 'x' }, '#/dueOn'],
    ])('names the field of a %s at fault: %j', async (path, body, pointer) => {
      const { id } = await instrument(test);
      const response = await change(`${id}/${path}`, body).expect(422);
      expect(response.body.errors).toEqual([expect.objectContaining({ pointer })]);
    });

    it('answers an instrument that is not there, or is a bench, with 404', async () => {
      const { id } = await bench(test);
      for (const unknown of [NOBODY, id]) {
        await change(`${unknown}/condition`, { condition: 'ready', note: 'x' }).expect(404);
        await change(`${unknown}/calibration`, { dueOn: '2026-02-01', note: 'x' }).expect(404);
        await member.agent.get(`/api/instruments/${unknown}`).expect(404);
        await member.agent.get(`/api/instruments/${unknown}/history`).expect(404);
      }
      await member.agent.get('/api/instruments/FR-021').expect(400);
    });
  });

  it('shows nothing to anybody not signed in', async () => {
    for (const path of [
      '/api/benches',
      '/api/instruments',
      `/api/instruments/${NOBODY}`,
      '/api/clearances/mine',
    ])
      await test.http().get(path).expect(401);
  });

  describe('clearances', () => {
    const grant = (body: object, who = steward) => who.agent.post('/api/clearances').send(body);
    const cleared = async () => {
      const { id: kindId } = await kind(test, { needsClearance: true });
      return { kindId, personId: member.person.id };
    };
    const mineOn = async (kindId: string) => {
      const { body } = await member.agent.get('/api/clearances/mine').expect(200);
      return (body as { kindId: string }[]).filter((clearance) => clearance.kindId === kindId);
    };

    it('are given by a steward until a day, and seen by the member and on the instrument', async () => {
      const wish = await cleared();
      const { id } = await instrument(test, { kindId: wish.kindId });
      const { body } = await grant({ ...wish, until: '2026-06-30' }).expect(201);
      const terms = { grantedOn: '2026-01-15', until: '2026-06-30' };
      expect(body).toMatchObject({ ...terms, personName: 'Some One', grantedBy: 'Some One', holds: true });
      expect(await mineOn(wish.kindId)).toMatchObject([terms]);
      expect(await show(id)).toMatchObject({ mayBook: true, myClearance: terms, clearedPeople: 1 });
      expect(await show(id, {}, steward)).toMatchObject({ mayBook: false, myClearance: null });
    });

    it('are renewed by giving them again: the new terms hold, the old ones end', async () => {
      const wish = await cleared();
      await grant({ ...wish, until: '2026-02-01' }).expect(201);
      await grant(wish).expect(201);
      expect(await mineOn(wish.kindId)).toMatchObject([{ until: null }]);
    });

    it('are given once, however many stewards give them at once', async () => {
      const wish = await cleared();
      const answers = await Promise.all(Array.from({ length: 8 }, () => grant(wish)));
      for (const { status } of answers) expect([201, 409]).toContain(status);
      expect(answers.filter(({ status }) => status === 201).length).toBeGreaterThan(0);
      expect(await mineOn(wish.kindId)).toHaveLength(1);
    });

    it('stop holding after their last day', async () => {
      const wish = await cleared();
      await grant({ ...wish, until: '2026-01-15' }).expect(201);
      test.clock.set(new Date('2026-01-15T23:59:00Z'));
      expect(await mineOn(wish.kindId)).toMatchObject([{ holds: true }]);
      test.clock.set(new Date('2026-01-16T00:00:00Z'));
      expect(await mineOn(wish.kindId)).toMatchObject([{ holds: false }]);
    });

    it('are taken back by a steward; twice is no error', async () => {
      const wish = await cleared();
      const { body } = await grant(wish).expect(201);
      await steward.agent.delete(`/api/clearances/${String(body.id)}`).expect(204);
      await steward.agent.delete(`/api/clearances/${String(body.id)}`).expect(204);
      expect(await mineOn(wish.kindId)).toEqual([]);
      await steward.agent.delete(`/api/clearances/${NOBODY}`).expect(404);
    });

    it('are given and taken back by stewards only; the whole list is theirs and the mentors’', async () => {
      const wish = await cleared();
      const { body } = await grant(wish).expect(201);
      const [mentor, treasurer] = [await someoneWith(test, 'mentor'), await someoneWith(test, 'treasurer')];
      for (const who of [member, mentor, treasurer]) {
        await grant(wish, who).expect(403);
        await who.agent.delete(`/api/clearances/${String(body.id)}`).expect(403);
      }
      await member.agent.get('/api/clearances').expect(403);
      await treasurer.agent.get('/api/clearances').expect(403);
      const list = await mentor.agent.get('/api/clearances').query({ kindId: wish.kindId }).expect(200);
      expect(list.body).toMatchObject({ total: 1, items: [{ personId: member.person.id }] });
    });

    it.each([
      ['a person who is none', { personId: NOBODY }, '#/personId'],
      ['a kind that is none', { kindId: NOBODY }, '#/kindId'],
      ['a last day before today', { until: '2026-01-14' }, '#/until'],
      ['a day that is none', { until: 'next year' }, '#/until'],
      ['an unknown field', { grantedById: NOBODY }, '#/grantedById'],
    ])('are refused for %s', async (_what, more, pointer) => {
      const { body } = await grant({ ...(await cleared()), ...more }).expect(422);
      expect(body.errors).toEqual([expect.objectContaining({ pointer })]);
    });

    it('are refused for a kind that needs none and for somebody who has left', async () => {
      const plain = await kind(test);
      await grant({ personId: member.person.id, kindId: plain.id }).expect(422);
      const { person: gone } = await someoneWith(test);
      await test.dataSource.query('UPDATE person SET left_at = now() WHERE id = $1', [gone.id]);
      await grant({ ...(await cleared()), personId: gone.id }).expect(422);
    });
  });
});
