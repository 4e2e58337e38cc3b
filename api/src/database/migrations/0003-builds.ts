import type { MigrationInterface, QueryRunner } from 'typeorm';
import { BUILD_TABLES, DROP_BUILD_TABLES } from './0003-builds/tables';
import { BUILD_RULES, DROP_BUILD_RULES } from './0003-builds/rules';
import { DROP_PUBLISHED_RULES, PUBLISHED_RULES } from './0003-builds/published';

/** Builds and what is done to them; published editions become fixed; the rules that no program can get round. */
export class Builds1700000000003 implements MigrationInterface {
  async up(queryRunner: QueryRunner): Promise<void> {
    for (const sql of [...PUBLISHED_RULES, ...BUILD_TABLES, ...BUILD_RULES]) await queryRunner.query(sql);
  }

  async down(queryRunner: QueryRunner): Promise<void> {
    for (const sql of [...DROP_BUILD_RULES, ...DROP_BUILD_TABLES, ...DROP_PUBLISHED_RULES])
      await queryRunner.query(sql);
  }
}
