import assert from 'node:assert/strict';
import { spawn } from 'node:child_process';
import { once } from 'node:events';
import { existsSync, mkdtempSync, readdirSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { afterEach, beforeEach, describe, it } from 'node:test';
import { identityOf } from './identity.mjs';
import { isHeld, LockHeld, takeLock, withLock } from './lock.mjs';

describe('lock', () => {
  /** @type {string} */
  let folder;
  /** @type {string} */
  let file;

  beforeEach(() => {
    folder = mkdtempSync(path.join(tmpdir(), 'ferrite-lock-'));
    file = path.join(folder, 'lock.json');
  });
  afterEach(() => rmSync(folder, { recursive: true }));

  it('is held until it is given back, and leaves nothing behind', () => {
    const release = takeLock(file, 'here');
    assert.equal(isHeld(file), true);
    release();
    assert.equal(isHeld(file), false);
    assert.deepEqual(readdirSync(folder), []);
  });

  it('tells who holds it to whoever finds it held', () => {
    takeLock(file, 'at http://127.0.0.1:4780');
    assert.throws(
      () => takeLock(file, 'second'),
      (error) =>
        error instanceof LockHeld &&
        error.holder.pid === process.pid &&
        error.holder.note === 'at http://127.0.0.1:4780',
    );
  });

  it('is taken over from a process that has ended', async () => {
    const ended = spawn(process.execPath, ['-e', '']);
    const identity = identityOf(ended.pid ?? 0);
    await once(ended, 'exit');
    writeFileSync(file, JSON.stringify({ ...identity, note: 'gone' }));
    takeLock(file, 'new');
    assert.equal(isHeld(file), true);
    assert.deepEqual(readdirSync(folder), ['lock.json']);
  });

  it('is taken over when its number now belongs to a process that started at another time', () => {
    const other = { ...identityOf(process.pid), startTicks: '1' };
    writeFileSync(file, JSON.stringify({ ...other, note: 'the one before' }));
    assert.equal(isHeld(file), false);
    takeLock(file, 'new');
    assert.equal(isHeld(file), true);
  });

  it('is taken over when it is from before the machine started again', () => {
    const before = { ...identityOf(process.pid), bootId: 'another start' };
    writeFileSync(file, JSON.stringify({ ...before, note: 'before the power cut' }));
    takeLock(file, 'new');
    assert.equal(isHeld(file), true);
  });

  it('is taken over when a full disk left only half of it', () => {
    writeFileSync(file, '{"pid":');
    takeLock(file, 'new');
    assert.equal(isHeld(file), true);
  });

  it('goes to exactly one of eight processes that find it stale together', async () => {
    writeFileSync(file, JSON.stringify({ pid: 1, startTicks: '0', bootId: 'gone', note: '' }));
    const code = `
      import { takeLock } from ${JSON.stringify(new URL('lock.mjs', import.meta.url).href)};
      process.stdout.write('ready');
      process.stdin.once('data', () => {
        try { takeLock(${JSON.stringify(file)}, 'racer'); process.stdout.write('won'); } catch { process.stdout.write('lost'); }
        process.stdin.on('end', () => process.exit());
      });`;
    const racers = Array.from({ length: 8 }, () =>
      spawn(process.execPath, ['--input-type=module', '-e', code]),
    );
    await Promise.all(racers.map((racer) => once(racer.stdout, 'data')));
    const answers = racers.map((racer) => once(racer.stdout, 'data'));
    for (const racer of racers) racer.stdin.write('go');
    const words = (await Promise.all(answers)).map(([data]) => String(data));
    for (const racer of racers) racer.stdin.end();
    assert.deepEqual(words.sort(), [...Array(7).fill('lost'), 'won']);
  });

  it('makes the second wait for the first, and says so once', async () => {
    /** @type {string[]} */
    const order = [];
    const release = takeLock(file, 'first');
    const second = withLock(
      file,
      'second',
      ({ note }) => order.push(`waiting for ${note}`),
      async () => order.push('second works'),
    );
    order.push('first works');
    release();
    await second;
    assert.deepEqual(order, ['waiting for first', 'first works', 'second works']);
    assert.equal(existsSync(file), false);
  });
});
