// @ts-check
import { readFileSync } from 'node:fs';

/** @typedef {{ passed: number, failed: number }} Count */

/**
 * A check without cases of its own counts as one.
 *
 * @param {number} exitCode
 * @returns {Count}
 */
export function countOne(exitCode) {
  return exitCode === 0 ? { passed: 1, failed: 0 } : { passed: 0, failed: 1 };
}

/**
 * @typedef {object} VitestReport vitest's json report, as far as it is read here
 * @property {number} numPassedTests
 * @property {number} numFailedTests
 * @property {{ status: string, assertionResults: { status: string }[] }[]} testResults one a file
 */

/**
 * @param {VitestReport | null} report null when there is none
 * @param {number} exitCode
 * @returns {Count} a file that fails outside its tests (it does not load, say) counts as one failure
 */
export function countVitest(report, exitCode) {
  if (report === null) return { passed: 0, failed: 1 };
  const brokenFiles = report.testResults.filter(
    (file) => file.status === 'failed' && file.assertionResults.every(({ status }) => status !== 'failed'),
  );
  return withExit(
    { passed: report.numPassedTests, failed: report.numFailedTests + brokenFiles.length },
    exitCode,
  );
}

/**
 * @typedef {object} PlaywrightReport Playwright's json report, as far as it is read here
 * @property {{ expected: number, unexpected: number, flaky: number, skipped: number }} stats
 */

/**
 * @param {PlaywrightReport | null} report null when there is none
 * @param {number} exitCode
 * @returns {Count} a test that passed only when repeated counts as failed
 */
export function countPlaywright(report, exitCode) {
  if (report === null) return { passed: 0, failed: 1 };
  const { expected, unexpected, flaky } = report.stats;
  return withExit({ passed: expected, failed: unexpected + flaky }, exitCode);
}

/**
 * @param {readonly Count[]} counts
 * @returns {Count}
 */
export function sumCounts(counts) {
  return {
    passed: counts.reduce((sum, { passed }) => sum + passed, 0),
    failed: counts.reduce((sum, { failed }) => sum + failed, 0),
  };
}

/**
 * @template T
 * @param {string} file
 * @returns {T | null} the report in it; null when it is missing or cut short
 */
export function readReport(file) {
  try {
    return JSON.parse(readFileSync(file, 'utf8'));
  } catch {
    return null;
  }
}

/**
 * A run that failed although no test of it did (nothing found, an error between tests) has one failure.
 *
 * @param {Count} count
 * @param {number} exitCode
 * @returns {Count}
 */
function withExit(count, exitCode) {
  return exitCode !== 0 && count.failed === 0 ? { ...count, failed: 1 } : count;
}
