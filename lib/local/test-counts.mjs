import { existsSync, readFileSync } from 'node:fs'

/**
 * What a runner's JSON report says, and never better than its exit code: a run that failed without saying which test, or
 * that found nothing to run, counts as one failure.
 */
export function countTests(report, code, read) {
  const told = existsSync(report)
    ? read(JSON.parse(readFileSync(report, 'utf8')))
    : { passed: 0, failed: 0, skipped: 0 }
  const nothing = told.passed + told.failed === 0
  return { ...told, failed: told.failed === 0 && (code !== 0 || nothing) ? 1 : told.failed }
}

/** Of Vitest's report. A file that cannot even be read has no tests to fail: it counts as one failure. */
export function vitestCounts({ numPassedTests, numFailedTests, numPendingTests, numTodoTests, testResults }) {
  const unreadable = testResults.filter(
    ({ status, assertionResults }) => status === 'failed' && assertionResults.length === 0,
  )
  return {
    passed: numPassedTests,
    failed: numFailedTests + unreadable.length,
    skipped: numPendingTests + (numTodoTests ?? 0),
  }
}

/** Of Playwright's report. A test that passed at the second try only did not pass. */
export function playwrightCounts({ stats }) {
  return { passed: stats.expected, failed: stats.unexpected + stats.flaky, skipped: stats.skipped }
}
