/**
 * Counts a runner's JSON report (Jest's form, which Vitest writes too). A file that failed without a failed test
 * did not load; a runner that failed without saying why, or left no report, counts as one failure.
 */
export function countResults(report, exitCode) {
  const passed = report?.numPassedTests ?? 0;
  const failed = (report?.numFailedTests ?? 0) + (report?.testResults ?? []).filter(failedToLoad).length;
  return { passed, failed: failed === 0 && (exitCode !== 0 || !report) ? 1 : failed };
}

function failedToLoad({ status, assertionResults }) {
  return status === 'failed' && !assertionResults.some((assertion) => assertion.status === 'failed');
}

export function addUp(counts) {
  return counts.reduce(
    (sum, { passed, failed }) => ({ passed: sum.passed + passed, failed: sum.failed + failed }),
    { passed: 0, failed: 0 },
  );
}

export function closingLine({ passed, failed }) {
  return `${passed} passed, ${failed} failed`;
}
