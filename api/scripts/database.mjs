// node api/scripts/database.mjs: a throw-away cluster for running single specs by hand, until Ctrl-C.
import './lib/toolchain.mjs';
import { clusterOf } from './lib/product/place.mjs';
import { installMissing } from './lib/setup/prepare.mjs';
import { say } from './lib/say.mjs';
import { runSession, untilStopped } from './lib/session.mjs';
import { openThrowAway } from './lib/testing/throw-away.mjs';

await runSession(async (session) => {
  const { signal } = session;
  const run = await openThrowAway('database', session);
  await installMissing(run, ['postgresql'], signal);
  const { adminUrl } = await clusterOf(run, true, signal);
  say('A test cluster is running until Ctrl-C. In another terminal:');
  say();
  say(`export TEST_DATABASE_ADMIN_URL=${adminUrl}`);
  say('cd api && npx jest src/bookings');
  await Promise.race([untilStopped(signal), run.children.untilOneDies()]);
});
