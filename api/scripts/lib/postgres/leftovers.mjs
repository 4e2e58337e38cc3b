import { createHash } from 'node:crypto';
import { readdirSync, rmSync } from 'node:fs';
import path from 'node:path';
import { commandLineOf, identityOf } from '../processes/identity.mjs';
import { shown } from '../paths.mjs';
import { PlainError } from '../say.mjs';
import { stopProcess } from '../processes/stopping.mjs';

/**
 * A name that PostgreSQL shows in the command line of each of its processes, so that those of this very folder can be
 * told from all others on the machine.
 * @param {string} folder
 */
export const nameOf = (folder) =>
  `ferrite-row-${createHash('sha256').update(folder).digest('hex').slice(0, 12)}`;

/** @param {string} folder */
export const dataIn = (folder) => path.join(folder, 'data');

/** @param {string} name */
function processesOf(name) {
  return readdirSync('/proc')
    .filter((entry) => /^\d+$/.test(entry))
    .map(Number)
    .filter((pid) => new RegExp(`cluster_name=${name}\\b|^postgres: ${name}:`).test(commandLineOf(pid)));
}

/** @param {number[]} pids @param {import('../processes/stopping.mjs').Kind} kind */
async function stopThese(pids, kind) {
  for (const pid of pids) {
    const identity = identityOf(pid);
    if (identity) await stopProcess(identity, kind);
  }
}

/**
 * Ends what still works in the folder after this script was killed: the server, or what is left of a killed server.
 * Only when nothing does is a pid file that lies there known to mean nothing.
 * @param {string} folder
 */
export async function clearCluster(folder) {
  const name = nameOf(folder);
  const isServer = (/** @type {number} */ pid) => commandLineOf(pid).includes('cluster_name=');
  await stopThese(processesOf(name).filter(isServer), 'postgres');
  await stopThese(processesOf(name), 'session');
  const left = processesOf(name);
  if (left.length > 0) {
    throw new PlainError(`PostgreSQL of ${shown(folder)} does not end: process ${left.join(', ')}.`);
  }
  rmSync(path.join(dataIn(folder), 'postmaster.pid'), { force: true });
}
