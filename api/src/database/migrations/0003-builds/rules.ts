/** What no program may get round, however it reaches the database. */
export const BUILD_RULES = [
  `CREATE FUNCTION broken(rule text, words text) RETURNS void LANGUAGE plpgsql AS $$
   BEGIN
     RAISE EXCEPTION '%', words USING ERRCODE = 'check_violation', CONSTRAINT = rule;
   END $$`,

  // A build stays its builder's and on its plan.
  `CREATE FUNCTION build_stays_whose_it_is() RETURNS trigger LANGUAGE plpgsql AS $$
   BEGIN
     IF (NEW.person_id, NEW.plan_id, NEW.serial) IS DISTINCT FROM (OLD.person_id, OLD.plan_id, OLD.serial) THEN
       PERFORM broken('build_stays_whose_it_is', 'A build keeps its builder, its plan and its serial.');
     END IF;
     RETURN NEW;
   END $$`,
  `CREATE TRIGGER build_stays_whose_it_is BEFORE UPDATE ON build
   FOR EACH ROW EXECUTE FUNCTION build_stays_whose_it_is()`,

  `CREATE FUNCTION build_stage_is_of_its_edition() RETURNS trigger LANGUAGE plpgsql AS $$
   BEGIN
     IF (SELECT edition_id FROM stage WHERE id = NEW.stage_id)
        IS DISTINCT FROM (SELECT edition_id FROM build WHERE id = NEW.build_id) THEN
       PERFORM broken('build_stage_of_its_edition', 'The stage is of another edition than the build.');
     END IF;
     RETURN NEW;
   END $$`,
  `CREATE TRIGGER build_stage_of_its_edition BEFORE INSERT OR UPDATE OF build_id, stage_id ON build_stage
   FOR EACH ROW EXECUTE FUNCTION build_stage_is_of_its_edition()`,

  // The record: readings and events are never changed, marks and photos can only be taken back, nothing is deleted.
  `CREATE FUNCTION record_is_fixed() RETURNS trigger LANGUAGE plpgsql AS $$
   BEGIN
     PERFORM broken(TG_TABLE_NAME || '_is_fixed', 'What is in the build record is never changed or deleted.');
     RETURN NULL;
   END $$`,
  `CREATE TRIGGER reading_is_fixed BEFORE UPDATE OR DELETE ON reading
   FOR EACH ROW EXECUTE FUNCTION record_is_fixed()`,
  `CREATE TRIGGER build_stage_event_is_fixed BEFORE UPDATE OR DELETE ON build_stage_event
   FOR EACH ROW EXECUTE FUNCTION record_is_fixed()`,
  `CREATE TRIGGER check_mark_is_kept BEFORE DELETE ON check_mark
   FOR EACH ROW EXECUTE FUNCTION record_is_fixed()`,
  `CREATE TRIGGER photo_is_kept BEFORE DELETE ON photo
   FOR EACH ROW EXECUTE FUNCTION record_is_fixed()`,
  `CREATE FUNCTION only_taken_back() RETURNS trigger LANGUAGE plpgsql AS $$
   DECLARE as_before record;
   BEGIN
     as_before := NEW;
     as_before.taken_back_at := NULL;
     IF OLD.taken_back_at IS NOT NULL OR NEW.taken_back_at IS NULL OR as_before IS DISTINCT FROM OLD THEN
       PERFORM broken(TG_TABLE_NAME || '_is_fixed', 'It can only be taken back, and only once.');
     END IF;
     RETURN NEW;
   END $$`,
  `CREATE TRIGGER check_mark_only_taken_back BEFORE UPDATE ON check_mark
   FOR EACH ROW EXECUTE FUNCTION only_taken_back()`,
  `CREATE TRIGGER photo_only_taken_back BEFORE UPDATE ON photo
   FOR EACH ROW EXECUTE FUNCTION only_taken_back()`,

  // Evidence is added and taken back while the stage is in the builder's hands; what a mentor saw, while in the mentor's.
  // The lock on the stage keeps it from being sent or signed off in the same moment.
  `CREATE FUNCTION evidence_fits_its_stage() RETURNS trigger LANGUAGE plpgsql AS $$
   DECLARE
     state_now text;
     wanted text;
     builder uuid;
   BEGIN
     SELECT state INTO state_now FROM build_stage
       WHERE build_id = NEW.build_id AND stage_id = NEW.stage_id FOR UPDATE;
     SELECT kind INTO wanted FROM plan_check WHERE id = NEW.check_id;
     SELECT person_id INTO builder FROM build WHERE id = NEW.build_id;
     IF (TG_TABLE_NAME = 'reading' AND wanted <> 'measure')
        OR (TG_TABLE_NAME = 'photo' AND wanted <> 'photo')
        OR (TG_TABLE_NAME = 'check_mark' AND wanted NOT IN ('tick', 'safety', 'mentor''s eyes')) THEN
       PERFORM broken(TG_TABLE_NAME || '_suits_its_check', 'The check asks for another kind of evidence.');
     END IF;
     IF wanted = 'mentor''s eyes' THEN
       IF state_now <> 'with mentor' THEN
         PERFORM broken(TG_TABLE_NAME || '_while_in_hand', 'The stage is not with a mentor.');
       END IF;
       IF NEW.by_person_id = builder
          OR NOT EXISTS (SELECT FROM person WHERE id = NEW.by_person_id AND 'mentor' = ANY (roles)) THEN
         PERFORM broken('check_mark_by_another_mentor', 'Only a mentor who is not the builder can say so.');
       END IF;
     ELSIF state_now NOT IN ('not started', 'on the bench', 'sent back') THEN
       PERFORM broken(TG_TABLE_NAME || '_while_in_hand', 'The stage is with a mentor or signed off.');
     ELSIF NEW.by_person_id <> builder THEN
       PERFORM broken(TG_TABLE_NAME || '_by_builder', 'Only the builder adds evidence.');
     END IF;
     RETURN NEW;
   END $$`,
  `CREATE TRIGGER reading_fits_its_stage BEFORE INSERT ON reading
   FOR EACH ROW EXECUTE FUNCTION evidence_fits_its_stage()`,
  `CREATE TRIGGER check_mark_fits_its_stage BEFORE INSERT OR UPDATE ON check_mark
   FOR EACH ROW EXECUTE FUNCTION evidence_fits_its_stage()`,
  `CREATE TRIGGER photo_fits_its_stage BEFORE INSERT OR UPDATE ON photo
   FOR EACH ROW EXECUTE FUNCTION evidence_fits_its_stage()`,

  // Value and uncertainty decide the verdict, against the window of the published check.
  `CREATE FUNCTION reading_verdict_follows() RETURNS trigger LANGUAGE plpgsql AS $$
   DECLARE
     asked plan_check;
     least double precision := NEW.value - NEW.expanded_uncertainty;
     most double precision := NEW.value + NEW.expanded_uncertainty;
     low double precision;
     high double precision;
   BEGIN
     SELECT * INTO asked FROM plan_check WHERE id = NEW.check_id;
     low := coalesce(asked.window_low, '-infinity');
     high := coalesce(asked.window_high, 'infinity');
     IF NEW.unit <> asked.unit OR NEW.method <> asked.method THEN
       PERFORM broken('reading_suits_its_check', 'The check asks for another unit or method.');
     END IF;
     IF NEW.verdict <> (CASE
          WHEN least >= low AND most <= high THEN 'pass'
          WHEN most < low OR least > high THEN 'not yet'
          ELSE 'too close to call'
        END) THEN
       PERFORM broken('reading_verdict_follows', 'The verdict does not follow from the value and the window.');
     END IF;
     RETURN NEW;
   END $$`,
  `CREATE TRIGGER reading_verdict_follows BEFORE INSERT ON reading
   FOR EACH ROW EXECUTE FUNCTION reading_verdict_follows()`,

  `CREATE FUNCTION check_is_settled(of_build uuid, of_check uuid, asked_kind text) RETURNS boolean LANGUAGE sql STABLE AS $$
     SELECT CASE asked_kind
       WHEN 'measure' THEN coalesce(
         (SELECT verdict = 'pass' FROM reading WHERE build_id = of_build AND check_id = of_check
          ORDER BY taken_at DESC, sequence DESC LIMIT 1), false)
       WHEN 'photo' THEN EXISTS (
         SELECT FROM photo WHERE build_id = of_build AND check_id = of_check AND taken_back_at IS NULL)
       ELSE EXISTS (
         SELECT FROM check_mark WHERE build_id = of_build AND check_id = of_check AND taken_back_at IS NULL)
     END
   $$`,

  // A stage moves by its events, one at a time, each from the right hands.
  `CREATE FUNCTION stage_moves_by_its_event() RETURNS trigger LANGUAGE plpgsql AS $$
   DECLARE
     state_now text;
     builder uuid;
   BEGIN
     SELECT state INTO state_now FROM build_stage
       WHERE build_id = NEW.build_id AND stage_id = NEW.stage_id FOR UPDATE;
     SELECT person_id INTO builder FROM build WHERE id = NEW.build_id;
     IF (NEW.kind = 'sent' AND state_now NOT IN ('on the bench', 'sent back'))
        OR (NEW.kind <> 'sent' AND state_now <> 'with mentor') THEN
       PERFORM broken('build_stage_event_in_order', 'The stage is not in a state for this.');
     END IF;
     IF NEW.kind IN ('sent', 'withdrawn') AND NEW.by_person_id <> builder THEN
       PERFORM broken('build_stage_event_by_builder', 'Only the builder sends a stage or takes it back.');
     END IF;
     IF NEW.kind IN ('sent back', 'signed off') THEN
       IF NEW.by_person_id = builder THEN
         PERFORM broken('build_stage_event_not_own', 'A builder does not decide on a stage of their own.');
       END IF;
       IF NOT EXISTS (SELECT FROM person WHERE id = NEW.by_person_id AND 'mentor' = ANY (roles)) THEN
         PERFORM broken('build_stage_event_by_mentor', 'Only a mentor decides on a stage.');
       END IF;
     END IF;
     IF NEW.kind = 'signed off' AND EXISTS (
       SELECT FROM plan_check c WHERE c.stage_id = NEW.stage_id AND (c.is_required OR c.kind = 'safety')
         AND NOT check_is_settled(NEW.build_id, c.id, c.kind)) THEN
       PERFORM broken('build_stage_event_checks_settled', 'A required check does not pass yet.');
     END IF;
     UPDATE build_stage SET state = CASE NEW.kind
         WHEN 'sent' THEN 'with mentor' WHEN 'withdrawn' THEN 'on the bench' ELSE NEW.kind END
       WHERE build_id = NEW.build_id AND stage_id = NEW.stage_id;
     RETURN NEW;
   END $$`,
  `CREATE TRIGGER build_stage_event_moves_stage BEFORE INSERT ON build_stage_event
   FOR EACH ROW EXECUTE FUNCTION stage_moves_by_its_event()`,

  `CREATE FUNCTION stage_state_has_its_event() RETURNS trigger LANGUAGE plpgsql AS $$
   DECLARE
     state_now text;
     last_kind text;
   BEGIN
     SELECT state INTO state_now FROM build_stage WHERE build_id = NEW.build_id AND stage_id = NEW.stage_id;
     SELECT kind INTO last_kind FROM build_stage_event
       WHERE build_id = NEW.build_id AND stage_id = NEW.stage_id ORDER BY position DESC LIMIT 1;
     IF (last_kind IS NULL AND state_now NOT IN ('not started', 'on the bench'))
        OR state_now <> (CASE last_kind
             WHEN 'sent' THEN 'with mentor' WHEN 'withdrawn' THEN 'on the bench' ELSE last_kind END) THEN
       PERFORM broken('build_stage_state_has_its_event', 'A stage changes hands only by an event that says who and when.');
     END IF;
     RETURN NULL;
   END $$`,
  `CREATE CONSTRAINT TRIGGER build_stage_state_has_its_event AFTER INSERT OR UPDATE ON build_stage
   DEFERRABLE INITIALLY DEFERRED FOR EACH ROW EXECUTE FUNCTION stage_state_has_its_event()`,
];

