import { joined, PNG, SOURCE_ENTRY, settleSource, startedBuild } from './factories/build.factory';
import { nightPlan } from './factories/night.factory';
import { cookiesOf, person } from './factories/person.factory';
import { appOn, startTestApp, type TestApp } from './app';

const POOL = 3;

/** Real sockets, and a process that has read nothing yet: every first write of it has everything still to look up. */
describe('a pool of connections that are all in use', () => {
  let first: TestApp;
  let fresh: TestApp;

  beforeAll(async () => {
    first = await startTestApp();
  });
  beforeEach(async () => {
    fresh = await appOn(first.environment.DATABASE_URL, { DATABASE_POOL: POOL, DATABASE_WAIT: 8 });
  });
  afterEach(() => fresh.close());
  afterAll(() => first.close());

  const post = async (path: string, cookie: string, body: unknown): Promise<Response> => {
    const headers = { cookie, 'content-type': 'application/json' };
    return fetch(`${fresh.baseUrl}${path}`, { method: 'POST', headers, body: JSON.stringify(body) });
  };
  const photo = (path: string, cookie: string): Promise<Response> => {
    const body = new FormData();
    body.set('photo', new Blob([PNG], { type: 'image/png' }), 'board.png');
    return fetch(`${fresh.baseUrl}${path}`, { method: 'POST', headers: { cookie }, body });
  };
  const builds = async (count: number) => {
    const one = await startedBuild(first);
    const others = Array.from({ length: count - 1 }, () => joined(first, one.build.planId));
    const started = [one, ...(await Promise.all(others))];
    const cookies = await Promise.all(started.map(({ builder }) => cookiesOf(first, builder)));
    return started.map((build, index) => ({ ...build, cookie: cookies[index] ?? '' }));
  };

  it.each(['readings', 'marks', 'photos', 'submit'] as const)(
    'gives none of them to a second question inside a transaction: %s',
    async (what) => {
      const started = await builds(POOL * 2);
      if (what === 'submit') for (const one of started) await settleSource(one);
      const reading = { method: 'oscilloscope', entry: SOURCE_ENTRY };
      const answers = await Promise.all(
        started.map(({ checkAt, stageAt, cookie }) => {
          if (what === 'readings') return post(checkAt('Output level at TP1', what), cookie, reading);
          if (what === 'marks') return post(checkAt('Board cleaned', what), cookie, {});
          if (what === 'photos') return photo(checkAt('Photo of the board', what), cookie);
          return post(stageAt('Source', what), cookie, { note: '' });
        }),
      );
      const wanted = what === 'submit' ? 200 : 201;
      expect(answers.map(({ status }) => status)).toEqual(started.map(() => wanted));
    },
  );

  it('gives none of them to a second question inside a transaction: nights', async () => {
    const mentors = Array.from({ length: POOL * 2 }, () => person(first, { roles: ['member', 'mentor'] }));
    const cookies = await Promise.all(mentors.map(async (mentor) => cookiesOf(first, await mentor)));
    const answers = await Promise.all(
      cookies.map((cookie) => post('/api/build-nights', cookie, nightPlan({ tellByMail: true }))),
    );
    expect(answers.map(({ status }) => status)).toEqual(cookies.map(() => 201));
  });

  it('says so after a while to whoever waits for one, instead of letting them hang', async () => {
    const cookie = await cookiesOf(first, await person(first));
    const held = await Promise.all(
      Array.from({ length: POOL }, async () => {
        const runner = fresh.dataSource.createQueryRunner();
        await runner.connect();
        return runner;
      }),
    );
    const waiting = await fetch(`${fresh.baseUrl}/api/plans`, { headers: { cookie } });
    await Promise.all(held.map((runner) => runner.release()));
    expect(waiting.status).toBe(503);
    expect(waiting.headers.get('retry-after')).toBe('2');
    expect(await waiting.json()).toMatchObject({ type: '/problems/busy' });
    expect((await fetch(`${fresh.baseUrl}/api/plans`, { headers: { cookie } })).status).toBe(200);
  });
});
