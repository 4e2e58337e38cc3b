import { readFileSync, renameSync, rmSync, writeFileSync } from 'node:fs';
import { commandLineOf, isAlive } from './identity.mjs';
import { stopProcess } from './stopping.mjs';

/**
 * A note of a process we started, kept on disk so that the next run can end it if this script is killed.
 * @typedef {import('./identity.mjs').Identity & {
 *   name: string, kind: import('./stopping.mjs').Kind, mark: string | null }} Note
 */

/** @param {string} file @param {Note[]} records */
export function saveRecords(file, records) {
  if (records.length === 0) return rmSync(file, { force: true });
  writeFileSync(`${file}.new`, JSON.stringify(records, null, 2));
  renameSync(`${file}.new`, file); // whole or not at all: we may be killed at any moment
}

/** @param {string} file @returns {Note[]} */
function readRecords(file) {
  try {
    return JSON.parse(readFileSync(file, 'utf8'));
  } catch {
    return []; // no run before this one, or it ended as it should
  }
}

/**
 * A number alone proves nothing, since the system gives it to somebody else later: the moment of starting and, where
 * we know it, the command line must agree too.
 * @param {Note} record
 */
export function isStillOurs(record) {
  return isAlive(record) && (record.mark === null || commandLineOf(record.pid).includes(record.mark));
}

/**
 * Ends what a killed run left running, last started first.
 * @param {string} file
 * @returns {Promise<string[]>} the names of what was ended
 */
export async function stopRecorded(file) {
  const left = readRecords(file).filter(isStillOurs).reverse();
  for (const record of left) await stopProcess(record, record.kind);
  rmSync(file, { force: true });
  return left.map(({ name }) => name);
}
