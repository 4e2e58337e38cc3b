import type { MigrationInterface, QueryRunner } from 'typeorm';

/**
 * Looked at when a transaction ends, with the night's row locked so that no other can change the count meanwhile:
 * as many come as there are places, nobody waits beside a free place, nobody overtakes.
 */
const KEEP_PLACES = `
  CREATE FUNCTION build_night_place_kept() RETURNS trigger LANGUAGE plpgsql AS $$
  DECLARE
    -- The argument names the column that holds the night's id in the watched table.
    night uuid := (to_jsonb(coalesce(NEW, OLD)) ->> TG_ARGV[0])::uuid;
    offered integer;
    kept record;
  BEGIN
    SELECT places INTO offered FROM build_night WHERE id = night FOR NO KEY UPDATE;
    SELECT count(*) FILTER (WHERE state = 'coming') AS coming,
           count(*) FILTER (WHERE state = 'waiting') AS waiting,
           max(turn) FILTER (WHERE state = 'coming') AS last_coming,
           min(turn) FILTER (WHERE state = 'waiting') AS first_waiting
      INTO kept FROM build_night_place WHERE night_id = night;
    IF kept.coming > offered THEN
      RAISE EXCEPTION 'more are coming than there are places' USING ERRCODE = 'check_violation', CONSTRAINT = 'build_night_place_kept', TABLE = 'build_night_place';
    END IF;
    IF kept.waiting > 0 AND (kept.coming < offered OR kept.last_coming > kept.first_waiting) THEN
      RAISE EXCEPTION 'somebody waits out of turn' USING ERRCODE = 'check_violation', CONSTRAINT = 'build_night_place_in_turn', TABLE = 'build_night_place';
    END IF;
    RETURN NULL;
  END $$`;

const WATCH_PLACES = `
  CREATE CONSTRAINT TRIGGER build_night_place_kept AFTER INSERT OR UPDATE OR DELETE ON build_night_place
  DEFERRABLE INITIALLY DEFERRED FOR EACH ROW EXECUTE FUNCTION build_night_place_kept('night_id')`;

const WATCH_OFFER = `
  CREATE CONSTRAINT TRIGGER build_night_place_kept AFTER UPDATE OF places ON build_night
  DEFERRABLE INITIALLY DEFERRED FOR EACH ROW EXECUTE FUNCTION build_night_place_kept('id')`;

