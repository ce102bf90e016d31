/** What a test runner's report says: how many passed, how many failed, and which. */
import { existsSync, readFileSync } from 'node:fs'

/** @typedef {{ passed: number, failed: number, skipped: number, failures: string[] }} Results */

const NONE = { passed: 0, failed: 1, skipped: 0, failures: ['The runner gave no report'] }

const firstLine = (text) =>
  (text ?? '')
    .replace(/\x1b\[[0-9;]*m/g, '')
    .trim()
    .split('\n')[0]

/**
 * Vitest's JSON report. A file that could not be loaded has no tests, and counts as one failure.
 * @returns {Results}
 */
export function readVitest(file) {
  if (!existsSync(file)) return NONE
  const report = JSON.parse(readFileSync(file, 'utf8'))
  const failures = report.testResults.flatMap((suite) => {
    const failed = suite.assertionResults.filter(({ status }) => status === 'failed')
    if (suite.status === 'failed' && failed.length === 0)
      return [`${suite.name}: ${firstLine(suite.message)}`]
    return failed.map((test) => `${suite.name} > ${test.fullName}: ${firstLine(test.failureMessages[0])}`)
  })
  const skipped = report.numPendingTests + report.numTodoTests
  return { passed: report.numPassedTests, failed: failures.length, skipped, failures }
}

const specsOf = (suite) => [...(suite.specs ?? []), ...(suite.suites ?? []).flatMap(specsOf)]

/**
 * Playwright's JSON report. A test that passed only when tried again counts as failed.
 * @returns {Results}
 */
export function readPlaywright(file) {
  if (!existsSync(file)) return NONE
  const { stats, suites, errors } = JSON.parse(readFileSync(file, 'utf8'))
  const failures = suites
    .flatMap(specsOf)
    .flatMap((spec) =>
      spec.tests
        .filter(({ status }) => status === 'unexpected' || status === 'flaky')
        .map(
          (test) =>
            `${spec.file} > ${spec.title}: ${firstLine(test.results.find(({ error }) => error)?.error.message)}`,
        ),
    )
  const whole = errors.map((error) => firstLine(error.message))
  const failed = failures.length + (failures.length === 0 ? whole.length : 0)
  return { passed: stats.expected, failed, skipped: stats.skipped, failures: [...failures, ...whole] }
}
