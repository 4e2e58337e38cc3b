import { PNG, sendSource, settleSource, SOURCE_ENTRY, startedBuild } from './factories/build.factory';
import { PASSWORD, person } from './factories/person.factory';
import { startTestApp, type TestApp } from './app';

/** Real sockets, so that requests really meet. */
describe('builds under a race', () => {
  let test: TestApp;

  beforeAll(async () => {
    test = await startTestApp();
  });
  afterAll(() => test.close());

  const statuses = async (calls: Promise<Response>[]): Promise<number[]> =>
    (await Promise.all(calls)).map(({ status }) => status).sort();
  const cookieOf = async (email: string): Promise<string> => {
    const response = await test.http().post('/api/auth/sign-in').send({ email, password: PASSWORD });
    return ((response.headers['set-cookie'] as unknown as string[]) ?? [])
      .map((c) => c.split(';')[0])
      .join('; ');
  };
  const post = (path: string, cookie: string, body: unknown = {}): Promise<Response> =>
    fetch(`${test.baseUrl}${path}`, {
      method: 'POST',
      headers: { cookie, 'content-type': 'application/json' },
      body: JSON.stringify(body),
    });

  it('of two mentors who sign at once one signs, and the other is told', async () => {
    const started = await startedBuild(test);
    await sendSource(started);
    const mentors = [1, 2].map(() => person(test, { roles: ['member', 'mentor'] }));
    const cookies = await Promise.all(mentors.map(async (made) => cookieOf((await made).email)));
    await post(started.checkAt('Looked at the joints', 'marks'), cookies[0] ?? '');
    const path = started.stageAt('Source', 'sign-off');
    expect(await statuses(cookies.map((cookie) => post(path, cookie)))).toEqual([200, 409]);
    expect((await started.now()).stages[0]?.events.map(({ kind }) => kind)).toEqual(['sent', 'signed off']);
  });

  it('of eight submits at once one counts', async () => {
    const started = await startedBuild(test);
    await settleSource(started);
    const cookie = await cookieOf(started.builder.email);
    const calls = Array.from({ length: 8 }, () => post(started.stageAt('Source', 'submit'), cookie));
    expect(await statuses(calls)).toEqual([200, ...Array.from({ length: 7 }, () => 409)]);
  });

  it('a reading that races the submit is in the record the mentor sees, or refused', async () => {
    const started = await startedBuild(test);
    await settleSource(started);
    const cookie = await cookieOf(started.builder.email);
    const reading = { method: 'oscilloscope', entry: { ...SOURCE_ENTRY, divisionsPeakToPeak: '2.0' } };
    const [sent, kept] = await Promise.all([
      post(started.stageAt('Source', 'submit'), cookie),
      post(started.checkAt('Output level at TP1', 'readings'), cookie, reading),
    ]);
    // The retake does not pass: either it came first and the stage was not sent, or it came too late.
    expect([
      [200, 409],
      [409, 201],
    ]).toContainEqual([sent.status, kept.status]);
  });

  it('two members who begin at once get two serials, and one person gets one build', async () => {
    const { build } = await startedBuild(test);
    const people = await Promise.all([1, 2, 3].map(() => person(test)));
    const cookies = await Promise.all(people.map(({ email }) => cookieOf(email)));
    const begun = await Promise.all(
      cookies.map((cookie) => post('/api/builds', cookie, { planId: build.planId })),
    );
    const serials = await Promise.all(
      begun.map(async (answer) => ((await answer.json()) as { serial: number }).serial),
    );
    expect(serials.sort()).toEqual([2, 3, 4]);
    const one = await person(test);
    const cookie = await cookieOf(one.email);
    const twice = [1, 2].map(() => post('/api/builds', cookie, { planId: build.planId }));
    expect(await statuses(twice)).toEqual([201, 409]);
  });

  it('of sixteen photos sent at once a check keeps twelve, and refuses the others with the reason', async () => {
    const started = await startedBuild(test);
    const cookie = await cookieOf(started.builder.email);
    const send = (index: number): Promise<Response> => {
      const body = new FormData();
      const picture = Buffer.concat([PNG, Buffer.from([index])]);
      body.set('photo', new Blob([picture], { type: 'image/png' }), 'board.png');
      const address = `${test.baseUrl}${started.checkAt('Photo of the board', 'photos')}`;
      return fetch(address, { method: 'POST', headers: { cookie }, body });
    };
    const answers = await Promise.all(Array.from({ length: 16 }, (_, index) => send(index)));
    const refused = answers.filter(({ status }) => status === 409);
    expect(refused).toHaveLength(4);
    expect(await refused[0]?.json()).toMatchObject({
      type: '/problems/photos-enough',
      detail: expect.stringMatching(/^Photo of the board has 12 photos/) as string,
    });
    const photos = (await started.now()).stages[0]?.checks[2]?.photos ?? [];
    expect(photos).toHaveLength(12);
    await started.agent.delete(photos[0]?.url ?? '').expect(204);
    expect((await send(16)).status).toBe(201);
  });

  it('ticks pressed at once are one mark', async () => {
    const started = await startedBuild(test);
    const cookie = await cookieOf(started.builder.email);
    const calls = Array.from({ length: 5 }, () => post(started.checkAt('Board cleaned', 'marks'), cookie));
    expect(await statuses(calls)).toEqual([201, 201, 201, 201, 201]);
    const [row] = await test.dataSource.query<{ n: string }[]>(
      'SELECT count(*) AS n FROM check_mark WHERE build_id = $1',
      [started.build.id],
    );
    expect(row?.n).toBe('1');
  });
});
