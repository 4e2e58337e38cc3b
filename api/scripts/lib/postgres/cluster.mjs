import { existsSync, mkdirSync, readFileSync, renameSync, rmSync, writeFileSync } from 'node:fs';
import path from 'node:path';
import { handOver, ordinaryUser } from './account.mjs';
import { postgresProgram, postgresVersions } from '../setup/debian.mjs';
import { untilReady } from '../processes/health.mjs';
import { clearCluster, dataIn, nameOf } from './leftovers.mjs';
import { shown } from '../paths.mjs';
import { freePorts } from '../processes/ports.mjs';
import { PlainError } from '../say.mjs';

/** The account that owns the cluster; the portal itself never uses it. */
const SUPERUSER = 'ferrite_admin';

/** No socket file: it would need a place that both accounts may use, with a short path. */
const always = ['listen_addresses=127.0.0.1', 'unix_socket_directories=', 'timezone=UTC', 'log_timezone=UTC'];

/** Nothing in the test cluster outlives the run, so it need not survive a power cut; Jest's workers share it. */
const throwAway = ['fsync=off', 'synchronous_commit=off', 'full_page_writes=off', 'max_connections=250'];

/**
 * @typedef {object} ClusterOptions
 * @property {string} folder of this cluster alone
 * @property {string} log
 * @property {string} password of the superuser
 * @property {boolean} isThrowAway
 * @property {import('../processes/children.mjs').Children} children
 * @property {AbortSignal} signal
 */

/** @param {string} data @returns {number} the major version to run: the one that made the data, else the newest */
function versionFor(data) {
  const made = path.join(data, 'PG_VERSION');
  const installed = postgresVersions();
  if (!existsSync(made)) return installed[0];
  const major = Number(readFileSync(made, 'utf8'));
  if (installed.includes(major)) return major;
  throw new PlainError(
    `${shown(data)} was made by PostgreSQL ${major}, which is not installed here (there is ${installed.join(', ')}). ` +
      `Install postgresql-${major}, or move the folder away to begin anew.`,
  );
}

/**
 * @param {ClusterOptions} options
 * @param {string} data
 * @param {import('./account.mjs').As} as
 */
async function initialize({ folder, log, password, isThrowAway, children, signal }, data, as) {
  const making = `${data}.making`;
  const passwordFile = path.join(folder, 'password');
  rmSync(making, { recursive: true, force: true });
  writeFileSync(passwordFile, password, { mode: 0o600 });
  handOver(passwordFile, folder);
  const args = [
    ...['-D', making, '-E', 'UTF8', '--locale=C.UTF-8'],
    ...['-U', SUPERUSER, '--auth=scram-sha-256', `--pwfile=${passwordFile}`],
    ...['--no-instructions', ...(isThrowAway ? ['--no-sync'] : [])],
  ];
  try {
    const initdb = as(postgresProgram(versionFor(data), 'initdb'), args);
    await children.mustRun(
      { name: 'initdb', ...initdb, cwd: '/', log: log.replace(/\.log$/, '-init.log') },
      signal,
    );
  } finally {
    rmSync(passwordFile, { force: true });
  }
  renameSync(making, data); // a cluster under its own name is a whole one, wherever we were killed
}

/** @param {string} data the server writes its state on the eighth line of its pid file */
function isAccepting(data) {
  try {
    return readFileSync(path.join(data, 'postmaster.pid'), 'utf8').split('\n')[7]?.trim() === 'ready';
  } catch {
    return false; // not written yet
  }
}

/**
 * Makes the cluster if there is none, and starts it on a free port of 127.0.0.1, with passwords, without a socket file.
 * System clusters are never looked at.
 * @param {ClusterOptions} options
 * @returns {Promise<{ adminUrl: string, host: string }>} the superuser's address, and host and port alone
 */
export async function startCluster(options) {
  const { folder, log, password, isThrowAway, children, signal } = options;
  const data = dataIn(folder);
  const mark = nameOf(folder);
  mkdirSync(folder, { recursive: true });
  const as = ordinaryUser(folder);
  await clearCluster(folder);
  if (!existsSync(data)) await initialize(options, data, as);

  const [port] = await freePorts(1);
  const settings = [...always, `port=${port}`, `cluster_name=${mark}`, ...(isThrowAway ? throwAway : [])];
  const args = ['-D', data, ...settings.flatMap((setting) => ['-c', setting])];
  const server = as(postgresProgram(versionFor(data), 'postgres'), args);
  // The server runs as our own child: we hear of its end at once, and SIGINT is its fast shutdown.
  const child = children.start({ name: 'PostgreSQL', ...server, cwd: '/', log, mark, kind: 'postgres' });
  await untilReady(child, () => isAccepting(data), signal);
  const host = `127.0.0.1:${port}`;
  return { adminUrl: `postgres://${SUPERUSER}:${password}@${host}/postgres`, host };
}
