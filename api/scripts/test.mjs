// npm test: its own set-up, every check, one sum.
import './lib/toolchain.mjs';
import process from 'node:process';
import { clusterOf } from './lib/product/place.mjs';
import { installMissing } from './lib/setup/prepare.mjs';
import { PlainError, say, seconds } from './lib/say.mjs';
import { schedule } from './lib/setup/schedule.mjs';
import { runSession } from './lib/session.mjs';
import { withoutOurs } from './lib/product/settings.mjs';
import { browserStep } from './lib/testing/browser.mjs';
import { drift } from './lib/testing/drift.mjs';
import { buildStep, gates, lintPortal, lintServer } from './lib/testing/gates.mjs';
import { help, readOptions } from './lib/testing/options.mjs';
import { restartStep } from './lib/testing/restart.mjs';
import { jestStep, scriptsStep, vitestStep } from './lib/testing/runners.mjs';
import { closingLine, inWords } from './lib/testing/tally.mjs';
import { openThrowAway } from './lib/testing/throw-away.mjs';

/**
 * @typedef {import('./lib/testing/step.mjs').Step} Step
 * @typedef {import('./lib/testing/step.mjs').Bench} Bench
 * @typedef {import('./lib/testing/step.mjs').Outcome} Outcome
 */

/** Compilers and linters make much that lives a moment: a larger nursery spares them a tenth of their time. */
const ROOMY = { NODE_OPTIONS: '--max-semi-space-size=64' };

/**
 * The order is a matter of time on two cores: the long ones that use a core each go first, side by side, the short
 * ones fill what is left, and what uses every core comes last.
 * @type {Step[]}
 */
const steps = [
  buildStep,
  lintPortal,
  lintServer,
  restartStep,
  ...gates,
  ...drift,
  scriptsStep,
  vitestStep,
  jestStep,
  browserStep,
];

/**
 * @param {Step[]} chosen
 * @param {import('./lib/session.mjs').Session} session
 * @returns {Promise<Bench>}
 */
async function setUp(chosen, session) {
  const run = await openThrowAway('test', session);
  const usesCluster = chosen.some((step) => step.usesCluster);
  const debian = new Set(chosen.flatMap((step) => step.debian ?? []));
  if (usesCluster) debian.add('postgresql');
  await installMissing(run, [...debian], session.signal);
  const cluster = usesCluster ? await clusterOf(run, true, session.signal) : null;
  return { run, cluster, env: { ...withoutOurs(process.env), ...ROOMY, TZ: 'UTC' }, signal: session.signal };
}

/** @param {Step} step @param {Bench} bench @returns {Promise<Outcome>} */
async function attempt(step, bench) {
  try {
    return await step.work(bench);
  } catch (error) {
    if (bench.signal.aborted) throw error;
    const output = error instanceof PlainError ? error.message : String(/** @type {Error} */ (error).stack);
    return { count: { passed: 0, failed: 1, skipped: 0 }, output };
  }
}

/**
 * @param {Step[]} chosen
 * @param {Map<Step, Outcome>} outcomes filled as steps end, so that a run cut short still tells what it has seen
 * @param {import('./lib/session.mjs').Session} session
 */
async function runSteps(chosen, outcomes, session) {
  const bench = await setUp(chosen, session);
  await schedule(chosen, 2, async (step) => {
    const from = performance.now();
    const outcome = await attempt(step, bench);
    outcomes.set(step, outcome);
    say(`── ${step.name}: ${inWords(outcome.count)} (${seconds(performance.now() - from)})`);
    if (outcome.output.trim()) say(`${outcome.output.trimEnd()}\n`);
    return outcome.count.failed === 0;
  });
}

/** @param {Step[]} chosen @param {Map<Step, Outcome>} outcomes */
function tellEnd(chosen, outcomes) {
  const unreached = chosen.filter((step) => !outcomes.has(step));
  const failed = chosen.filter((step) => (outcomes.get(step)?.count.failed ?? 0) > 0);
  /** @param {string} what @param {Step[]} which */
  const list = (what, which) =>
    which.length > 0 && say(`${what}: ${which.map(({ name }) => name).join(', ')}`);
  list('Failed', failed);
  list('Not reached', unreached);
  say(
    closingLine(
      [...outcomes.values()].map(({ count }) => count),
      unreached.length,
    ),
  );
  return failed.length + unreached.length === 0;
}

await runSession(
  async (session) => {
    const chosen = readOptions(process.argv.slice(2), steps);
    if (chosen === null) return say(help(steps));
    /** @type {Map<Step, Outcome>} */
    const outcomes = new Map();
    // Put first, so it comes last: after everything is stopped, the sum is the last line.
    session.atEnd(() => tellEnd(chosen, outcomes));
    await runSteps(chosen, outcomes, session);
  },
  { codeWhenStopped: 130 },
);