const TRIGGERS = [
  ['build_stage', 'build_stage_state_has_its_event'],
  ['build_stage_event', 'build_stage_event_moves_stage'],
  ['reading', 'reading_verdict_follows'],
  ['photo', 'photo_fits_its_stage'],
  ['check_mark', 'check_mark_fits_its_stage'],
  ['reading', 'reading_fits_its_stage'],
  ['photo', 'photo_only_taken_back'],
  ['check_mark', 'check_mark_only_taken_back'],
  ['photo', 'photo_is_kept'],
  ['check_mark', 'check_mark_is_kept'],
  ['build_stage_event', 'build_stage_event_is_fixed'],
  ['reading', 'reading_is_fixed'],
  ['build_stage', 'build_stage_of_its_edition'],
  ['build', 'build_stays_whose_it_is'],
];

const FUNCTIONS = [
  'stage_state_has_its_event()',
  'stage_moves_by_its_event()',
  'check_is_settled(uuid, uuid, text)',
  'reading_verdict_follows()',
  'evidence_fits_its_stage()',
  'only_taken_back()',
  'record_is_fixed()',
  'build_stage_is_of_its_edition()',
  'build_stays_whose_it_is()',
  'broken(text, text)',
];

export const DROP_BUILD_RULES = [
  ...TRIGGERS.map(([table, trigger]) => `DROP TRIGGER ${trigger} ON ${table}`),
  ...FUNCTIONS.map((name) => `DROP FUNCTION ${name}`),
];
