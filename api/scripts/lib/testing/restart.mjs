import { spawn } from 'node:child_process';
import { readFileSync } from 'node:fs';
import path from 'node:path';
import { inRoot } from '../paths.mjs';
import { freePorts } from '../processes/ports.mjs';
import { RECORDS } from '../product/run-folder.mjs';

/** @typedef {import('./step.mjs').Bench} Bench */

const LONGEST_START_MS = 180_000;
const API = inRoot('api/dist/main.js');
const DAY_MS = 86_400_000;

/**
 * `npm start` as a person's shell would run it.
 * @param {NodeJS.ProcessEnv} env
 * @param {AbortSignal} signal
 */
function launch(env, signal) {
  const child = spawn(process.execPath, [inRoot('api/scripts/start.mjs')], {
    env,
    signal,
    killSignal: 'SIGTERM',
  });
  let output = '';
  /** @param {Buffer} chunk */
  const hear = (chunk) => (output += chunk.toString());
  child.stdout.on('data', hear);
  child.stderr.on('data', hear);
  child.on('error', () => undefined); // the signal's; the step has ended then
  /** @type {Promise<number | null>} */
  const ended = new Promise((resolve) => child.on('close', resolve));
  return { child, ended, output: () => output };
}

/** @param {ReturnType<typeof launch>} started */
async function untilReady(started) {
  const from = Date.now();
  while (!started.output().includes('is ready at')) {
    if (started.child.exitCode !== null || Date.now() - from > LONGEST_START_MS)
      throw new Error(`npm start did not come up:\n${started.output()}`);
    await new Promise((resolve) => setTimeout(resolve, 100));
  }
}

/** @param {string} address @param {string} where @param {RequestInit & { cookie?: string }} init */
const ask = (address, where, { cookie, ...init } = {}) =>
  fetch(`${address}${where}`, {
    ...init,
    headers: { origin: address, 'content-type': 'application/json', ...(cookie && { cookie }) },
  });

/** @param {string} address @returns {Promise<string>} the member's cookies */
async function signIn(address) {
  const body = JSON.stringify({ email: 'member@larkmoor.example', password: 'larkmoor-demo' });
  const answer = await ask(address, '/api/auth/sign-in', { method: 'POST', body });
  if (!answer.ok) throw new Error(`Sign-in answered ${answer.status}: ${await answer.text()}`);
  return answer.headers
    .getSetCookie()
    .map((one) => one.split(';')[0])
    .join('; ');
}

/** @param {string} address @returns {Promise<string>} the id of a booking of the first bench, four weeks ahead */
async function book(address) {
  const cookie = await signIn(address);
  const benches = await (await ask(address, '/api/benches', { cookie })).json();
  const day = new Date(Date.now() + 28 * DAY_MS).toISOString().slice(0, 10);
  const body = JSON.stringify({
    resourceIds: [benches.items[0].id],
    startsAt: `${day}T03:00:00Z`,
    endsAt: `${day}T04:00:00Z`,
  });
  const answer = await ask(address, '/api/bookings', { method: 'POST', body, cookie });
  if (answer.status !== 201) throw new Error(`Booking answered ${answer.status}: ${await answer.text()}`);
  return (await answer.json()).id;
}

/** @param {string} address @param {string} id */
async function isKept(address, id) {
  const cookie = await signIn(address);
  const from = new Date(Date.now() + 26 * DAY_MS).toISOString();
  const to = new Date(Date.now() + 30 * DAY_MS).toISOString();
  const bookings = await (await ask(address, `/api/bookings?from=${from}&to=${to}`, { cookie })).json();
  return bookings.some((/** @type {{ id: string }} */ booking) => booking.id === id);
}

/** @param {string} folder @returns {{ pid: number, mark: string | null }[]} what npm start has noted as running */
const noted = (folder) => JSON.parse(readFileSync(path.join(folder, RECORDS), 'utf8'));

/** @param {number} pid */
function isRunning(pid) {
  try {
    return process.kill(pid, 0);
  } catch {
    return false;
  }
}

/**
 * What somebody may do to a running product, in this order; each check stands on the one before.
 * @param {Bench} bench
 * @param {(name: string, isOk: boolean) => void} check
 */
async function story({ run, env, signal }, check) {
  const [port] = await freePorts(1);
  const folder = path.join(run.folder, 'restarted');
  const address = `http://127.0.0.1:${port}`;
  const own = { ...env, PORT: String(port), FERRITE_DATA_DIR: folder };

  const first = launch(own, signal);
  await untilReady(first);
  const booking = await book(address);
  check('an empty folder becomes a running club', await isKept(address, booking));

  const second = launch(own, signal);
  const code = await second.ended;
  check(
    'a second start says that it runs already, and ends',
    code !== 0 && second.output().includes('already running'),
  );

  const api = noted(folder).find(({ mark }) => mark === API);
  process.kill(/** @type {{ pid: number }} */ (api).pid, 'SIGKILL');
  check('when the API is killed the start ends, and not as if all were well', (await first.ended) !== 0);

  const again = launch(own, signal);
  await untilReady(again);
  check('after a kill of the API the next start has everything', await isKept(address, booking));

  again.child.kill('SIGKILL');
  await again.ended;
  const afterCrash = launch(own, signal);
  await untilReady(afterCrash);
  check('after a kill of the start itself the lock it left is no hindrance', await isKept(address, booking));

  const left = noted(folder).map(({ pid }) => pid);
  afterCrash.child.kill('SIGTERM');
  await afterCrash.ended;
  check('a stop takes along all it had started', left.length > 0 && !left.some(isRunning));
}

/** @param {Bench} bench @returns {Promise<import('./step.mjs').Outcome>} */
async function restart(bench) {
  let passed = 0;
  /** @type {string[]} */
  const failures = [];
  const ending = new AbortController();
  const signal = AbortSignal.any([bench.signal, ending.signal]);
  try {
    await story({ ...bench, signal }, (name, isOk) => (isOk ? (passed += 1) : failures.push(name)));
  } catch (error) {
    failures.push(String(error));
  } finally {
    ending.abort();
  }
  return { count: { passed, failed: failures.length, skipped: 0 }, output: failures.join('\n') };
}

/** @type {import('./step.mjs').Step} */
export const restartStep = {
  name: 'restart',
  about: 'npm start from an empty folder, killed, and started again',
  needs: ['build'],
  debian: ['postgresql'],
  work: restart,
};
