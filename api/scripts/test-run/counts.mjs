import fs from 'node:fs';

export const NOTHING = { passed: 0, failed: 0, skipped: 0 };

export function sumOf(counts) {
  return counts.reduce(
    (sum, each) => ({
      passed: sum.passed + each.passed,
      failed: sum.failed + each.failed,
      skipped: sum.skipped + each.skipped,
    }),
    NOTHING,
  );
}

/**
 * The counts of a finished part. A file that could not be loaded counts as one failure, and so does a runner that ended with
 * an error, or left no report, without naming a failed test: a crash must never look like a pass.
 */
export function countsOf({ exitCode, reportPath, lastLine }) {
  const counts = reportPath ? countsOfReport(reportPath) : countsOfLine(lastLine);
  if (counts === null) return { ...NOTHING, failed: 1 };
  if (exitCode !== 0 && counts.failed === 0) return { ...counts, failed: 1 };
  return counts;
}

/** Reads the JSON report that vitest and jest share; null when there is none or it is cut off. */
function countsOfReport(reportPath) {
  try {
    const report = JSON.parse(fs.readFileSync(reportPath, 'utf8'));
    const broken = report.testResults.filter(
      ({ status, assertionResults }) => status === 'failed' && !hasFailed(assertionResults),
    );
    return wholeNumbers({
      passed: report.numPassedTests,
      failed: report.numFailedTests + broken.length,
      skipped: report.numPendingTests + report.numTodoTests,
    });
  } catch {
    return null;
  }
}

function hasFailed(results) {
  return results.some(({ status }) => status === 'failed');
}

function countsOfLine(line) {
  try {
    const { passed, failed, skipped } = JSON.parse(line);
    return wholeNumbers({ passed, failed, skipped });
  } catch {
    return null;
  }
}

function wholeNumbers(counts) {
  return Object.values(counts).every((count) => Number.isInteger(count) && count >= 0) ? counts : null;
}
