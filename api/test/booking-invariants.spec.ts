import { bench, tomorrowAt } from './factories/bench.factory';
import { someoneWith } from './factories/person.factory';
import { startTestApp, type TestApp } from './app';

/** What the database refuses by itself, tried past every service. */
describe('the bench book in the database', () => {
  let test: TestApp;

  beforeAll(async () => {
    test = await startTestApp();
  });
  afterAll(() => test.close());

  const broken = (sql: string, parameters: unknown[]): Promise<string | undefined> =>
    test.dataSource.query(sql, parameters).then(
      () => undefined,
      (error: { driverError: { constraint?: string } }) => error.driverError.constraint,
    );
  const booked = async (count = 1): Promise<string> => {
    const { agent } = await someoneWith(test);
    const benches = await Promise.all(Array.from({ length: count }, () => bench(test)));
    const body = {
      resourceIds: benches.map(({ id }) => id),
      startsAt: tomorrowAt(14),
      endsAt: tomorrowAt(16),
    };
    const response = await agent.post('/api/bookings').send(body).expect(201);
    return (response.body as { id: string }).id;
  };
  const itemsOf = (bookingId: string) =>
    test.dataSource.query<{ starts_at: Date; ends_at: Date; holds: boolean; resource_id: string }[]>(
      'SELECT * FROM booking_item WHERE booking_id = $1 ORDER BY resource_id',
      [bookingId],
    );

  it('moves and gives back what is held with the booking', async () => {
    const id = await booked(2);
    await test.dataSource.query(`UPDATE booking SET ends_at = $2 WHERE id = $1`, [id, tomorrowAt(17)]);
    const held = { ends_at: new Date(tomorrowAt(17)), holds: true };
    expect(await itemsOf(id)).toMatchObject([held, held]);
    await test.dataSource.query(
      `UPDATE booking SET cancelled_at = now() - interval '20 years', holds = false WHERE id = $1`,
      [id],
    );
    expect(await itemsOf(id)).toMatchObject([{ holds: false }, { holds: false }]);
  });

  it('holds nothing at other times than the booking, and nothing longer than it', async () => {
    const id = await booked();
    expect(
      await broken(`UPDATE booking_item SET ends_at = $2 WHERE booking_id = $1`, [id, tomorrowAt(18)]),
    ).toBe('booking_item_as_booked');
    expect(await broken(`UPDATE booking_item SET holds = false WHERE booking_id = $1`, [id])).toBe(
      'booking_item_as_booked',
    );
    expect(await broken(`UPDATE booking SET holds = false WHERE id = $1`, [id])).toBe(
      'booking_holds_unless_cancelled',
    );
  });

  it('has no booking of nothing', async () => {
    const id = await booked();
    expect(await broken('DELETE FROM booking_item WHERE booking_id = $1', [id])).toBe(
      'booking_holds_something',
    );
    expect(
      await broken(
        `INSERT INTO booking (kind, person_id, starts_at, ends_at, made_at)
         SELECT kind, person_id, starts_at, ends_at, made_at FROM booking WHERE id = $1`,
        [id],
      ),
    ).toBe('booking_holds_something');
    expect(await broken('DELETE FROM booking WHERE id = $1', [id])).toBeUndefined();
  });

  it('has none either when two take one thing each out of it at once', async () => {
    const id = await booked(2);
    const items = await itemsOf(id);
    const takeOut = (resourceId: string) =>
      broken('DELETE FROM booking_item WHERE booking_id = $1 AND resource_id = $2', [id, resourceId]);
    const answers = await Promise.all(items.map((item) => takeOut(item.resource_id)));
    expect(answers.filter((answer) => answer === undefined)).toHaveLength(1);
    expect(await itemsOf(id)).toHaveLength(1);
  });
});
