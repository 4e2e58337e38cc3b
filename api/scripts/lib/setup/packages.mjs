import { existsSync, readFileSync } from 'node:fs';
import path from 'node:path';
import { isDeepStrictEqual } from 'node:util';
import { inRoot, root } from '../paths.mjs';
import { sayWhile } from '../say.mjs';

/**
 * One entry of a lock file.
 * @typedef {{ version?: string, integrity?: string, link?: boolean, optional?: boolean,
 *   dependencies?: Record<string, string>, devDependencies?: Record<string, string> }} Locked
 * @typedef {{ packages: Record<string, Locked> }} Lock
 */

/** @param {Locked | undefined} a @param {Locked | undefined} b */
const isSame = (a, b) => a?.version === b?.version && a?.integrity === b?.integrity;

/** @param {string} place @param {Locked} locked */
const isFromRegistry = (place, locked) => place.includes('node_modules/') && !locked.link;

/**
 * Whether what lies in node_modules is what the lock asks for. npm leaves its own list of what it installed there, last
 * of all, so an installation cut short has none. Dates prove nothing here: a fresh clone is newer than everything.
 * @param {Lock} lock package-lock.json
 * @param {Lock | null} installed node_modules/.package-lock.json
 * @param {(place: string) => boolean} exists a folder on the list may have been deleted since
 */
export function isInstalled(lock, installed, exists) {
  if (installed === null) return false;
  const isWanted = Object.entries(lock.packages).every(
    ([place, locked]) =>
      !isFromRegistry(place, locked) ||
      isSame(locked, installed.packages[place]) ||
      // Optional ones are left out where they are made for another machine.
      (locked.optional && !installed.packages[place]),
  );
  return (
    isWanted && Object.keys(installed.packages).every((place) => place in lock.packages && exists(place))
  );
}

/**
 * Whether a package.json still asks for what the lock was made from. npm ci refuses a lock that lags behind, and says
 * so better than a program that misses a package would.
 * @param {Locked} manifest package.json
 * @param {Locked | undefined} locked its entry in the lock
 */
export function isLocked(manifest, locked) {
  return (
    isDeepStrictEqual(manifest.dependencies ?? {}, locked?.dependencies ?? {}) &&
    isDeepStrictEqual(manifest.devDependencies ?? {}, locked?.devDependencies ?? {})
  );
}

/** @param {...string} parts */
function readJson(...parts) {
  try {
    return JSON.parse(readFileSync(inRoot(...parts), 'utf8'));
  } catch {
    return null;
  }
}

function needsInstall() {
  const lock = readJson('package-lock.json');
  const workspaces = ['', ...readJson('package.json').workspaces];
  const isCurrent = workspaces.every((place) =>
    isLocked(readJson(place, 'package.json'), lock.packages[place]),
  );
  return (
    !isCurrent ||
    !isInstalled(lock, readJson('node_modules/.package-lock.json'), (place) => existsSync(inRoot(place)))
  );
}

/**
 * The npm that runs us when there is one, for a machine may have several.
 * @param {string[]} args
 */
export function npm(args) {
  const cli = process.env.npm_execpath;
  return cli?.endsWith('npm-cli.js')
    ? { command: process.execPath, args: [cli, ...args] }
    : { command: 'npm', args };
}

/**
 * npm's option for one workspace. By its name: the path `api` would mean `api/levels` as well.
 * @param {string} name
 */
export const workspace = (name) => ['-w', `@ferrite-row/${name}`];

/**
 * @param {import('../processes/children.mjs').Children} children
 * @param {string} logs
 * @param {AbortSignal} signal
 */
export async function installPackages(children, logs, signal) {
  if (!needsInstall()) return;
  const log = path.join(logs, 'npm.log');
  // With NODE_ENV=production npm would leave out what the builds need.
  const spec = { name: 'npm ci', ...npm(['ci', '--include=dev', '--no-progress']), cwd: root, log };
  await sayWhile('Installing npm packages from the lock file, about a minute', () =>
    children.mustRun(spec, signal),
  );
}
