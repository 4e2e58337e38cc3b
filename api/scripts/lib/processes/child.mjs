import { spawn } from 'node:child_process';
import { closeSync, existsSync, openSync, readFileSync, renameSync } from 'node:fs';
import { echoLines } from './echo.mjs';
import { identityOf } from './identity.mjs';
import { send, stopProcess } from './stopping.mjs';

/**
 * What to start.
 * @typedef {object} Spec
 * @property {string} name as a person reads it: 'the API'
 * @property {string} command
 * @property {string[]} args
 * @property {string} [cwd]
 * @property {NodeJS.ProcessEnv} [env] the whole environment; left out, ours
 * @property {string} log file that takes what it prints
 * @property {string} [echo] word to show its lines under, in this terminal, as well
 * @property {string} [mark] words on its command line by which it is known again after a crash of ours
 * @property {import('./stopping.mjs').Kind} [kind]
 */

/** How a process ended. @typedef {{ code: number | null, signal: string | null, error?: Error }} Ending */

/** The log of the run before is what explains a crash, so one of them is kept. @param {string} log */
function openLog(log) {
  if (existsSync(log)) renameSync(log, log.replace(/\.log$/, '.previous.log'));
  return openSync(log, 'w', 0o600);
}

/**
 * A process that we started. It writes straight into its log file, not through us: nothing is lost and nothing blocks
 * when this script is killed. It leads its own process group, so that Ctrl-C in the terminal reaches only this script,
 * which then stops everything in order.
 */
export class Child {
  isStopping = false;

  /** @param {Spec} spec */
  constructor(spec) {
    this.spec = spec;
    this.kind = spec.kind ?? 'program';
    const log = openLog(spec.log);
    const started = spawn(spec.command, spec.args, {
      cwd: spec.cwd,
      env: spec.env ?? process.env,
      detached: true,
      stdio: spec.echo ? ['ignore', 'pipe', 'pipe'] : ['ignore', log, log],
    });
    if (spec.echo) echoLines(started, spec.echo, spec.log);
    closeSync(log);
    this.pid = started.pid;
    this.identity = this.pid === undefined ? null : identityOf(this.pid);
    /** @type {Promise<Ending>} */
    this.ended = new Promise((resolve) => {
      started.once('error', (error) => resolve({ code: null, signal: null, error }));
      started.once('exit', (code, signal) => {
        // What it started and left behind goes with it.
        if (this.kind === 'program' && this.pid) send(-this.pid, 'SIGKILL');
        resolve({ code, signal });
      });
    });
  }

  output() {
    return readFileSync(this.spec.log, 'utf8');
  }

  async stop() {
    this.isStopping = true;
    if (this.identity) await stopProcess(this.identity, this.kind);
    await this.ended;
  }
}

/** @param {Ending} ending */
export function describeEnding({ code, signal, error }) {
  if (error) return `could not be started: ${error.message}`;
  return signal ? `was ended by ${signal}` : `ended with code ${code}`;
}
