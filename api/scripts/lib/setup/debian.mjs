import { existsSync, mkdirSync, readdirSync, rmdirSync, rmSync, writeFileSync } from 'node:fs';
import path from 'node:path';
import { PlainError, sayWhile } from '../say.mjs';

/** Where Debian puts each major version of PostgreSQL; none of it is on the PATH. */
const POSTGRES_HOME = '/usr/lib/postgresql';

/** @returns {number[]} major versions of PostgreSQL whose server is installed, newest first */
export function postgresVersions() {
  if (!existsSync(POSTGRES_HOME)) return [];
  return readdirSync(POSTGRES_HOME)
    .filter((major) => existsSync(path.join(POSTGRES_HOME, major, 'bin/initdb')))
    .map(Number)
    .sort((a, b) => b - a);
}

/** @param {number} major @param {'initdb' | 'postgres'} program */
export const postgresProgram = (major, program) => path.join(POSTGRES_HOME, String(major), 'bin', program);

/**
 * Debian's packages we may need, and how to see that one is there. We look for the files, not in the package database:
 * `postgresql-15` alone does as well as the package `postgresql` that asks for it.
 */
const isInstalled = {
  postgresql: () => postgresVersions().length > 0,
  chromium: () => existsSync('/usr/bin/chromium'),
  'fonts-liberation': () => existsSync('/usr/share/fonts/truetype/liberation'),
  ngspice: () => existsSync('/usr/bin/ngspice'),
};

/** @typedef {keyof typeof isInstalled} DebianPackage */

/**
 * Does the work with Debian told not to make and start a system cluster along with the server, which nobody asked for.
 * The file is ours and goes again; a machine that had PostgreSQL before never gets here.
 * @template T
 * @param {() => Promise<T>} work
 */
async function withoutSystemCluster(work) {
  const folder = '/etc/postgresql-common/createcluster.d';
  const file = path.join(folder, 'ferrite-row.conf');
  if (existsSync(file)) return work();
  const made = mkdirSync(folder, { recursive: true });
  writeFileSync(file, 'create_main_cluster = false\n');
  try {
    return await work();
  } finally {
    rmSync(file, { force: true });
    if (made && readdirSync(folder).length === 0) rmdirSync(folder);
  }
}

/**
 * @param {import('../processes/children.mjs').Children} children
 * @param {string} logs
 * @param {DebianPackage[]} missing
 */
async function install(children, logs, missing) {
  const env = { ...process.env, DEBIAN_FRONTEND: 'noninteractive' };
  /** @param {string} name @param {string[]} args */
  const apt = (name, args) => {
    // dpkg may be busy for somebody else; a minute's patience beats a failed first start.
    const all = ['-o', 'DPkg::Lock::Timeout=300', ...args];
    // No signal is passed: an installation cut short leaves the machine's package database half done.
    return children.mustRun({ name, command: 'apt-get', args: all, env, log: path.join(logs, 'apt.log') });
  };
  await apt('apt-get update', ['update']);
  await apt('apt-get install', ['install', '-y', '--no-install-recommends', ...missing]);
}

/**
 * @param {DebianPackage[]} wanted
 * @returns {DebianPackage[]} those that are not there
 * @throws {PlainError} naming what to install, when we may not do it ourselves
 */
export function missingFromDebian(wanted) {
  const missing = wanted.filter((name) => !isInstalled[name]());
  const names = missing.join(' ');
  if (missing.length === 0 || process.getuid?.() === 0) return missing;
  throw new PlainError(
    `Missing from this machine: ${names}. As root: apt-get install --no-install-recommends ${names}`,
  );
}

/**
 * @param {import('../processes/children.mjs').Children} children
 * @param {string} logs
 * @param {DebianPackage[]} missing
 */
export async function installDebian(children, logs, missing) {
  if (missing.length === 0) return;
  const work = () => install(children, logs, missing);
  const isNewServer = missing.includes('postgresql');
  await sayWhile(`Installing from Debian: ${missing.join(' ')}`, () =>
    isNewServer ? withoutSystemCluster(work) : work(),
  );
}
