// @ts-check
// Counts what passed and what failed, from the reports that the test runners leave.
import { readFileSync } from 'node:fs';

/** @typedef {{ passed: number, failed: number }} Tally */

/** A check that passes or fails as a whole. @param {number} exitCode @returns {Tally} */
export const checked = (exitCode) => (exitCode === 0 ? { passed: 1, failed: 0 } : { passed: 0, failed: 1 });

/** @param {Tally[]} tallies @returns {Tally} */
export const sum = (tallies) => ({
  passed: tallies.reduce((total, { passed }) => total + passed, 0),
  failed: tallies.reduce((total, { failed }) => total + failed, 0),
});

/** A runner that failed without naming a test, or left no report, still counts as a failure. @param {number} exitCode @param {Tally} counted */
const atLeastTheExitCode = (exitCode, { passed, failed }) => ({
  passed,
  failed: exitCode === 0 ? failed : Math.max(failed, 1),
});

/** @param {string} path */
const readReport = (path) => {
  try {
    return JSON.parse(readFileSync(path, 'utf8'));
  } catch {
    return undefined;
  }
};

/** @typedef {{ status: string, assertionResults: { status: string }[] }} VitestFile */

/** @param {number} exitCode @param {string} reportPath @returns {Tally} */
export const vitestTally = (exitCode, reportPath) => {
  const report = readReport(reportPath);
  if (!report) return { passed: 0, failed: 1 };
  /** @type {VitestFile[]} */
  const files = report.testResults;
  const count = (/** @type {VitestFile} */ file, /** @type {string} */ status) =>
    file.assertionResults.filter((test) => test.status === status).length;
  const tallies = files.map((file) => {
    const failed = count(file, 'failed');
    // A file that could not be read, or whose preparation failed, has failed without a failed test in it.
    return { passed: count(file, 'passed'), failed: file.status === 'failed' ? Math.max(failed, 1) : failed };
  });
  return atLeastTheExitCode(exitCode, sum(tallies));
};

/** @param {number} exitCode @param {string} reportPath @returns {Tally} */
export const playwrightTally = (exitCode, reportPath) => {
  const report = readReport(reportPath);
  if (!report) return { passed: 0, failed: 1 };
  const { expected, unexpected, flaky } = report.stats;
  return atLeastTheExitCode(exitCode, { passed: expected, failed: unexpected + flaky });
};
