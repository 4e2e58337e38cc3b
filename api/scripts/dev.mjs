// npm run dev: the product for the people who change it, with the API and the portal reloading on every save.
import './lib/toolchain.mjs';
import path from 'node:path';
import process from 'node:process';
import { untilHealthy } from './lib/processes/health.mjs';
import { inRoot } from './lib/paths.mjs';
import { openPlace } from './lib/product/place.mjs';
import { freePorts, refuseTaken } from './lib/processes/ports.mjs';
import { buildMissing, installMissing } from './lib/setup/prepare.mjs';
import { apiEnvironment, fakeAddresses, fillDatabase, startFakes } from './lib/product/product.mjs';
import { readiness } from './lib/product/readiness.mjs';
import { openRunFolder } from './lib/product/run-folder.mjs';
import { say } from './lib/say.mjs';
import { runSession, untilStopped } from './lib/session.mjs';
import { readSettings } from './lib/product/settings.mjs';

/** @param {string} name of a program in node_modules */
const bin = (name) => inRoot('node_modules/.bin', name);

await runSession(async (session) => {
  const { signal } = session;
  // People open the portal's reloading server; it hands what starts with /api on to the API behind it.
  const settings = readSettings(process.env);
  const run = await openRunFolder(settings.dataFolder, settings.address, session);
  await refuseTaken(settings);
  await installMissing(run, settings.databaseUrl ? [] : ['postgresql'], signal);
  await buildMissing(run, signal);

  const [apiPort] = await freePorts(1, [settings.port + 4]);
  const apiAddress = `http://127.0.0.1:${apiPort}`;
  const publicUrl = settings.publicUrl ?? settings.address;
  const behind = { ...settings, port: apiPort, host: '127.0.0.1', address: apiAddress, publicUrl };
  const place = await openPlace(run, behind, signal);
  await Promise.all([startFakes(place, run.children, signal), fillDatabase(place, run.children, signal)]);

  /** @param {string} word @param {string[]} command @param {string} cwd @param {NodeJS.ProcessEnv} [env] */
  const watch = (word, [command, ...args], cwd, env) => {
    const log = path.join(run.logs, `${word}.log`);
    return run.children.start({
      name: word,
      command: bin(command),
      args,
      cwd: inRoot(cwd),
      env,
      log,
      echo: word,
    });
  };
  watch('levels', ['tsc', '-b', '--watch', '--preserveWatchOutput'], 'api/levels');
  const api = watch(
    'api',
    ['nest', 'start', '--watch', '--preserveWatchOutput'],
    'api',
    apiEnvironment(place),
  );
  const vite = ['vite', '--host', settings.host, '--port', String(settings.port), '--strictPort'];
  watch('portal', vite, 'portal', { ...process.env, API_URL: apiAddress });
  // It compiles everything first.
  await untilHealthy(api, `${apiAddress}/api/health`, signal, 300_000);

  const { address, isProduction } = settings;
  say(readiness({ address, isDemo: !isProduction, ...fakeAddresses(place), logs: run.logs }));
  await Promise.race([untilStopped(signal), run.children.untilOneDies()]);
});
