import http from 'node:http';
import { setTimeout as sleep } from 'node:timers/promises';
import { deathOf } from './children.mjs';
import { PlainError, seconds, tail } from '../say.mjs';

/** @param {string} url @returns {Promise<boolean>} whether it answers 200 */
function answers(url) {
  return new Promise((resolve) => {
    const request = http.get(url, { agent: false, timeout: 2_000 }, (response) => {
      response.resume();
      resolve(response.statusCode === 200);
    });
    request.once('timeout', () => request.destroy());
    request.once('error', () => resolve(false));
  });
}

/**
 * Waits until a child we started is ready.
 * @param {import('./child.mjs').Child} child
 * @param {() => boolean | Promise<boolean>} isReady
 * @param {AbortSignal} signal
 * @param {number} [limitMs] ample by default: another program may be keeping the machine busy
 * @throws {PlainError} with the end of its log, when it ends or takes too long
 */
export async function untilReady(child, isReady, signal, limitMs = 120_000) {
  /** @type {import('./child.mjs').Ending | undefined} */
  let ending;
  void child.ended.then((how) => (ending = how));
  const deadline = performance.now() + limitMs;
  while (!(await isReady())) {
    signal.throwIfAborted();
    if (ending) throw await deathOf(child);
    if (performance.now() > deadline) {
      const log = tail(child.output(), 25);
      throw new PlainError(`${log}\n\n${child.spec.name} was not ready within ${seconds(limitMs)}.`);
    }
    await sleep(40);
  }
}

/**
 * @param {import('./child.mjs').Child} child
 * @param {string} url answers 200 when the child is ready
 * @param {AbortSignal} signal
 * @param {number} [limitMs]
 */
export const untilHealthy = (child, url, signal, limitMs) =>
  untilReady(child, () => answers(url), signal, limitMs);