export class BuildNights1700000000005 implements MigrationInterface {
  async up(queryRunner: QueryRunner): Promise<void> {
    await queryRunner.query(
      `CREATE TABLE "build_night_series" ("id" uuid NOT NULL DEFAULT gen_random_uuid(), "title" text NOT NULL, "rule" text NOT NULL, "made_by_id" uuid NOT NULL, "made_at" TIMESTAMP WITH TIME ZONE NOT NULL, CONSTRAINT "build_night_series_title_present" CHECK (length(btrim(title)) > 0), CONSTRAINT "build_night_series_pk" PRIMARY KEY ("id"))`,
    );
    await queryRunner.query(
      `CREATE TABLE "build_night" ("id" uuid NOT NULL DEFAULT gen_random_uuid(), "series_id" uuid, "number" integer, "title" text NOT NULL, "starts_at" TIMESTAMP WITH TIME ZONE NOT NULL, "ends_at" TIMESTAMP WITH TIME ZONE NOT NULL, "places" integer NOT NULL, "note" text NOT NULL DEFAULT '', "booking_id" uuid, "made_by_id" uuid NOT NULL, "made_at" TIMESTAMP WITH TIME ZONE NOT NULL, "cancelled_at" TIMESTAMP WITH TIME ZONE, "cancelled_reason" text, CONSTRAINT "build_night_booking_once" UNIQUE ("booking_id"), CONSTRAINT "build_night_number_once" UNIQUE ("series_id", "number"), CONSTRAINT "build_night_times" UNIQUE ("id", "starts_at", "ends_at"), CONSTRAINT "build_night_cancelled_with_word" CHECK ((cancelled_at IS NULL) = (cancelled_reason IS NULL)), CONSTRAINT "build_night_numbered_in_series" CHECK ((series_id IS NULL) = (number IS NULL)), CONSTRAINT "build_night_title_present" CHECK (length(btrim(title)) > 0), CONSTRAINT "build_night_places_some" CHECK (places BETWEEN 1 AND 100), CONSTRAINT "build_night_ends_after_start" CHECK (ends_at > starts_at), CONSTRAINT "build_night_pk" PRIMARY KEY ("id"))`,
    );
    await queryRunner.query(`CREATE INDEX "build_night_starts" ON "build_night" ("starts_at")`);
    await queryRunner.query(
      `CREATE TABLE "build_night_bench" ("night_id" uuid NOT NULL, "resource_id" uuid NOT NULL, CONSTRAINT "build_night_bench_pk" PRIMARY KEY ("night_id", "resource_id"))`,
    );
    await queryRunner.query(
      `CREATE INDEX "build_night_bench_resource" ON "build_night_bench" ("resource_id")`,
    );
    await queryRunner.query(
      `CREATE TABLE "build_night_mentor" ("night_id" uuid NOT NULL, "person_id" uuid NOT NULL, "starts_at" TIMESTAMP WITH TIME ZONE NOT NULL, "ends_at" TIMESTAMP WITH TIME ZONE NOT NULL, "released_at" TIMESTAMP WITH TIME ZONE, CONSTRAINT "build_night_mentor_on_one_duty" EXCLUDE USING gist (person_id WITH =, tstzrange(starts_at, ends_at) WITH &&) WHERE (released_at IS NULL), CONSTRAINT "build_night_mentor_pk" PRIMARY KEY ("night_id", "person_id"))`,
    );
    await queryRunner.query(
      `CREATE TABLE "build_night_place" ("night_id" uuid NOT NULL, "person_id" uuid NOT NULL, "state" text NOT NULL, "turn" integer NOT NULL, "said_at" TIMESTAMP WITH TIME ZONE NOT NULL, CONSTRAINT "build_night_place_turn_once" UNIQUE ("night_id", "turn"), CONSTRAINT "build_night_place_turn_positive" CHECK (turn > 0), CONSTRAINT "build_night_place_state_known" CHECK (state IN ('coming', 'waiting')), CONSTRAINT "build_night_place_pk" PRIMARY KEY ("night_id", "person_id"))`,
    );
    await queryRunner.query(
      `CREATE TABLE "build_night_stage" ("night_id" uuid NOT NULL, "stage_id" uuid NOT NULL, CONSTRAINT "build_night_stage_pk" PRIMARY KEY ("night_id", "stage_id"))`,
    );
    await queryRunner.query(
      `ALTER TABLE "build_night_series" ADD CONSTRAINT "build_night_series_made_by_person" FOREIGN KEY ("made_by_id") REFERENCES "person"("id") ON DELETE NO ACTION ON UPDATE NO ACTION`,
    );
    await queryRunner.query(
      `ALTER TABLE "build_night" ADD CONSTRAINT "build_night_of_series" FOREIGN KEY ("series_id") REFERENCES "build_night_series"("id") ON DELETE NO ACTION ON UPDATE NO ACTION`,
    );
    await queryRunner.query(
      `ALTER TABLE "build_night" ADD CONSTRAINT "build_night_holds_booking" FOREIGN KEY ("booking_id") REFERENCES "booking"("id") ON DELETE NO ACTION ON UPDATE NO ACTION`,
    );
    await queryRunner.query(
      `ALTER TABLE "build_night" ADD CONSTRAINT "build_night_made_by_person" FOREIGN KEY ("made_by_id") REFERENCES "person"("id") ON DELETE NO ACTION ON UPDATE NO ACTION`,
    );
    await queryRunner.query(
      `ALTER TABLE "build_night_bench" ADD CONSTRAINT "build_night_bench_of_night" FOREIGN KEY ("night_id") REFERENCES "build_night"("id") ON DELETE NO ACTION ON UPDATE NO ACTION`,
    );
    await queryRunner.query(
      `ALTER TABLE "build_night_bench" ADD CONSTRAINT "build_night_bench_is_resource" FOREIGN KEY ("resource_id") REFERENCES "resource"("id") ON DELETE NO ACTION ON UPDATE NO ACTION`,
    );
    await queryRunner.query(
      `ALTER TABLE "build_night_mentor" ADD CONSTRAINT "build_night_mentor_of_night" FOREIGN KEY ("night_id", "starts_at", "ends_at") REFERENCES "build_night"("id", "starts_at", "ends_at") ON DELETE NO ACTION ON UPDATE CASCADE`,
    );
    await queryRunner.query(
      `ALTER TABLE "build_night_mentor" ADD CONSTRAINT "build_night_mentor_is_person" FOREIGN KEY ("person_id") REFERENCES "person"("id") ON DELETE NO ACTION ON UPDATE NO ACTION`,
    );
    await queryRunner.query(
      `ALTER TABLE "build_night_place" ADD CONSTRAINT "build_night_place_of_night" FOREIGN KEY ("night_id") REFERENCES "build_night"("id") ON DELETE NO ACTION ON UPDATE NO ACTION`,
    );
    await queryRunner.query(
      `ALTER TABLE "build_night_place" ADD CONSTRAINT "build_night_place_of_person" FOREIGN KEY ("person_id") REFERENCES "person"("id") ON DELETE NO ACTION ON UPDATE NO ACTION`,
    );
    await queryRunner.query(
      `ALTER TABLE "build_night_stage" ADD CONSTRAINT "build_night_stage_of_night" FOREIGN KEY ("night_id") REFERENCES "build_night"("id") ON DELETE NO ACTION ON UPDATE NO ACTION`,
    );
    await queryRunner.query(
      `ALTER TABLE "build_night_stage" ADD CONSTRAINT "build_night_stage_exists" FOREIGN KEY ("stage_id") REFERENCES "stage"("id") ON DELETE NO ACTION ON UPDATE NO ACTION`,
    );
    await queryRunner.query(KEEP_PLACES);
    await queryRunner.query(WATCH_PLACES);
    await queryRunner.query(WATCH_OFFER);
  }

