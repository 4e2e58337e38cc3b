import type { MigrationInterface, QueryRunner } from 'typeorm';

export class PlansInstrumentsGroups1700000000002 implements MigrationInterface {
  async up(queryRunner: QueryRunner): Promise<void> {
    await queryRunner.query(
      `CREATE TABLE "build_group" ("id" uuid NOT NULL DEFAULT gen_random_uuid(), "name" text NOT NULL, "about" text NOT NULL DEFAULT '', CONSTRAINT "build_group_name_once" UNIQUE ("name"), CONSTRAINT "build_group_pk" PRIMARY KEY ("id"))`,
    );
    await queryRunner.query(
      `CREATE TABLE "build_group_member" ("group_id" uuid NOT NULL, "person_id" uuid NOT NULL, CONSTRAINT "build_group_member_pk" PRIMARY KEY ("group_id", "person_id"))`,
    );
    await queryRunner.query(
      `CREATE TABLE "instrument_kind" ("id" uuid NOT NULL DEFAULT gen_random_uuid(), "name" text NOT NULL, "needs_clearance" boolean NOT NULL, "needs_calibration" boolean NOT NULL, CONSTRAINT "instrument_kind_name_once" UNIQUE ("name"), CONSTRAINT "instrument_kind_pk" PRIMARY KEY ("id"))`,
    );
    await queryRunner.query(
      `CREATE TABLE "resource" ("id" uuid NOT NULL DEFAULT gen_random_uuid(), "kind" text NOT NULL, "tag" text NOT NULL, "name" text NOT NULL, "position" integer NOT NULL DEFAULT '0', "retired_at" TIMESTAMP WITH TIME ZONE, CONSTRAINT "resource_tag_once" UNIQUE ("tag"), CONSTRAINT "resource_kind_known" CHECK (kind IN ('bench', 'instrument')), CONSTRAINT "resource_pk" PRIMARY KEY ("id"))`,
    );
    await queryRunner.query(
      `CREATE TABLE "instrument" ("resource_id" uuid NOT NULL, "kind_id" uuid NOT NULL, "condition" text NOT NULL DEFAULT 'ready', "condition_note" text NOT NULL DEFAULT '', "calibration_due_on" date, "damage_level_dbm" double precision, "amplitude_accuracy_db" double precision, CONSTRAINT "instrument_accuracy_positive" CHECK (amplitude_accuracy_db IS NULL OR amplitude_accuracy_db > 0), CONSTRAINT "instrument_condition_known" CHECK (condition IN ('ready', 'in repair', 'out of use')), CONSTRAINT "instrument_pk" PRIMARY KEY ("resource_id"))`,
    );
    await queryRunner.query(`CREATE INDEX "instrument_of_kind" ON "instrument"  ("kind_id") `);
    await queryRunner.query(
      `CREATE TABLE "plan" ("id" uuid NOT NULL DEFAULT gen_random_uuid(), "name" text NOT NULL, "summary" text NOT NULL DEFAULT '', CONSTRAINT "plan_name_once" UNIQUE ("name"), CONSTRAINT "plan_pk" PRIMARY KEY ("id"))`,
    );
    await queryRunner.query(
      `CREATE TABLE "plan_edition" ("id" uuid NOT NULL DEFAULT gen_random_uuid(), "plan_id" uuid NOT NULL, "number" integer NOT NULL, "published_at" TIMESTAMP WITH TIME ZONE, CONSTRAINT "plan_edition_number_once" UNIQUE ("plan_id", "number"), CONSTRAINT "plan_edition_number_positive" CHECK (number > 0), CONSTRAINT "plan_edition_pk" PRIMARY KEY ("id"))`,
    );
    await queryRunner.query(
      `CREATE TABLE "stage" ("id" uuid NOT NULL DEFAULT gen_random_uuid(), "edition_id" uuid NOT NULL, "position" integer NOT NULL, "name" text NOT NULL, "summary" text NOT NULL DEFAULT '', "cautions" text array NOT NULL DEFAULT '{}', CONSTRAINT "stage_position_once" UNIQUE ("edition_id", "position"), CONSTRAINT "stage_cautions_known" CHECK (cautions <@ ARRAY['load before power','hot parts','rf power','mains','rf exposure','licence needed']::text[]), CONSTRAINT "stage_position_positive" CHECK (position > 0), CONSTRAINT "stage_pk" PRIMARY KEY ("id"))`,
    );
    await queryRunner.query(
      `CREATE TABLE "level_point" ("id" uuid NOT NULL DEFAULT gen_random_uuid(), "stage_id" uuid NOT NULL, "position" integer NOT NULL, "name" text NOT NULL, "test_point" text NOT NULL, "planned_dbm" double precision NOT NULL, "tolerance_db" double precision NOT NULL, "limit_dbm" double precision, CONSTRAINT "level_point_position_once" UNIQUE ("stage_id", "position"), CONSTRAINT "level_point_limit_above_plan" CHECK (limit_dbm IS NULL OR limit_dbm > planned_dbm), CONSTRAINT "level_point_tolerance_positive" CHECK (tolerance_db > 0), CONSTRAINT "level_point_pk" PRIMARY KEY ("id"))`,
    );
    await queryRunner.query(
      `CREATE TABLE "plan_check" ("id" uuid NOT NULL DEFAULT gen_random_uuid(), "stage_id" uuid NOT NULL, "position" integer NOT NULL, "kind" text NOT NULL, "title" text NOT NULL, "instruction" text NOT NULL DEFAULT '', "is_required" boolean NOT NULL DEFAULT true, "method" text, "unit" text, "window_low" double precision, "window_high" double precision, "target" double precision, "defaults" jsonb NOT NULL DEFAULT '{}', "from_check_ids" uuid array NOT NULL DEFAULT '{}', "level_point_id" uuid, "instrument_kind_id" uuid, CONSTRAINT "plan_check_position_once" UNIQUE ("stage_id", "position"), CONSTRAINT "plan_check_window" CHECK (window_low IS NULL OR window_high IS NULL OR window_low < window_high), CONSTRAINT "plan_check_measure_complete" CHECK ((kind = 'measure') = (method IS NOT NULL AND unit IS NOT NULL)), CONSTRAINT "plan_check_kind_known" CHECK (kind IN ('tick', 'measure', 'photo', 'safety', 'mentor''s eyes')), CONSTRAINT "plan_check_pk" PRIMARY KEY ("id"))`,
    );
    await queryRunner.query(
      `ALTER TABLE "build_group_member" ADD CONSTRAINT "build_group_member_of_group" FOREIGN KEY ("group_id") REFERENCES "build_group"("id") ON DELETE CASCADE ON UPDATE NO ACTION`,
    );
    await queryRunner.query(
      `ALTER TABLE "build_group_member" ADD CONSTRAINT "build_group_member_is_person" FOREIGN KEY ("person_id") REFERENCES "person"("id") ON DELETE CASCADE ON UPDATE NO ACTION`,
    );
    await queryRunner.query(
      `ALTER TABLE "instrument" ADD CONSTRAINT "instrument_is_resource" FOREIGN KEY ("resource_id") REFERENCES "resource"("id") ON DELETE NO ACTION ON UPDATE NO ACTION`,
    );
    await queryRunner.query(
      `ALTER TABLE "instrument" ADD CONSTRAINT "instrument_kind_exists" FOREIGN KEY ("kind_id") REFERENCES "instrument_kind"("id") ON DELETE NO ACTION ON UPDATE NO ACTION`,
    );
    await queryRunner.query(
      `ALTER TABLE "plan_edition" ADD CONSTRAINT "plan_edition_of_plan" FOREIGN KEY ("plan_id") REFERENCES "plan"("id") ON DELETE NO ACTION ON UPDATE NO ACTION`,
    );
    await queryRunner.query(
      `ALTER TABLE "stage" ADD CONSTRAINT "stage_of_edition" FOREIGN KEY ("edition_id") REFERENCES "plan_edition"("id") ON DELETE NO ACTION ON UPDATE NO ACTION`,
    );
    await queryRunner.query(
      `ALTER TABLE "level_point" ADD CONSTRAINT "level_point_of_stage" FOREIGN KEY ("stage_id") REFERENCES "stage"("id") ON DELETE NO ACTION ON UPDATE NO ACTION`,
    );
    await queryRunner.query(
      `ALTER TABLE "plan_check" ADD CONSTRAINT "plan_check_of_stage" FOREIGN KEY ("stage_id") REFERENCES "stage"("id") ON DELETE NO ACTION ON UPDATE NO ACTION`,
    );
    await queryRunner.query(
      `ALTER TABLE "plan_check" ADD CONSTRAINT "plan_check_level_point_exists" FOREIGN KEY ("level_point_id") REFERENCES "level_point"("id") ON DELETE NO ACTION ON UPDATE NO ACTION`,
    );
    await queryRunner.query(
      `ALTER TABLE "plan_check" ADD CONSTRAINT "plan_check_instrument_kind_exists" FOREIGN KEY ("instrument_kind_id") REFERENCES "instrument_kind"("id") ON DELETE NO ACTION ON UPDATE NO ACTION`,
    );
  }

