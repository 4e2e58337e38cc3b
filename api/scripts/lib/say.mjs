/** A failure whose message is all that the person at the terminal needs; it is shown without a stack. */
export class PlainError extends Error {}

/** @param {string} [line] */
export function say(line = '') {
  process.stdout.write(`${line}\n`);
}

/** @param {string} line */
export function complain(line) {
  process.stderr.write(`${line}\n`);
}

/**
 * Says what is going on and, at the end, how long it took; silence for half a minute reads as a hang.
 * @template T
 * @param {string} doing
 * @param {() => Promise<T>} work
 * @returns {Promise<T>}
 */
export async function sayWhile(doing, work) {
  say(`${doing} …`);
  const from = performance.now();
  const result = await work();
  say(`  done in ${seconds(performance.now() - from)}: ${doing}`);
  return result;
}

/** @param {number} ms */
export function seconds(ms) {
  return `${(ms / 1000).toFixed(1)} s`;
}

/**
 * @param {string} text
 * @param {number} lines
 */
export function tail(text, lines) {
  return text.trimEnd().split('\n').slice(-lines).join('\n');
}
