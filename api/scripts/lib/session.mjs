import { complain, PlainError } from './say.mjs';

/** What a signal aborts with. */
class Stopped extends Error {}

/**
 * @typedef {object} Session
 * @property {AbortSignal} signal aborted when the person wants to stop
 * @property {(undo: () => unknown) => void} atEnd what to do at the end, whatever the end is, last one first; one that
 *   throws, or gives false, makes the whole unsuccessful
 */

/** @param {AbortSignal} signal */
export async function untilStopped(signal) {
  await new Promise((resolve) => {
    if (signal.aborted) resolve(undefined);
    signal.addEventListener('abort', resolve);
  });
}

/** @param {unknown} error */
function tell(error) {
  if (error instanceof Stopped) return;
  complain(
    error instanceof PlainError ? `\n${error.message}` : `\n${/** @type {Error} */ (error).stack ?? error}`,
  );
}

/** @param {(() => unknown)[]} undo @returns {Promise<boolean>} whether all went well */
async function putBack(undo) {
  let isOk = true;
  for (const step of undo.reverse()) {
    try {
      if ((await step()) === false) isOk = false;
    } catch (error) {
      tell(error);
      isOk = false;
    }
  }
  return isOk;
}

/**
 * Runs one command from start to end and leaves nothing behind: what was begun is put back when it ends, when it fails,
 * on Ctrl-C, on SIGTERM and when the terminal closes. A second Ctrl-C changes nothing, since npm passes on the one that
 * the terminal has already delivered.
 * @param {(session: Session) => Promise<number | void>} main gives the exit code; none is 0
 * @param {{ codeWhenStopped?: number }} [options] being stopped is the normal end of a server, but not of a test run
 */
export async function runSession(main, { codeWhenStopped = 0 } = {}) {
  const stop = new AbortController();
  for (const name of ['SIGINT', 'SIGTERM', 'SIGHUP']) process.on(name, () => stop.abort(new Stopped(name)));
  // The terminal may be gone before we are: stopping in good order matters more than telling about it.
  for (const stream of [process.stdout, process.stderr]) stream.on('error', () => {});
  /** @type {(() => unknown)[]} */
  const undo = [];
  let code = 0;
  try {
    code = (await main({ signal: stop.signal, atEnd: (step) => undo.push(step) })) ?? 0;
  } catch (error) {
    tell(error);
    code = error instanceof Stopped ? codeWhenStopped : 1;
  }
  const isOk = await putBack(undo);
  process.exitCode = isOk ? code : Math.max(code, 1);
}
