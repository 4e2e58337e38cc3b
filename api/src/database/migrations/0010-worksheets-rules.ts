import type { MigrationInterface, QueryRunner } from 'typeorm';

/** Calculations put on builds, and the club's choice of rules for what may be sent. */
export class WorksheetsRules1700000000010 implements MigrationInterface {
  async up(queryRunner: QueryRunner): Promise<void> {
    await queryRunner.query(
      `CREATE TABLE "worksheet" ("id" uuid NOT NULL DEFAULT gen_random_uuid(), "build_id" uuid NOT NULL, "stage_id" uuid NOT NULL, "family" text NOT NULL, "inputs" text NOT NULL, "result" text NOT NULL, "at" TIMESTAMP WITH TIME ZONE NOT NULL, "taken_back_at" TIMESTAMP WITH TIME ZONE, CONSTRAINT "worksheet_result_present" CHECK (length(btrim(result)) > 0), CONSTRAINT "worksheet_family_known" CHECK (family IN ('conversions', 'readings', 'mixing', 'pads', 'chain', 'filters', 'matching', 'guards')), CONSTRAINT "worksheet_pk" PRIMARY KEY ("id"))`,
    );
    await queryRunner.query(`CREATE INDEX "worksheet_of_stage" ON "worksheet"("build_id", "stage_id", "at")`);
    await queryRunner.query(
      `ALTER TABLE "worksheet" ADD CONSTRAINT "worksheet_of_build_stage" FOREIGN KEY ("build_id", "stage_id") REFERENCES "build_stage"("build_id","stage_id") ON DELETE NO ACTION ON UPDATE NO ACTION`,
    );
    await queryRunner.query(`ALTER TABLE "club" ADD "rule_set" text NOT NULL DEFAULT 'IARU-R1'`);
    await queryRunner.query(
      `ALTER TABLE "club" ADD CONSTRAINT "club_rule_set_known" CHECK (rule_set IN ('US-97', 'IARU-R1'))`,
    );
  }

  async down(queryRunner: QueryRunner): Promise<void> {
    await queryRunner.query(`ALTER TABLE "club" DROP COLUMN "rule_set"`);
    await queryRunner.query(`DROP TABLE "worksheet"`);
  }
}
