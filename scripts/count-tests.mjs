/**
 * Counts the tests of a vitest report in JSON. A file that failed without a failed test (it could not be loaded, or its
 * set-up failed) counts as one failed test, and so does a run that failed without saying where.
 */
export function countTests(report, runSucceeded) {
  const count = { passed: 0, failed: 0, skipped: 0 };
  for (const file of report?.testResults ?? []) {
    const failedBefore = count.failed;
    for (const { status } of file.assertionResults) {
      if (status === "passed") count.passed++;
      else if (status === "failed") count.failed++;
      else count.skipped++;
    }
    if (file.status === "failed" && count.failed === failedBefore) count.failed++;
  }
  if (!runSucceeded && count.failed === 0) count.failed++;
  return count;
}
