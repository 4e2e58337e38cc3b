import type supertest from 'supertest';
import { startTestApp, TEST_NOW, type TestApp } from '../../test/app';
import { night } from '../../test/factories/night.factory';
import { PASSWORD, person, someoneWith } from '../../test/factories/person.factory';
import type { Person } from '../people/person.entity';

interface Guest {
  person: Person;
  /** Over a socket of its own: a race through the whole server. */
  say: (method: 'POST' | 'DELETE') => Promise<{ status: number; body: Night }>;
}

interface Night {
  coming: number;
  waiting: number;
  mine: { state: string; line: number | null } | null;
  comingPeople: { id: string }[];
  waitingPeople: { id: string }[];
}

describe('coming to a build night', () => {
  let test: TestApp;
  let mentor: supertest.Agent;

  beforeAll(async () => {
    test = await startTestApp();
  });
  beforeEach(async () => {
    test.clock.set(TEST_NOW);
    mentor = (await someoneWith(test, 'mentor')).agent;
  });
  afterAll(() => test.close());

  async function guest(nightId: string): Promise<Guest> {
    const someone = await person(test);
    const headers = { 'content-type': 'application/json' };
    const signedIn = await fetch(`${test.baseUrl}/api/auth/sign-in`, {
      method: 'POST',
      headers,
      body: JSON.stringify({ email: someone.email, password: PASSWORD }),
    });
    const cookie = signedIn.headers
      .getSetCookie()
      .map((one) => one.split(';')[0])
      .join('; ');
    const url = `${test.baseUrl}/api/build-nights/${nightId}/coming`;
    return {
      person: someone,
      say: async (method) => {
        const answer = await fetch(url, { method, headers: { cookie } });
        return { status: answer.status, body: (await answer.json()) as Night };
      },
    };
  }

  const guestsOf = (nightId: string, count: number): Promise<Guest[]> =>
    Promise.all(Array.from({ length: count }, () => guest(nightId)));
  const show = async (nightId: string): Promise<Night> =>
    (await mentor.get(`/api/build-nights/${nightId}`).expect(200)).body as Night;
  const lettersTo = (email: string): Promise<{ subject: string; text: string }[]> =>
    test.dataSource.query('SELECT subject, text FROM mail WHERE "to" = $1 ORDER BY queued_at, id', [email]);
  const rows = (nightId: string): Promise<{ person_id: string; state: string; turn: number }[]> =>
    test.dataSource.query(
      'SELECT person_id, state, turn FROM build_night_place WHERE night_id = $1 ORDER BY turn',
      [nightId],
    );

  it('gives 8 of 30 who say so at once a place, and lets 22 wait in one strict order', async () => {
    const { id } = await night(mentor, { places: 8 });
    const guests = await guestsOf(id, 30);
    const answers = await Promise.allSettled(guests.map(({ say }) => say('POST')));
    const said = answers.map((answer) => (answer.status === 'fulfilled' ? answer.value : undefined));
    expect(said.map((answer) => answer?.status)).toEqual(Array.from({ length: 30 }, () => 200));
    const kept = await rows(id);
    expect(kept.map(({ turn }) => turn)).toEqual(Array.from({ length: 30 }, (_, index) => index + 1));
    expect(kept.map(({ state }) => state)).toEqual([
      ...Array.from({ length: 8 }, () => 'coming'),
      ...Array.from({ length: 22 }, () => 'waiting'),
    ]);
    // What each was told is what was kept.
    said.forEach((answer, index) => {
      const row = kept.find(({ person_id }) => person_id === guests[index]?.person.id);
      expect(answer?.body.mine?.state).toBe(row?.state);
    });

    const leaving = guests.filter(({ person: { id: guestId } }) =>
      kept.slice(0, 8).some(({ person_id }) => person_id === guestId),
    );
    const alsoLeaving = guests.filter(({ person: { id: guestId } }) =>
      [kept[9], kept[12]].some((row) => row?.person_id === guestId),
    );
    const left = await Promise.all([...leaving, ...alsoLeaving].map(({ say }) => say('DELETE')));
    expect(left.map(({ status }) => status)).toEqual(Array.from({ length: 10 }, () => 200));

    // The order of those who stay is the order in which they came: no gap, nobody overtaken.
    const stayed = kept.slice(8).filter((_row, index) => index !== 1 && index !== 4);
    const after = await show(id);
    expect(after.comingPeople.map((one) => one.id)).toEqual(stayed.slice(0, 8).map((row) => row.person_id));
    expect(after.waitingPeople.map((one) => one.id)).toEqual(stayed.slice(8).map((row) => row.person_id));
    expect(after).toMatchObject({ coming: 8, waiting: 12 });
    for (const { person_id } of stayed.slice(0, 8)) {
      const moved = guests.find((one) => one.person.id === person_id);
      expect(await lettersTo(moved?.person.email ?? '')).toHaveLength(1);
    }
    for (const { person_id } of stayed.slice(8)) {
      const waiting = guests.find((one) => one.person.id === person_id);
      expect(await lettersTo(waiting?.person.email ?? '')).toHaveLength(0);
    }
  });

  it('tells whoever moves up when it is and how to give the place up again', async () => {
    const { id } = await night(mentor, { places: 1 });
    const [first, second] = (await guestsOf(id, 2)) as [Guest, Guest];
    expect((await first.say('POST')).body.mine).toEqual({ state: 'coming', line: null });
    expect((await second.say('POST')).body.mine).toEqual({ state: 'waiting', line: 1 });
    await first.say('DELETE');
    const [letter] = await lettersTo(second.person.email);
    expect(letter?.subject).toBe('You have a place: Winding evening');
    expect(letter?.text).toContain('Tue 20 Jan, 19:30 to 21:30');
    expect(letter?.text).toContain('/build-nights');
  });

  it('changes nothing when it is said twice, at once or one after the other', async () => {
    const { id } = await night(mentor, { places: 2 });
    const someone = await guest(id);
    await Promise.all([someone.say('POST'), someone.say('POST'), someone.say('POST')]);
    expect(await show(id)).toMatchObject({ coming: 1, waiting: 0 });
    await Promise.all([someone.say('DELETE'), someone.say('DELETE')]);
    expect((await someone.say('DELETE')).status).toBe(200);
    expect(await show(id)).toMatchObject({ coming: 0, waiting: 0 });
  });

  it('puts who left and comes back at the end of the line', async () => {
    const { id } = await night(mentor, { places: 1 });
    const [first, second, third] = (await guestsOf(id, 3)) as [Guest, Guest, Guest];
    for (const one of [first, second, third]) await one.say('POST');
    await first.say('DELETE');
    expect((await first.say('POST')).body.mine).toEqual({ state: 'waiting', line: 2 });
    expect((await show(id)).waitingPeople.map((one) => one.id)).toEqual([third.person.id, first.person.id]);
  });

  it('says no when the night is over or cancelled, when one is on duty, and when it is not there', async () => {
    const { id } = await night(mentor);
    const { agent } = await someoneWith(test);
    const onDuty = await mentor.post(`/api/build-nights/${id}/coming`).expect(409);
    expect(onDuty.body.type).toBe('/problems/night-on-duty');
    test.clock.set(new Date('2026-01-20T21:29:59Z'));
    await agent.post('/api/auth/refresh').expect(204);
    await agent.post(`/api/build-nights/${id}/coming`).expect(200);
    test.clock.set(new Date('2026-01-20T21:30:00Z'));
    for (const method of ['post', 'delete'] as const) {
      const { body } = await agent[method](`/api/build-nights/${id}/coming`).expect(409);
      expect(body.type).toBe('/problems/night-over');
    }
    const nowhere = '00000000-0000-4000-8000-000000000000';
    await agent.post(`/api/build-nights/${nowhere}/coming`).expect(404);
    await agent.delete('/api/build-nights/tonight/coming').expect(400);
    await test.http().post(`/api/build-nights/${id}/coming`).expect(401);
    await test.http().delete(`/api/build-nights/${id}/coming`).expect(401);
  });

  describe('in the database, whoever writes', () => {
    let nightId: string;
    let people: Person[];

    beforeEach(async () => {
      nightId = (await night(mentor, { places: 2 })).id;
      people = await Promise.all(Array.from({ length: 4 }, () => person(test)));
    });

    const put = (...states: ('coming' | 'waiting')[]): Promise<unknown> =>
      test.dataSource.query(
        `INSERT INTO build_night_place (night_id, person_id, state, turn, said_at)
         SELECT $1, person_id, state, turn, now()
         FROM unnest($2::uuid[], $3::text[]) WITH ORDINALITY AS said(person_id, state, turn)`,
        [nightId, people.slice(0, states.length).map(({ id }) => id), states],
      );

    it('no more come than there are places', async () => {
      await expect(put('coming', 'coming', 'coming')).rejects.toMatchObject({
        driverError: { constraint: 'build_night_place_kept' },
      });
      await put('coming', 'coming', 'waiting');
      const fewer = test.dataSource.query('UPDATE build_night SET places = 1 WHERE id = $1', [nightId]);
      await expect(fewer).rejects.toMatchObject({ driverError: { constraint: 'build_night_place_kept' } });
    });

    it('nobody takes a place on a cancelled night', async () => {
      await put('coming');
      await test.dataSource.query(
        `UPDATE build_night SET cancelled_at = now(), cancelled_reason = 'No heating.' WHERE id = $1`,
        [nightId],
      );
      const cancelled = { driverError: { constraint: 'build_night_place_not_cancelled' } };
      const more = test.dataSource.query(
        `INSERT INTO build_night_place (night_id, person_id, state, turn, said_at) VALUES ($1, $2, 'coming', 9, now())`,
        [nightId, people[2]?.id],
      );
      await expect(more).rejects.toMatchObject(cancelled);
    });

    it('nobody waits beside a free place, and nobody overtakes', async () => {
      const inTurn = { driverError: { constraint: 'build_night_place_in_turn' } };
      await expect(put('coming', 'waiting')).rejects.toMatchObject(inTurn);
      await expect(put('coming', 'waiting', 'coming')).rejects.toMatchObject(inTurn);
      await put('coming', 'coming', 'waiting');
      const more = test.dataSource.query('UPDATE build_night SET places = 3 WHERE id = $1', [nightId]);
      await expect(more).rejects.toMatchObject(inTurn);
      const gone = test.dataSource.query('DELETE FROM build_night_place WHERE night_id = $1 AND turn = 1', [
        nightId,
      ]);
      await expect(gone).rejects.toMatchObject(inTurn);
    });

    it('two who bypass the API and take the last place at once do not both get it', async () => {
      await put('coming');
      const take = (index: number) =>
        test.dataSource.query(
          `INSERT INTO build_night_place (night_id, person_id, state, turn, said_at) VALUES ($1, $2, 'coming', $3, now())`,
          [nightId, people[index]?.id, index + 10],
        );
      const taken = await Promise.allSettled([take(1), take(2), take(3)]);
      expect(taken.map(({ status }) => status).sort()).toEqual(['fulfilled', 'rejected', 'rejected']);
    });
  });
});
