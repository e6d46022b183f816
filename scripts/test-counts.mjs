// Counts tests from the reports the tools write, never from what they print.
import { existsSync, readFileSync } from 'node:fs';

function read(path) {
  return existsSync(path) ? JSON.parse(readFileSync(path, 'utf8')) : undefined;
}

/** A run that ended badly without a failed test (an error outside any test) counts as one failure. */
function settled({ passed, failed, skipped }, code, what) {
  if (failed === 0 && code !== 0)
    return { passed, failed: 1, skipped, note: `${what} ended with code ${code}` };
  if (passed + failed === 0) return { passed, failed: 1, skipped, note: 'not one test was run' };
  return { passed, failed, skipped };
}

export function vitestCounts(path, code) {
  const report = read(path);
  if (!report) return settled({ passed: 0, failed: 0, skipped: 0 }, code, 'vitest');
  // A file that could not even be loaded has no tests to fail, and must not be lost for that.
  const unloaded = report.testResults.filter(
    (file) => file.status === 'failed' && file.assertionResults.length === 0,
  );
  const counts = {
    passed: report.numPassedTests,
    failed: report.numFailedTests + unloaded.length,
    skipped: report.numPendingTests + report.numTodoTests,
  };
  return settled(counts, code, 'vitest');
}

export function playwrightCounts(path, code) {
  const report = read(path);
  if (!report) return settled({ passed: 0, failed: 0, skipped: 0 }, code, 'playwright');
  const { expected, unexpected, flaky, skipped } = report.stats;
  return settled({ passed: expected, failed: unexpected + flaky, skipped }, code, 'playwright');
}

/** A tool without tests of its own counts as one. */
export function wholeCounts(code) {
  return code === 0 ? { passed: 1, failed: 0, skipped: 0 } : { passed: 0, failed: 1, skipped: 0 };
}
