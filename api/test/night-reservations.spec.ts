import type supertest from 'supertest';
import { BookingsService, type NightReservation } from '../src/bookings/bookings.service';
import { constraintOf } from '../src/common/constraint';
import { bench, tomorrowAt } from './factories/bench.factory';
import { someoneWith } from './factories/person.factory';
import { startTestApp, TEST_NOW, type TestApp } from './app';

describe('benches held for build nights', () => {
  let test: TestApp;
  let mentor: { person: { id: string }; agent: supertest.Agent };

  beforeAll(async () => {
    test = await startTestApp();
    mentor = await someoneWith(test, 'mentor');
  });
  beforeEach(() => test.clock.set(TEST_NOW));
  afterAll(() => test.close());

  const night = (resourceIds: string[], fromHour = 19, overrides: Partial<NightReservation> = {}) => ({
    personId: mentor.person.id,
    title: 'Build night 14',
    resourceIds,
    startsAt: new Date(tomorrowAt(fromHour)),
    endsAt: new Date(tomorrowAt(fromHour + 3)),
    ...overrides,
  });
  const service = () => test.app.get(BookingsService);
  const reserve = (...nights: NightReservation[]) =>
    test.dataSource.transaction((manager) => service().reserveForNights(manager, nights));
  const held = async (resourceId: string): Promise<unknown[]> => {
    const query = { from: tomorrowAt(0), to: tomorrowAt(24 * 21), resourceId };
    const { body } = await mentor.agent.get('/api/bookings').query(query).expect(200);
    return body as unknown[];
  };

  it('stand in the book under the night’s title and refuse members, who are told for what', async () => {
    const { id, tag } = await bench(test);
    await reserve(night([id]));
    expect(await held(id)).toMatchObject([{ kind: 'build night', title: 'Build night 14', mine: false }]);
    const { body } = await mentor.agent
      .post('/api/bookings')
      .send({ resourceIds: [id], startsAt: tomorrowAt(18), endsAt: tomorrowAt(20) })
      .expect(409);
    expect(body.detail).toContain(`${tag} is held for Build night 14, Fri 16 Jan, 19:00 to 22:00.`);
    expect(body.takenBy).toMatchObject([{ by: 'Build night 14' }]);
  });

  it('are held for a whole series or for none of it', async () => {
    const [first, second] = [await bench(test), await bench(test)];
    await reserve(night([second.id], 19 + 24 * 7));
    const series = [0, 1, 2].map((week) => night([first.id, second.id], 19 + 24 * 7 * week));
    const broken = await reserve(...series).catch((error: unknown) => error);
    expect(constraintOf(broken)).toBe('booking_no_overlap');
    expect(await held(first.id)).toEqual([]);
    const clashes = await service().findClashes([first.id, second.id], series);
    expect(clashes).toMatchObject([{ spanIndex: 1, resourceTag: second.tag, title: 'Build night 14' }]);
  });

  it('leave out bookings that do not count when looking for clashes', async () => {
    const { id } = await bench(test);
    const [mine] = await reserve(night([id]));
    const spans = [night([id])];
    expect(await service().findClashes([id], spans)).toHaveLength(1);
    expect(await service().findClashes([id], spans, { exceptBookingIds: [mine ?? ''] })).toEqual([]);
    expect(await service().findClashes([], spans)).toEqual([]);
  });

  it('move to other times and benches, whole or not at all', async () => {
    const [from, to] = [await bench(test), await bench(test)];
    const [booking] = await reserve(night([from.id]));
    const [blocker] = await reserve(night([to.id], 19, { title: 'Open evening' }));
    const move = (fromHour: number) =>
      test.dataSource.transaction((manager) =>
        service().moveForNight(manager, booking ?? '', night([to.id], fromHour)),
      );
    expect(constraintOf(await move(20).catch((error: unknown) => error))).toBe('booking_no_overlap');
    expect(await held(from.id)).toHaveLength(1);
    await move(22);
    expect(await held(from.id)).toEqual([]);
    expect(await held(to.id)).toMatchObject([{ id: blocker }, { id: booking, startsAt: tomorrowAt(22) }]);
  });

  it('are given back once, however often they are released', async () => {
    const { id } = await bench(test);
    const [booking] = await reserve(night([id]));
    const release = () =>
      test.dataSource.transaction((manager) =>
        service().releaseForNight(manager, booking ?? '', mentor.person.id),
      );
    await release();
    expect(await held(id)).toEqual([]);
    await reserve(night([id]));
    await release();
    expect(await held(id)).toHaveLength(1);
  });

  it('are refused for a bench the club does not have, and for no bench at all', async () => {
    const unknown = '5f0e0000-0000-4000-8000-000000000000';
    await expect(reserve(night([unknown]))).rejects.toMatchObject({ code: 'invalid-input' });
    await expect(reserve(night([]))).rejects.toMatchObject({ code: 'invalid-input' });
  });
});
