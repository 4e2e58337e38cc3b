import type { MigrationInterface, QueryRunner } from 'typeorm';

export class BookingsClearances1700000000004 implements MigrationInterface {
  async up(queryRunner: QueryRunner): Promise<void> {
    // Lets a uuid stand beside a range in one exclusion constraint; part of PostgreSQL itself.
    await queryRunner.query(`CREATE EXTENSION IF NOT EXISTS btree_gist`);
    await queryRunner.query(
      `CREATE TABLE "booking" ("id" uuid NOT NULL DEFAULT gen_random_uuid(), "kind" text NOT NULL, "title" text NOT NULL DEFAULT '', "person_id" uuid NOT NULL, "group_id" uuid, "check_id" uuid, "starts_at" TIMESTAMP WITH TIME ZONE NOT NULL, "ends_at" TIMESTAMP WITH TIME ZONE NOT NULL, "made_at" TIMESTAMP WITH TIME ZONE NOT NULL, "cancelled_at" TIMESTAMP WITH TIME ZONE, "cancelled_by_id" uuid, CONSTRAINT "booking_night_named" CHECK (kind = 'session' OR length(btrim(title)) > 0), CONSTRAINT "booking_times_ordered" CHECK (starts_at < ends_at), CONSTRAINT "booking_kind_known" CHECK (kind IN ('session', 'build night')), CONSTRAINT "booking_pk" PRIMARY KEY ("id"))`,
    );
    await queryRunner.query(`CREATE INDEX "booking_of_person" ON "booking"("person_id", "starts_at")`);
    await queryRunner.query(`CREATE INDEX "booking_by_start" ON "booking"("starts_at")`);
    await queryRunner.query(
      `CREATE TABLE "booking_item" ("booking_id" uuid NOT NULL, "resource_id" uuid NOT NULL, "starts_at" TIMESTAMP WITH TIME ZONE NOT NULL, "ends_at" TIMESTAMP WITH TIME ZONE NOT NULL, "cancelled_at" TIMESTAMP WITH TIME ZONE, CONSTRAINT "booking_item_times_ordered" CHECK (starts_at < ends_at), CONSTRAINT "booking_no_overlap" EXCLUDE USING gist ("resource_id" WITH =, tstzrange("starts_at", "ends_at", '[)') WITH &&) WHERE ("cancelled_at" IS NULL), CONSTRAINT "booking_item_pk" PRIMARY KEY ("booking_id", "resource_id"))`,
    );
    await queryRunner.query(
      `CREATE TABLE "clearance" ("id" uuid NOT NULL DEFAULT gen_random_uuid(), "person_id" uuid NOT NULL, "kind_id" uuid NOT NULL, "granted_by_id" uuid NOT NULL, "granted_on" date NOT NULL, "until" date, "ended_at" TIMESTAMP WITH TIME ZONE, "ended_by_id" uuid, CONSTRAINT "clearance_days_ordered" CHECK (until IS NULL OR granted_on <= until), CONSTRAINT "clearance_pk" PRIMARY KEY ("id"))`,
    );
    await queryRunner.query(`CREATE INDEX "clearance_of_kind" ON "clearance"("kind_id")`);
    await queryRunner.query(
      `CREATE UNIQUE INDEX "clearance_once" ON "clearance"("person_id", "kind_id") WHERE ended_at IS NULL`,
    );
    await queryRunner.query(
      `CREATE TABLE "instrument_change" ("id" uuid NOT NULL DEFAULT gen_random_uuid(), "instrument_id" uuid NOT NULL, "changed_by_id" uuid NOT NULL, "changed_at" TIMESTAMP WITH TIME ZONE NOT NULL, "changed" text NOT NULL, "before" text, "after" text, "note" text NOT NULL DEFAULT '', CONSTRAINT "instrument_change_known" CHECK (changed IN ('condition', 'calibration')), CONSTRAINT "instrument_change_pk" PRIMARY KEY ("id"))`,
    );
    await queryRunner.query(
      `CREATE INDEX "instrument_change_of_instrument" ON "instrument_change"("instrument_id", "changed_at")`,
    );
    await queryRunner.query(
      `ALTER TABLE "booking" ADD CONSTRAINT "booking_person_exists" FOREIGN KEY ("person_id") REFERENCES "person"("id") ON DELETE NO ACTION ON UPDATE NO ACTION`,
    );
    await queryRunner.query(
      `ALTER TABLE "booking" ADD CONSTRAINT "booking_group_exists" FOREIGN KEY ("group_id") REFERENCES "build_group"("id") ON DELETE NO ACTION ON UPDATE NO ACTION`,
    );
    await queryRunner.query(
      `ALTER TABLE "booking" ADD CONSTRAINT "booking_check_exists" FOREIGN KEY ("check_id") REFERENCES "plan_check"("id") ON DELETE NO ACTION ON UPDATE NO ACTION`,
    );
    await queryRunner.query(
      `ALTER TABLE "booking" ADD CONSTRAINT "booking_canceller_exists" FOREIGN KEY ("cancelled_by_id") REFERENCES "person"("id") ON DELETE NO ACTION ON UPDATE NO ACTION`,
    );
    await queryRunner.query(
      `ALTER TABLE "booking_item" ADD CONSTRAINT "booking_item_of_booking" FOREIGN KEY ("booking_id") REFERENCES "booking"("id") ON DELETE CASCADE ON UPDATE NO ACTION`,
    );
    await queryRunner.query(
      `ALTER TABLE "booking_item" ADD CONSTRAINT "booking_item_resource_exists" FOREIGN KEY ("resource_id") REFERENCES "resource"("id") ON DELETE NO ACTION ON UPDATE NO ACTION`,
    );
    await queryRunner.query(
      `ALTER TABLE "clearance" ADD CONSTRAINT "clearance_person_exists" FOREIGN KEY ("person_id") REFERENCES "person"("id") ON DELETE NO ACTION ON UPDATE NO ACTION`,
    );
    await queryRunner.query(
      `ALTER TABLE "clearance" ADD CONSTRAINT "clearance_kind_exists" FOREIGN KEY ("kind_id") REFERENCES "instrument_kind"("id") ON DELETE NO ACTION ON UPDATE NO ACTION`,
    );
    await queryRunner.query(
      `ALTER TABLE "clearance" ADD CONSTRAINT "clearance_granter_exists" FOREIGN KEY ("granted_by_id") REFERENCES "person"("id") ON DELETE NO ACTION ON UPDATE NO ACTION`,
    );
    await queryRunner.query(
      `ALTER TABLE "clearance" ADD CONSTRAINT "clearance_ender_exists" FOREIGN KEY ("ended_by_id") REFERENCES "person"("id") ON DELETE NO ACTION ON UPDATE NO ACTION`,
    );
    await queryRunner.query(
      `ALTER TABLE "instrument_change" ADD CONSTRAINT "instrument_change_instrument_exists" FOREIGN KEY ("instrument_id") REFERENCES "instrument"("resource_id") ON DELETE NO ACTION ON UPDATE NO ACTION`,
    );
    await queryRunner.query(
      `ALTER TABLE "instrument_change" ADD CONSTRAINT "instrument_change_person_exists" FOREIGN KEY ("changed_by_id") REFERENCES "person"("id") ON DELETE NO ACTION ON UPDATE NO ACTION`,
    );
  }

