import path from 'node:path';
import { ensureDatabase } from '../postgres/databases.mjs';
import { inRoot } from '../paths.mjs';
import { freePorts } from '../processes/ports.mjs';
import { fakeAddresses, fillDatabase, startApi, startFakes } from '../product/product.mjs';
import { PlainError, tail } from '../say.mjs';
import { readSettings } from '../product/settings.mjs';
import { runnerOutcome } from './step.mjs';
import { countPlaywright } from './tally.mjs';

/** @typedef {import('./step.mjs').Bench} Bench */

/**
 * The built product with a fresh demo club, started the way `npm start` does it, on ports of its own.
 * @param {Bench} bench
 */
async function startProduct({ run, cluster, env, signal }) {
  if (!cluster) throw new Error('This step stands on the cluster.');
  const [port, cards, mail, smtp] = await freePorts(4);
  const databaseUrl = await ensureDatabase(cluster, {
    name: 'ferrite_row_test_browser',
    password: run.secrets.database,
  });
  const place = {
    settings: readSettings({ PORT: String(port) }),
    env,
    secrets: run.secrets,
    databaseUrl,
    folder: run.memory,
    logs: run.logs,
    ports: { cards, mail, smtp },
  };
  await Promise.all([startFakes(place, run.children, signal), fillDatabase(place, run.children, signal)]);
  return { place, api: await startApi(place, run.children, signal) };
}

/** @param {Bench} bench */
async function browser(bench) {
  const { place, api } = await startProduct(bench);
  const { mail, cards } = fakeAddresses(place);
  if (!mail || !cards) throw new PlainError('The browser tests run against the stand-ins only.');
  const report = path.join(bench.run.folder, 'playwright.json');
  const command = {
    name: 'playwright',
    command: inRoot('node_modules/.bin/playwright'),
    args: ['test', '-c', 'portal/browser/playwright.config.ts', '--reporter=list,json'],
    env: {
      PLAYWRIGHT_JSON_OUTPUT_FILE: report,
      FERRITE_BASE_URL: place.settings.address,
      FERRITE_MAIL_URL: mail,
      FERRITE_PAYMENTS_URL: cards,
    },
  };
  const outcome = await runnerOutcome(bench, command, report, countPlaywright);
  if (outcome.count.failed === 0) return outcome;
  return { ...outcome, output: `${outcome.output}\nThe API's last lines:\n${tail(api.output(), 30)}` };
}

/** @type {import('./step.mjs').Step} */
export const browserStep = {
  name: 'browser',
  about: 'the stories, in Chromium against the built product',
  needs: ['build'],
  // Two browsers at once, and a count of how long keys take.
  alone: true,
  usesCluster: true,
  debian: ['chromium', 'fonts-liberation'],
  work: browser,
};
