import { BuildsService } from '../src/builds/builds.service';
import {
  PNG,
  sendSource,
  settleAmplifier,
  settleSource,
  signOffSource,
  SOURCE_ENTRY,
  startedBuild,
} from './factories/build.factory';
import { instrument, kind } from './factories/bench.factory';
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

  describe('reading', () => {
    it('is kept as typed beside what the server works out', async () => {
      const { agent, checkAt, now } = await startedBuild(test);
      const { body } = await agent
        .post(checkAt('Output level at TP1', 'readings'))
        .send({ method: 'oscilloscope', entry: SOURCE_ENTRY })
        .expect(201);
      // 2 mV/div × 3.55 div × 10 = 71 mV peak to peak; 71² / (8 × 50) µW = 12.6 µW = −19.0 dBm.
      expect(body).toMatchObject({
        unit: 'dBm',
        verdict: 'pass',
        calculation: 'oscilloscope/1',
        entry: SOURCE_ENTRY,
      });
      expect(body.value).toBeCloseTo(-18.995, 3);
      expect(body.components.map(({ name }: { name: string }) => name)).toEqual([
        'reading resolution',
        'vertical gain',
        'probe',
        'load',
      ]);
      const after = await now();
      expect(after.stages[0]).toMatchObject({ state: 'on the bench', settled: 1 });
    });

    it('is never overwritten: a retake is in force, the first stays in the record', async () => {
      const { agent, checkAt, now, check } = await startedBuild(test);
      const keep = (divisionsPeakToPeak: string) =>
        agent
          .post(checkAt('Output level at TP1', 'readings'))
          .send({ method: 'oscilloscope', entry: { ...SOURCE_ENTRY, divisionsPeakToPeak } })
          .expect(201);
      await keep('3.0');
      test.clock.advance(HOUR);
      await keep('3.55');
      const shown = (await now()).stages[0]?.checks.find(({ id }) => id === check('Output level at TP1').id);
      expect(shown?.readings.map(({ verdict, isSuperseded }) => [verdict, isSuperseded])).toEqual([
        ['too close to call', true],
        ['pass', false],
      ]);
    });

    it('that waited on a device takes its place in time, not in order of arrival', async () => {
      const { agent, checkAt, now, check } = await startedBuild(test);
      test.clock.advance(2 * HOUR);
      const keep = (divisionsPeakToPeak: string, takenAt?: string) =>
        agent
          .post(checkAt('Output level at TP1', 'readings'))
          .send({ method: 'oscilloscope', entry: { ...SOURCE_ENTRY, divisionsPeakToPeak }, takenAt })
          .expect(201);
      await keep('3.55');
      await keep('3.0', new Date(TEST_NOW.getTime() + HOUR).toISOString());
      const shown = (await now()).stages[0]?.checks.find(({ id }) => id === check('Output level at TP1').id);
      expect(shown?.readings.map(({ verdict }) => verdict)).toEqual(['too close to call', 'pass']);
      expect(shown?.isSettled).toBe(true);
    });

    it('feeds what works itself out: the next stage’s input, then its gain with both uncertainties', async () => {
      const started = await startedBuild(test);
      await sendSource(started);
      await settleAmplifier(started);
      const [input, output, gain] = (await started.now()).stages[1]?.checks ?? [];
      const [inForce, measured, workedOut] = [input, output, gain].map((check) => check?.readings.at(-1));
      expect(inForce).toMatchObject({
        method: 'carried',
        verdict: 'pass',
        entry: {},
        calculation: 'oscilloscope/1',
      });
      expect(workedOut?.value).toBeCloseTo((measured?.value ?? 0) - (inForce?.value ?? 0), 9);
      const both = Math.hypot(measured?.expandedUncertainty ?? 0, inForce?.expandedUncertainty ?? 0);
      expect(workedOut?.expandedUncertainty).toBeCloseTo(both, 9);
    });

    it('works gains out anew when an input changes, and leaves the record of a stage that was sent', async () => {
      const started = await startedBuild(test);
      await sendSource(started);
      await settleAmplifier(started);
      await started.agent.post(started.stageAt('Source', 'withdraw')).expect(200);
      test.clock.advance(HOUR);
      const reading = { method: 'oscilloscope', entry: { ...SOURCE_ENTRY, divisionsPeakToPeak: '3.6' } };
      await started.agent.post(started.checkAt('Output level at TP1', 'readings')).send(reading).expect(201);
      const gainOf = async () => (await started.now()).stages[1]?.checks[2]?.readings.length;
      expect(await gainOf()).toBe(2);
      await started.agent.post(started.stageAt('Source', 'submit')).send({}).expect(200);
      await started.agent.post(started.stageAt('Amplifier', 'submit')).send({}).expect(200);
      await started.agent.post(started.stageAt('Source', 'withdraw')).expect(200);
      await started.agent.post(started.checkAt('Output level at TP1', 'readings')).send(reading).expect(201);
      expect(await gainOf()).toBe(2);
    });
  });

  describe('instrument', () => {
    const measured = async () => {
      const scopes = await kind(test, { name: `Scope ${Math.random()}`, needsCalibration: true });
      const started = await startedBuild(test, smallPlan({}, scopes.name));
      const keep = (instrumentId: string, takenAt?: string) =>
        started.agent
          .post(started.checkAt('Output level at TP1', 'readings'))
          .send({ method: 'oscilloscope', entry: SOURCE_ENTRY, instrumentId, takenAt });
      return { started, scopes, keep };
    };

    it('is named in the reading with its calibration as it was then', async () => {
      const { scopes, keep } = await measured();
      const scope = await instrument(test, { kindId: scopes.id, calibrationDueOn: '2026-01-15' });
      const { body } = await keep(scope.id).expect(201);
      expect(body).toMatchObject({ instrumentTag: scope.tag, calibrationDueOn: '2026-01-15' });
    });

    it('past its calibration on the day it was used is refused with the reason', async () => {
      const { scopes, keep } = await measured();
      const scope = await instrument(test, { kindId: scopes.id, calibrationDueOn: '2026-01-14' });
      const { body } = await keep(scope.id).expect(422);
      expect(body.errors).toMatchObject([{ pointer: '#/instrumentId' }]);
      expect(body.detail).toMatch(/calibration of .* ran out on 14 Jan 2026/);
    });

    it('was good on the day a reading was taken, even if it is past today', async () => {
      const { scopes, keep } = await measured();
      const scope = await instrument(test, { kindId: scopes.id, calibrationDueOn: '2026-01-15' });
      test.clock.advance(30 * HOUR);
      await keep(scope.id, new Date(TEST_NOW.getTime() + HOUR).toISOString()).expect(201);
      await keep(scope.id).expect(422);
    });

    it('in repair, of another kind, or unknown is refused', async () => {
      const { scopes, keep } = await measured();
      const broken = await instrument(test, { kindId: scopes.id, calibrationDueOn: '2027-01-01' });
      await test.dataSource.query(`UPDATE instrument SET condition = 'in repair' WHERE resource_id = $1`, [
        broken.id,
      ]);
      const meter = await instrument(test);
      for (const id of [broken.id, meter.id, '00000000-0000-4000-8000-000000000000'])
        expect((await keep(id).expect(422)).body.errors[0].pointer).toBe('#/instrumentId');
    });

    it('choices come with the reason against those that cannot be chosen', async () => {
      const { scopes, started } = await measured();
      const good = await instrument(test, { kindId: scopes.id, calibrationDueOn: '2027-01-01' });
      const past = await instrument(test, { kindId: scopes.id, calibrationDueOn: '2025-01-01' });
      const { body } = await started.agent
        .get(started.checkAt('Output level at TP1', 'instruments'))
        .expect(200);
      expect(body).toMatchObject([
        { tag: good.tag, reason: null },
        { tag: past.tag, reason: expect.stringContaining('ran out') as string },
      ]);
      const none = await started.agent.get(started.checkAt('Board cleaned', 'instruments')).expect(200);
      expect(none.body).toEqual([]);
    });
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
        'It opens when stage 2 Amplifier is signed off.',
      );
      await mentor.post(started.stageAt('Amplifier', 'sign-off')).send({}).expect(200);
      expect((await started.now()).stages[2]?.lockedBecause).toBe(
        'It opens when an organiser has seen your licence.',
      );
      const { agent: organiser } = await someoneWith(test, 'organiser');
      await organiser.post(started.at('/licence')).expect(204);
      await organiser.post(started.at('/licence')).expect(409);
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
      const own = body.items.filter(({ buildId }: { buildId: string }) =>
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
