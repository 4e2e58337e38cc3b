import { randomBytes } from 'node:crypto';
import { DataSource } from 'typeorm';
import { databaseOptions } from '../src/database/options';
import { asAdmin, templateName, urlOf } from './database';

/** Migrates the template that every spec's database is copied from. */
export default async function globalSetup(): Promise<void> {
  process.env.TZ = 'UTC';
  process.env.FERRITE_TEST_RUN = randomBytes(4).toString('hex');
  await asAdmin(`CREATE DATABASE ${templateName()}`);
  const dataSource = new DataSource(databaseOptions(urlOf(templateName())));
  await dataSource.initialize();
  await dataSource.runMigrations({ transaction: 'each' });
  await dataSource.destroy();
}
