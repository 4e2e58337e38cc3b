import { PASSWORD, person, signedInAs, someoneWith } from './factories/person.factory';
import { startTestApp, TEST_NOW, type TestApp } from './app';

const MINUTE = 60_000;

describe('signing in', () => {
  let test: TestApp;

  beforeAll(async () => {
    test = await startTestApp();
  });
  beforeEach(() => test.clock.set(TEST_NOW));
  afterAll(() => test.close());

  const cookiesOf = (response: { headers: Record<string, unknown> }): string[] =>
    (response.headers['set-cookie'] as string[] | undefined) ?? [];
  const signIn = (email: string, password = PASSWORD) =>
    test.http().post('/api/auth/sign-in').send({ email, password });

  it('answers with the person and keeps both tokens where scripts cannot read them', async () => {
    const someone = await person(test, { name: 'Tamsin Ardley' });
    const response = await signIn(someone.email.toUpperCase()).expect(200);
    expect(response.body).toMatchObject({ name: 'Tamsin Ardley', roles: ['member'], sharedDevice: false });
    const cookies = cookiesOf(response);
    expect(cookies).toHaveLength(2);
    for (const cookie of cookies) expect(cookie).toMatch(/HttpOnly; SameSite=Strict/);
    expect(JSON.stringify(response.body)).not.toMatch(/token|argon2/i);
  });

  it('stores the password as argon2id and never in clear', async () => {
    const someone = await person(test);
    const [row] = await test.dataSource.query<{ password_hash: string }[]>(
      'SELECT password_hash FROM person WHERE id = $1',
      [someone.id],
    );
    expect(row?.password_hash).toMatch(/^\$argon2id\$v=19\$m=19456,t=2,p=1\$/);
  });

  it('gives one answer to a wrong password and to an unknown email', async () => {
    const someone = await person(test);
    const wrong = await signIn(someone.email, 'not it').expect(401);
    const unknown = await signIn('nobody@larkmoor.example', 'not it').expect(401);
    expect(wrong.body).toMatchObject({ type: '/problems/wrong-email-or-password', status: 401 });
    expect(unknown.body).toMatchObject({
      type: wrong.body.type as string,
      detail: wrong.body.detail as string,
    });
  });

  it('makes the sixth try in a minute wait, the right password too, and lets it through after the minute', async () => {
    const someone = await person(test);
    for (let tries = 0; tries < 5; tries += 1) await signIn(someone.email, 'not it').expect(401);
    const response = await signIn(someone.email).expect(429);
    expect(response.body).toMatchObject({ type: '/problems/slow-down', retryAfterSeconds: 60 });
    expect(response.headers['retry-after']).toBe('60');
    test.clock.advance(MINUTE + 1);
    await signIn(someone.email).expect(200);
  });

  it('refuses somebody who has left the club', async () => {
    const someone = await person(test);
    await test.dataSource.query('UPDATE person SET left_at = now() WHERE id = $1', [someone.id]);
    await signIn(someone.email).expect(401);
  });

  it('ends the session on the server: the old cookies no longer work after signing out', async () => {
    const someone = await person(test);
    const cookies = cookiesOf(await signIn(someone.email).expect(200)).map(
      (cookie) => cookie.split(';')[0] ?? '',
    );
    await test.http().get('/api/auth/me').set('Cookie', cookies).expect(200);
    await test.http().post('/api/auth/sign-out').set('Cookie', cookies).expect(204);
    await test.http().get('/api/auth/me').set('Cookie', cookies).expect(401);
    await test.http().post('/api/auth/refresh').set('Cookie', cookies).expect(401);
  });

  it('exchanges the refresh token, and takes an old one for a theft that ends the session', async () => {
    const someone = await person(test);
    const first = cookiesOf(await signIn(someone.email).expect(200));
    const second = cookiesOf(await test.http().post('/api/auth/refresh').set('Cookie', first).expect(204));
    expect(second).not.toEqual(first);
    test.clock.advance(2 * MINUTE);
    await test.http().post('/api/auth/refresh').set('Cookie', first).expect(401);
    await test.http().get('/api/auth/me').set('Cookie', second).expect(401);
  });

  it('lets two tabs refresh in the same moment', async () => {
    const someone = await person(test);
    const cookies = cookiesOf(await signIn(someone.email).expect(200));
    const answers = await Promise.all(
      [1, 2].map(() => test.http().post('/api/auth/refresh').set('Cookie', cookies)),
    );
    expect(answers.map(({ status }) => status)).toEqual([204, 204]);
  });

  it('runs out on a shared bench tablet after ten minutes untouched', async () => {
    const someone = await person(test);
    const agent = test.http();
    await agent
      .post('/api/auth/sign-in')
      .send({ email: someone.email, password: PASSWORD, sharedDevice: true })
      .expect(200);
    test.clock.advance(9 * MINUTE);
    await agent.post('/api/auth/refresh').expect(204);
    test.clock.advance(11 * MINUTE);
    await agent.post('/api/auth/refresh').expect(401);
  });

  it('sees a role the moment it is given', async () => {
    const { person: someone, agent } = await someoneWith(test);
    await test.dataSource.query(`UPDATE person SET roles = '{member,mentor}' WHERE id = $1`, [someone.id]);
    const { body } = await agent.get('/api/auth/me').expect(200);
    expect(body).toMatchObject({ roles: ['member', 'mentor'] });
  });

  it('refuses a write that a page of another site sends', async () => {
    const someone = await person(test);
    const agent = await signedInAs(test, someone);
    const response = await agent
      .post('/api/auth/sign-out')
      .set('Origin', 'https://elsewhere.example')
      .expect(403);
    expect(response.body).toMatchObject({ type: '/problems/foreign-origin' });
    await agent.post('/api/auth/sign-out').set('Origin', test.environment.PUBLIC_URL).expect(204);
  });
});
