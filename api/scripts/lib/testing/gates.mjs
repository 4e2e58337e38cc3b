import { buildMissing } from '../setup/prepare.mjs';
import { gateOutcome, npmGate } from './step.mjs';

/** @typedef {import('./step.mjs').Bench} Bench */

/** @param {Bench} bench */
async function build({ run, signal }) {
  await buildMissing(run, signal);
  return gateOutcome(true, '');
}

/**
 * ESLint with the compiler's errors among its own (`type-errors.rule.mjs`): one reading of the sources does for both.
 * @param {'portal' | 'server'} half
 * @param {string[]} without the folders of the other half
 * @returns {import('./step.mjs').Step}
 */
const lint = (half, without) => ({
  name: `lint-${half}`,
  about: `ESLint and TypeScript's own errors, the ${half}'s half`,
  // Its rules ask for types, and those of the server's packages come from their builds.
  needs: ['build'],
  work: (bench) =>
    npmGate(
      bench,
      'gate:lint',
      without.map((folder) => `--ignore-pattern=${folder}/`),
    ),
});

export const buildStep = { name: 'build', about: 'everything that is stale', work: build };
export const lintPortal = lint('portal', ['api', 'fakes', 'seeds']);
export const lintServer = lint('server', ['portal']);

/** @type {import('./step.mjs').Step[]} the quick ones */
export const gates = [
  { name: 'format', about: 'Prettier', work: (bench) => npmGate(bench, 'gate:format') },
  {
    name: 'rooms',
    about: 'who imports from whom, and no cycles',
    work: (bench) => npmGate(bench, 'gate:rooms'),
  },
  { name: 'unused', about: 'code and packages nobody uses', work: (bench) => npmGate(bench, 'gate:unused') },
  {
    name: 'types',
    about: 'TypeScript of these commands; that of the rooms is in lint',
    work: (bench) => npmGate(bench, 'gate:types'),
  },
];
