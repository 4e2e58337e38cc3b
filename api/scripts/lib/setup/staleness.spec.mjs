import assert from 'node:assert/strict';
import { mkdirSync, mkdtempSync, renameSync, rmSync, utimesSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { afterEach, beforeEach, describe, it } from 'node:test';
import { filesIn, isFresh, outputMark, sourceMark, STAMP } from './staleness.mjs';

describe('a build', () => {
  /** @type {string} */
  let folder;
  const at = (/** @type {string[]} */ ...parts) => path.join(folder, ...parts);
  const mark = () => sourceMark(folder, filesIn(at('src')));
  const stamp = () => {
    const outputs = outputMark([at('dist')]);
    writeFileSync(at('dist', STAMP), JSON.stringify({ sources: mark(), outputs }));
  };
  const fresh = () => isFresh(mark(), [at('dist')]);

  beforeEach(() => {
    folder = mkdtempSync(path.join(tmpdir(), 'ferrite-build-'));
    for (const name of ['src/inner', 'src/node_modules', 'dist']) mkdirSync(at(name), { recursive: true });
    writeFileSync(at('src/inner/a.ts'), 'a');
    writeFileSync(at('src/b.ts'), 'b');
    writeFileSync(at('dist/a.js'), 'a');
    stamp();
  });
  afterEach(() => rmSync(folder, { recursive: true }));

  it('is fresh as long as nothing changes', () => assert.equal(fresh(), true));

  it('stays fresh when a checkout only gives files a new date', () => {
    utimesSync(at('src/b.ts'), 1, 1);
    assert.equal(fresh(), true);
  });

  it('stays fresh when a spec or an installed package changes', () => {
    writeFileSync(at('src/b.spec.ts'), 'spec');
    writeFileSync(at('src/node_modules/x.js'), 'x');
    assert.equal(fresh(), true);
  });

  /** @type {[string, () => void][]} */
  const changes = [
    ['a source changes, even to the same length', () => writeFileSync(at('src/b.ts'), 'c')],
    ['a source appears', () => writeFileSync(at('src/c.ts'), '')],
    ['a source goes', () => rmSync(at('src/b.ts'))],
    ['a source is renamed', () => renameSync(at('src/b.ts'), at('src/z.ts'))],
    [
      'text moves from one source to the next',
      () => (writeFileSync(at('src/b.ts'), ''), writeFileSync(at('src/inner/a.ts'), 'ab')),
    ],
    ['an output is deleted', () => rmSync(at('dist/a.js'))],
    ['an output is written by somebody else', () => writeFileSync(at('dist/a.js'), 'other')],
    ['the whole output is cleared', () => rmSync(at('dist'), { recursive: true })],
    ['its note is damaged', () => writeFileSync(at('dist', STAMP), '{')],
  ];
  for (const [what, change] of changes) {
    it(`is stale when ${what}`, () => {
      change();
      assert.equal(fresh(), false);
    });
  }
});
