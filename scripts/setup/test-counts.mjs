// Reads what the two test runners wrote down for machines. A report that is missing or unreadable is a failure.
import { readFileSync } from "node:fs";

const nothing = { passed: 0, failed: 1, skipped: 0 };

export function countVitest(file, status) {
  const report = readJson(file);
  if (!report) return nothing;
  // A file that could not even be loaded holds no tests, yet it has failed.
  const broken = report.testResults.filter((suite) => suite.status === "failed" && suite.assertionResults.length === 0).length;
  return atLeastOneFailure({ passed: report.numPassedTests, failed: report.numFailedTests + broken, skipped: report.numPendingTests + (report.numTodoTests ?? 0) }, status);
}

export function countPlaywright(file, status) {
  const report = readJson(file);
  if (!report) return nothing;
  const { expected, unexpected, flaky, skipped } = report.stats;
  return atLeastOneFailure({ passed: expected + flaky, failed: unexpected + (expected + unexpected + flaky === 0 ? report.errors.length : 0), skipped }, status);
}

/** The runner says that something is wrong, but no test did: that counts too. */
function atLeastOneFailure(counts, status) {
  return status !== 0 && counts.failed === 0 ? { ...counts, failed: 1 } : counts;
}

function readJson(file) {
  try {
    return JSON.parse(readFileSync(file, "utf8"));
  } catch {
    return null;
  }
}
