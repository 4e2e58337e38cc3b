/**
 * What a step of the test run has counted.
 * @typedef {{ passed: number, failed: number, skipped: number }} Count
 */

/**
 * One file's results in the JSON report of Jest, which Vitest writes too.
 * @typedef {{ status: string, assertionResults: { status: string }[] }} FileResult
 */

/** @param {Count[]} counts @returns {Count} */
function sum(counts) {
  const total = { passed: 0, failed: 0, skipped: 0 };
  for (const { passed, failed, skipped } of counts) {
    total.passed += passed;
    total.failed += failed;
    total.skipped += skipped;
  }
  return total;
}

/** @param {FileResult} file @returns {Count} a file that failed before its first test counts as one failure */
function countFile({ status, assertionResults }) {
  const passed = assertionResults.filter((test) => test.status === 'passed').length;
  const failed = assertionResults.filter((test) => test.status === 'failed').length;
  const skipped = assertionResults.length - passed - failed;
  return { passed, failed: status === 'failed' ? Math.max(failed, 1) : failed, skipped };
}

/** @param {string} report JSON of Jest or Vitest */
export function countJest(report) {
  return sum(JSON.parse(report).testResults.map(countFile));
}

/**
 * A test that passed only when it was tried again has passed; the list printed above the count tells which.
 * @param {string} report JSON of Playwright
 * @returns {Count}
 */
export function countPlaywright(report) {
  const { stats, errors } = JSON.parse(report);
  return {
    passed: stats.expected + stats.flaky,
    failed: stats.unexpected + errors.length,
    skipped: stats.skipped,
  };
}

/** @param {string} report TAP of Node's test runner, which ends with its own counts @returns {Count} */
export function countTap(report) {
  /** @param {string} what */
  const number = (what) => Number(report.match(new RegExp(`^# ${what} (\\d+)$`, 'm'))?.[1]);
  return {
    passed: number('pass'),
    failed: number('fail') + number('cancelled'),
    skipped: number('skipped') + number('todo'),
  };
}

/**
 * The count to believe. A runner that crashed, that left no report behind, or that found no test has not passed,
 * whatever else it says.
 * @param {Count | null} count null when there is no report that can be read
 * @param {boolean} isOk whether the runner's exit code was 0
 * @returns {Count}
 */
export function believable(count, isOk) {
  if (count === null || ![count.passed, count.failed].every(Number.isInteger)) {
    return { passed: 0, failed: 1, skipped: 0 };
  }
  const isEmpty = count.passed + count.failed === 0;
  return { ...count, failed: count.failed === 0 && (!isOk || isEmpty) ? 1 : count.failed };
}

/** @param {Count} count */
export function inWords({ passed, failed, skipped }) {
  return `${passed} passed, ${failed} failed${skipped > 0 ? `, ${skipped} skipped` : ''}`;
}

/**
 * The last line of a test run. A step that was not reached counts as failed.
 * @param {Count[]} counts
 * @param {number} unreached
 */
export function closingLine(counts, unreached) {
  const { passed, failed } = sum(counts);
  return `${passed} passed, ${failed + unreached} failed`;
}
