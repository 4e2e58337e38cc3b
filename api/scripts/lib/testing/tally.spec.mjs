import assert from 'node:assert/strict';
import { describe, it } from 'node:test';
import { believable, closingLine, countJest, countPlaywright, countTap, inWords } from './tally.mjs';

/** @param {string} status @param {string[]} tests */
const file = (status, ...tests) => ({ status, assertionResults: tests.map((each) => ({ status: each })) });
/** @param {ReturnType<typeof file>[]} testResults */
const report = (...testResults) => JSON.stringify({ testResults });

describe('what Jest and Vitest report', () => {
  it('is counted test by test', () => {
    const text = report(
      file('passed', 'passed', 'passed', 'pending'),
      file('failed', 'passed', 'failed', 'todo'),
    );
    assert.deepEqual(countJest(text), { passed: 3, failed: 1, skipped: 2 });
  });

  it('counts a file that failed before its first test as one failure', () => {
    assert.deepEqual(countJest(report(file('failed'), file('passed', 'passed'))), {
      passed: 1,
      failed: 1,
      skipped: 0,
    });
  });

  it('counts a file whose clean-up failed after tests that passed as one failure', () => {
    assert.equal(countJest(report(file('failed', 'passed'))).failed, 1);
  });
});

describe('what Playwright reports', () => {
  it('is counted with the errors outside of tests', () => {
    const stats = { expected: 4, flaky: 1, unexpected: 2, skipped: 3 };
    assert.deepEqual(countPlaywright(JSON.stringify({ stats, errors: [{}] })), {
      passed: 5,
      failed: 3,
      skipped: 3,
    });
  });
});

describe("what Node's runner reports", () => {
  it('is read from the counts at its end', () => {
    const end = [
      '# tests 9',
      '# suites 2',
      '# pass 5',
      '# fail 1',
      '# cancelled 1',
      '# skipped 1',
      '# todo 1',
    ];
    assert.deepEqual(countTap(['TAP version 13', ...end, ''].join('\n')), {
      passed: 5,
      failed: 2,
      skipped: 2,
    });
  });

  it('is no count at all when it was cut short', () => {
    assert.deepEqual(believable(countTap('TAP version 13\nok 1 - first\n'), false), {
      passed: 0,
      failed: 1,
      skipped: 0,
    });
  });
});

describe('the count to believe', () => {
  const three = { passed: 3, failed: 0, skipped: 0 };

  it('is what was reported when the runner ended well', () => {
    assert.deepEqual(believable(three, true), three);
  });

  it('has a failure when there is no report', () => {
    assert.equal(believable(null, true).failed, 1);
  });

  it('has a failure when the runner crashed after tests that all passed', () => {
    assert.deepEqual(believable(three, false), { passed: 3, failed: 1, skipped: 0 });
  });

  it('has a failure when no test was found, or all were skipped', () => {
    assert.equal(believable({ passed: 0, failed: 0, skipped: 7 }, true).failed, 1);
  });

  it('does not count failed tests twice when the runner tells of them by its exit code too', () => {
    assert.equal(believable({ passed: 3, failed: 2, skipped: 0 }, false).failed, 2);
  });
});

describe('the last line', () => {
  it('sums every step and counts one that was not reached as failed', () => {
    const counts = [
      { passed: 1, failed: 0, skipped: 0 },
      { passed: 40, failed: 2, skipped: 1 },
    ];
    assert.equal(closingLine(counts, 3), '41 passed, 5 failed');
  });

  it('is all failure when nothing was reached', () => {
    assert.equal(closingLine([], 12), '0 passed, 12 failed');
  });

  it('mentions what was skipped in a step, where there is something', () => {
    assert.equal(inWords({ passed: 1, failed: 0, skipped: 2 }), '1 passed, 0 failed, 2 skipped');
    assert.equal(inWords({ passed: 1, failed: 0, skipped: 0 }), '1 passed, 0 failed');
  });
});
