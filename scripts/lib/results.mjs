// @ts-check

/**
 * @typedef {object} Result of one part of the checks
 * @property {string} name
 * @property {number} passed
 * @property {number} failed
 * @property {number} [skipped]
 * @property {string} [note] why it failed, when its own output does not say
 */

/**
 * @typedef {object} VitestReport what is read of vitest's JSON report
 * @property {number} numPassedTests
 * @property {number} numFailedTests
 * @property {number} [numPendingTests]
 * @property {number} [numTodoTests]
 * @property {{ status: string, assertionResults: { status: string }[] }[]} testResults one per file
 */

/**
 * Counts one vitest run. A file that broke before its tests counts as one failure, and so does a run that failed
 * without a failing test, or that ran no test: silence is never success.
 * @param {string} name
 * @param {VitestReport | null} report
 * @param {number | null} exitCode
 * @returns {Result}
 */
export function countVitest(name, report, exitCode) {
  if (!report) return { name, passed: 0, failed: 1, note: 'vitest ended without a report' };
  const brokenFiles = report.testResults.filter(
    ({ status, assertionResults }) =>
      status === 'failed' && !assertionResults.some((assertion) => assertion.status === 'failed'),
  ).length;
  const passed = report.numPassedTests;
  const failed = report.numFailedTests + brokenFiles;
  const skipped = (report.numPendingTests ?? 0) + (report.numTodoTests ?? 0);
  if (failed > 0) return { name, passed, failed, skipped };
  if (passed === 0) return { name, passed, failed: 1, skipped, note: 'no test ran' };
  if (exitCode !== 0) return { name, passed, failed: 1, skipped, note: 'vitest failed outside its tests' };
  return { name, passed, failed, skipped };
}

/**
 * @param {string} name
 * @param {boolean} isGood
 * @returns {Result}
 */
export const countStep = (name, isGood) => ({ name, passed: isGood ? 1 : 0, failed: isGood ? 0 : 1 });

/**
 * @param {Result[]} results
 * @returns {{ passed: number, failed: number, lines: string[] }} the last line is `N passed, N failed`
 */
export function summarise(results) {
  const passed = results.reduce((sum, result) => sum + result.passed, 0);
  const failed = results.reduce((sum, result) => sum + result.failed, 0);
  const lines = results.map(
    (result) =>
      `  ${result.failed > 0 ? '✗' : '✓'} ${result.name}: ${result.passed} passed, ${result.failed} failed` +
      `${result.skipped ? `, ${result.skipped} skipped` : ''}${result.note ? ` (${result.note})` : ''}`,
  );
  return { passed, failed, lines: [...lines, `${passed} passed, ${failed} failed`] };
}

/**
 * @param {{ passed: number, failed: number }} sum
 * @returns {number} the exit code: nothing tested is a failure too
 */
export const exitCodeOf = ({ passed, failed }) => (failed === 0 && passed > 0 ? 0 : 1);
