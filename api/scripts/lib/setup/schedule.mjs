/**
 * Something to be done once all that it needs is done.
 * @typedef {object} Task
 * @property {string} name
 * @property {string[]} [needs] names of other tasks; one that is not in the list counts as done
 * @property {boolean} [alone] it wants the machine to itself
 */

/**
 * Does tasks in their order, several at a time. A task that needs a failed one is not done.
 * @template {Task} T
 * @param {T[]} tasks
 * @param {number} atOnce
 * @param {(task: T) => Promise<boolean>} work whether the task succeeded; what it throws ends the whole
 * @returns {Promise<Set<string>>} names of the tasks that were not reached
 */
export async function schedule(tasks, atOnce, work) {
  const waiting = new Set(tasks);
  /** @type {Map<string, boolean>} */
  const ended = new Map();
  /** @type {Map<T, Promise<void>>} */
  const running = new Map();
  /** @type {Set<string>} */
  const unreached = new Set();

  const known = new Set(tasks.map(({ name }) => name));
  /** @param {T} task */
  const needed = (task) => (task.needs ?? []).filter((name) => known.has(name));
  /** @param {T} task */
  const isHopeless = (task) => needed(task).some((name) => unreached.has(name) || ended.get(name) === false);
  /** @param {T} task */
  const isReady = (task) => needed(task).every((name) => ended.get(name) === true);
  /** @param {T} task */
  const fits = (task) =>
    running.size < (task.alone ? 1 : atOnce) && ![...running.keys()].some(({ alone }) => alone);

  /** @param {T} task */
  async function begin(task) {
    const isOk = await work(task);
    ended.set(task.name, isOk);
    running.delete(task);
  }

  for (;;) {
    for (const task of waiting) {
      if (isHopeless(task)) {
        waiting.delete(task);
        unreached.add(task.name);
      } else if (isReady(task)) {
        // Nobody overtakes a task that waits for room, or one that wants to be alone would wait for ever.
        if (!fits(task)) break;
        waiting.delete(task);
        running.set(task, begin(task));
      }
    }
    if (running.size === 0) return unreached;
    await Promise.race(running.values());
  }
}
