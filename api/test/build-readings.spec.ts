import type { BuildStageDto } from '../src/builds/dto/build-stage.dto';
import {
  sendSource,
  settleAmplifier,
  SOURCE_ENTRY,
  startedBuild,
  type StartedBuild,
} from './factories/build.factory';
import { someoneWith } from './factories/person.factory';
import { instrument, kind } from './factories/bench.factory';
import { smallPlan } from './factories/plan.factory';
import { startTestApp, TEST_NOW, type TestApp } from './app';

const HOUR = 3_600_000;

let test: TestApp;

beforeAll(async () => {
  test = await startTestApp();
});
beforeEach(() => test.clock.set(TEST_NOW));
afterAll(() => test.close());

describe('a reading', () => {
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
    expect((body.components as { name: string }[]).map(({ name }) => name)).toEqual([
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
    const late = await keep('3.0', new Date(TEST_NOW.getTime() + HOUR).toISOString());
    expect(late.body).toMatchObject({ verdict: 'too close to call', isSuperseded: true });
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

describe('a time at which a reading is said to have been taken', () => {
  const keepAt = (started: StartedBuild, title: string, takenAt: Date) =>
    started.agent
      .post(started.checkAt(title, 'readings'))
      .send({ method: 'oscilloscope', entry: SOURCE_ENTRY, takenAt: takenAt.toISOString() });
  const after = (milliseconds: number) => new Date(TEST_NOW.getTime() + milliseconds);

  it('lies neither before the build was begun nor in the time to come', async () => {
    const started = await startedBuild(test);
    test.clock.advance(HOUR);
    for (const takenAt of [after(-1), after(2 * HOUR)]) {
      const { body } = await keepAt(started, 'Output level at TP1', takenAt).expect(422);
      expect(body.errors).toMatchObject([{ pointer: '#/takenAt' }]);
    }
    await keepAt(started, 'Output level at TP1', after(0)).expect(201);
  });

  it('does not lie before the stage opened', async () => {
    const started = await startedBuild(test);
    test.clock.advance(HOUR);
    await sendSource(started);
    test.clock.advance(HOUR);
    const { body } = await keepAt(started, 'Output level at TP2', after(HOUR - 1)).expect(422);
    expect(body.errors).toEqual([
      { pointer: '#/takenAt', detail: 'That was before Amplifier could be begun.' },
    ]);
    await keepAt(started, 'Output level at TP2', after(HOUR)).expect(201);
  });
});

describe('what is worked out of readings that were taken again while its stage was with a mentor', () => {
  /** Both stages sent, the first sent back, mended by another level, sent again and signed off. */
  const stale = async () => {
    const started = await startedBuild(test);
    await sendSource(started);
    await settleAmplifier(started);
    await started.agent.post(started.stageAt('Amplifier', 'submit')).send({}).expect(200);
    const { agent: mentor } = await someoneWith(test, 'mentor');
    await mentor.post(started.stageAt('Source', 'send-back')).send({ note: 'Once more.' }).expect(200);
    test.clock.advance(HOUR);
    const reading = { method: 'oscilloscope', entry: { ...SOURCE_ENTRY, divisionsPeakToPeak: '3.6' } };
    const { body } = await started.agent
      .post(started.checkAt('Output level at TP1', 'readings'))
      .send(reading)
      .expect(201);
    await started.agent.post(started.stageAt('Source', 'submit')).send({}).expect(200);
    await mentor.post(started.checkAt('Looked at the joints', 'marks')).expect(201);
    await mentor.post(started.stageAt('Source', 'sign-off')).send({}).expect(200);
    return { started, mentor, again: body.value as number };
  };
  const inputOf = async ({ now }: StartedBuild) => (await now()).stages[1]?.checks[0]?.readings.at(-1)?.value;

  it('is not signed off, and the words say why', async () => {
    const { started, mentor } = await stale();
    const { body } = await mentor.post(started.stageAt('Amplifier', 'sign-off')).send({}).expect(409);
    expect(body).toMatchObject({ type: '/problems/readings-out-of-date' });
    expect(body.detail).toMatch(/^Input level at TP1 of Amplifier was worked out/);
  });

  it('is worked out anew when the stage is sent back, and signed off then', async () => {
    const { started, mentor, again } = await stale();
    await mentor.post(started.stageAt('Amplifier', 'send-back')).send({ note: 'Once more.' }).expect(200);
    expect(await inputOf(started)).toBe(again);
    await started.agent.post(started.stageAt('Amplifier', 'submit')).send({}).expect(200);
    await mentor.post(started.stageAt('Amplifier', 'sign-off')).send({}).expect(200);
  });

  it('is worked out anew when the builder takes the stage back', async () => {
    const { started, again } = await stale();
    const { body } = await started.agent.post(started.stageAt('Amplifier', 'withdraw')).expect(200);
    expect((body as BuildStageDto).checks.slice(0, 3).map(({ readings }) => readings.length)).toEqual([
      2, 1, 2,
    ]);
    expect(await inputOf(started)).toBe(again);
  });

  it('is not sent either, should a reading have come past the services', async () => {
    const started = await startedBuild(test);
    await sendSource(started);
    await settleAmplifier(started);
    await started.agent.post(started.stageAt('Source', 'withdraw')).expect(200);
    await test.dataSource.query(
      `INSERT INTO reading SELECT (jsonb_populate_record(r, jsonb_build_object('id', gen_random_uuid(),
         'sequence', nextval('reading_sequence_seq')))).* FROM reading r WHERE check_id = $1`,
      [started.check('Output level at TP1').id],
    );
    await started.agent.post(started.stageAt('Source', 'submit')).send({}).expect(200);
    const { body } = await started.agent.post(started.stageAt('Amplifier', 'submit')).send({}).expect(409);
    expect(body).toMatchObject({ type: '/problems/readings-out-of-date' });
  });
});

describe('an instrument', () => {
  const measured = async () => {
    const scopes = await kind(test, { name: `Scope ${Math.random()}`, needsCalibration: true });
    const started = await startedBuild(test, smallPlan({}, scopes.name));
    const keep = (instrumentId?: string, takenAt?: string) =>
      started.agent
        .post(started.checkAt('Output level at TP1', 'readings'))
        .send({ method: 'oscilloscope', entry: SOURCE_ENTRY, instrumentId, takenAt });
    return { started, scopes, keep };
  };

  it('is to be named where the check names its kind', async () => {
    const { keep, scopes } = await measured();
    const { body } = await keep().expect(422);
    const detail = `Choose the ${scopes.name.toLowerCase()} it was read on.`;
    expect(body.errors).toEqual([{ pointer: '#/instrumentId', detail }]);
  });

  it('is worked out with: its own limits stand in the budget, in the choice, and in what can be recomputed', async () => {
    const { started, scopes, keep } = await measured();
    const figures = { verticalGainToleranceRel: 0.01 };
    const better = await instrument(test, { kindId: scopes.id, calibrationDueOn: '2026-02-15', figures });
    const plain = await instrument(test, { kindId: scopes.id, calibrationDueOn: '2026-02-15' });
    const gainOf = async (instrumentId: string) => {
      const { body } = await keep(instrumentId).expect(201);
      return (body.components as { name: string; limit: number }[]).find(
        ({ name }) => name === 'vertical gain',
      )?.limit;
    };
    // To first order 20/ln 10 × 0.01 = 0.0869 dB; 3 % where nothing is stated.
    expect(await gainOf(better.id)).toBeCloseTo(0.0869, 3);
    expect(await gainOf(plain.id)).toBeCloseTo(0.2606, 3);
    const [kept] = await test.dataSource.query<{ inputs: object }[]>(
      'SELECT inputs FROM reading WHERE instrument_id = $1',
      [better.id],
    );
    expect(kept?.inputs).toMatchObject(figures);
    const { body } = await started.agent
      .get(started.checkAt('Output level at TP1', 'instruments'))
      .expect(200);
    expect(body).toEqual([
      expect.objectContaining({ id: better.id, figures, damageLevelDbm: null }),
      expect.objectContaining({ id: plain.id, figures: {} }),
    ]);
  });

  it('states numbers and nothing else, whoever writes them', async () => {
    const { id } = await instrument(test);
    const write = (figures: object) =>
      test.dataSource.query('UPDATE instrument SET figures = $2 WHERE resource_id = $1', [
        id,
        JSON.stringify(figures),
      ]);
    await expect(write({ timeBasePpm: 'plenty' })).rejects.toThrow('instrument_figures_numbers');
    await expect(write([1])).rejects.toThrow('instrument_figures_numbers');
    await write({ timeBasePpm: 0.5 });
  });

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

  it('is judged the same in whatever spelling its id comes', async () => {
    const { scopes, keep } = await measured();
    const past = await instrument(test, { kindId: scopes.id, calibrationDueOn: '2026-01-14' });
    const { body } = await keep(past.id.toUpperCase()).expect(422);
    expect(body.detail).toMatch(/calibration of .* ran out on 14 Jan 2026/);
    const fit = await instrument(test, { kindId: scopes.id, calibrationDueOn: '2026-01-15' });
    const kept = await keep(fit.id.toUpperCase()).expect(201);
    expect(kept.body).toMatchObject({ instrumentId: fit.id });
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