  async down(queryRunner: QueryRunner): Promise<void> {
    await queryRunner.query(
      `ALTER TABLE "instrument_change" DROP CONSTRAINT "instrument_change_person_exists"`,
    );
    await queryRunner.query(
      `ALTER TABLE "instrument_change" DROP CONSTRAINT "instrument_change_instrument_exists"`,
    );
    await queryRunner.query(`ALTER TABLE "clearance" DROP CONSTRAINT "clearance_ender_exists"`);
    await queryRunner.query(`ALTER TABLE "clearance" DROP CONSTRAINT "clearance_granter_exists"`);
    await queryRunner.query(`ALTER TABLE "clearance" DROP CONSTRAINT "clearance_kind_exists"`);
    await queryRunner.query(`ALTER TABLE "clearance" DROP CONSTRAINT "clearance_person_exists"`);
    await queryRunner.query(`ALTER TABLE "booking_item" DROP CONSTRAINT "booking_item_resource_exists"`);
    await queryRunner.query(`ALTER TABLE "booking_item" DROP CONSTRAINT "booking_item_of_booking"`);
    await queryRunner.query(`ALTER TABLE "booking" DROP CONSTRAINT "booking_canceller_exists"`);
    await queryRunner.query(`ALTER TABLE "booking" DROP CONSTRAINT "booking_check_exists"`);
    await queryRunner.query(`ALTER TABLE "booking" DROP CONSTRAINT "booking_group_exists"`);
    await queryRunner.query(`ALTER TABLE "booking" DROP CONSTRAINT "booking_person_exists"`);
    await queryRunner.query(`DROP INDEX "public"."instrument_change_of_instrument"`);
    await queryRunner.query(`DROP TABLE "instrument_change"`);
    await queryRunner.query(`DROP INDEX "public"."clearance_once"`);
    await queryRunner.query(`DROP INDEX "public"."clearance_of_kind"`);
    await queryRunner.query(`DROP TABLE "clearance"`);
    await queryRunner.query(`DROP TABLE "booking_item"`);
    await queryRunner.query(`DROP INDEX "public"."booking_by_start"`);
    await queryRunner.query(`DROP INDEX "public"."booking_of_person"`);
    await queryRunner.query(`DROP TABLE "booking"`);
  }
}
