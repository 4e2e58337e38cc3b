import { someoneWith } from './factories/person.factory';
import { startTestApp, type TestApp } from './app';

describe('bad input', () => {
  let test: TestApp;

  beforeAll(async () => {
    test = await startTestApp();
  });
  afterAll(() => test.close());

  it.each([
    [
      'an unknown field',
      { email: 'a@b.example', password: 'x', admin: true },
      '#/admin',
      'There is no field named admin.',
    ],
    ['a wrong type', { email: 'a@b.example', password: 12 }, '#/password', 'password must be a string.'],
    ['a missing field', { password: 'x' }, '#/email', 'email is needed.'],
    ['a null', { email: null, password: 'x' }, '#/email', 'email is needed.'],
    ['no email', { email: '', password: 'x' }, '#/email', 'That is not an email address.'],
    [
      'an overlong text',
      { email: 'a@b.example', password: 'x'.repeat(201) },
      '#/password',
      'password must be shorter than or equal to 200 characters.',
    ],
  ])('names the field and says what is wrong with it: %s', async (_what, body, pointer, detail) => {
    const response = await test.http().post('/api/auth/sign-in').send(body).expect(422);
    expect(response.headers['content-type']).toMatch(/^application\/problem\+json/);
    expect(response.body).toMatchObject({
      type: '/problems/invalid-input',
      status: 422,
      detail,
      errors: [{ pointer, detail }],
    });
  });

  it('asks for each field of an empty body', async () => {
    const { body } = await test.http().post('/api/auth/sign-in').send({}).expect(422);
    expect((body as { errors: unknown }).errors).toEqual([
      { pointer: '#/email', detail: 'email is needed.' },
      { pointer: '#/password', detail: 'password is needed.' },
    ]);
  });

  it('names the part of an address that cannot be read, and takes an id in any spelling', async () => {
    const { agent, person } = await someoneWith(test);
    const detail = 'personId in the address is not an id.';
    const { body } = await agent.get('/api/people/not-an-id').expect(400);
    expect(body).toMatchObject({
      type: '/problems/unreadable-request',
      detail,
      errors: [{ pointer: '#/personId', detail }],
    });
    const edition = await agent.get(`/api/plans/${person.id}/editions/first`).expect(400);
    expect(edition.body).toMatchObject({ errors: [{ pointer: '#/number' }] });
    const shouted = await agent.get(`/api/people/${person.id.toUpperCase()}`).expect(200);
    expect(shouted.body).toMatchObject({ id: person.id });
  });

  it('answers broken JSON with a problem document', async () => {
    const response = await test
      .http()
      .post('/api/auth/sign-in')
      .set('Content-Type', 'application/json')
      .send('{"email":')
      .expect(400);
    expect(response.body).toMatchObject({ type: '/problems/unreadable-request' });
  });

  it('answers a body past the limit with a problem document', async () => {
    const response = await test
      .http()
      .post('/api/auth/sign-in')
      .send({ email: 'x'.repeat(300_000) })
      .expect(413);
    expect(response.body).toMatchObject({ type: '/problems/too-large' });
  });

  it('answers an unknown address, a malformed id and a malformed path with problem documents', async () => {
    const { agent } = await someoneWith(test);
    await test
      .http()
      .get('/api/nothing-here')
      .expect(404)
      .expect('content-type', /problem\+json/);
    await agent
      .get('/api/people/not-an-id')
      .expect(400)
      .expect('content-type', /problem\+json/);
    await agent
      .get('/api/people/%E0%A4%A')
      .expect(400)
      .expect('content-type', /problem\+json/);
  });

  it('answers who is not signed in with 401 and says nothing else', async () => {
    const response = await test.http().get('/api/people').expect(401);
    expect(response.body).toMatchObject({ type: '/problems/not-signed-in' });
  });

  it('explains each kind of problem at the address it names', async () => {
    const { body } = await test.http().get('/problems/invalid-input').expect(200);
    expect(body).toEqual({
      type: '/problems/invalid-input',
      status: 422,
      title: 'Something in the form needs another look',
    });
  });
});

describe('without its database', () => {
  let test: TestApp;

  beforeAll(async () => {
    test = await startTestApp();
    await test.dataSource.destroy();
  });
  afterAll(() => test.close());

  it('the API is not healthy: 503', async () => {
    const { body } = await test
      .http()
      .get('/api/health')
      .expect(503)
      .expect('content-type', /problem\+json/);
    expect(body).toMatchObject({ type: '/problems/not-now', status: 503 });
  });

  it('a request fails with a kind of problem that is explained, and no word about what was changed', async () => {
    const { body } = await test.http().get('/api/club').expect(500);
    const { type, title, status, detail } = body as Record<string, string>;
    expect(type).toBe('/problems/unplanned');
    expect(detail).not.toMatch(/nothing was/i);
    expect((await test.http().get('/problems/unplanned').expect(200)).body).toEqual({ type, title, status });
  });
});
