/** As TypeORM writes them from the entities; the drift check compares the two. */
export const BUILD_TABLES = [
  `CREATE TABLE "build" (
       "id" uuid NOT NULL DEFAULT gen_random_uuid(),
       "person_id" uuid NOT NULL,
       "edition_id" uuid NOT NULL,
       "plan_id" uuid NOT NULL,
       "serial" integer NOT NULL,
       "started_at" TIMESTAMP WITH TIME ZONE NOT NULL,
       "ended_at" TIMESTAMP WITH TIME ZONE,
       "licence_seen_at" TIMESTAMP WITH TIME ZONE,
       "licence_seen_by_id" uuid,
       CONSTRAINT "build_serial_once" UNIQUE ("plan_id", "serial"),
       CONSTRAINT "build_licence_named" CHECK (
           (licence_seen_at IS NULL) = (licence_seen_by_id IS NULL)
       ),
       CONSTRAINT "build_serial_positive" CHECK (serial > 0),
       CONSTRAINT "build_pk" PRIMARY KEY ("id")
   )`,
  `CREATE UNIQUE INDEX "build_one_live" ON "build" ("person_id", "plan_id")
   WHERE ended_at IS NULL`,
  `CREATE TABLE "build_stage" (
       "build_id" uuid NOT NULL,
       "stage_id" uuid NOT NULL,
       "state" text NOT NULL DEFAULT 'not started',
       CONSTRAINT "build_stage_state_known" CHECK (
           state IN (
               'not started',
               'on the bench',
               'with mentor',
               'sent back',
               'signed off'
           )
       ),
       CONSTRAINT "build_stage_pk" PRIMARY KEY ("build_id", "stage_id")
   )`,
  `CREATE INDEX "build_stage_with_mentor" ON "build_stage" ("state")
   WHERE state = 'with mentor'`,
  `CREATE TABLE "build_stage_event" (
       "id" uuid NOT NULL DEFAULT gen_random_uuid(),
       "build_id" uuid NOT NULL,
       "stage_id" uuid NOT NULL,
       "position" integer NOT NULL,
       "kind" text NOT NULL,
       "by_person_id" uuid NOT NULL,
       "at" TIMESTAMP WITH TIME ZONE NOT NULL,
       "note" text NOT NULL DEFAULT '',
       CONSTRAINT "build_stage_event_position_once" UNIQUE ("build_id", "stage_id", "position"),
       CONSTRAINT "build_stage_event_word_given" CHECK (
           kind <> 'sent back'
           OR length(btrim(note)) > 0
       ),
       CONSTRAINT "build_stage_event_kind_known" CHECK (
           kind IN ('sent', 'withdrawn', 'sent back', 'signed off')
       ),
       CONSTRAINT "build_stage_event_pk" PRIMARY KEY ("id")
   )`,
  `CREATE INDEX "build_stage_event_latest" ON "build_stage_event" ("kind", "at")`,
  `CREATE TABLE "check_mark" (
       "id" uuid NOT NULL DEFAULT gen_random_uuid(),
       "build_id" uuid NOT NULL,
       "stage_id" uuid NOT NULL,
       "check_id" uuid NOT NULL,
       "by_person_id" uuid NOT NULL,
       "at" TIMESTAMP WITH TIME ZONE NOT NULL,
       "taken_back_at" TIMESTAMP WITH TIME ZONE,
       CONSTRAINT "check_mark_times_in_order" CHECK (
           taken_back_at IS NULL
           OR taken_back_at >= at
       ),
       CONSTRAINT "check_mark_pk" PRIMARY KEY ("id")
   )`,
  `CREATE UNIQUE INDEX "check_mark_once" ON "check_mark" ("build_id", "check_id")
   WHERE taken_back_at IS NULL`,
  `CREATE TABLE "photo" (
       "id" uuid NOT NULL DEFAULT gen_random_uuid(),
       "build_id" uuid NOT NULL,
       "stage_id" uuid NOT NULL,
       "check_id" uuid NOT NULL,
       "by_person_id" uuid NOT NULL,
       "content_type" text NOT NULL,
       "bytes" bytea NOT NULL,
       "sha256" text NOT NULL,
       "caption" text NOT NULL DEFAULT '',
       "at" TIMESTAMP WITH TIME ZONE NOT NULL,
       "taken_back_at" TIMESTAMP WITH TIME ZONE,
       CONSTRAINT "photo_size" CHECK (
           octet_length(bytes) BETWEEN 1 AND 6291456
       ),
       CONSTRAINT "photo_type_known" CHECK (
           content_type IN ('image/jpeg', 'image/png', 'image/webp')
       ),
       CONSTRAINT "photo_pk" PRIMARY KEY ("id")
   )`,
  `CREATE INDEX "photo_by_check" ON "photo" ("build_id", "check_id")`,
  `CREATE TABLE "reading" (
       "id" uuid NOT NULL DEFAULT gen_random_uuid(),
       "build_id" uuid NOT NULL,
       "stage_id" uuid NOT NULL,
       "check_id" uuid NOT NULL,
       "by_person_id" uuid NOT NULL,
       "sequence" BIGSERIAL NOT NULL,
       "method" text NOT NULL,
       "entry" jsonb NOT NULL,
       "inputs" jsonb NOT NULL,
       "from_reading_ids" uuid array NOT NULL DEFAULT '{}',
       "value" double precision NOT NULL,
       "unit" text NOT NULL,
       "uncertainty_unit" text NOT NULL,
       "standard_uncertainty" double precision NOT NULL,
       "expanded_uncertainty" double precision NOT NULL,
       "components" jsonb NOT NULL,
       "volts_peak_to_peak" double precision,
       "watts" double precision,
       "verdict" text NOT NULL,
       "calculation" text NOT NULL,
       "instrument_id" uuid,
       "instrument_tag" text,
       "calibration_due_on" date,
       "caution_acknowledged" boolean NOT NULL DEFAULT false,
       "taken_at" TIMESTAMP WITH TIME ZONE NOT NULL,
       "kept_at" TIMESTAMP WITH TIME ZONE NOT NULL,
       CONSTRAINT "reading_times_in_order" CHECK (taken_at <= kept_at),
       CONSTRAINT "reading_uncertainty_sound" CHECK (
           standard_uncertainty >= 0
           AND expanded_uncertainty >= standard_uncertainty
           AND expanded_uncertainty <= 1e15
       ),
       CONSTRAINT "reading_value_finite" CHECK (abs(value) <= 1e15),
       CONSTRAINT "reading_verdict_known" CHECK (
           verdict IN ('pass', 'too close to call', 'not yet')
       ),
       CONSTRAINT "reading_pk" PRIMARY KEY ("id")
   )`,
  `CREATE INDEX "reading_latest" ON "reading" ("build_id", "check_id", "taken_at", "sequence")`,
  `ALTER TABLE "plan_edition"
   ADD CONSTRAINT "plan_edition_of_its_plan" UNIQUE ("id", "plan_id")`,
  `ALTER TABLE "plan_check"
   ADD CONSTRAINT "plan_check_of_its_stage" UNIQUE ("id", "stage_id")`,
  `ALTER TABLE "build"
   ADD CONSTRAINT "build_of_person" FOREIGN KEY ("person_id") REFERENCES "person"("id") ON DELETE NO ACTION ON UPDATE NO ACTION`,
  `ALTER TABLE "build"
   ADD CONSTRAINT "build_to_edition" FOREIGN KEY ("edition_id", "plan_id") REFERENCES "plan_edition"("id", "plan_id") ON DELETE NO ACTION ON UPDATE NO ACTION`,
  `ALTER TABLE "build"
   ADD CONSTRAINT "build_licence_seen_by" FOREIGN KEY ("licence_seen_by_id") REFERENCES "person"("id") ON DELETE NO ACTION ON UPDATE NO ACTION`,
  `ALTER TABLE "build_stage"
   ADD CONSTRAINT "build_stage_of_build" FOREIGN KEY ("build_id") REFERENCES "build"("id") ON DELETE NO ACTION ON UPDATE NO ACTION`,
  `ALTER TABLE "build_stage"
   ADD CONSTRAINT "build_stage_of_stage" FOREIGN KEY ("stage_id") REFERENCES "stage"("id") ON DELETE NO ACTION ON UPDATE NO ACTION`,
  `ALTER TABLE "build_stage_event"
   ADD CONSTRAINT "build_stage_event_of_stage" FOREIGN KEY ("build_id", "stage_id") REFERENCES "build_stage"("build_id", "stage_id") ON DELETE NO ACTION ON UPDATE NO ACTION`,
  `ALTER TABLE "build_stage_event"
   ADD CONSTRAINT "build_stage_event_by_person" FOREIGN KEY ("by_person_id") REFERENCES "person"("id") ON DELETE NO ACTION ON UPDATE NO ACTION`,
  `ALTER TABLE "check_mark"
   ADD CONSTRAINT "check_mark_of_stage" FOREIGN KEY ("build_id", "stage_id") REFERENCES "build_stage"("build_id", "stage_id") ON DELETE NO ACTION ON UPDATE NO ACTION`,
  `ALTER TABLE "check_mark"
   ADD CONSTRAINT "check_mark_of_check" FOREIGN KEY ("check_id", "stage_id") REFERENCES "plan_check"("id", "stage_id") ON DELETE NO ACTION ON UPDATE NO ACTION`,
  `ALTER TABLE "check_mark"
   ADD CONSTRAINT "check_mark_by_person" FOREIGN KEY ("by_person_id") REFERENCES "person"("id") ON DELETE NO ACTION ON UPDATE NO ACTION`,
  `ALTER TABLE "photo"
   ADD CONSTRAINT "photo_of_stage" FOREIGN KEY ("build_id", "stage_id") REFERENCES "build_stage"("build_id", "stage_id") ON DELETE NO ACTION ON UPDATE NO ACTION`,
  `ALTER TABLE "photo"
   ADD CONSTRAINT "photo_of_check" FOREIGN KEY ("check_id", "stage_id") REFERENCES "plan_check"("id", "stage_id") ON DELETE NO ACTION ON UPDATE NO ACTION`,
  `ALTER TABLE "photo"
   ADD CONSTRAINT "photo_by_person" FOREIGN KEY ("by_person_id") REFERENCES "person"("id") ON DELETE NO ACTION ON UPDATE NO ACTION`,
  `ALTER TABLE "reading"
   ADD CONSTRAINT "reading_of_stage" FOREIGN KEY ("build_id", "stage_id") REFERENCES "build_stage"("build_id", "stage_id") ON DELETE NO ACTION ON UPDATE NO ACTION`,
  `ALTER TABLE "reading"
   ADD CONSTRAINT "reading_of_check" FOREIGN KEY ("check_id", "stage_id") REFERENCES "plan_check"("id", "stage_id") ON DELETE NO ACTION ON UPDATE NO ACTION`,
  `ALTER TABLE "reading"
   ADD CONSTRAINT "reading_by_person" FOREIGN KEY ("by_person_id") REFERENCES "person"("id") ON DELETE NO ACTION ON UPDATE NO ACTION`,
  `ALTER TABLE "reading"
   ADD CONSTRAINT "reading_with_instrument" FOREIGN KEY ("instrument_id") REFERENCES "resource"("id") ON DELETE NO ACTION ON UPDATE NO ACTION`,
];

