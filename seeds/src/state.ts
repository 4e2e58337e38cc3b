import type { ServiceContext } from '@ferrite-row/api/context';
import { CLUB } from './club';

export type ClubState = 'empty' | 'half seeded' | 'inhabited';

/** The club's name is written last, so a database with demo people and another name is a seeding that was cut short. */
export async function stateOfClub({ database }: ServiceContext): Promise<ClubState> {
  const [found] = await database.query<{ people: number; strangers: number; name: string }[]>(
    `SELECT count(*)::int AS people, (count(*) FILTER (WHERE email NOT LIKE '%@larkmoor.example'))::int AS strangers,
            (SELECT name FROM club) AS name
     FROM person`,
  );
  if (!found || found.people === 0) return 'empty';
  return found.strangers === 0 && found.name !== CLUB.name ? 'half seeded' : 'inhabited';
}

/** Empties every table of a seeding that was cut short. Only ever called on a database without a stranger in it. */
export async function wipe({ database }: ServiceContext): Promise<void> {
  const tables = database.entityMetadatas
    .map(({ tableName }) => tableName)
    .filter((table) => table !== 'club');
  await database.query(`TRUNCATE ${tables.map((table) => `"${table}"`).join(', ')} RESTART IDENTITY CASCADE`);
}
