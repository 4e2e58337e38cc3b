import type { MigrationInterface, QueryRunner } from 'typeorm';

/** What an instrument's sheet says that readings are worked out with. */
export class InstrumentFigures1700000000012 implements MigrationInterface {
  async up(queryRunner: QueryRunner): Promise<void> {
    await queryRunner.query(`ALTER TABLE "instrument" ADD "figures" jsonb NOT NULL DEFAULT '{}'`);
    await queryRunner.query(
      `ALTER TABLE "instrument" ADD CONSTRAINT "instrument_figures_numbers" CHECK (jsonb_typeof(figures) = 'object' AND NOT jsonb_path_exists(figures, '$.* ? (@.type() != "number")'))`,
    );
  }

  async down(queryRunner: QueryRunner): Promise<void> {
    await queryRunner.query(`ALTER TABLE "instrument" DROP COLUMN "figures"`);
  }
}
