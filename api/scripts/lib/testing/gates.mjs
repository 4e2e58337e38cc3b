import { inRoot } from '../paths.mjs';
import { npm, workspace } from '../setup/packages.mjs';
import { buildMissing } from '../setup/prepare.mjs';
import { gateOutcome, npmGate, runCommand } from './step.mjs';

/** @typedef {import('./step.mjs').Bench} Bench */

/** @param {Bench} bench */
async function build({ run, signal }) {
  await buildMissing(run, signal);
  return gateOutcome(true, '');
}

/** @param {Bench} bench every workspace is checked, also after one has failed */
async function types(bench) {
  const workspaces = ['api', 'fakes', 'seeds', 'portal'];
  const checks = [
    ...workspaces.map((name) => ({
      name: `types of ${name}`,
      ...npm(['run', '--silent', 'typecheck', ...workspace(name)]),
    })),
    {
      name: 'types of scripts',
      command: inRoot('node_modules/.bin/tsc'),
      args: ['-p', inRoot('api/scripts')],
    },
  ];
  let isAllOk = true;
  let text = '';
  for (const check of checks) {
    const { isOk, output } = await runCommand(bench, check);
    isAllOk &&= isOk;
    if (!isOk) text += `${output}\n\n`;
  }
  return gateOutcome(isAllOk, text);
}

/** @type {import('./step.mjs').Step[]} */
export const gates = [
  { name: 'build', about: 'everything that is stale', work: build },
  { name: 'format', about: 'Prettier', work: (bench) => npmGate(bench, 'gate:format') },
  {
    name: 'rooms',
    about: 'who imports from whom, and no cycles',
    work: (bench) => npmGate(bench, 'gate:rooms'),
  },
  { name: 'unused', about: 'code and packages nobody uses', work: (bench) => npmGate(bench, 'gate:unused') },
  { name: 'types', about: 'TypeScript, every workspace', needs: ['build'], work: types },
  // Its rules ask for types, and those of the server's packages come from their builds.
  { name: 'lint', about: 'ESLint', needs: ['build'], work: (bench) => npmGate(bench, 'gate:lint') },
];
