import { setTimeout as sleep } from 'node:timers/promises';
import { isAlive } from './identity.mjs';

/**
 * How to end a kind of process: signals in turn, each with the time it is given.
 * @typedef {{ signal: NodeJS.Signals, waitMs: number }[]} StopPlan
 */

/** @typedef {'program' | 'postgres' | 'session'} Kind */

/** @type {Record<Kind, StopPlan>} */
const plans = {
  program: [
    { signal: 'SIGTERM', waitMs: 10_000 },
    { signal: 'SIGKILL', waitMs: 5_000 },
  ],
  // SIGINT is PostgreSQL's "fast" shutdown: sessions are rolled back and everything is written out. SIGQUIT leaves the
  // write-ahead log to be replayed at the next start; SIGKILL would leave its shared memory behind as well.
  postgres: [
    { signal: 'SIGINT', waitMs: 30_000 },
    { signal: 'SIGQUIT', waitMs: 10_000 },
    { signal: 'SIGKILL', waitMs: 5_000 },
  ],
  // What is left of a PostgreSQL whose server was killed. Most such processes notice and end; the one that replays the
  // log goes on for a minute, and the data must have only one master.
  session: [
    { signal: 'SIGQUIT', waitMs: 3_000 },
    { signal: 'SIGKILL', waitMs: 5_000 },
  ],
};

/**
 * @param {number} target a process, or a process group when negative
 * @param {NodeJS.Signals} signal
 */
export function send(target, signal) {
  try {
    process.kill(target, signal);
  } catch (error) {
    if (/** @type {NodeJS.ErrnoException} */ (error).code !== 'ESRCH') throw error; // it ended by itself meanwhile
  }
}

/** @param {import('./identity.mjs').Identity} identity @param {number} waitMs */
async function endsWithin(identity, waitMs) {
  const deadline = performance.now() + waitMs;
  while (isAlive(identity)) {
    if (performance.now() > deadline) return false;
    await sleep(30);
  }
  return true;
}

/**
 * Ends a process, and with it what it started itself. Each of our children leads a process group of its own; only
 * PostgreSQL is told alone, because it ends its own processes in the right order.
 * @param {import('./identity.mjs').Identity} identity
 * @param {Kind} kind
 */
export async function stopProcess(identity, kind) {
  const target = kind === 'program' ? -identity.pid : identity.pid;
  for (const { signal, waitMs } of plans[kind]) {
    if (!isAlive(identity)) return;
    send(target, signal);
    if (await endsWithin(identity, waitMs)) return;
  }
}
