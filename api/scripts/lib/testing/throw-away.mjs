import { existsSync, mkdirSync, readdirSync, rmSync, statSync } from 'node:fs';
import path from 'node:path';
import { clearCluster } from '../postgres/leftovers.mjs';
import { isHeld } from '../processes/lock.mjs';
import { inRoot } from '../paths.mjs';
import { clusterFolder } from '../product/place.mjs';
import { stopRecorded } from '../processes/records.mjs';
import { LOCK, openRunFolder, RECORDS } from '../product/run-folder.mjs';

/** @param {string} folder one that was made this moment may only not have its lock yet */
function isAbandoned(folder) {
  const lock = path.join(folder, LOCK);
  if (existsSync(lock)) return !isHeld(lock);
  return Date.now() - statSync(folder).mtimeMs > 60_000;
}

/** Ends and removes what killed test runs have left. @param {string} parent */
async function sweep(parent) {
  for (const name of readdirSync(parent)) {
    const folder = path.join(parent, name);
    if (!isAbandoned(folder)) continue;
    await stopRecorded(path.join(folder, RECORDS));
    await clearCluster(clusterFolder(folder));
    rmSync(folder, { recursive: true, force: true });
  }
}

/**
 * A folder for this run alone, which goes when the run ends. Each run has its own, so several can go on at once.
 * @param {string} what names the kind of run
 * @param {import('../session.mjs').Session} session
 */
export async function openThrowAway(what, session) {
  const parent = inRoot('.ferrite-test');
  mkdirSync(parent, { recursive: true });
  await sweep(parent);
  const folder = path.join(parent, `${what}-${process.pid}`);
  session.atEnd(() => rmSync(folder, { recursive: true, force: true }));
  return openRunFolder(folder, 'its test ports', session);
}
