import type { MigrationInterface, QueryRunner } from 'typeorm';
import { BOOKINGS_AS_HELD, BOOKINGS_LOOSE } from './0008-what-hangs-together/bookings';
import { DROP_RECORD_RULES, RECORD_RULES } from './0008-what-hangs-together/record';

/** What is held follows its booking; the build record and the places of a night are kept in more ways than before. */
export class WhatHangsTogether1700000000008 implements MigrationInterface {
  async up(queryRunner: QueryRunner): Promise<void> {
    for (const sql of [...BOOKINGS_AS_HELD, ...RECORD_RULES]) await queryRunner.query(sql);
  }

  async down(queryRunner: QueryRunner): Promise<void> {
    for (const sql of [...DROP_RECORD_RULES, ...BOOKINGS_LOOSE]) await queryRunner.query(sql);
  }
}
