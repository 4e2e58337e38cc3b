import type { ServiceContext } from '@ferrite-row/api/context';
import { CLUB } from './club';

type Database = ServiceContext['database'];

export type ClubState = 'empty' | 'half seeded' | 'inhabited';

/** The club's own address is written last, so demo people without it are a seeding that was cut short. */
export async function stateOfClub(database: Database): Promise<ClubState> {
  const [found] = await database.query<{ people: number; strangers: number; contact: string }[]>(
    `SELECT count(*)::int AS people, (count(*) FILTER (WHERE email NOT LIKE '%@larkmoor.example'))::int AS strangers,
            (SELECT contact_email FROM club) AS contact
     FROM person`,
  );
  if (!found || found.people === 0) return 'empty';
  return found.strangers === 0 && found.contact !== CLUB.contactEmail ? 'half seeded' : 'inhabited';
}

/**
 * Throws away a seeding that was cut short and lays the schema anew: the ledger's own rules let nobody empty it, and that
 * is right. Only ever called on a database without a stranger in it.
 */
export async function wipe(database: Database): Promise<void> {
  await database.query('DROP SCHEMA public CASCADE');
  await database.query('CREATE SCHEMA public');
  await database.runMigrations({ transaction: 'each' });
}
