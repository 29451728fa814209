/** @typedef {{ passed: number, failed: number }} Count */

/**
 * @typedef {object} Report what Vitest's JSON reporter writes, as far as it is read here
 * @property {number} numPassedTests
 * @property {number} numFailedTests
 * @property {number} numPendingTests
 * @property {number} numTodoTests
 * @property {{ status: string, assertionResults: { status: string }[] }[]} testResults one for each file
 */

/**
 * Counts a run of Vitest so that nothing that went wrong is lost: a file that could not be loaded, an error outside of any test and a
 * test that was left out each count as failed.
 * @param {number} exitCode
 * @param {() => string} readReport
 * @returns {Count}
 */
export const countOf = (exitCode, readReport) => {
  /** @type {Report} */
  let report;
  try {
    report = JSON.parse(readReport());
  } catch {
    return { passed: 0, failed: exitCode === 0 ? 0 : 1 };
  }
  const brokenFiles = report.testResults.filter(
    (file) => file.status === 'failed' && !file.assertionResults.some((one) => one.status === 'failed'),
  );
  const failed =
    report.numFailedTests +
    brokenFiles.length +
    // Those of a broken file are told by the file.
    (brokenFiles.length === 0 ? report.numPendingTests + report.numTodoTests : 0);
  return { passed: report.numPassedTests, failed: failed === 0 && exitCode !== 0 ? 1 : failed };
};