  async down(queryRunner: QueryRunner): Promise<void> {
    await queryRunner.query(`ALTER TABLE "plan_check" DROP CONSTRAINT "plan_check_instrument_kind_exists"`);
    await queryRunner.query(`ALTER TABLE "plan_check" DROP CONSTRAINT "plan_check_level_point_exists"`);
    await queryRunner.query(`ALTER TABLE "plan_check" DROP CONSTRAINT "plan_check_of_stage"`);
    await queryRunner.query(`ALTER TABLE "level_point" DROP CONSTRAINT "level_point_of_stage"`);
    await queryRunner.query(`ALTER TABLE "stage" DROP CONSTRAINT "stage_of_edition"`);
    await queryRunner.query(`ALTER TABLE "plan_edition" DROP CONSTRAINT "plan_edition_of_plan"`);
    await queryRunner.query(`ALTER TABLE "instrument" DROP CONSTRAINT "instrument_kind_exists"`);
    await queryRunner.query(`ALTER TABLE "instrument" DROP CONSTRAINT "instrument_is_resource"`);
    await queryRunner.query(
      `ALTER TABLE "build_group_member" DROP CONSTRAINT "build_group_member_is_person"`,
    );
    await queryRunner.query(`ALTER TABLE "build_group_member" DROP CONSTRAINT "build_group_member_of_group"`);
    await queryRunner.query(`DROP TABLE "plan_check"`);
    await queryRunner.query(`DROP TABLE "level_point"`);
    await queryRunner.query(`DROP TABLE "stage"`);
    await queryRunner.query(`DROP TABLE "plan_edition"`);
    await queryRunner.query(`DROP TABLE "plan"`);
    await queryRunner.query(`DROP INDEX "public"."instrument_of_kind"`);
    await queryRunner.query(`DROP TABLE "instrument"`);
    await queryRunner.query(`DROP TABLE "resource"`);
    await queryRunner.query(`DROP TABLE "instrument_kind"`);
    await queryRunner.query(`DROP TABLE "build_group_member"`);
    await queryRunner.query(`DROP TABLE "build_group"`);
  }
}
