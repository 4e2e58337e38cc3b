import assert from 'node:assert/strict';
import { describe, it } from 'node:test';
import { readOptions } from './options.mjs';

const work = () => Promise.reject(new Error('not run here'));
const steps = [
  { name: 'build', about: '', work },
  { name: 'types', about: '', needs: ['build'], work },
  { name: 'jest', about: '', work },
];
/** @param {string[]} args */
const chosen = (...args) => readOptions(args, steps)?.map(({ name }) => name);

describe('npm test --only', () => {
  it('takes all steps when it is left out', () => assert.deepEqual(chosen(), ['build', 'types', 'jest']));

  it('takes the named steps and those they need, in the usual order', () => {
    assert.deepEqual(chosen('--only', 'jest,types'), ['build', 'types', 'jest']);
    assert.deepEqual(chosen('--only', 'jest'), ['jest']);
  });

  it('refuses a step that does not exist, and lists those that do', () => {
    assert.throws(() => chosen('--only', 'jset'), /no step named jset[^]*jest/);
  });

  it('refuses an option it does not know', () => assert.throws(() => chosen('--fast'), /--fast[^]*Steps:/));

  it('takes no step when help is asked for', () => assert.equal(chosen('--help'), undefined));
});
