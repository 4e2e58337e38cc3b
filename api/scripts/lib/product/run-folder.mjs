import { accessSync, constants, mkdirSync, realpathSync } from 'node:fs';
import path from 'node:path';
import { Children } from '../processes/children.mjs';
import { LockHeld, takeLock } from '../processes/lock.mjs';
import { stopRecorded } from '../processes/records.mjs';
import { shown } from '../paths.mjs';
import { PlainError, say } from '../say.mjs';
import { keepSecrets } from './secrets.mjs';

/**
 * A folder that one run of a script has to itself: its lock, its secrets, its logs, its cluster.
 * @typedef {object} RunFolder
 * @property {string} folder
 * @property {string} logs
 * @property {string} memory of the fakes
 * @property {Children} children
 * @property {import('./secrets.mjs').Secrets} secrets
 */

export const LOCK = 'lock.json';
export const RECORDS = 'running.json';

/** @param {string} folder @returns {string} the folder's one true name, or its processes would not be known again */
function makeFolder(folder) {
  try {
    // It stays open to be walked through, for the account that PostgreSQL runs as.
    mkdirSync(folder, { recursive: true });
    accessSync(folder, constants.W_OK);
    return realpathSync(folder);
  } catch (error) {
    throw new PlainError(
      `The folder ${shown(folder)} cannot be used (${/** @type {NodeJS.ErrnoException} */ (error).code}). Run as the user ` +
        'who made it, or set FERRITE_DATA_DIR to another folder.',
    );
  }
}

/** @param {string} file @param {string} address */
function lockOrTell(file, address) {
  try {
    return takeLock(file, address);
  } catch (error) {
    if (!(error instanceof LockHeld)) throw error;
    const { note, pid } = error.holder;
    throw new PlainError(`Ferrite Row is already running at ${note} (process ${pid})`);
  }
}

/**
 * Takes the folder for this run, ends what a killed run has left going in it, and sees to it that all is stopped
 * and given back at the end.
 * @param {string} wanted
 * @param {string} address for whoever finds the folder taken
 * @param {import('../session.mjs').Session} session
 * @returns {Promise<RunFolder>}
 */
export async function openRunFolder(wanted, address, session) {
  const folder = makeFolder(wanted);
  const logs = path.join(folder, 'logs');
  const memory = path.join(folder, 'fakes');
  for (const inner of [logs, memory]) mkdirSync(inner, { recursive: true, mode: 0o700 });
  session.atEnd(lockOrTell(path.join(folder, LOCK), address));
  const records = path.join(folder, RECORDS);
  const left = await stopRecorded(records);
  if (left.length > 0) say(`Ended what an interrupted run had left going: ${left.join(', ')}.`);
  const children = new Children(records);
  session.atEnd(() => children.stopAll());
  return { folder, logs, memory, children, secrets: keepSecrets(path.join(folder, 'secrets.json')) };
}
