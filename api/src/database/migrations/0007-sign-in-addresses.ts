import type { MigrationInterface, QueryRunner } from 'typeorm';

export class SignInAddresses1700000000007 implements MigrationInterface {
  async up(queryRunner: QueryRunner): Promise<void> {
    await queryRunner.query(
      `CREATE INDEX "sign_in_failure_from" ON "sign_in_failure"  ("address", "failed_at") `,
    );
  }

  async down(queryRunner: QueryRunner): Promise<void> {
    await queryRunner.query(`DROP INDEX "public"."sign_in_failure_from"`);
  }
}
