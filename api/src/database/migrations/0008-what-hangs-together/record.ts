const RECORD = ['reading', 'build_stage_event', 'check_mark', 'photo'];

export const RECORD_RULES: readonly string[] = [
  // Nobody empties the build record either.
  ...RECORD.map(
    (table) => `CREATE TRIGGER ${table}_never_emptied BEFORE TRUNCATE ON ${table}
   FOR EACH STATEMENT EXECUTE FUNCTION record_is_fixed()`,
  ),

  // A value that works itself out counts while the readings it was made of are in force.
  `CREATE FUNCTION stage_is_worked_out_afresh() RETURNS trigger LANGUAGE plpgsql AS $$
   BEGIN
     IF EXISTS (
       WITH in_force AS (
         SELECT DISTINCT ON (check_id) id, stage_id, from_reading_ids FROM reading
         WHERE build_id = NEW.build_id ORDER BY check_id, taken_at DESC, sequence DESC)
       SELECT FROM in_force made, unnest(made.from_reading_ids) AS source(id)
       WHERE made.stage_id = NEW.stage_id AND source.id NOT IN (SELECT id FROM in_force)) THEN
       PERFORM broken('build_stage_event_worked_out_afresh', 'A reading that another was made of was taken again.');
     END IF;
     RETURN NEW;
   END $$`,
  `CREATE TRIGGER build_stage_event_worked_out_afresh BEFORE INSERT ON build_stage_event
   FOR EACH ROW WHEN (NEW.kind IN ('sent', 'signed off')) EXECUTE FUNCTION stage_is_worked_out_afresh()`,

  // Pictures lie in the database, so there is an end to them. Counted after photo_fits_its_stage has locked the stage:
  // triggers fire in the order of their names.
  `CREATE FUNCTION photo_no_more_than_twelve() RETURNS trigger LANGUAGE plpgsql AS $$
   BEGIN
     IF (SELECT count(*) FROM photo
         WHERE build_id = NEW.build_id AND check_id = NEW.check_id AND taken_back_at IS NULL) >= 12 THEN
       PERFORM broken('photo_no_more_than_twelve', 'A check has at most twelve photos.');
     END IF;
     RETURN NEW;
   END $$`,
  `CREATE TRIGGER photo_no_more_than_twelve BEFORE INSERT ON photo
   FOR EACH ROW EXECUTE FUNCTION photo_no_more_than_twelve()`,

  // The lock on the night keeps it from being cancelled in the same moment.
  `CREATE FUNCTION build_night_place_not_cancelled() RETURNS trigger LANGUAGE plpgsql AS $$
   DECLARE cancelled timestamptz;
   BEGIN
     SELECT cancelled_at INTO cancelled FROM build_night WHERE id = NEW.night_id FOR NO KEY UPDATE;
     IF cancelled IS NOT NULL THEN
       PERFORM broken('build_night_place_not_cancelled', 'Nobody takes a place on a cancelled night.');
     END IF;
     RETURN NEW;
   END $$`,
  `CREATE TRIGGER build_night_place_not_cancelled BEFORE INSERT OR UPDATE ON build_night_place
   FOR EACH ROW EXECUTE FUNCTION build_night_place_not_cancelled()`,
];

export const DROP_RECORD_RULES: readonly string[] = [
  `DROP TRIGGER build_night_place_not_cancelled ON build_night_place`,
  `DROP FUNCTION build_night_place_not_cancelled()`,
  `DROP TRIGGER photo_no_more_than_twelve ON photo`,
  `DROP FUNCTION photo_no_more_than_twelve()`,
  `DROP TRIGGER build_stage_event_worked_out_afresh ON build_stage_event`,
  `DROP FUNCTION stage_is_worked_out_afresh()`,
  ...RECORD.map((table) => `DROP TRIGGER ${table}_never_emptied ON ${table}`),
];
