import path from 'node:path';
import { inRoot } from '../paths.mjs';
import { filesIn } from '../setup/staleness.mjs';
import { runnerOutcome } from './step.mjs';
import { countJest, countTap } from './tally.mjs';

/** @typedef {import('./step.mjs').Bench} Bench */

/** @param {Bench} bench the files are named: left to search by itself, Node would take test.mjs, this run, for a spec */
function scripts(bench) {
  const report = path.join(bench.run.folder, 'scripts.tap');
  const specs = filesIn(inRoot('api/scripts/lib')).filter((file) => file.endsWith('.spec.mjs'));
  if (specs.length === 0) throw new Error('There is no spec below api/scripts/lib.');
  const reporters = [
    ...['--test-reporter=spec', '--test-reporter-destination=stdout'],
    ...['--test-reporter=tap', `--test-reporter-destination=${report}`],
  ];
  const command = { name: 'scripts', command: process.execPath, args: ['--test', ...reporters, ...specs] };
  return runnerOutcome(bench, command, report, countTap);
}

/** @param {Bench} bench */
function jest(bench) {
  const report = path.join(bench.run.folder, 'jest.json');
  const command = {
    name: 'jest',
    command: inRoot('node_modules/.bin/jest'),
    args: ['--json', `--outputFile=${report}`, '--maxWorkers=3'],
    cwd: inRoot('api'),
    env: { TEST_DATABASE_ADMIN_URL: bench.cluster?.adminUrl },
  };
  return runnerOutcome(bench, command, report, countJest);
}

/** @param {Bench} bench */
function vitest(bench) {
  const report = path.join(bench.run.folder, 'vitest.json');
  const command = {
    name: 'vitest',
    command: inRoot('node_modules/.bin/vitest'),
    args: ['run', '--reporter=default', '--reporter=json', `--outputFile.json=${report}`],
    cwd: inRoot('portal'),
  };
  return runnerOutcome(bench, command, report, countJest);
}

/** @typedef {import('./step.mjs').Step} Step */

/** @type {Step} */
export const scriptsStep = { name: 'scripts', about: 'specs of these commands', work: scripts };

// Both use every core themselves, and what they time should not wait for a compiler.

/** @type {Step} */
export const vitestStep = { name: 'vitest', about: 'specs of the portal', alone: true, work: vitest };

/** @type {Step} */
export const jestStep = {
  name: 'jest',
  about: 'specs of the API, the levels, the fakes and the seeds',
  alone: true,
  usesCluster: true,
  debian: ['ngspice'],
  work: jest,
};
