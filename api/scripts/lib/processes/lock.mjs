import { linkSync, readFileSync, renameSync, rmSync, writeFileSync } from 'node:fs';
import { setTimeout as sleep } from 'node:timers/promises';
import { identityOf, isAlive } from './identity.mjs';

/**
 * Who holds a lock, with a word for the person who finds it held.
 * @typedef {import('./identity.mjs').Identity & { note: string }} Holder
 */

export class LockHeld extends Error {
  /** @param {Holder} holder */
  constructor(holder) {
    super(`Held by process ${holder.pid}: ${holder.note}`);
    this.holder = holder;
  }
}

/**
 * @param {string} file
 * @returns {Holder | null} null when the file is absent or not one of ours
 */
function readHolder(file) {
  try {
    return JSON.parse(readFileSync(file, 'utf8'));
  } catch {
    return null;
  }
}

/**
 * @param {string} file
 * @returns {boolean} whether the process that made this lock still runs
 */
export function isHeld(file) {
  const holder = readHolder(file);
  return holder !== null && isAlive(holder);
}

/** @param {string} from @param {string} to @returns {boolean} false when `to` exists */
function linkIfFree(from, to) {
  try {
    linkSync(from, to);
    return true;
  } catch (error) {
    if (/** @type {NodeJS.ErrnoException} */ (error).code === 'EEXIST') return false;
    throw error;
  }
}

/**
 * Moves a dead holder's lock out of the way. Two processes may come to this point together, and the slower one could
 * move the faster one's new lock: what was moved is looked at again and put back if its holder lives.
 * @param {string} file
 */
function clearStale(file) {
  const moved = `${file}.stale-${process.pid}`;
  try {
    renameSync(file, moved);
  } catch {
    return; // somebody else has just cleared it
  }
  if (isHeld(moved)) linkIfFree(moved, file);
  rmSync(moved, { force: true });
}

/**
 * Takes the lock, also from a holder that no longer runs.
 * @param {string} file
 * @param {string} note
 * @returns {() => void} gives it back
 * @throws {LockHeld} when another process holds it
 */
export function takeLock(file, note) {
  const mine = `${file}.${process.pid}`;
  // Written whole beside its place and then linked to it: nobody ever reads half a lock, and only one link succeeds.
  writeFileSync(mine, JSON.stringify({ ...identityOf(process.pid), note }));
  try {
    for (let attempt = 0; attempt < 5; attempt += 1) {
      if (linkIfFree(mine, file)) return () => rmSync(file, { force: true });
      const holder = readHolder(file);
      if (holder !== null && isAlive(holder)) throw new LockHeld(holder);
      clearStale(file);
    }
    throw new Error(`The lock ${file} could not be taken; remove it if nothing is running.`);
  } finally {
    rmSync(mine, { force: true });
  }
}

/**
 * Does the work while holding the lock, waiting for another process to finish with it first.
 * @template T
 * @param {string} file
 * @param {string} note
 * @param {(holder: Holder) => void} onWait called once when there is somebody to wait for
 * @param {() => Promise<T>} work
 * @param {AbortSignal} [signal]
 * @returns {Promise<T>}
 */
export async function withLock(file, note, onWait, work, signal) {
  for (let told = false; ; told = true) {
    signal?.throwIfAborted();
    try {
      const release = takeLock(file, note);
      return await work().finally(release);
    } catch (error) {
      if (!(error instanceof LockHeld)) throw error;
      if (!told) onWait(error.holder);
      await sleep(300);
    }
  }
}
