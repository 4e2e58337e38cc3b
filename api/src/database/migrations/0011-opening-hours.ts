import type { MigrationInterface, QueryRunner } from 'typeorm';

/** When the workshop is open. A club that gives no hours has no rows. */
export class OpeningHours1700000000011 implements MigrationInterface {
  async up(queryRunner: QueryRunner): Promise<void> {
    await queryRunner.query(
      `CREATE TABLE "opening_hours" ("weekday" smallint NOT NULL, "opens_minute" smallint NOT NULL, "closes_minute" smallint NOT NULL, CONSTRAINT "opening_hours_in_order" CHECK (opens_minute >= 0 AND opens_minute < closes_minute AND closes_minute <= 1440), CONSTRAINT "opening_hours_weekday_known" CHECK (weekday BETWEEN 1 AND 7), CONSTRAINT "opening_hours_pk" PRIMARY KEY ("weekday"))`,
    );
  }

  async down(queryRunner: QueryRunner): Promise<void> {
    await queryRunner.query(`DROP TABLE "opening_hours"`);
  }
}
