import { BuildsService } from '../src/builds/builds.service';
import type { LicenceDto } from '../src/builds/dto/licence.dto';
import type { BuildDto } from '../src/builds/dto/build.dto';
import {
  PNG,
  sendSource,
  settleAmplifier,
  settleSource,
  signOffSource,
  startedBuild,
} from './factories/build.factory';
import { smallPlan } from './factories/plan.factory';
import { someoneWith } from './factories/person.factory';
import { startTestApp, TEST_NOW, type TestApp } from './app';

const HOUR = 3_600_000;

describe('a build', () => {
  let test: TestApp;

  beforeAll(async () => {
    test = await startTestApp();
  });
  beforeEach(() => test.clock.set(TEST_NOW));
  afterAll(() => test.close());

  it('begins at the newest edition with the next serial, its first stage open and the rest locked', async () => {
    const plan = smallPlan();
    const { build, builder } = await startedBuild(test, plan);
    expect(build).toMatchObject({
      planName: plan.name,
      editionNumber: 1,
      serial: 1,
      builder: { id: builder.id },
    });
    expect(build.stages.map(({ state }) => state)).toEqual(['not started', 'locked', 'locked']);
    expect(build.currentStageId).toBe(build.stages[0]?.id);
    expect(build.stages[1]?.lockedBecause).toBe(
      'It opens when stage 1 Source is with a mentor or signed off.',
    );
    const { agent } = await someoneWith(test);
    const second = await agent.post('/api/builds').send({ planId: build.planId }).expect(201);
    expect(second.body.serial).toBe(2);
  });

  it('is one for each person and plan at a time', async () => {
    const { agent, build } = await startedBuild(test);
    const again = await agent.post('/api/builds').send({ planId: build.planId }).expect(409);
    expect(again.body.type).toBe('/problems/build-started-already');
  });

  it('is shown whole under mine', async () => {
    const { agent, build } = await startedBuild(test);
    const { body } = await agent.get('/api/builds/mine').expect(200);
    expect(body).toEqual([build]);
  });

  describe('stage', () => {
    it('goes to a mentor, is seen and signed off, and opens the next', async () => {
      const started = await startedBuild(test);
      await sendSource(started);
      const sent = await started.now();
      expect(sent.stages.map(({ state }) => state)).toEqual(['with mentor', 'not started', 'locked']);
      const mentor = await signOffSource(test, started);
      const signed = await started.now();
      expect(signed.stages[0]).toMatchObject({ state: 'signed off' });
      expect(signed.stages[0]?.events).toMatchObject([
        { kind: 'sent', by: { id: started.builder.id }, note: 'Here it is.', at: TEST_NOW.toISOString() },
        { kind: 'signed off', note: 'Nice.' },
      ]);
      expect(signed.currentStageId).toBe(started.stage('Amplifier').id);
      const shown = await mentor.get(started.at('')).expect(200);
      expect(shown.body).toEqual(signed);
    });

    it('is sent back with a word, mended and sent again; what the mentor saw is to be seen again', async () => {
      const started = await startedBuild(test);
      await sendSource(started);
      const { agent: mentor } = await someoneWith(test, 'mentor');
      await mentor.post(started.checkAt('Looked at the joints', 'marks')).expect(201);
      await mentor
        .post(started.stageAt('Source', 'send-back'))
        .send({ note: 'A joint at R3 is dry.' })
        .expect(200);
      const back = await started.now();
      expect(back.stages[0]).toMatchObject({ state: 'sent back', missingToSend: 0, missingToSignOff: 1 });
      expect(back.currentStageId).toBe(started.stage('Source').id);
      await started.agent.post(started.stageAt('Source', 'submit')).send({}).expect(200);
      await mentor.post(started.stageAt('Source', 'sign-off')).send({}).expect(409);
    });

    it('on the air waits for every sign-off and for a licence an organiser has seen', async () => {
      const started = await startedBuild(test);
      await sendSource(started);
      const mentor = await signOffSource(test, started);
      await settleAmplifier(started);
      await started.agent.post(started.stageAt('Amplifier', 'submit')).send({}).expect(200);
      expect((await started.now()).stages[2]?.lockedBecause).toBe(
        'It opens when stage 2 Amplifier is signed off and an organiser has seen your licence.',
      );
      await mentor.post(started.stageAt('Amplifier', 'sign-off')).send({}).expect(200);
      expect((await started.now()).stages[2]?.lockedBecause).toBe(
        'It opens when an organiser has seen your licence.',
      );
      const { agent: organiser } = await someoneWith(test, 'organiser');
      const listed = async () => {
        const { body } = await organiser.get('/api/licences').expect(200);
        return (body as LicenceDto[]).find(({ buildId }) => buildId === started.build.id);
      };
      expect(await listed()).toMatchObject({
        builder: { id: started.build.builder.id },
        seenAt: null,
        seenBy: null,
      });
      await organiser.post(started.at('/licence')).expect(204);
      await organiser.post(started.at('/licence')).expect(409);
      expect(await listed()).toMatchObject({
        seenAt: expect.any(String),
        seenBy: { name: expect.any(String) },
      });
      expect((await started.now()).stages[2]).toMatchObject({ state: 'not started', lockedBecause: null });
    });

    it('asks for the tick beside its caution with every reading', async () => {
      const started = await startedBuild(test);
      await sendSource(started);
      const mentor = await signOffSource(test, started);
      await settleAmplifier(started);
      await started.agent.post(started.stageAt('Amplifier', 'submit')).send({}).expect(200);
      await mentor.post(started.stageAt('Amplifier', 'sign-off')).send({}).expect(200);
      const { agent: organiser } = await someoneWith(test, 'organiser');
      await organiser.post(started.at('/licence')).expect(204);
      const reading = { method: 'meter', entry: { value: '18', readToValue: '0.5' } };
      const at = started.checkAt('Return loss', 'readings');
      const { body } = await started.agent.post(at).send(reading).expect(422);
      expect(body.errors).toMatchObject([{ pointer: '#/cautionAcknowledged' }]);
      const kept = await started.agent
        .post(at)
        .send({ ...reading, cautionAcknowledged: true })
        .expect(201);
      expect(kept.body).toMatchObject({ verdict: 'pass', cautionAcknowledged: true });
    });
  });

  describe('review queue', () => {
    it('has the longest waiting first, with how often it went back, and the last sign-off', async () => {
      const first = await startedBuild(test);
      await sendSource(first);
      test.clock.advance(HOUR);
      const second = await startedBuild(test);
      await sendSource(second);
      const { agent: mentor } = await someoneWith(test, 'mentor');
      await mentor.post(first.stageAt('Source', 'send-back')).send({ note: 'Again.' }).expect(200);
      test.clock.advance(HOUR);
      await first.agent.post(first.stageAt('Source', 'submit')).send({}).expect(200);
      const { body } = await mentor.get('/api/reviews?perPage=200').expect(200);
      const own = (body.items as { buildId: string }[]).filter(({ buildId }) =>
        [first.build.id, second.build.id].includes(buildId),
      );
      expect(own).toMatchObject([
        { buildId: second.build.id, stageName: 'Source', timesSentBack: 0, isOwn: false },
        { buildId: first.build.id, timesSentBack: 1 },
      ]);
      await signOffSource(test, second);
      const after = await mentor.get('/api/reviews').expect(200);
      expect(after.body.lastSignOffAt).toBe(test.clock.now().toISOString());
    });
  });

  describe('photo', () => {
    it('comes back byte for byte to those who may see the build, with headers a browser needs', async () => {
      const { agent, checkAt } = await startedBuild(test);
      const { body } = await agent
        .post(checkAt('Photo of the board', 'photos'))
        .field('caption', 'Top')
        .attach('photo', PNG, 'x.png')
        .expect(201);
      expect(body).toMatchObject({ caption: 'Top', contentType: 'image/png' });
      const shown = await agent
        .get(body.url as string)
        .buffer(true)
        .expect(200);
      expect(shown.headers).toMatchObject({
        'content-type': 'image/png',
        'cache-control': 'private, no-cache',
        'x-content-type-options': 'nosniff',
      });
      expect(Buffer.compare(shown.body as Buffer, PNG)).toBe(0);
      const etag = shown.headers.etag as string;
      await agent
        .get(body.url as string)
        .set('If-None-Match', etag)
        .expect(304);
      const { agent: mentor } = await someoneWith(test, 'mentor');
      await mentor.get(body.url as string).expect(200);
      const { agent: other } = await someoneWith(test);
      await other.get(body.url as string).expect(404);
    });

    it('sent twice is kept once, and can be taken back until the stage is sent', async () => {
      const { agent, checkAt, now, stageAt, ...rest } = await startedBuild(test);
      const started = { agent, checkAt, now, stageAt, ...rest };
      const add = () =>
        agent.post(checkAt('Photo of the board', 'photos')).attach('photo', PNG, 'x.png').expect(201);
      const [one, two] = [await add(), await add()];
      expect(two.body.id).toBe(one.body.id);
      await agent.delete(one.body.url as string).expect(204);
      await agent.get(one.body.url as string).expect(404);
      await agent.delete(one.body.url as string).expect(404);
      await settleSource(started);
      await agent.post(stageAt('Source', 'submit')).send({}).expect(200);
      const kept = (await now()).stages[0]?.checks[2]?.photos[0];
      await agent.delete(kept?.url ?? '').expect(409);
    });
  });

  it('is summed up for every page by the states of its stages alone', async () => {
    const { agent, build } = await startedBuild(test);
    const { body } = await agent.get('/api/builds/mine/summary').expect(200);
    const [whole] = (await agent.get('/api/builds/mine').expect(200)).body as BuildDto[];
    const { id, planName, serial, endedAt, currentStageId } = build;
    const stages = whole?.stages.map((stage) => ({
      ...{ id: stage.id, position: stage.position, name: stage.name, state: stage.state },
    }));
    expect(body).toEqual([{ id, planName, serial, endedAt, currentStageId, stages }]);
    // Nothing of what is in a build is read for it, nor for the question who is on a stage.
    await test.dataSource.query('ALTER TABLE reading RENAME TO reading_out_of_reach');
    try {
      await agent.get('/api/builds/mine/summary').expect(200);
      const people = await test.app.get(BuildsService).peopleOnStages([currentStageId ?? '']);
      expect(people).toHaveLength(1);
    } finally {
      await test.dataSource.query('ALTER TABLE reading_out_of_reach RENAME TO reading');
    }
    const { agent: other } = await someoneWith(test);
    expect((await other.get('/api/builds/mine/summary').expect(200)).body).toEqual([]);
    await test.http().get('/api/builds/mine/summary').expect(401);
  });

  describe('on a server whose clock is behind another’s', () => {
    const ahead = <T>(work: () => PromiseLike<T>): Promise<T> => {
      test.clock.advance(5_000);
      return Promise.resolve(work()).finally(() => test.clock.advance(-5_000));
    };

    it('has its marks taken back', async () => {
      const started = await startedBuild(test);
      await ahead(() => sendSource(started));
      const { agent: mentor } = await someoneWith(test, 'mentor');
      await ahead(() => mentor.post(started.checkAt('Looked at the joints', 'marks')).expect(201));
      await mentor.post(started.stageAt('Source', 'send-back')).send({ note: 'Once more.' }).expect(200);
      await started.agent.delete(started.checkAt('Board cleaned', 'marks')).expect(204);
      expect((await started.now()).stages[0]?.checks.filter(({ mark }) => mark !== null)).toEqual([]);
    });

    it('has its gain worked out of a level that seems to come from the future', async () => {
      const started = await startedBuild(test);
      await ahead(() => sendSource(started));
      await settleAmplifier(started);
      expect((await started.now()).stages[1]?.checks[2]?.readings).toHaveLength(1);
    });
  });

  it('tells other features who is on a stage now', async () => {
    const started = await startedBuild(test);
    const people = await test.app.get(BuildsService).peopleOnStages([started.stage('Source').id]);
    expect(people).toEqual([
      { personId: started.builder.id, name: started.builder.name, email: started.builder.email },
    ]);
    await sendSource(started);
    expect(await test.app.get(BuildsService).peopleOnStages([started.stage('Source').id])).toEqual([]);
  });
});
