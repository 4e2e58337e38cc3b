import { Child, describeEnding } from './child.mjs';
import { saveRecords } from './records.mjs';
import { PlainError, tail } from '../say.mjs';
import { shown } from '../paths.mjs';

/** @typedef {import('./child.mjs').Spec} Spec */

/** All processes of one run of a script: started, written down, and stopped in reverse order. */
export class Children {
  /** @type {Child[]} */
  #running = [];
  #isClosed = false;
  /** @type {(child: Child) => void} */
  #onDeath = () => {};
  #firstDeath = new Promise((/** @type {(child: Child) => void} */ resolve) => (this.#onDeath = resolve));

  /** @param {string} recordFile where the running processes are written down */
  constructor(recordFile) {
    this.recordFile = recordFile;
  }

  /**
   * Starts something that is meant to go on.
   * @param {Spec} spec
   */
  start(spec) {
    const child = this.#launch(spec);
    void child.ended.then(() => {
      if (!child.isStopping) this.#onDeath(child);
    });
    return child;
  }

  /**
   * Runs a command to its end.
   * @param {Spec} spec
   * @param {{ signal?: AbortSignal, limitMs?: number }} [options] left out, it is never interrupted
   */
  async run(spec, { signal, limitMs } = {}) {
    signal?.throwIfAborted();
    const child = this.#launch(spec);
    const stop = () => void child.stop();
    const timer = limitMs === undefined ? undefined : setTimeout(stop, limitMs);
    signal?.addEventListener('abort', stop);
    const ending = await child.ended;
    signal?.removeEventListener('abort', stop);
    clearTimeout(timer);
    signal?.throwIfAborted();
    const isOk = ending.code === 0 && !child.isStopping;
    const how = child.isStopping ? `was stopped: not finished within ${limitMs} ms` : describeEnding(ending);
    // A failure is never silent, even if the command was.
    return { isOk, output: isOk ? child.output() : `${child.output().trimEnd()}\n\n${spec.name} ${how}.` };
  }

  /**
   * Runs a command that has to succeed.
   * @param {Spec} spec
   * @param {AbortSignal} [signal]
   */
  async mustRun(spec, signal) {
    const { isOk, output } = await this.run(spec, { signal });
    if (!isOk) throw new PlainError(tail(output, 60));
  }

  /** Never returns, unless a child that is meant to go on has ended by itself: then it throws. */
  async untilOneDies() {
    throw await deathOf(await this.#firstDeath);
  }

  async stopAll() {
    this.#isClosed = true;
    for (const child of [...this.#running].reverse()) await child.stop();
  }

  /** @param {Spec} spec */
  #launch(spec) {
    if (this.#isClosed) throw new PlainError(`${spec.name} was not started: everything is being stopped.`);
    const child = new Child(spec);
    this.#running.push(child);
    this.#save();
    void child.ended.then(() => {
      this.#running = this.#running.filter((other) => other !== child);
      this.#save();
    });
    return child;
  }

  #save() {
    const records = this.#running.flatMap(({ identity, kind, spec }) =>
      identity ? [{ ...identity, kind, name: spec.name, mark: spec.mark ?? null }] : [],
    );
    saveRecords(this.recordFile, records);
  }
}

/**
 * What to tell about a child that should not have ended.
 * @param {Child} child
 */
export async function deathOf(child) {
  const ending = describeEnding(await child.ended);
  const log = shown(child.spec.log);
  return new PlainError(
    `${child.spec.name} (process ${child.pid}) ${ending}. The last lines of ${log}:\n\n${tail(child.output(), 25)}`,
  );
}
