/** Reads how many tests passed and failed from the JSON reports of the two test runners. */
import { existsSync, readFileSync } from 'node:fs';

const readReport = (path) => (existsSync(path) ? JSON.parse(readFileSync(path, 'utf8')) : undefined);

/** A skipped test counts as failed: it proves nothing and looks as if it did. */
export function vitestCounts(path) {
  const report = readReport(path);
  if (report === undefined) return { passed: 0, failed: 1 };
  const inFiles = report.numFailedTests + report.numPendingTests + report.numTodoTests;
  // A file that cannot even be loaded has no failed test, only a failed suite.
  const brokenFiles = report.testResults.filter((file) => file.status === 'failed' && file.assertionResults.length === 0).length;
  return { passed: report.numPassedTests, failed: inFiles + brokenFiles };
}

/** As above; a flaky test, one that passed only when tried again, counts as failed too. */
export function playwrightCounts(path) {
  const report = readReport(path);
  if (report === undefined) return { passed: 0, failed: 1 };
  const { expected, unexpected, flaky, skipped } = report.stats;
  return { passed: expected, failed: unexpected + flaky + skipped + report.errors.length };
}
