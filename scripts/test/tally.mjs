import { readFileSync } from 'node:fs';

/** @typedef {{ passed: number, failed: number }} Tally */

/** One check that either holds or does not. @param {boolean} held @returns {Tally} */
export function oneCheck(held) {
  return held ? { passed: 1, failed: 0 } : { passed: 0, failed: 1 };
}

/**
 * Counts from a tool's JSON report. A tool that failed without a failed test (a file that does not load) counts as one failure.
 * @param {string} file
 * @param {number} code the tool's exit code
 * @param {(report: any) => Tally} read
 * @returns {Tally}
 */
export function tallyFrom(file, code, read) {
  let tally = { passed: 0, failed: 0 };
  try {
    tally = read(JSON.parse(readFileSync(file, 'utf8')));
  } catch {
    return { passed: 0, failed: 1 };
  }
  return code !== 0 && tally.failed === 0 ? { ...tally, failed: 1 } : tally;
}

/** @param {any} report of vitest */
export function vitestTally(report) {
  const unloaded = report.testResults.filter((/** @type {any} */ file) => file.status === 'failed' && file.assertionResults.length === 0).length;
  return { passed: report.numPassedTests, failed: report.numFailedTests + unloaded };
}

/** @param {any} report of Playwright; a flaky test is a failed one */
export function playwrightTally(report) {
  return { passed: report.stats.expected, failed: report.stats.unexpected + report.stats.flaky + report.errors.length };
}
