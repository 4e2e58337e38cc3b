import { createHash } from 'node:crypto';
import { existsSync, readdirSync, readFileSync, statSync } from 'node:fs';
import path from 'node:path';

/** Folders that no build reads. */
const SKIPPED = new Set(['node_modules', 'dist']);

/** @param {string} name specs are no part of what is built */
const isSpec = (name) => /\.(spec|test)\.tsx?$/.test(name);

/**
 * @param {string} place a file or a folder
 * @returns {string[]} the files in it, in an order that does not depend on the disk
 */
export function filesIn(place) {
  if (!existsSync(place)) return [];
  if (!statSync(place).isDirectory()) return [place];
  return readdirSync(place)
    .filter((name) => !SKIPPED.has(name) && !isSpec(name))
    .sort()
    .flatMap((name) => filesIn(path.join(place, name)));
}

/**
 * A short text that changes when any of these files changes, appears, goes or is renamed. It is made from what is in
 * them: dates change with every checkout, and a copy may keep old ones.
 * @param {string} base folder that the names are taken from
 * @param {string[]} files
 */
export function sourceMark(base, files) {
  const hash = createHash('sha256');
  for (const file of files) {
    hash
      .update(`${path.relative(base, file)}\0`)
      .update(readFileSync(file))
      .update('\0');
  }
  return hash.digest('hex');
}

/**
 * The same for what a build has written, from names, sizes and dates: it tells whether somebody else has written there
 * since, or taken something away.
 * @param {string[]} folders
 */
export function outputMark(folders) {
  const hash = createHash('sha256');
  for (const folder of folders) {
    for (const file of readdirSync(folder, { recursive: true }).map(String).sort()) {
      const { size, mtimeMs } = statSync(path.join(folder, file));
      if (path.basename(file) !== STAMP) hash.update(`${file}\0${size}\0${mtimeMs}\0`);
    }
  }
  return hash.digest('hex');
}

/** Where a build notes what it was made from and what it has written. */
export const STAMP = '.built-from.json';

/**
 * @param {string} sources mark of the sources as they are now
 * @param {string[]} outputs folders of the build; the first one carries the note
 */
export function isFresh(sources, outputs) {
  try {
    const stamp = JSON.parse(readFileSync(path.join(outputs[0], STAMP), 'utf8'));
    return stamp.sources === sources && stamp.outputs === outputMark(outputs);
  } catch {
    return false; // never built, or cleared
  }
}
