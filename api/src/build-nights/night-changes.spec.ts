import type supertest from 'supertest';
import { startTestApp, TEST_NOW, type TestApp } from '../../test/app';
import { bench, night, stage } from '../../test/factories/night.factory';
import { someoneWith } from '../../test/factories/person.factory';
import type { Person } from '../people/person.entity';

describe('changing a build night', () => {
  let test: TestApp;
  let mentor: { person: Person; agent: supertest.Agent };
  let member: { person: Person; agent: supertest.Agent };

  beforeAll(async () => {
    test = await startTestApp();
  });
  beforeEach(async () => {
    test.clock.set(TEST_NOW);
    mentor = await someoneWith(test, 'mentor');
    member = await someoneWith(test);
  });
  afterAll(() => test.close());

  const change = (id: string, body: object) => mentor.agent.patch(`/api/build-nights/${id}`).send(body);
  const cancel = (id: string, reason = 'The hall has no heating.') =>
    mentor.agent.post(`/api/build-nights/${id}/cancel`).send({ reason });
  const come = (agent: supertest.Agent, id: string) =>
    agent.post(`/api/build-nights/${id}/coming`).expect(200);
  const lettersTo = (email: string): Promise<{ subject: string; text: string }[]> =>
    test.dataSource.query('SELECT subject, text FROM mail WHERE "to" = $1 ORDER BY queued_at, id', [email]);

  it('moves the waiting list up when there are more places, and tells who moved', async () => {
    const { id } = await night(mentor.agent, { places: 1 });
    const others = [await someoneWith(test), await someoneWith(test)];
    await come(member.agent, id);
    for (const { agent } of others) await come(agent, id);
    const { body } = await change(id, { places: 2 }).expect(200);
    expect(body).toMatchObject({ places: 2, coming: 2, waiting: 1 });
    expect(await lettersTo(others[0]?.person.email ?? '')).toHaveLength(1);
    expect(await lettersTo(others[1]?.person.email ?? '')).toHaveLength(0);
  });

  it('refuses fewer places than people who are coming, and changes nothing', async () => {
    const { id } = await night(mentor.agent, { places: 2 });
    await come(member.agent, id);
    await come((await someoneWith(test)).agent, id);
    const { body } = await change(id, { places: 1, title: 'Another name' }).expect(409);
    expect(body.type).toBe('/problems/night-places-taken');
    const after = await mentor.agent.get(`/api/build-nights/${id}`).expect(200);
    expect(after.body).toMatchObject({ places: 2, title: 'Winding evening' });
  });

  it('changes title, note, benches, mentors and stages, and leaves the rest', async () => {
    const [first, second, third] = [await bench(test), await bench(test), await bench(test)];
    const [before, after] = [await stage(test, 'Mixer'), await stage(test, 'Driver')];
    const greta = await someoneWith(test, 'mentor');
    const { id } = await night(mentor.agent, { benchIds: [first.id, second.id], stageIds: [before.id] });
    const { body } = await change(id, {
      title: 'Driver evening',
      note: 'Bring a heatsink.',
      benchIds: [second.id, third.id],
      mentorIds: [greta.person.id],
      stageIds: [after.id],
    }).expect(200);
    expect(body).toMatchObject({
      title: 'Driver evening',
      note: 'Bring a heatsink.',
      places: 8,
      startsAt: '2026-01-20T19:30:00.000Z',
      benches: [{ id: second.id }, { id: third.id }],
      mentors: [{ id: greta.person.id }],
      stages: [{ id: after.id }],
    });
    expect((await lettersTo(greta.person.email)).map(({ subject }) => subject)).toEqual([
      'You are on duty: Driver evening',
    ]);
    // The first bench is free again, the third is not.
    await night(greta.agent, { mentorIds: [mentor.person.id], benchIds: [first.id] });
    const taken = { title: 'x', places: 1, startsAt: body.startsAt, endsAt: body.endsAt };
    const other = await someoneWith(test, 'mentor');
    await other.agent
      .post('/api/build-nights')
      .send({ ...taken, benchIds: [third.id] })
      .expect(409);
  });

  it('moves a night with its benches and mentors, and tells everybody who is coming or waiting', async () => {
    const held = await bench(test);
    const { id } = await night(mentor.agent, { benchIds: [held.id], places: 1 });
    const waiting = await someoneWith(test);
    await come(member.agent, id);
    await come(waiting.agent, id);
    const times = { startsAt: '2026-01-21T19:00:00Z', endsAt: '2026-01-21T22:00:00Z' };
    await change(id, times).expect(200);
    for (const { person } of [member, waiting]) {
      const [letter] = await lettersTo(person.email);
      expect(letter?.subject).toBe('Other times: Winding evening');
      expect(letter?.text).toContain('is now Wed 21 Jan, 19:00 to 22:00. It was Tue 20 Jan, 19:30 to 21:30.');
    }
    // The old evening is free for bench and mentor, the new one is not.
    await night(mentor.agent, { benchIds: [held.id] });
    const clash = { title: 'x', places: 1, ...times, benchIds: [held.id] };
    const { body } = await mentor.agent.post('/api/build-nights').send(clash).expect(409);
    expect(body.clashes[0].clashes).toHaveLength(2);
  });

  it('refuses a move onto a taken bench or a mentor’s other duty, but not onto its own hours', async () => {
    const held = await bench(test);
    const other = await someoneWith(test, 'mentor');
    const times = { startsAt: '2026-01-21T19:00:00Z', endsAt: '2026-01-21T21:00:00Z' };
    await night(other.agent, { title: 'Vector clearance', ...times, benchIds: [held.id] });
    const { id } = await night(mentor.agent, { benchIds: [held.id] });
    const { body } = await change(id, times).expect(409);
    expect(body).toMatchObject({ type: '/problems/night-clash', clashes: [{ date: '2026-01-21' }] });
    await change(id, { mentorIds: [other.person.id], benchIds: [], ...times }).expect(409);
    await change(id, { startsAt: '2026-01-20T19:00:00Z', endsAt: '2026-01-20T21:00:00Z' }).expect(200);
  });

  it('takes another title though a bench was retired since, and wants another bench for other times', async () => {
    const { id: benchId } = await bench(test);
    const { id } = await night(mentor.agent, { benchIds: [benchId] });
    await test.dataSource.query('UPDATE resource SET retired_at = $2 WHERE id = $1', [benchId, TEST_NOW]);
    const { body } = await change(id, { title: 'Cores and cables' }).expect(200);
    expect(body).toMatchObject({ title: 'Cores and cables', benches: [{ id: benchId }] });
    const [booking] = await test.dataSource.query<{ title: string }[]>(
      'SELECT title FROM booking JOIN booking_item ON booking_id = id WHERE resource_id = $1',
      [benchId],
    );
    expect(booking?.title).toBe('Cores and cables');
    await change(id, { startsAt: '2026-01-20T19:45:00Z' }).expect(422);
  });

  it('gives the place of somebody who is put on duty to the next in line', async () => {
    const { id } = await night(mentor.agent, { places: 1 });
    const greta = await someoneWith(test, 'mentor');
    await come(greta.agent, id);
    await come(member.agent, id);
    const { body } = await change(id, { mentorIds: [mentor.person.id, greta.person.id] }).expect(200);
    expect(body).toMatchObject({ coming: 1, waiting: 0, comingPeople: [{ id: member.person.id }] });
    expect(await lettersTo(member.person.email)).toHaveLength(1);
  });

  it('loses nothing of two changes made at once', async () => {
    const { id } = await night(mentor.agent);
    const other = await someoneWith(test, 'mentor');
    const held = await bench(test);
    await Promise.all([
      change(id, { note: 'Bring cores.' }).expect(200),
      other.agent.patch(`/api/build-nights/${id}`).send({ places: 12 }).expect(200),
      other.agent
        .patch(`/api/build-nights/${id}`)
        .send({ benchIds: [held.id] })
        .expect(200),
    ]);
    const { body } = await mentor.agent.get(`/api/build-nights/${id}`).expect(200);
    expect(body).toMatchObject({ note: 'Bring cores.', places: 12, benches: [{ id: held.id }] });
  });

  it('cancels with a word that goes to everybody once, and gives back benches and mentors', async () => {
    const held = await bench(test);
    const greta = await someoneWith(test, 'mentor');
    const { id } = await night(mentor.agent, {
      benchIds: [held.id],
      mentorIds: [mentor.person.id, greta.person.id],
      places: 1,
    });
    const waiting = await someoneWith(test);
    await come(member.agent, id);
    await come(waiting.agent, id);
    const { body } = await cancel(id).expect(200);
    expect(body).toMatchObject({
      cancelledAt: TEST_NOW.toISOString(),
      cancelledReason: 'The hall has no heating.',
    });
    for (const { person } of [member, waiting]) {
      const letters = await lettersTo(person.email);
      expect(letters.map(({ subject }) => subject)).toEqual(['Cancelled: Winding evening']);
      expect(letters[0]?.text).toContain('The hall has no heating.');
    }
    expect((await lettersTo(greta.person.email)).map(({ subject }) => subject)).toContain(
      'Cancelled: Winding evening',
    );
    expect(await lettersTo(mentor.person.email)).toEqual([]);
    await night(mentor.agent, { benchIds: [held.id], mentorIds: [mentor.person.id, greta.person.id] });
  });

  it('says no to every change of a night that is cancelled or over', async () => {
    const { id } = await night(mentor.agent);
    await cancel(id).expect(200);
    expect((await cancel(id).expect(409)).body.type).toBe('/problems/night-cancelled');
    expect((await change(id, { places: 9 }).expect(409)).body.type).toBe('/problems/night-cancelled');
    const said = await member.agent.post(`/api/build-nights/${id}/coming`).expect(409);
    expect(said.body.type).toBe('/problems/night-cancelled');
    const past = await night(mentor.agent);
    test.clock.set(new Date('2026-01-20T21:30:00Z'));
    await mentor.agent.post('/api/auth/refresh').expect(204);
    expect((await change(past.id, { places: 9 }).expect(409)).body.type).toBe('/problems/night-over');
    expect((await cancel(past.id).expect(409)).body.type).toBe('/problems/night-over');
  });

  it('refuses changing and cancelling by somebody who is no mentor, and of a night that is not there', async () => {
    const { id } = await night(mentor.agent);
    const nowhere = '00000000-0000-4000-8000-000000000000';
    await member.agent.patch(`/api/build-nights/${id}`).send({ places: 9 }).expect(403);
    await member.agent.post(`/api/build-nights/${id}/cancel`).send({ reason: 'x' }).expect(403);
    await test.http().patch(`/api/build-nights/${id}`).send({ places: 9 }).expect(401);
    await change(nowhere, { places: 9 }).expect(404);
    await cancel(nowhere).expect(404);
  });

  it.each([
    ['an unknown field', { colour: 'green' }, '#/colour'],
    ['a null title', { title: null }, '#/title'],
    ['null places', { places: null }, '#/places'],
    ['a null note', { note: null }, '#/note'],
    ['null benches', { benchIds: null }, '#/benchIds'],
    ['no places', { places: 0 }, '#/places'],
    ['an end before the beginning', { endsAt: '2026-01-20T19:00:00Z' }, '#/endsAt'],
    ['a beginning in the past', { startsAt: '2026-01-15T11:00:00Z' }, '#/startsAt'],
    ['no mentor', { mentorIds: [] }, '#/mentorIds'],
    ['a mentor who is nobody', { mentorIds: ['00000000-0000-4000-8000-000000000000'] }, '#/mentorIds'],
    ['a bench that is none', { benchIds: ['00000000-0000-4000-8000-000000000000'] }, '#/benchIds'],
    ['a stage of no plan', { stageIds: ['00000000-0000-4000-8000-000000000000'] }, '#/stageIds'],
  ])('refuses %s', async (_what, body, pointer) => {
    const { id } = await night(mentor.agent);
    const response = await change(id, body).expect(422);
    expect(response.body.errors[0].pointer).toBe(pointer);
    await test.dataSource.query('UPDATE build_night_mentor SET released_at = now()');
  });

  it('wants a word for a cancellation', async () => {
    const { id } = await night(mentor.agent);
    for (const reason of [undefined, '', ' ', 'x'.repeat(301), 7]) {
      const { body } = await mentor.agent.post(`/api/build-nights/${id}/cancel`).send({ reason }).expect(422);
      expect(body.errors[0].pointer).toBe('#/reason');
    }
  });
});
