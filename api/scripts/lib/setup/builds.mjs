import { readdirSync, rmSync, writeFileSync } from 'node:fs';
import path from 'node:path';
import { npm, workspace } from './packages.mjs';
import { inRoot, root } from '../paths.mjs';
import { sayWhile } from '../say.mjs';
import { schedule } from './schedule.mjs';
import { filesIn, isFresh, outputMark, sourceMark, STAMP } from './staleness.mjs';

/**
 * What is built, from what. Whole folders are named where they hold nothing else, so that a new file is not forgotten.
 * @typedef {import('./schedule.mjs').Task & { sources: string[], outputs: string[] }} Build
 * @type {Build[]}
 */
const builds = [
  {
    name: 'api',
    sources: [
      'api/src',
      'api/levels',
      'api/package.json',
      'api/tsconfig.json',
      'api/tsconfig.build.json',
      'api/nest-cli.json',
    ],
    outputs: ['api/dist', 'api/levels/dist'],
  },
  { name: 'fakes', sources: ['fakes'], outputs: ['fakes/dist'] },
  {
    name: 'portal',
    sources: [
      'portal/src',
      'portal/public',
      'portal/index.html',
      'portal/package.json',
      'portal/tsconfig.json',
      'portal/vite.config.ts',
      'api/levels/src',
    ],
    outputs: ['portal/dist'],
  },
  // It is compiled against the API's output, and runs with it.
  { name: 'seeds', needs: ['api'], sources: ['seeds', 'api/src', 'api/levels/src'], outputs: ['seeds/dist'] },
];

/** @param {Build} build other versions of the packages make another build */
function sourcesOf(build) {
  const files = [...build.sources, 'package-lock.json'].flatMap((place) => filesIn(inRoot(place)));
  return sourceMark(
    root,
    files.filter((file) => !file.endsWith('.tsbuildinfo')),
  );
}

/** @param {Build} build */
const folders = (build) => build.outputs.map((folder) => inRoot(folder));

/**
 * Clears what the last build left. The compiler's own notes go too: they would tell it that a file which somebody has
 * deleted is still there.
 * @param {Build} build
 */
function clear(build) {
  for (const folder of folders(build)) {
    rmSync(folder, { recursive: true, force: true });
    const above = path.dirname(folder);
    for (const name of readdirSync(above)) {
      if (name.endsWith('.tsbuildinfo')) rmSync(path.join(above, name));
    }
  }
}

/**
 * Builds what is stale.
 * @param {import('../processes/children.mjs').Children} children
 * @param {string} logs
 * @param {AbortSignal} signal
 */
export async function buildStale(children, logs, signal) {
  const stale = builds.filter((build) => !isFresh(sourcesOf(build), folders(build)));
  if (stale.length === 0) return;
  /** @param {Build} build */
  async function make(build) {
    // Taken before building: what is saved while the compiler runs is built the next time.
    const sources = sourcesOf(build);
    clear(build);
    const log = path.join(logs, `build-${build.name}.log`);
    const name = `The build of ${build.name}`;
    await children.mustRun(
      { name, ...npm(['run', 'build', ...workspace(build.name)]), cwd: root, log },
      signal,
    );
    writeFileSync(
      path.join(folders(build)[0], STAMP),
      JSON.stringify({ sources, outputs: outputMark(folders(build)) }),
    );
    return true;
  }
  const names = stale.map(({ name }) => name).join(', ');
  await sayWhile(`Building ${names}`, async () => void (await schedule(stale, 2, make)));
}
