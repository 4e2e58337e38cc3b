// npm start: everything from a bare Debian machine with Node to the running product.
import './lib/toolchain.mjs';
import process from 'node:process';
import { openPlace } from './lib/product/place.mjs';
import { refuseTaken } from './lib/processes/ports.mjs';
import { buildMissing, installMissing } from './lib/setup/prepare.mjs';
import { fakeAddresses, fillDatabase, startApi, startFakes } from './lib/product/product.mjs';
import { readiness } from './lib/product/readiness.mjs';
import { openRunFolder } from './lib/product/run-folder.mjs';
import { say } from './lib/say.mjs';
import { runSession, untilStopped } from './lib/session.mjs';
import { readSettings } from './lib/product/settings.mjs';

await runSession(async (session) => {
  const { signal } = session;
  const settings = readSettings(process.env);
  const { address, dataFolder, isProduction } = settings;

  const run = await openRunFolder(dataFolder, address, session);
  await refuseTaken(settings);
  await installMissing(run, settings.databaseUrl ? [] : ['postgresql'], signal);
  await buildMissing(run, signal);

  const place = await openPlace(run, settings, signal);
  await Promise.all([startFakes(place, run.children, signal), fillDatabase(place, run.children, signal)]);
  await startApi(place, run.children, signal);

  say(readiness({ address, isDemo: !isProduction, ...fakeAddresses(place), logs: run.logs }));
  await Promise.race([untilStopped(signal), run.children.untilOneDies()]);
  say('Stopping …');
});
