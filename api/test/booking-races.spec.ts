import { bench, instrument, tomorrowAt } from './factories/bench.factory';
import { PASSWORD, person } from './factories/person.factory';
import { startTestApp, type TestApp } from './app';

interface Answer {
  status: number;
  /** Of a booking, or of a refusal. */
  body: { id?: string; detail?: string; nearestFree?: unknown[]; resources?: { id: string }[] };
}

/** Through real sockets, because a race inside one process's call stack is none. */
describe('racing for benches and instruments', () => {
  let test: TestApp;
  let cookie: string;

  beforeAll(async () => {
    test = await startTestApp();
    const someone = await person(test);
    const response = await test
      .http()
      .post('/api/auth/sign-in')
      .send({ email: someone.email, password: PASSWORD })
      .expect(200);
    const cookies = response.headers['set-cookie'] as unknown as string[];
    cookie = cookies.map((line) => line.split(';')[0]).join('; ');
  });
  afterAll(() => test.close());

  const send = async (method: string, path: string, body?: unknown): Promise<Answer> => {
    const headers = { cookie, 'content-type': 'application/json', connection: 'close' };
    const response = await fetch(`${test.baseUrl}/api${path}`, {
      method,
      headers,
      ...(body === undefined ? {} : { body: JSON.stringify(body) }),
    });
    const text = await response.text();
    return { status: response.status, body: (text ? JSON.parse(text) : {}) as Answer['body'] };
  };
  const book = (resourceIds: string[], from = tomorrowAt(14), to = tomorrowAt(16)) =>
    send('POST', '/bookings', { resourceIds, startsAt: from, endsAt: to });
  const times = <T>(count: number, work: (index: number) => Promise<T>): Promise<T[]> =>
    Promise.all(Array.from({ length: count }, (_, index) => work(index)));
  const tally = (answers: { status: number }[]): Record<number, number> => {
    const counts: Record<number, number> = {};
    for (const { status } of answers) counts[status] = (counts[status] ?? 0) + 1;
    return counts;
  };
  const itemsOf = (ids: string[]): Promise<{ booking_id: string; resource_id: string }[]> =>
    test.dataSource.query(
      'SELECT booking_id, resource_id FROM booking_item WHERE resource_id = ANY ($1) AND holds',
      [ids],
    );

  it('gives one instrument and time to exactly one of 50, and tells the other 49 who has it', async () => {
    const { id, tag } = await instrument(test);
    const answers = await times(50, () => book([id]));
    expect(tally(answers)).toEqual({ 201: 1, 409: 49 });
    expect(await itemsOf([id])).toHaveLength(1);
    for (const { body } of answers.filter(({ status }) => status === 409)) {
      expect(body.detail).toContain(`You already have ${tag} then, Fri 16 Jan, 14:00 to 16:00.`);
      expect(body.nearestFree).toHaveLength(3);
    }
  });

  it('books overlapping sets asked for in different orders whole or not at all', async () => {
    const [a, b, c] = await times(3, () => bench(test).then(({ id }) => id));
    if (!a || !b || !c) throw new Error('three benches were asked for');
    const sets = [
      [a, b],
      [b, a],
      [b, c],
      [c, b],
      [c, a],
      [a, c],
      [a, b, c],
      [c, b, a],
    ];
    const answers = await times(48, (index) => book(sets[index % sets.length] ?? []));
    const won = answers.filter(({ status }) => status === 201);
    expect(won.length).toBe(1);
    expect(tally(answers)).toEqual({ 201: 1, 409: 47 });
    const wanted = won[0]?.body.resources?.map(({ id }) => id).sort();
    const items = await itemsOf([a, b, c]);
    expect(items.map((item) => item.resource_id).sort()).toEqual(wanted);
    expect(new Set(items.map((item) => item.booking_id)).size).toBe(1);
  });

  it('lets overlapping times of one bench through only where they do not touch', async () => {
    const { id } = await bench(test);
    // 24 wishes of one hour, each half an hour after the one before: no two neighbours can both hold.
    const answers = await times(24, (index) =>
      book([id], tomorrowAt(6, index * 30), tomorrowAt(7, index * 30)),
    );
    expect(Object.keys(tally(answers)).sort()).toEqual(['201', '409']);
    const [{ overlaps }] = await test.dataSource.query<[{ overlaps: string }]>(
      `SELECT count(*) AS overlaps FROM booking_item a JOIN booking_item b
         ON a.resource_id = b.resource_id AND a.booking_id < b.booking_id
        AND tstzrange(a.starts_at, a.ends_at) && tstzrange(b.starts_at, b.ends_at)
       WHERE a.resource_id = $1`,
      [id],
    );
    expect(overlaps).toBe('0');
    const kept = await itemsOf([id]);
    expect(kept).toHaveLength(answers.filter(({ status }) => status === 201).length);
    expect(kept.length).toBeGreaterThanOrEqual(8);
  });

  it('cancels once however many cancel at once, and gives the time to exactly one of those who wait', async () => {
    const { id } = await bench(test);
    const first = await book([id]);
    const [cancels, books] = await Promise.all([
      times(10, () => send('DELETE', `/bookings/${first.body.id}`)),
      times(20, () => book([id])),
    ]);
    expect(tally(cancels)).toEqual({ 204: 10 });
    const second = await book([id]);
    const won = [...books, second].filter(({ status }) => status === 201);
    expect(won).toHaveLength(1);
    expect(tally([...books, second])).toEqual({ 201: 1, 409: 20 });
    expect(await itemsOf([id])).toEqual([{ booking_id: won[0]?.body.id, resource_id: id }]);
  });

  it('keeps the rule in the database itself: a write past the service is refused as well', async () => {
    const { id } = await bench(test);
    const made = await book([id]);
    const write = test.dataSource.query(
      `WITH other AS (
         INSERT INTO booking (kind, person_id, starts_at, ends_at, made_at)
         SELECT kind, person_id, starts_at, ends_at, made_at FROM booking WHERE id = $1 RETURNING id)
       INSERT INTO booking_item (booking_id, resource_id, starts_at, ends_at)
       SELECT other.id, $2, $3::timestamptz, $4::timestamptz FROM other`,
      [made.body.id, id, tomorrowAt(15, 59), tomorrowAt(18)],
    );
    await expect(write).rejects.toMatchObject({ driverError: { constraint: 'booking_no_overlap' } });
  });
});
