import { PlainError } from '../say.mjs';

/** The account the portal connects as: it owns its database and is no superuser. */
const OWNER = 'ferrite_row';

/**
 * @typedef {object} Wanted
 * @property {string} name of the database
 * @property {string} password of its owner
 */

/** @param {string} adminUrl */
async function connect(adminUrl) {
  const { default: pg } = await import('pg'); // not at the top: before the first installation there is none
  const client = new pg.Client({ connectionString: adminUrl });
  try {
    await client.connect();
    return client;
  } catch (error) {
    if (/** @type {{ code?: string }} */ (error).code !== '28P01') throw error;
    throw new PlainError(
      'The kept password does not open the database: secrets.json is not the one the data was made with.',
    );
  }
}

/**
 * Makes the owner and the database where they are missing.
 * @param {{ adminUrl: string, host: string }} cluster
 * @param {Wanted} wanted
 * @returns {Promise<string>} the address the portal uses
 */
export async function ensureDatabase(cluster, { name, password }) {
  const client = await connect(cluster.adminUrl);
  try {
    const role = await client.query('SELECT 1 FROM pg_roles WHERE rolname = $1', [OWNER]);
    if (role.rowCount === 0) {
      await client.query(`CREATE ROLE ${OWNER} LOGIN PASSWORD ${client.escapeLiteral(password)}`);
    }
    const database = await client.query('SELECT 1 FROM pg_database WHERE datname = $1', [name]);
    if (database.rowCount === 0) {
      await client.query(`CREATE DATABASE ${client.escapeIdentifier(name)} OWNER ${OWNER}`);
    }
  } finally {
    await client.end();
  }
  return `postgres://${OWNER}:${password}@${cluster.host}/${name}`;
}
