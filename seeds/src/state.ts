import type { ServiceContext } from '@ferrite-row/api/context';

type Database = ServiceContext['database'];

export type ClubState = 'empty' | 'half seeded' | 'inhabited';

/** Stands in the database from the first row of a seeding to its last, and outlives a process that is stopped between. */
const MARKER = 'demo_seeding';

/** Half seeded is only what says so itself; and whoever is no demo person was not seeded, whatever is said. */
export async function stateOfClub(database: Database): Promise<ClubState> {
  const [found] = await database.query<{ people: number; strangers: number; marked: boolean }[]>(
    `SELECT count(*)::int AS people, (count(*) FILTER (WHERE email NOT LIKE '%@larkmoor.example'))::int AS strangers,
            to_regnamespace('${MARKER}') IS NOT NULL AS marked
     FROM person`,
  );
  if (found?.marked && found.strangers === 0) return 'half seeded';
  return !found || found.people === 0 ? 'empty' : 'inhabited';
}

export async function beginSeeding(database: Database): Promise<void> {
  await database.query(`CREATE SCHEMA IF NOT EXISTS ${MARKER}`);
}

export async function endSeeding(database: Database): Promise<void> {
  await database.query(`DROP SCHEMA ${MARKER}`);
}

/**
 * Throws away a seeding that was cut short and lays the schema anew: the ledger's own rules let nobody empty it, and that
 * is right. Only ever called on a database that is marked, without a stranger in it.
 */
export async function wipe(database: Database): Promise<void> {
  await database.query('DROP SCHEMA public CASCADE');
  await database.query('CREATE SCHEMA public');
  await database.runMigrations({ transaction: 'each' });
}
