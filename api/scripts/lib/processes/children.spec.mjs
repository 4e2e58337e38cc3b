import assert from 'node:assert/strict';
import { existsSync, mkdtempSync, readFileSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { afterEach, beforeEach, describe, it } from 'node:test';
import { Children } from './children.mjs';
import { untilReady } from './health.mjs';
import { identityOf, isAlive, parseStat } from './identity.mjs';
import { isStillOurs, saveRecords, stopRecorded } from './records.mjs';

describe('children', () => {
  /** @type {string} */
  let folder;
  /** @type {Children} */
  let children;

  beforeEach(() => {
    folder = mkdtempSync(path.join(tmpdir(), 'ferrite-children-'));
    children = new Children(path.join(folder, 'running.json'));
  });
  afterEach(async () => {
    await children.stopAll();
    rmSync(folder, { recursive: true });
  });

  /** @param {string} name @param {string} code */
  const program = (name, code) => ({
    name,
    command: process.execPath,
    args: ['-e', code],
    log: path.join(folder, `${name}.log`),
  });
  const idle = 'console.log("up"); setInterval(() => {}, 1000)';
  const signal = new AbortController().signal;

  it('returns what a command printed and whether it succeeded', async () => {
    const { isOk, output } = await children.run(program('fails', 'console.error("why"); process.exit(3)'));
    assert.equal(isOk, false);
    assert.equal(output, 'why\n\nfails ended with code 3.');
  });

  it('stops a command that takes longer than it is given, and says so', async () => {
    const { isOk, output } = await children.run(program('hangs', idle), { limitMs: 300 });
    assert.equal(isOk, false);
    assert.match(output, /not finished within 300 ms/);
  });

  it('reports a program that does not exist as one that could not be started', async () => {
    const spec = { ...program('absent', ''), command: path.join(folder, 'absent') };
    await assert.rejects(children.mustRun(spec), /could not be started/);
  });

  it('says which child has died, with the last lines of its log', async () => {
    children.start(program('steady', idle));
    const dying = children.start(program('dying', 'console.log("last words"); setInterval(() => {}, 1000)'));
    await untilReady(dying, () => dying.output().includes('last words'), signal);
    process.kill(dying.pid ?? 0, 'SIGKILL');
    await assert.rejects(children.untilOneDies(), /dying \(process \d+\) was ended by SIGKILL[^]*last words/);
  });

  it('stops with the last lines when a child ends before it is ready', async () => {
    const child = children.start(program('refuses', 'console.log("no database"); process.exit(1)'));
    await assert.rejects(
      untilReady(child, () => false, signal),
      /ended with code 1[^]*no database/,
    );
  });

  it('stops children in reverse order, together with what they started', async () => {
    const order = path.join(folder, 'order');
    const noting = (/** @type {string} */ name) =>
      `process.on('SIGTERM', () => { require('fs').appendFileSync(${JSON.stringify(order)}, '${name} '); process.exit(); });
       const inner = require('child_process').spawn('sleep', ['60']); console.log(inner.pid); setInterval(() => {}, 1000)`;
    const all = ['first', 'second'].map((name) => children.start(program(name, noting(name))));
    for (const child of all) await untilReady(child, () => child.output() !== '', signal);
    const inner = all.map((child) => identityOf(Number(child.output())));
    await children.stopAll();
    assert.equal(readFileSync(order, 'utf8'), 'second first ');
    for (const identity of inner) assert.equal(identity !== null && isAlive(identity), false);
  });

  it('starts nothing any more once everything is being stopped', async () => {
    await children.stopAll();
    assert.throws(() => children.start(program('late', idle)), /was not started/);
  });

  it('writes running processes down, so that the next run can end them after a crash', async () => {
    const spec = { ...program('orphan', idle), mark: 'setInterval' };
    const child = children.start(spec);
    await untilReady(child, () => child.output().includes('up'), signal);
    assert.deepEqual(await stopRecorded(children.recordFile), ['orphan']);
    assert.equal(child.identity !== null && isAlive(child.identity), false);
  });

  it('keeps no record when nothing runs', async () => {
    await children.run(program('short', ''));
    assert.equal(existsSync(children.recordFile), false);
  });
});

describe('a recorded process', () => {
  const me = /** @type {import('./identity.mjs').Identity} */ (identityOf(process.pid));
  const note = { ...me, name: 'me', kind: /** @type {const} */ ('program'), mark: null };

  it('is still ours when number, start and command line agree', () => {
    assert.equal(isStillOurs({ ...note, mark: process.execPath }), true);
  });

  it('is left alone when its number belongs to a process that started at another time', async () => {
    const folder = mkdtempSync(path.join(tmpdir(), 'ferrite-records-'));
    const file = path.join(folder, 'running.json');
    saveRecords(file, [{ ...note, startTicks: '1' }]);
    assert.deepEqual(await stopRecorded(file), []); // and this very process lives on to say so
    rmSync(folder, { recursive: true });
  });

  it('is left alone when it runs another program', () => {
    assert.equal(isStillOurs({ ...note, mark: '/no/such/program.js' }), false);
  });
});

describe('the state line of a process', () => {
  it('is read right for a command with spaces and parentheses in its name', () => {
    const fields = ['S', ...Array.from({ length: 18 }, (_, index) => String(index)), '98765', 'rest'];
    assert.deepEqual(parseStat(`12 (a) (b c) ${fields.join(' ')}`), { state: 'S', startTicks: '98765' });
  });
});
