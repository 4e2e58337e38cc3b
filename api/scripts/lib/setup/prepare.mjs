import { mkdirSync } from 'node:fs';
import { buildStale } from './builds.mjs';
import { installDebian, missingFromDebian } from './debian.mjs';
import { withLock } from '../processes/lock.mjs';
import { installPackages } from './packages.mjs';
import { inRoot } from '../paths.mjs';
import { say } from '../say.mjs';

/**
 * node_modules and the built files belong to the checkout, which `npm start` and `npm test` may work in together: one
 * of them changes these at a time.
 * @template T
 * @param {AbortSignal} signal
 * @param {() => Promise<T>} work
 */
function oneAtATime(signal, work) {
  mkdirSync(inRoot('.ferrite'), { recursive: true });
  return withLock(
    inRoot('.ferrite/preparing.json'),
    'installing or building',
    ({ pid, note }) => say(`Waiting for process ${pid}, which is ${note} …`),
    work,
    signal,
  );
}

/**
 * Brings what is missing from the machine and from node_modules.
 * @param {import('../product/run-folder.mjs').RunFolder} run
 * @param {import('./debian.mjs').DebianPackage[]} wanted
 * @param {AbortSignal} signal
 */
export function installMissing({ children, logs }, wanted, signal) {
  return oneAtATime(signal, async () => {
    const missing = missingFromDebian(wanted);
    const both = [installDebian(children, logs, missing), installPackages(children, logs, signal)];
    // Side by side, for both mostly wait for the network; and to the end, for Debian's must not be cut short.
    const ends = await Promise.allSettled(both);
    for (const end of ends) if (end.status === 'rejected') throw end.reason;
    signal.throwIfAborted();
  });
}

/**
 * @param {import('../product/run-folder.mjs').RunFolder} run
 * @param {AbortSignal} signal
 */
export function buildMissing({ children, logs }, signal) {
  return oneAtATime(signal, () => buildStale(children, logs, signal));
}
