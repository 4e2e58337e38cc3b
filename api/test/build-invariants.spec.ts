import {
  sendSource,
  settleAmplifier,
  signOffSource,
  SOURCE_ENTRY,
  startedBuild,
  type StartedBuild,
} from './factories/build.factory';
import { person } from './factories/person.factory';
import { startTestApp, type TestApp } from './app';

/** What the database refuses by itself, tried past every service. */
describe('the database', () => {
  let test: TestApp;

  beforeAll(async () => {
    test = await startTestApp();
  });
  afterAll(() => test.close());

  const broken = (sql: string, parameters: unknown[]): Promise<string | undefined> =>
    test.dataSource.query(sql, parameters).then(
      () => undefined,
      (error: { driverError: { constraint?: string } }) => error.driverError.constraint,
    );
  const event = (started: StartedBuild, kind: string, byPersonId: string, position = 2) =>
    broken(
      `INSERT INTO build_stage_event (build_id, stage_id, position, kind, by_person_id, at, note)
       VALUES ($1, $2, $3, $4, $5, now(), 'word')`,
      [started.build.id, started.stage('Source').id, position, kind, byPersonId],
    );
  const mentorId = async () => (await person(test, { roles: ['member', 'mentor'] })).id;
  const withReading = async (): Promise<StartedBuild> => {
    const started = await startedBuild(test);
    const reading = { method: 'oscilloscope', entry: SOURCE_ENTRY };
    await started.agent.post(started.checkAt('Output level at TP1', 'readings')).send(reading).expect(201);
    return started;
  };
  /** A copy of the build's reading with some columns changed. */
  const copied = (started: StartedBuild, columns: string, parameters: unknown[] = []) =>
    broken(
      `INSERT INTO reading SELECT (jsonb_populate_record(r, jsonb_build_object('id', gen_random_uuid(), 'sequence', nextval('reading_sequence_seq')) || ${columns})).*
       FROM reading r WHERE build_id = $1 AND method = 'oscilloscope' LIMIT 1`,
      [started.build.id, ...parameters],
    );

  it('changes no reading and deletes none', async () => {
    const { build } = await withReading();
    expect(await broken('UPDATE reading SET value = 0 WHERE build_id = $1', [build.id])).toBe(
      'reading_is_fixed',
    );
    expect(await broken('DELETE FROM reading WHERE build_id = $1', [build.id])).toBe('reading_is_fixed');
  });

  it('takes no verdict that does not follow from the value and the window', async () => {
    const started = await withReading();
    expect(await copied(started, `'{}'`)).toBeUndefined();
    expect(await copied(started, `'{"value": -30}'`)).toBe('reading_verdict_follows');
    expect(await copied(started, `'{"expanded_uncertainty": 9}'`)).toBe('reading_verdict_follows');
    expect(await copied(started, `'{"value": -30, "verdict": "not yet"}'`)).toBeUndefined();
  });

  it('takes no reading in another unit, by another method, that is no number, or with less than no uncertainty', async () => {
    const started = await withReading();
    expect(await copied(started, `'{"unit": "W"}'`)).toBe('reading_suits_its_check');
    expect(await copied(started, `'{"method": "analyzer"}'`)).toBe('reading_suits_its_check');
    expect(await copied(started, `'{"value": "NaN", "verdict": "too close to call"}'`)).toMatch(/^reading_/);
    expect(await copied(started, `'{"standard_uncertainty": -1}'`)).toBe('reading_uncertainty_sound');
  });

  it('takes no reading on a check of another stage or kind', async () => {
    const started = await withReading();
    const onOther = `jsonb_build_object('check_id', $2::uuid)`;
    const gain = started.check('Gain').id;
    expect(await copied(started, onOther, [gain])).toBeDefined();
    expect(await copied(started, onOther, [started.check('Board cleaned').id])).toBe(
      'reading_suits_its_check',
    );
  });

  it('takes no reading once the stage was sent', async () => {
    const started = await startedBuild(test);
    await sendSource(started);
    expect(await copied(started, `'{}'`)).toBe('reading_while_in_hand');
  });

  it('signs nothing off by a bare change of state', async () => {
    const started = await startedBuild(test);
    await sendSource(started);
    const set = 'UPDATE build_stage SET state = $3 WHERE build_id = $1 AND stage_id = $2';
    for (const state of ['signed off', 'sent back', 'on the bench'])
      expect(await broken(set, [started.build.id, started.stage('Source').id, state])).toBe(
        'build_stage_state_has_its_event',
      );
  });

  it('lets no builder sign off, even one who is a mentor', async () => {
    const started = await startedBuild(test);
    await sendSource(started);
    await test.dataSource.query(`UPDATE person SET roles = '{member,mentor}' WHERE id = $1`, [
      started.builder.id,
    ]);
    expect(await event(started, 'signed off', started.builder.id)).toBe('build_stage_event_not_own');
    expect(await event(started, 'sent back', started.builder.id)).toBe('build_stage_event_not_own');
  });

  it('lets nobody sign off who is no mentor', async () => {
    const started = await startedBuild(test);
    await sendSource(started);
    const other = await person(test);
    expect(await event(started, 'signed off', other.id)).toBe('build_stage_event_by_mentor');
  });

  it('signs off only when each required check passes', async () => {
    const started = await startedBuild(test);
    await sendSource(started);
    const mentor = await mentorId();
    expect(await event(started, 'signed off', mentor)).toBe('build_stage_event_checks_settled');
    const seen = `INSERT INTO check_mark (build_id, stage_id, check_id, by_person_id, at) VALUES ($1, $2, $3, $4, now())`;
    const eyes = [started.build.id, started.stage('Source').id, started.check('Looked at the joints').id];
    expect(await broken(seen, [...eyes, started.builder.id])).toBe('check_mark_by_another_mentor');
    expect(await broken(seen, [...eyes, mentor])).toBeUndefined();
    expect(await event(started, 'signed off', mentor)).toBeUndefined();
  });

  it('signs off only when safety is acknowledged, though the plan does not call it required', async () => {
    const started = await startedBuild(test);
    await sendSource(started);
    await signOffSource(test, started);
    await settleAmplifier(started);
    await started.agent.delete(started.checkAt('The load was fitted', 'marks')).expect(204);
    const amplifier = started.stage('Amplifier').id;
    const add = `INSERT INTO build_stage_event (build_id, stage_id, position, kind, by_person_id, at) VALUES ($1, $2, $3, $4, $5, now())`;
    expect(await broken(add, [started.build.id, amplifier, 1, 'sent', started.builder.id])).toBeUndefined();
    expect(await broken(add, [started.build.id, amplifier, 2, 'signed off', await mentorId()])).toBe(
      'build_stage_event_checks_settled',
    );
  });

  it('moves a stage by one event at a time, in order', async () => {
    const started = await startedBuild(test);
    expect(await event(started, 'sent', started.builder.id, 1)).toBe('build_stage_event_in_order');
    await sendSource(started);
    expect(await event(started, 'sent', started.builder.id)).toBe('build_stage_event_in_order');
    expect(await event(started, 'withdrawn', await mentorId())).toBe('build_stage_event_by_builder');
    expect(await event(started, 'sent back', await mentorId(), 1)).toBe('build_stage_event_position_once');
  });

  it('asks for a word when a stage is sent back', async () => {
    const started = await startedBuild(test);
    await sendSource(started);
    const silent = `INSERT INTO build_stage_event (build_id, stage_id, position, kind, by_person_id, at, note) VALUES ($1, $2, 2, 'sent back', $3, now(), '  ')`;
    const parameters = [started.build.id, started.stage('Source').id, await mentorId()];
    expect(await broken(silent, parameters)).toBe('build_stage_event_word_given');
  });

  it('changes and deletes no event, mark or photo, but lets a mark be taken back once', async () => {
    const started = await startedBuild(test);
    await sendSource(started);
    const { id } = started.build;
    expect(await broken(`UPDATE build_stage_event SET note = '' WHERE build_id = $1`, [id])).toBe(
      'build_stage_event_is_fixed',
    );
    expect(await broken('DELETE FROM build_stage_event WHERE build_id = $1', [id])).toBe(
      'build_stage_event_is_fixed',
    );
    expect(await broken('DELETE FROM check_mark WHERE build_id = $1', [id])).toBe('check_mark_is_fixed');
    expect(await broken('DELETE FROM photo WHERE build_id = $1', [id])).toBe('photo_is_fixed');
    expect(await broken(`UPDATE photo SET caption = 'other' WHERE build_id = $1`, [id])).toMatch(/^photo_/);
    await started.agent.post(started.stageAt('Source', 'withdraw')).expect(200);
    const takeBack = `UPDATE check_mark SET taken_back_at = at - interval '1 minute' WHERE build_id = $1`;
    expect(await broken(takeBack, [id])).toBe('check_mark_times_in_order');
    const later = `UPDATE check_mark SET taken_back_at = at + interval '1 minute' WHERE build_id = $1`;
    expect(await broken(later, [id])).toBeUndefined();
    expect(await broken(later, [id])).toBe('check_mark_is_fixed');
  });

  it.each(['reading', 'build_stage_event', 'check_mark', 'photo'])('empties no record: %s', async (table) => {
    expect(await broken(`TRUNCATE ${table} CASCADE`, [])).toBe(`${table}_is_fixed`);
  });

  it('signs nothing off that was worked out of a reading taken again since', async () => {
    const started = await startedBuild(test);
    await sendSource(started);
    await settleAmplifier(started);
    await started.agent.post(started.stageAt('Source', 'withdraw')).expect(200);
    expect(await copied(started, `'{"kept_at": "2026-01-16T00:00:00Z"}'`)).toBeUndefined();
    expect(
      await broken(
        `INSERT INTO build_stage_event (build_id, stage_id, position, kind, by_person_id, at)
         VALUES ($1, $2, 1, 'sent', $3, now())`,
        [started.build.id, started.stage('Amplifier').id, started.builder.id],
      ),
    ).toBe('build_stage_event_worked_out_afresh');
  });

  it('keeps one live build for each person and plan, and a build with its builder', async () => {
    const { build, builder } = await startedBuild(test);
    const another = `INSERT INTO build (person_id, plan_id, edition_id, serial, started_at) SELECT person_id, plan_id, edition_id, 99, now() FROM build WHERE id = $1`;
    expect(await broken(another, [build.id])).toBe('build_one_live');
    expect(await broken('UPDATE build SET ended_at = now() WHERE id = $1', [build.id])).toBeUndefined();
    expect(await broken(another, [build.id])).toBeUndefined();
    const other = await person(test);
    expect(other.id).not.toBe(builder.id);
    expect(await broken('UPDATE build SET person_id = $2 WHERE id = $1', [build.id, other.id])).toBe(
      'build_stays_whose_it_is',
    );
  });

  it('lets no stage of another plan into a build', async () => {
    const [one, other] = [await startedBuild(test), await startedBuild(test)];
    const add = 'INSERT INTO build_stage (build_id, stage_id) VALUES ($1, $2)';
    expect(await broken(add, [one.build.id, other.stage('Source').id])).toBe('build_stage_of_its_edition');
  });

  it('keeps no picture over 6 MB and none of another kind', async () => {
    const started = await startedBuild(test);
    const add = `INSERT INTO photo (build_id, stage_id, check_id, by_person_id, content_type, bytes, sha256, at) VALUES ($1, $2, $3, $4, $5, $6, '', now())`;
    const at = [
      started.build.id,
      started.stage('Source').id,
      started.check('Photo of the board').id,
      started.builder.id,
    ];
    expect(await broken(add, [...at, 'image/png', Buffer.alloc(6 * 1024 * 1024 + 1)])).toBe('photo_size');
    expect(await broken(add, [...at, 'image/svg+xml', Buffer.alloc(1)])).toBe('photo_type_known');
    for (let count = 0; count < 12; count += 1)
      expect(await broken(add, [...at, 'image/png', Buffer.alloc(1)])).toBeUndefined();
    expect(await broken(add, [...at, 'image/png', Buffer.alloc(1)])).toBe('photo_no_more_than_twelve');
  });
});
