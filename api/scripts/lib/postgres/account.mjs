import { spawnSync } from 'node:child_process';
import { chownSync, statSync } from 'node:fs';
import { shown } from '../paths.mjs';
import { PlainError } from '../say.mjs';

/**
 * Puts before a command what makes it run as an ordinary user.
 * @typedef {(command: string, args: string[]) => { command: string, args: string[] }} As
 */

/** Debian makes this account together with the server. @param {'-u' | '-g'} which */
function idOfPostgres(which) {
  const { status, stdout } = spawnSync('id', [which, 'postgres'], { encoding: 'utf8' });
  if (status !== 0) throw new PlainError('There is no account named postgres to run the server.');
  return Number(stdout);
}

/**
 * A checkout in a closed home folder (/root is one) cannot be walked through by another account. This single capability
 * lets it pass; no permission of any folder is changed for it. Taken only where it is needed.
 */
const passing = ['--inh-caps', '--ambient-caps', '--bounding-set'].map(
  (set) => `${set}=-all,+dac_read_search`,
);

/**
 * Asked by listing the folder: `test -w` asks the kernel in a way that leaves capabilities out.
 * @param {string[]} how
 * @param {string} folder
 */
const reaches = (how, folder) =>
  spawnSync('setpriv', [...how, '--', 'ls', folder], { cwd: '/', stdio: 'ignore' }).status === 0;

/**
 * PostgreSQL refuses to run as root. Run by root we hand a new folder to Debian's account `postgres` and run as that, or
 * as the user to whom an older one belongs; run by anybody else, as ourselves.
 * @param {string} folder the cluster's folder, which exists
 * @returns {As}
 */
export function ordinaryUser(folder) {
  if (process.getuid?.() !== 0) return (command, args) => ({ command, args });
  if (statSync(folder).uid === 0) chownSync(folder, idOfPostgres('-u'), idOfPostgres('-g'));
  const { uid, gid } = statSync(folder);
  const plain = [`--reuid=${uid}`, `--regid=${gid}`, '--clear-groups'];
  const how = [plain, [...plain, ...passing]].find((way) => reaches(way, folder));
  if (!how) {
    throw new PlainError(
      `The account that runs PostgreSQL cannot get to ${shown(folder)}. Set FERRITE_DATA_DIR to a folder outside closed ` +
        'ones, for example FERRITE_DATA_DIR=/var/lib/ferrite-row.',
    );
  }
  return (command, args) => ({ command: 'setpriv', args: [...how, '--', command, ...args] });
}

/** Gives a file to whoever runs the cluster. @param {string} file @param {string} folder */
export function handOver(file, folder) {
  const { uid, gid } = statSync(folder);
  chownSync(file, uid, gid);
}