export const DROP_BUILD_TABLES = [
  `ALTER TABLE "reading" DROP CONSTRAINT "reading_with_instrument"`,
  `ALTER TABLE "reading" DROP CONSTRAINT "reading_by_person"`,
  `ALTER TABLE "reading" DROP CONSTRAINT "reading_of_check"`,
  `ALTER TABLE "reading" DROP CONSTRAINT "reading_of_stage"`,
  `ALTER TABLE "photo" DROP CONSTRAINT "photo_by_person"`,
  `ALTER TABLE "photo" DROP CONSTRAINT "photo_of_check"`,
  `ALTER TABLE "photo" DROP CONSTRAINT "photo_of_stage"`,
  `ALTER TABLE "check_mark" DROP CONSTRAINT "check_mark_by_person"`,
  `ALTER TABLE "check_mark" DROP CONSTRAINT "check_mark_of_check"`,
  `ALTER TABLE "check_mark" DROP CONSTRAINT "check_mark_of_stage"`,
  `ALTER TABLE "build_stage_event" DROP CONSTRAINT "build_stage_event_by_person"`,
  `ALTER TABLE "build_stage_event" DROP CONSTRAINT "build_stage_event_of_stage"`,
  `ALTER TABLE "build_stage" DROP CONSTRAINT "build_stage_of_stage"`,
  `ALTER TABLE "build_stage" DROP CONSTRAINT "build_stage_of_build"`,
  `ALTER TABLE "build" DROP CONSTRAINT "build_licence_seen_by"`,
  `ALTER TABLE "build" DROP CONSTRAINT "build_to_edition"`,
  `ALTER TABLE "build" DROP CONSTRAINT "build_of_person"`,
  `ALTER TABLE "plan_check" DROP CONSTRAINT "plan_check_of_its_stage"`,
  `ALTER TABLE "plan_edition" DROP CONSTRAINT "plan_edition_of_its_plan"`,
  `DROP INDEX "public"."reading_latest"`,
  `DROP TABLE "reading"`,
  `DROP INDEX "public"."photo_by_check"`,
  `DROP TABLE "photo"`,
  `DROP INDEX "public"."check_mark_once"`,
  `DROP TABLE "check_mark"`,
  `DROP INDEX "public"."build_stage_event_latest"`,
  `DROP TABLE "build_stage_event"`,
  `DROP INDEX "public"."build_stage_with_mentor"`,
  `DROP TABLE "build_stage"`,
  `DROP INDEX "public"."build_one_live"`,
  `DROP TABLE "build"`,
];
