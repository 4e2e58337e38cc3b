import { randomBytes } from 'node:crypto';
import { existsSync, readFileSync, renameSync, writeFileSync } from 'node:fs';
import { shown } from '../paths.mjs';
import { PlainError } from '../say.mjs';

// Letters, digits, '-' and '_' only: they stand in addresses and in SQL as they are.
const random = () => randomBytes(32).toString('base64url');

/** @returns {Secrets} */
const fresh = () => ({
  databaseAdmin: random(),
  database: random(),
  signIn: random(),
  cards: `sk_test_${random()}`,
  cardEvents: `whsec_${random()}`,
});

/**
 * @typedef {object} Secrets
 * @property {string} databaseAdmin password of the cluster's superuser
 * @property {string} database password of the portal's database account
 * @property {string} signIn signs the sign-in tokens; changing it signs everybody out
 * @property {string} cards key the portal shows to the stand-in card service
 * @property {string} cardEvents signs what the stand-in card service reports
 */

/** @param {string} file */
function read(file) {
  if (!existsSync(file)) return {};
  try {
    return JSON.parse(readFileSync(file, 'utf8'));
  } catch {
    // Making new ones would lock the owner out of the data without a word.
    throw new PlainError(
      `${shown(file)} cannot be read. Put back a copy, or move the whole data folder away to begin anew.`,
    );
  }
}

/**
 * Secrets of one data folder: made by chance the first time, kept for its owner's eyes, the same ever after.
 * @param {string} file
 * @returns {Secrets}
 */
export function keepSecrets(file) {
  const kept = read(file);
  const secrets = { ...fresh(), ...kept };
  if (Object.keys(kept).length !== Object.keys(secrets).length) {
    writeFileSync(`${file}.new`, JSON.stringify(secrets, null, 2), { mode: 0o600 });
    renameSync(`${file}.new`, file);
  }
  return secrets;
}
