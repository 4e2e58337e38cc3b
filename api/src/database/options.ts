import type { DataSourceOptions } from 'typeorm';
import { entities } from './entities';
import * as migrations from './migrations/index';
import { SnakeNaming } from './naming';

/** How every program of ours reaches PostgreSQL. Migrations are the only source of the schema. */
export function databaseOptions(url: string, poolSize = 10, waitSeconds = 20): DataSourceOptions {
  return {
    type: 'postgres',
    url,
    poolSize,
    // Somebody who waits longer for a free connection is told so; waiting without end would hang the whole process.
    connectTimeoutMS: waitSeconds * 1000,
    entities,
    migrations: Object.values(migrations),
    migrationsTableName: 'migration',
    namingStrategy: new SnakeNaming(),
    synchronize: false,
    // Core PostgreSQL makes uuids; no extension has to be installed for them.
    uuidExtension: 'pgcrypto',
    installExtensions: false,
    invalidWhereValuesBehavior: { null: 'throw', undefined: 'throw' },
    extra: { options: '-c timezone=UTC -c lock_timeout=10000', application_name: 'ferrite-row' },
  };
}
