/**
 * @typedef {{ passed: number, failed: number }} Tally
 * @typedef {{
 *   success?: boolean,
 *   testResults?: Array<{ status: string, assertionResults: Array<{ status: string }> }>,
 * }} VitestReport what vitest's JSON reporter writes
 */

/**
 * Counts tests; a file that failed without a failed test of its own (it could not be collected, or a hook failed)
 * counts as one failure, and so does a run that failed for no counted reason or left no report.
 * @param {VitestReport | undefined} report @param {number} exitCode of vitest @returns {Tally}
 */
export function tallyReport(report, exitCode) {
  if (!report) return { passed: 0, failed: 1 };
  let [passed, failed] = [0, 0];
  for (const { status, assertionResults } of report.testResults ?? []) {
    const failedHere = assertionResults.filter((test) => test.status === 'failed').length;
    passed += assertionResults.filter((test) => test.status === 'passed').length;
    failed += failedHere === 0 && status === 'failed' ? 1 : failedHere;
  }
  if (failed === 0 && (exitCode !== 0 || report.success === false)) failed = 1;
  return { passed, failed };
}

/** @param {Tally[]} tallies @returns {Tally} */
export function sumTallies(tallies) {
  return tallies.reduce((sum, { passed, failed }) => ({ passed: sum.passed + passed, failed: sum.failed + failed }), {
    passed: 0,
    failed: 0,
  });
}
