import { mkdirSync } from 'node:fs';
import path from 'node:path';
import { ensureDatabase } from '../postgres/databases.mjs';
import { inRoot } from '../paths.mjs';
import { gateOutcome, runCommand } from './step.mjs';

/** @typedef {import('./step.mjs').Bench} Bench */

/** @param {Bench} bench */
function scratch({ run }) {
  const folder = path.join(run.folder, 'scratch');
  mkdirSync(folder, { recursive: true });
  return folder;
}

/**
 * Runs commands until one fails; that one's output is the answer.
 * @param {Bench} bench
 * @param {Parameters<typeof runCommand>[1][]} commands
 * @param {string} remedy
 */
async function allMustPass(bench, commands, remedy) {
  for (const command of commands) {
    const { isOk, output } = await runCommand(bench, command);
    if (!isOk) return gateOutcome(false, `${output}\n${remedy}`);
  }
  return gateOutcome(true, '');
}

/** @param {Bench} bench the committed document and client are what the code gives now */
function client(bench) {
  const document = path.join(scratch(bench), 'openapi.json');
  const schema = path.join(scratch(bench), 'schema.d.ts');
  const diff = { command: 'diff', cwd: inRoot() };
  return allMustPass(
    bench,
    [
      { name: 'openapi', command: process.execPath, args: [inRoot('api/dist/openapi.js'), document] },
      { name: 'api document drift', ...diff, args: ['-u', 'api/openapi.json', document] },
      {
        name: 'openapi-typescript',
        command: inRoot('node_modules/.bin/openapi-typescript'),
        args: [document, '-o', schema],
      },
      { name: 'client drift', ...diff, args: ['-u', 'portal/src/api-client/schema.d.ts', schema] },
    ],
    'To renew both files: npm run build -w @ferrite-row/api && npm run openapi -w @ferrite-row/api && npm run client -w portal',
  );
}

/** @param {Bench} bench the migrations, all of them, give the schema that the entities describe */
async function migrations(bench) {
  if (!bench.cluster) throw new Error('This step stands on the cluster.');
  const name = 'ferrite_row_test_migrations';
  const password = bench.run.secrets.database;
  const env = { DATABASE_URL: await ensureDatabase(bench.cluster, { name, password }) };
  const dataSource = inRoot('api/dist/database/data-source.js');
  return allMustPass(
    bench,
    [
      { name: 'migrate', command: process.execPath, args: [inRoot('api/dist/migrate.js')], env },
      {
        name: 'migration drift',
        command: inRoot('node_modules/.bin/typeorm'),
        args: ['-d', dataSource, 'migration:generate', path.join(scratch(bench), 'Drift'), '--check'],
        env,
      },
    ],
    'The entities and the migrations disagree: write a migration for what is shown above.',
  );
}

/** @type {import('./step.mjs').Step[]} */
export const drift = [
  { name: 'client', about: 'OpenAPI document and client are fresh', needs: ['build'], work: client },
  {
    name: 'migrations',
    about: 'migrations and entities agree',
    needs: ['build'],
    usesCluster: true,
    work: migrations,
  },
];
