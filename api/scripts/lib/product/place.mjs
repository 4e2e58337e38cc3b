import path from 'node:path';
import { startCluster } from '../postgres/cluster.mjs';
import { ensureDatabase } from '../postgres/databases.mjs';
import { freePorts } from '../processes/ports.mjs';

/** @param {string} folder of a run */
export const clusterFolder = (folder) => path.join(folder, 'pg');

/**
 * The cluster of a run folder.
 * @param {import('./run-folder.mjs').RunFolder} run
 * @param {boolean} isThrowAway
 * @param {AbortSignal} signal
 */
export function clusterOf({ folder, logs, children, secrets }, isThrowAway, signal) {
  return startCluster({
    folder: clusterFolder(folder),
    log: path.join(logs, 'postgres.log'),
    password: secrets.databaseAdmin,
    isThrowAway,
    children,
    signal,
  });
}

/**
 * Where the product of a data folder lives: its database, started if it is ours, and its ports.
 * @param {import('./run-folder.mjs').RunFolder} run
 * @param {import('./settings.mjs').Settings} settings
 * @param {AbortSignal} signal
 * @returns {Promise<import('./product.mjs').Place>}
 */
export async function openPlace(run, settings, signal) {
  const { logs, memory, secrets } = run;
  const databaseUrl = settings.databaseUrl ?? (await ownDatabase(run, signal));
  const [cards, mail, smtp] = await freePorts(
    3,
    [1, 2, 3].map((step) => settings.port + step),
  );
  return {
    settings,
    env: process.env,
    secrets,
    databaseUrl,
    folder: memory,
    logs,
    ports: { cards, mail, smtp },
  };
}

/** @param {import('./run-folder.mjs').RunFolder} run @param {AbortSignal} signal */
async function ownDatabase(run, signal) {
  const cluster = await clusterOf(run, false, signal);
  return ensureDatabase(cluster, { name: 'ferrite_row', password: run.secrets.database });
}
