import assert from 'node:assert/strict';
import { describe, it } from 'node:test';
import { isInstalled, isLocked } from './packages.mjs';

const lock = {
  packages: {
    '': {},
    api: { dependencies: { pg: '8.0.0' } },
    'node_modules/@ferrite-row/api': { link: true },
    'node_modules/pg': { version: '8.0.0', integrity: 'sha-a' },
    'node_modules/for-another-machine': { version: '1.0.0', integrity: 'sha-b', optional: true },
  },
};
const installed = () => ({
  packages: /** @type {Record<string, { version?: string, integrity?: string, link?: boolean }>} */ ({
    api: {},
    'node_modules/@ferrite-row/api': { link: true },
    'node_modules/pg': { version: '8.0.0', integrity: 'sha-a' },
  }),
});

const everywhere = () => true;

describe('node_modules', () => {
  it('is complete without optional packages of other machines', () => {
    assert.equal(isInstalled(lock, installed(), everywhere), true);
  });

  it('is stale when there is none, or its installation was cut short', () => {
    assert.equal(isInstalled(lock, null, everywhere), false);
  });

  it('is stale when a folder on its list has been deleted', () => {
    assert.equal(
      isInstalled(lock, installed(), (place) => place !== 'node_modules/pg'),
      false,
    );
  });

  it('is stale when a package is missing', () => {
    const { packages } = installed();
    delete packages['node_modules/pg'];
    assert.equal(isInstalled(lock, { packages }, everywhere), false);
  });

  it('is stale when a package has another version, or other contents under the same version', () => {
    for (const other of [
      { version: '8.0.1', integrity: 'sha-a' },
      { version: '8.0.0', integrity: 'sha-x' },
    ]) {
      const { packages } = installed();
      packages['node_modules/pg'] = other;
      assert.equal(isInstalled(lock, { packages }, everywhere), false);
    }
  });

  it('is stale when it holds a package the lock no longer names', () => {
    const { packages } = installed();
    packages['node_modules/left-over'] = { version: '1.0.0' };
    assert.equal(isInstalled(lock, { packages }, everywhere), false);
  });
});

describe('a package.json', () => {
  it('agrees with a lock made from it, in whatever order it lists packages', () => {
    const manifest = { dependencies: { b: '2', a: '1' }, devDependencies: { c: '3' } };
    assert.equal(isLocked(manifest, { dependencies: { a: '1', b: '2' }, devDependencies: { c: '3' } }), true);
  });

  it('does not agree when a package was added, or moved to another version', () => {
    assert.equal(isLocked({ dependencies: { a: '1', b: '2' } }, { dependencies: { a: '1' } }), false);
    assert.equal(isLocked({ devDependencies: { a: '2' } }, { devDependencies: { a: '1' } }), false);
    assert.equal(isLocked({ dependencies: { a: '1' } }, undefined), false);
  });
});
