/** Passed and failed tests of one stage. */
export const counted = (passed, failed, skipped = 0) => ({ passed, failed, skipped })

/** From Vitest's JSON report; a file that could not be loaded counts as one failure, since its tests never ran. */
export function countVitest(report) {
  const unloadable = report.testResults.filter(file => file.status === 'failed' && file.assertionResults.every(({ status }) => status !== 'failed')).length
  return counted(report.numPassedTests, report.numFailedTests + unloadable, report.numPendingTests + (report.numTodoTests ?? 0))
}

/** From Playwright's JSON report; an error outside any test counts as one failure. @param {{ stats: Record<string, number>, errors?: unknown[] }} report */
export function countPlaywright({ stats, errors = [] }) {
  return counted(stats.expected + stats.flaky, stats.unexpected + errors.length, stats.skipped)
}

/** A stage that ended badly without a failed test in its report has failed once. */
export function withStatus(count, status) {
  return status !== 0 && count.failed === 0 ? { ...count, failed: 1 } : count
}

/** The sums of all stages. */
export function sumOf(counts) {
  return counts.reduce((sum, count) => counted(sum.passed + count.passed, sum.failed + count.failed, sum.skipped + count.skipped), counted(0, 0))
}

/** The words for a stage's line. */
export const countWords = ({ passed, failed, skipped }) => `${passed} passed, ${failed} failed${skipped > 0 ? `, ${skipped} skipped` : ''}`
