import type supertest from 'supertest';
import { bench, tomorrowAt } from './factories/bench.factory';
import { someoneWith } from './factories/person.factory';
import { startTestApp, TEST_NOW, type TestApp } from './app';
import { BookingsService } from '../src/bookings/bookings.service';

const NOBODY = '5f0e0000-0000-4000-8000-000000000000';

describe('cancelling a booking', () => {
  let test: TestApp;
  let me: { person: { id: string; email: string }; agent: supertest.Agent };
  let other: typeof me;

  beforeAll(async () => {
    test = await startTestApp();
    [me, other] = await Promise.all([someoneWith(test), someoneWith(test)]);
  });
  beforeEach(() => test.clock.set(TEST_NOW));
  afterAll(() => test.close());

  const book = async (resourceId: string, from = 14, to = 16, who = me): Promise<string> => {
    const { body } = await who.agent
      .post('/api/bookings')
      .send({ resourceIds: [resourceId], startsAt: tomorrowAt(from), endsAt: tomorrowAt(to) })
      .expect(201);
    return body.id as string;
  };
  const listed = async (resourceId: string, who = me) => {
    const query = { from: tomorrowAt(0), to: tomorrowAt(24), resourceId };
    const { body } = await who.agent.get('/api/bookings').query(query).expect(200);
    return body as { id: string; endsAt: string }[];
  };

  it('is offered to nobody it is not for, who sees all the same who has what', async () => {
    const { id } = await bench(test);
    await book(id);
    expect(await listed(id, other)).toMatchObject([
      { personName: 'Some One', mine: false, mayCancel: false, resources: [{ id }] },
    ]);
  });

  it('gives the bench back to others and leaves the book and the own list', async () => {
    const { id } = await bench(test);
    const booking = await book(id);
    await me.agent.delete(`/api/bookings/${booking}`).expect(204);
    expect(await listed(id)).toEqual([]);
    const { body } = await me.agent.get('/api/bookings/mine').expect(200);
    expect((body as { id: string }[]).map((mine) => mine.id)).not.toContain(booking);
    await book(id, 14, 16, other);
  });

  it('done twice changes nothing more and is no error', async () => {
    const { id } = await bench(test);
    const booking = await book(id);
    await me.agent.delete(`/api/bookings/${booking}`).expect(204);
    await book(id, 14, 16, other);
    await me.agent.delete(`/api/bookings/${booking}`).expect(204);
    expect(await listed(id)).toHaveLength(1);
  });

  it('ends a running one now: the past part stays in the book, the rest is free', async () => {
    const { id } = await bench(test);
    const booking = await book(id);
    test.clock.set(new Date(tomorrowAt(15)));
    await me.agent.delete(`/api/bookings/${booking}`).expect(204);
    expect(await listed(id)).toMatchObject([{ id: booking, endsAt: tomorrowAt(15) }]);
    await book(id, 15, 16, other);
    test.clock.set(new Date(tomorrowAt(15, 30)));
    await me.agent.delete(`/api/bookings/${booking}`).expect(204);
  });

  it('refuses one that is over', async () => {
    const { id } = await bench(test);
    const booking = await book(id);
    test.clock.set(new Date(tomorrowAt(16)));
    const { body } = await me.agent.delete(`/api/bookings/${booking}`).expect(409);
    expect(body).toMatchObject({ type: '/problems/booking-over' });
    expect(await listed(id)).toMatchObject([{ endsAt: tomorrowAt(16) }]);
  });

  it('refuses another member and a treasurer, and nothing changes', async () => {
    const { id } = await bench(test);
    const booking = await book(id);
    const { agent: treasurer } = await someoneWith(test, 'treasurer');
    for (const agent of [other.agent, treasurer]) {
      const { body } = await agent.delete(`/api/bookings/${booking}`).expect(403);
      expect(body).toMatchObject({ type: '/problems/not-allowed' });
    }
    expect(await listed(id)).toHaveLength(1);
  });

  it.each(['steward', 'mentor', 'organiser'] as const)(
    'is open to a %s, and the person is told by mail',
    async (role) => {
      const { id } = await bench(test);
      const booking = await book(id);
      const { agent } = await someoneWith(test, role);
      await agent.delete(`/api/bookings/${booking}`).expect(204);
      expect(await listed(id)).toEqual([]);
      const mail = await test.dataSource.query<{ subject: string; text: string }[]>(
        'SELECT subject, text FROM mail WHERE "to" = $1 ORDER BY queued_at DESC',
        [me.person.email],
      );
      expect(mail[0]?.subject).toBe('Your bench booking is cancelled: Fri 16 Jan, 14:00 to 16:00');
      expect(mail[0]?.text).toContain('Some One cancelled your booking');
    },
  );

  it('sends no mail about what somebody cancels for themselves', async () => {
    const { id } = await bench(test);
    await other.agent.delete(`/api/bookings/${await book(id, 14, 16, other)}`).expect(204);
    const query = 'SELECT 1 FROM mail WHERE "to" = $1';
    expect(await test.dataSource.query(query, [other.person.email])).toEqual([]);
  });

  it('refuses what is held for a build night, to a mentor too', async () => {
    const { id } = await bench(test);
    const night = {
      personId: other.person.id,
      title: 'Build night 14',
      resourceIds: [id],
      startsAt: new Date(tomorrowAt(19)),
      endsAt: new Date(tomorrowAt(22)),
    };
    const service = test.app.get(BookingsService);
    const booking = await test.dataSource.transaction((manager) => service.reserveForNight(manager, night));
    const { agent } = await someoneWith(test, 'mentor');
    const { body } = await agent.delete(`/api/bookings/${booking}`).expect(409);
    expect(body).toMatchObject({ type: '/problems/booking-of-build-night' });
    expect(await listed(id)).toHaveLength(1);
  });

  it('answers an unknown booking with 404 and a malformed id with 400', async () => {
    await me.agent.delete(`/api/bookings/${NOBODY}`).expect(404);
    await me.agent.delete('/api/bookings/mine').expect(400);
  });
});
