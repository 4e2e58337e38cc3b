import { PASSWORD, person } from './factories/person.factory';
import { startTestApp, TEST_NOW, type TestApp } from './app';

const MINUTE = 60_000;

const range = (count: number): number[] => Array.from({ length: count }, (_, index) => index);
const counted = (statuses: number[]): Record<number, number> =>
  Object.fromEntries(
    [...new Set(statuses)].map((status) => [status, statuses.filter((s) => s === status).length]),
  );

describe.each([
  ['with nothing in front', undefined],
  ['behind a proxy', 'loopback'],
])('guessing passwords, %s', (_where, TRUSTED_PROXY) => {
  let test: TestApp;

  beforeAll(async () => {
    test = await startTestApp({ TRUSTED_PROXY });
  });
  beforeEach(async () => {
    test.clock.set(TEST_NOW);
    await test.dataSource.query('DELETE FROM sign_in_failure');
  });
  afterAll(() => test.close());

  const signIn = async (email: string, password = 'a guess', address?: string): Promise<number> => {
    const request = test.http().post('/api/auth/sign-in');
    if (address) request.set('X-Forwarded-For', address);
    return (await request.send({ email, password })).status;
  };
  const atOnce = (tries: Promise<number>[]): Promise<number[]> => Promise.all(tries);

  it('takes five of twenty sent in one moment', async () => {
    const { email } = await person(test);
    const statuses = await atOnce(range(20).map(() => signIn(email)));
    expect(counted(statuses)).toEqual({ 401: 5, 429: 15 });
  });

  it('takes thirty a minute from one address, whoever they are for', async () => {
    const statuses = await atOnce(range(40).map((n) => signIn(`nobody-${n}@larkmoor.example`)));
    expect(counted(statuses)).toEqual({ 401: 30, 429: 10 });
    test.clock.advance(MINUTE);
    expect(await signIn('nobody@larkmoor.example')).toBe(401);
  });

  it('does not count those who know their password', async () => {
    const { email } = await person(test);
    for (const _ of range(8)) expect(await signIn(email, PASSWORD)).toBe(200);
    expect(await test.dataSource.query('SELECT * FROM sign_in_failure')).toEqual([]);
  });

  it('forgets tries that no limit counts any more', async () => {
    for (const n of range(3)) await signIn(`nobody-${n}@larkmoor.example`);
    test.clock.advance(16 * MINUTE);
    await signIn('nobody@larkmoor.example');
    expect(await test.dataSource.query('SELECT email FROM sign_in_failure')).toEqual([
      { email: 'nobody@larkmoor.example' },
    ]);
  });

  if (TRUSTED_PROXY === undefined)
    it('believes nobody who names an address of their own', async () => {
      const { email } = await person(test);
      for (const n of range(5)) expect(await signIn(email, 'a guess', `10.0.0.${n}`)).toBe(401);
      expect(await signIn(email, 'a guess', '10.0.0.99')).toBe(429);
    });
  else
    it('takes ten a minute at one email from everywhere, and keeps its owner out no longer', async () => {
      const { email } = await person(test);
      const statuses = await atOnce(range(20).map((n) => signIn(email, 'a guess', `10.0.0.${n}`)));
      expect(counted(statuses)).toEqual({ 401: 10, 429: 10 });
      expect(await signIn(email, PASSWORD, '10.0.1.1')).toBe(429);
      test.clock.advance(MINUTE);
      expect(await signIn(email, PASSWORD, '10.0.1.1')).toBe(200);
    });
});
