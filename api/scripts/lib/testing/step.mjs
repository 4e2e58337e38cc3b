import { readFileSync } from 'node:fs';
import path from 'node:path';
import { root } from '../paths.mjs';
import { npm } from '../setup/packages.mjs';
import { believable } from './tally.mjs';

/**
 * @typedef {import('./tally.mjs').Count} Count
 * @typedef {{ count: Count, output: string }} Outcome
 */

/**
 * What a step works with.
 * @typedef {object} Bench
 * @property {import('../product/run-folder.mjs').RunFolder} run
 * @property {{ adminUrl: string, host: string } | null} cluster
 * @property {NodeJS.ProcessEnv} env
 * @property {AbortSignal} signal
 */

/**
 * One step of the test run.
 * @typedef {import('../setup/schedule.mjs').Task & {
 *   about: string,
 *   debian?: import('../setup/debian.mjs').DebianPackage[],
 *   usesCluster?: boolean,
 *   work: (bench: Bench) => Promise<Outcome>,
 * }} Step
 */

/** Long enough for the slowest runner on two busy cores; a step that hangs must not hold up the rest for ever. */
const LIMIT_MS = 12 * 60_000;

/**
 * @param {Bench} bench
 * @param {{ name: string, command: string, args: string[], cwd?: string, env?: NodeJS.ProcessEnv }} command
 */
export function runCommand({ run, env, signal }, command) {
  const log = path.join(run.logs, `${command.name.replaceAll(' ', '-')}.log`);
  const spec = { ...command, cwd: command.cwd ?? root, env: { ...env, ...command.env }, log };
  return run.children.run(spec, { signal, limitMs: LIMIT_MS });
}

/** @param {boolean} isOk @param {string} output @returns {Outcome} a gate is one check: open or shut */
export const gateOutcome = (isOk, output) => ({
  count: { passed: isOk ? 1 : 0, failed: isOk ? 0 : 1, skipped: 0 },
  output,
});

/**
 * A gate that is one of package.json's scripts.
 * @param {Bench} bench
 * @param {string} script
 * @param {string[]} args
 */
export async function npmGate(bench, script, args = []) {
  const name = [script, ...args].join(' ').replaceAll(/[^\w :-]/g, '');
  const { isOk, output } = await runCommand(bench, {
    name,
    ...npm(['run', '--silent', script, '--', ...args]),
  });
  return gateOutcome(isOk, output);
}

/**
 * A runner that writes a report of what it has counted.
 * @param {Bench} bench
 * @param {Parameters<typeof runCommand>[1]} command
 * @param {string} report
 * @param {(report: string) => Count} read
 * @returns {Promise<Outcome>}
 */
export async function runnerOutcome(bench, command, report, read) {
  const { isOk, output } = await runCommand(bench, command);
  return { count: believable(readReport(report, read), isOk), output };
}

/** @param {string} file @param {(report: string) => Count} read */
function readReport(file, read) {
  try {
    return read(readFileSync(file, 'utf8'));
  } catch {
    return null; // none was written, or not to its end
  }
}
