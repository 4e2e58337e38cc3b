import assert from 'node:assert/strict';
import { setTimeout as sleep } from 'node:timers/promises';
import { describe, it } from 'node:test';
import { schedule } from './schedule.mjs';

/**
 * Runs the tasks and notes when each begins and ends.
 * @param {(import('./schedule.mjs').Task & { fails?: boolean })[]} tasks
 */
async function trace(tasks) {
  /** @type {string[]} */
  const log = [];
  let running = 0;
  let most = 0;
  const unreached = await schedule(tasks, 2, async ({ name, fails }) => {
    most = Math.max(most, (running += 1));
    log.push(`+${name}`);
    await sleep(5);
    log.push(`-${name}`);
    running -= 1;
    return !fails;
  });
  return { log, most, unreached: [...unreached] };
}

describe('schedule', () => {
  it('works at two tasks at a time, never at three', async () => {
    const { log, most } = await trace(['a', 'b', 'c', 'd'].map((name) => ({ name })));
    assert.equal(most, 2);
    assert.equal(log.length, 8);
  });

  it('begins a task only when what it needs is done', async () => {
    const { log } = await trace([{ name: 'seeds', needs: ['api'] }, { name: 'api' }]);
    assert.deepEqual(log, ['+api', '-api', '+seeds', '-seeds']);
  });

  it('gives a task that wants to be alone the machine to itself, and lets nobody overtake it', async () => {
    const { log } = await trace([{ name: 'a' }, { name: 'alone', alone: true }, { name: 'b' }]);
    assert.deepEqual(log, ['+a', '-a', '+alone', '-alone', '+b', '-b']);
  });

  it('does not reach what needs a failed task, near or far, and goes on with the rest', async () => {
    const { log, unreached } = await trace([
      { name: 'build', fails: true },
      { name: 'types', needs: ['build'] },
      { name: 'after', needs: ['types'] },
      { name: 'format' },
    ]);
    assert.deepEqual(unreached, ['types', 'after']);
    assert.ok(log.includes('-format'));
  });

  it('takes a needed task that is not in the list for done', async () => {
    assert.deepEqual((await trace([{ name: 'seeds', needs: ['api'] }])).log, ['+seeds', '-seeds']);
  });

  it('ends with the error when a task throws', async () => {
    await assert.rejects(
      schedule([{ name: 'a' }], 2, () => Promise.reject(new Error('stopped'))),
      /stopped/,
    );
  });
});
