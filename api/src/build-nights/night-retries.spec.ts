import { startTestApp, TEST_NOW, type TestApp } from '../../test/app';
import { night, nightPlan } from '../../test/factories/night.factory';
import { someoneWith } from '../../test/factories/person.factory';

/** Raises what PostgreSQL raises for a deadlock, once; the count of a sequence survives the rollback. */
const GIVE_UP_ONCE = `
  CREATE SEQUENCE tries;
  CREATE FUNCTION give_up_once() RETURNS trigger LANGUAGE plpgsql AS $$
  BEGIN
    IF nextval('tries') <= TG_ARGV[0]::bigint THEN
      RAISE EXCEPTION 'deadlock detected' USING ERRCODE = 'deadlock_detected';
    END IF;
    RETURN NULL;
  END $$`;

describe('a build night, when the database gives a change up for the sake of another', () => {
  let test: TestApp;

  beforeAll(async () => {
    test = await startTestApp();
    await test.dataSource.query(GIVE_UP_ONCE);
  });
  beforeEach(() => test.clock.set(TEST_NOW));
  afterAll(() => test.close());

  const givenUp = async <T>(times: number, statement: string, work: () => PromiseLike<T>): Promise<T> => {
    const [, table] = statement.split(' ON ');
    await test.dataSource.query(`ALTER SEQUENCE tries RESTART`);
    await test.dataSource.query(
      `CREATE TRIGGER give_up BEFORE ${statement} FOR EACH STATEMENT EXECUTE FUNCTION give_up_once(${times})`,
    );
    try {
      return await work();
    } finally {
      await test.dataSource.query(`DROP TRIGGER give_up ON ${table}`);
    }
  };

  it('is scheduled, changed, said yes and no to, and cancelled at the second try', async () => {
    const { agent: mentor } = await someoneWith(test, 'mentor');
    const { agent: member } = await someoneWith(test);
    const { id } = await givenUp(1, 'INSERT ON build_night', () => night(mentor));
    const at = `/api/build-nights/${id}`;
    await givenUp(1, 'UPDATE ON build_night', () => mentor.patch(at).send({ title: 'Cores' }).expect(200));
    await givenUp(1, 'INSERT ON build_night_place', () => member.post(`${at}/coming`).expect(200));
    await givenUp(1, 'DELETE ON build_night_place', () => member.delete(`${at}/coming`).expect(200));
    await givenUp(1, 'UPDATE ON build_night', () =>
      mentor.post(`${at}/cancel`).send({ reason: 'No heating.' }).expect(200),
    );
  });

  it('asks to come again when the second try is given up too, and has changed nothing', async () => {
    const { agent: mentor } = await someoneWith(test, 'mentor');
    const answer = await givenUp(2, 'INSERT ON build_night', () =>
      mentor.post('/api/build-nights').send(nightPlan({ title: 'Twice given up' })),
    );
    expect(answer.status).toBe(503);
    expect(answer.body).toMatchObject({ type: '/problems/busy' });
    expect(answer.headers['retry-after']).toBe('2');
    const [row] = await test.dataSource.query<{ count: number }[]>(
      `SELECT count(*)::integer AS count FROM build_night WHERE title = 'Twice given up'`,
    );
    expect(row?.count).toBe(0);
  });
});
