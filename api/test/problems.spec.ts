import { someoneWith } from './factories/person.factory';
import { startTestApp, type TestApp } from './app';

describe('bad input', () => {
  let test: TestApp;

  beforeAll(async () => {
    test = await startTestApp();
  });
  afterAll(() => test.close());

  it.each([
    ['an unknown field', { email: 'a@b.example', password: 'x', admin: true }, '#/admin'],
    ['a wrong type', { email: 'a@b.example', password: 12 }, '#/password'],
    ['a missing field', { password: 'x' }, '#/email'],
    ['an overlong text', { email: 'a@b.example', password: 'x'.repeat(201) }, '#/password'],
  ])('names the field: %s', async (_what, body, pointer) => {
    const response = await test.http().post('/api/auth/sign-in').send(body).expect(422);
    expect(response.headers['content-type']).toMatch(/^application\/problem\+json/);
    expect(response.body).toMatchObject({
      type: '/problems/invalid-input',
      status: 422,
      errors: [{ pointer }],
    });
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
