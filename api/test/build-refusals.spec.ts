import type supertest from 'supertest';
import { PNG, sendSource, SOURCE_ENTRY, startedBuild, type StartedBuild } from './factories/build.factory';
import { someoneWith } from './factories/person.factory';
import { startTestApp, TEST_NOW, type TestApp } from './app';

const NOBODY = '00000000-0000-4000-8000-000000000000';
const READING = { method: 'oscilloscope', entry: SOURCE_ENTRY };

describe('what builds refuse', () => {
  let test: TestApp;
  let started: StartedBuild;
  let other: supertest.Agent;
  let mentor: supertest.Agent;

  beforeAll(async () => {
    test = await startTestApp();
    started = await startedBuild(test);
    ({ agent: other } = await someoneWith(test));
    ({ agent: mentor } = await someoneWith(test, 'mentor'));
  });
  afterAll(() => test.close());

  const refused = async (
    answer: supertest.Test,
    status: number,
    type: string,
  ): Promise<supertest.Response> => {
    const response = await answer;
    expect(response.headers['content-type']).toMatch(/^application\/problem\+json/);
    expect({ status: response.status, type: response.body.type }).toEqual({
      status,
      type: `/problems/${type}`,
    });
    return response;
  };
  const reading = (body: object, agent = started.agent) =>
    agent.post(started.checkAt('Output level at TP1', 'readings')).send(body);

  it('those who are not signed in', async () => {
    await refused(test.http().get('/api/builds/mine'), 401, 'not-signed-in');
    await refused(test.http().get(started.at('')), 401, 'not-signed-in');
    await refused(reading(READING, test.http()), 401, 'not-signed-in');
    await refused(test.http().get('/api/reviews'), 401, 'not-signed-in');
  });

  it('another member, who is not told that the build is there', async () => {
    await refused(other.get(started.at('')), 404, 'not-found');
    await refused(reading(READING, other), 404, 'not-found');
    await refused(other.post(started.checkAt('Board cleaned', 'marks')), 404, 'not-found');
    await refused(other.delete(started.checkAt('Board cleaned', 'marks')), 404, 'not-found');
    await refused(
      other.post(started.checkAt('Photo of the board', 'photos')).attach('photo', PNG, 'x.png'),
      404,
      'not-found',
    );
    await refused(other.get(started.checkAt('Board cleaned', 'instruments')), 404, 'not-found');
    await refused(other.post(started.stageAt('Source', 'submit')).send({}), 404, 'not-found');
    await refused(other.post(started.stageAt('Source', 'withdraw')), 404, 'not-found');
    await refused(other.get(started.at(`/photos/${NOBODY}`)), 404, 'not-found');
  });

  it('a mentor who would add to somebody’s build', async () => {
    await refused(reading(READING, mentor), 403, 'not-allowed');
    await refused(mentor.post(started.checkAt('Board cleaned', 'marks')), 403, 'not-allowed');
    await refused(mentor.post(started.stageAt('Source', 'submit')).send({}), 403, 'not-allowed');
    await refused(
      mentor.post(started.checkAt('Photo of the board', 'photos')).attach('photo', PNG, 'x.png'),
      403,
      'not-allowed',
    );
  });

  it('a member who would decide, look at the queue or see a licence', async () => {
    await refused(started.agent.post(started.stageAt('Source', 'sign-off')).send({}), 403, 'not-allowed');
    await refused(
      started.agent.post(started.stageAt('Source', 'send-back')).send({ note: 'x' }),
      403,
      'not-allowed',
    );
    await refused(started.agent.get('/api/reviews'), 403, 'not-allowed');
    await refused(started.agent.post(started.at('/licence')), 403, 'not-allowed');
    await refused(mentor.post(started.at('/licence')), 403, 'not-allowed');
    await refused(mentor.get('/api/licences'), 403, 'not-allowed');
  });

  it('a mentor who would decide on a build of their own', async () => {
    const own = await startedBuild(test);
    await sendSource(own);
    await test.dataSource.query(`UPDATE person SET roles = '{member,mentor}' WHERE id = $1`, [
      own.builder.id,
    ]);
    await refused(own.agent.post(own.checkAt('Looked at the joints', 'marks')), 403, 'own-stage');
    await refused(own.agent.post(own.stageAt('Source', 'sign-off')).send({}), 403, 'own-stage');
    await refused(own.agent.post(own.stageAt('Source', 'send-back')).send({ note: 'x' }), 403, 'own-stage');
    const { body } = await own.agent.get('/api/reviews?perPage=200').expect(200);
    expect(
      (body.items as { buildId: string }[]).find(({ buildId }) => buildId === own.build.id),
    ).toMatchObject({
      isOwn: true,
    });
  });

  it.each<[string, object, string]>([
    ['an unknown field', { ...READING, value: -19 }, '#/value'],
    ['a verdict of its own', { ...READING, verdict: 'pass' }, '#/verdict'],
    ['no method', { entry: SOURCE_ENTRY }, '#/method'],
    ['another method', { ...READING, method: 'analyzer' }, '#/method'],
    ['an entry that is text', { ...READING, entry: 'twenty' }, '#/entry'],
    ['an entry that is a list', { ...READING, entry: ['20m'] }, '#/entry'],
    [
      'an entry with a number in place of text',
      { ...READING, entry: { ...SOURCE_ENTRY, loadOhms: 50 } },
      '#/entry/loadOhms',
    ],
    [
      'a field of another method',
      { ...READING, entry: { ...SOURCE_ENTRY, padsInLineDb: '0' } },
      '#/entry/padsInLineDb',
    ],
    ['a missing field', { ...READING, entry: { ...SOURCE_ENTRY, loadOhms: undefined } }, '#/entry/loadOhms'],
    [
      'a negative resistance',
      { ...READING, entry: { ...SOURCE_ENTRY, loadOhms: '-50' } },
      '#/entry/loadOhms',
    ],
    ['no number at all', { ...READING, entry: { ...SOURCE_ENTRY, loadOhms: 'NaN' } }, '#/entry/loadOhms'],
    ['an infinite one', { ...READING, entry: { ...SOURCE_ENTRY, loadOhms: 'Infinity' } }, '#/entry/loadOhms'],
    [
      'one past all numbers',
      { ...READING, entry: { ...SOURCE_ENTRY, loadOhms: '1e999' } },
      '#/entry/loadOhms',
    ],
    [
      'more divisions than the screen has',
      { ...READING, entry: { ...SOURCE_ENTRY, divisionsPeakToPeak: '33' } },
      '#/entry/divisionsPeakToPeak',
    ],
    [
      'overlong text',
      { ...READING, entry: { ...SOURCE_ENTRY, loadOhms: '5'.repeat(5000) } },
      '#/entry/loadOhms',
    ],
    [
      'a character that cannot be stored',
      { ...READING, entry: { ...SOURCE_ENTRY, loadOhms: '50\u0000' } },
      '#/entry/loadOhms',
    ],
    [
      'a time to come',
      { ...READING, takenAt: new Date(TEST_NOW.getTime() + 3_600_000).toISOString() },
      '#/takenAt',
    ],
    ['a time before the build', { ...READING, takenAt: '2020-01-01T00:00:00Z' }, '#/takenAt'],
    ['a time without an offset', { ...READING, takenAt: '2026-01-15T12:00:00' }, '#/takenAt'],
    ['an instrument that is no id', { ...READING, instrumentId: 'FR-021' }, '#/instrumentId'],
    ['an instrument nobody has', { ...READING, instrumentId: NOBODY }, '#/instrumentId'],
    ['a tick that is a word', { ...READING, cautionAcknowledged: 'yes' }, '#/cautionAcknowledged'],
  ])('a reading with %s, naming the field, and keeps nothing', async (_what, body, pointer) => {
    const response = await refused(reading(body), 422, 'invalid-input');
    expect((response.body.errors as { pointer: string }[]).map((error) => error.pointer)).toContain(pointer);
    const [row] = await test.dataSource.query<{ n: string }[]>(
      'SELECT count(*) AS n FROM reading WHERE build_id = $1',
      [started.build.id],
    );
    expect(row?.n).toBe('0');
  });

  it('an entry with a field that only objects have', async () => {
    const body = `{"method":"oscilloscope","entry":{"__proto__":"1","constructor":"2"}}`;
    const answer = started.agent
      .post(started.checkAt('Output level at TP1', 'readings'))
      .set('Content-Type', 'application/json')
      .send(body);
    await refused(answer, 422, 'invalid-input');
  });

  it('evidence of another kind than the check asks for', async () => {
    await refused(
      started.agent.post(started.checkAt('Board cleaned', 'readings')).send(READING),
      422,
      'invalid-input',
    );
    await refused(started.agent.post(started.checkAt('Output level at TP1', 'marks')), 422, 'invalid-input');
    await refused(
      started.agent.post(started.checkAt('Board cleaned', 'photos')).attach('photo', PNG, 'x.png'),
      422,
      'invalid-input',
    );
  });

  it('everything on a locked stage', async () => {
    await refused(
      started.agent.post(started.checkAt('Output level at TP2', 'readings')).send(READING),
      409,
      'stage-locked',
    );
    await refused(started.agent.post(started.checkAt('The load was fitted', 'marks')), 409, 'stage-locked');
    await refused(started.agent.post(started.stageAt('Amplifier', 'submit')).send({}), 409, 'stage-locked');
  });

  it('to send what is not complete, and says what is missing', async () => {
    const fresh = await startedBuild(test);
    const response = await refused(
      fresh.agent.post(fresh.stageAt('Source', 'submit')).send({}),
      409,
      'checks-missing',
    );
    expect((response.body.missing as { title: string }[]).map(({ title }) => title)).toEqual([
      ...['Board cleaned', 'Output level at TP1', 'Photo of the board'],
    ]);
  });

  it('anything more once a stage was sent, and to decide on one that was not', async () => {
    const sent = await startedBuild(test);
    await refused(mentor.post(sent.stageAt('Source', 'sign-off')).send({}), 409, 'stage-not-with-mentor');
    await refused(
      mentor.post(sent.stageAt('Source', 'send-back')).send({ note: 'x' }),
      409,
      'stage-not-with-mentor',
    );
    await refused(mentor.post(sent.checkAt('Looked at the joints', 'marks')), 409, 'stage-not-with-mentor');
    await refused(sent.agent.post(sent.stageAt('Source', 'withdraw')), 409, 'stage-not-with-mentor');
    await sendSource(sent);
    await refused(sent.agent.post(sent.stageAt('Source', 'submit')).send({}), 409, 'stage-out-of-hand');
    await refused(
      sent.agent.post(sent.checkAt('Output level at TP1', 'readings')).send(READING),
      409,
      'stage-out-of-hand',
    );
    await refused(sent.agent.delete(sent.checkAt('Board cleaned', 'marks')), 409, 'stage-out-of-hand');
    await refused(mentor.post(sent.stageAt('Source', 'sign-off')).send({}), 409, 'checks-missing');
  });

  it.each<[string, string, object]>([
    ['no word', 'send-back', {}],
    ['an empty word', 'send-back', { note: '   ' }],
    ['an overlong word', 'send-back', { note: 'x'.repeat(1001) }],
    ['a word that cannot be stored', 'send-back', { note: 'a\u0000b' }],
    ['an unknown field', 'sign-off', { waiver: true }],
    ['a note that is a number', 'sign-off', { note: 7 }],
  ])('a decision with %s', async (_what, act, body) => {
    await refused(mentor.post(started.stageAt('Source', act)).send(body), 422, 'invalid-input');
  });

  it('ids that are none, of nobody, or of another build', async () => {
    const another = await startedBuild(test);
    await refused(started.agent.get('/api/builds/not-an-id'), 400, 'unreadable-request');
    await refused(started.agent.get(`/api/builds/${NOBODY}`), 404, 'not-found');
    const foreignCheck = another.check('Output level at TP1').id;
    await refused(
      started.agent.post(started.at(`/checks/${foreignCheck}/readings`)).send(READING),
      404,
      'not-found',
    );
    await refused(started.agent.get(started.at(`/checks/${NOBODY}/instruments`)), 404, 'not-found');
    await refused(
      mentor.post(started.at(`/stages/${another.stage('Source').id}/sign-off`)).send({}),
      404,
      'not-found',
    );
    await refused(started.agent.post(started.at(`/stages/${NOBODY}/submit`)).send({}), 404, 'not-found');
    const { agent: organiser } = await someoneWith(test, 'organiser');
    await refused(organiser.post(`/api/builds/${NOBODY}/licence`), 404, 'not-found');
  });

  it('to begin what is no plan', async () => {
    await refused(other.post('/api/builds').send({ planId: NOBODY }), 422, 'invalid-input');
    await refused(other.post('/api/builds').send({ planId: 'x' }), 422, 'invalid-input');
    await refused(other.post('/api/builds').send({}), 422, 'invalid-input');
  });

  describe('uploads', () => {
    const NO_FORMS = ['multipart/mixed; boundary=x', 'multipart/related; boundary=x'];
    const upload = () => started.agent.post(started.checkAt('Photo of the board', 'photos'));

    it('of another kind, whatever the name says', async () => {
      await refused(
        upload().attach('photo', Buffer.from('<svg/>'), { filename: 'x.png', contentType: 'image/png' }),
        415,
        'wrong-kind-of-file',
      );
      await refused(upload().attach('photo', Buffer.from('GIF89a...'), 'x.gif'), 415, 'wrong-kind-of-file');
    });

    it('over 6 MB, empty, missing, two at once, or under another name', async () => {
      await refused(
        upload().attach('photo', Buffer.concat([PNG, Buffer.alloc(6 * 1024 * 1024)]), 'x.png'),
        413,
        'too-large',
      );
      await refused(upload().attach('photo', Buffer.alloc(0), 'x.png'), 422, 'invalid-input');
      await refused(upload().field('caption', 'none'), 422, 'invalid-input');
      await refused(
        upload().attach('photo', PNG, 'x.png').attach('photo', PNG, 'y.png'),
        400,
        'unreadable-request',
      );
      await refused(upload().attach('picture', PNG, 'x.png'), 400, 'unreadable-request');
    });

    it('with an overlong caption or an unknown field', async () => {
      await refused(
        upload().field('caption', 'x'.repeat(121)).attach('photo', PNG, 'x.png'),
        422,
        'invalid-input',
      );
      await refused(upload().field('stage', '1').attach('photo', PNG, 'x.png'), 422, 'invalid-input');
    });

    it('that are no form', async () => {
      await refused(upload(), 422, 'invalid-input');
      await refused(upload().send({ photo: 'x' }), 415, 'wrong-kind-of-file');
      for (const type of NO_FORMS)
        await refused(upload().set('content-type', type).send('--x--\r\n'), 415, 'wrong-kind-of-file');
    });
  });
});