  async down(queryRunner: QueryRunner): Promise<void> {
    await queryRunner.query(`DROP TRIGGER build_night_place_kept ON build_night`);
    await queryRunner.query(`DROP TRIGGER build_night_place_kept ON build_night_place`);
    await queryRunner.query(`DROP FUNCTION build_night_place_kept()`);
    await queryRunner.query(`ALTER TABLE "build_night_stage" DROP CONSTRAINT "build_night_stage_exists"`);
    await queryRunner.query(`ALTER TABLE "build_night_stage" DROP CONSTRAINT "build_night_stage_of_night"`);
    await queryRunner.query(`ALTER TABLE "build_night_place" DROP CONSTRAINT "build_night_place_of_person"`);
    await queryRunner.query(`ALTER TABLE "build_night_place" DROP CONSTRAINT "build_night_place_of_night"`);
    await queryRunner.query(
      `ALTER TABLE "build_night_mentor" DROP CONSTRAINT "build_night_mentor_is_person"`,
    );
    await queryRunner.query(`ALTER TABLE "build_night_mentor" DROP CONSTRAINT "build_night_mentor_of_night"`);
    await queryRunner.query(
      `ALTER TABLE "build_night_bench" DROP CONSTRAINT "build_night_bench_is_resource"`,
    );
    await queryRunner.query(`ALTER TABLE "build_night_bench" DROP CONSTRAINT "build_night_bench_of_night"`);
    await queryRunner.query(`ALTER TABLE "build_night" DROP CONSTRAINT "build_night_holds_booking"`);
    await queryRunner.query(`ALTER TABLE "build_night" DROP CONSTRAINT "build_night_made_by_person"`);
    await queryRunner.query(`ALTER TABLE "build_night" DROP CONSTRAINT "build_night_of_series"`);
    await queryRunner.query(
      `ALTER TABLE "build_night_series" DROP CONSTRAINT "build_night_series_made_by_person"`,
    );
    await queryRunner.query(`DROP TABLE "build_night_stage"`);
    await queryRunner.query(`DROP TABLE "build_night_place"`);
    await queryRunner.query(`DROP TABLE "build_night_mentor"`);
    await queryRunner.query(`DROP INDEX "public"."build_night_bench_resource"`);
    await queryRunner.query(`DROP TABLE "build_night_bench"`);
    await queryRunner.query(`DROP INDEX "public"."build_night_starts"`);
    await queryRunner.query(`DROP TABLE "build_night"`);
    await queryRunner.query(`DROP TABLE "build_night_series"`);
  }
}
