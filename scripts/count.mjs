import { existsSync, readFileSync } from 'node:fs'

/**
 * @typedef {{ passed: number, failed: number }} Count
 * @typedef {{ status: string, assertionResults: readonly { status: string }[] }} FileResult
 */

/**
 * Reads vitest's JSON report. Three failures hide from its own count of failed tests, and each counts as one here: a
 * file that could not be loaded or set up, an exit code that no test explains, and a report that was never written.
 * A skipped test counts as failed: nobody would see it otherwise.
 * @param {string} file
 * @param {number} code exit code of vitest
 * @returns {Count}
 */
export function countOf(file, code) {
  if (!existsSync(file)) return { passed: 0, failed: 1 }
  const report = JSON.parse(readFileSync(file, 'utf8'))
  /** @type {readonly FileResult[]} */
  const files = report.testResults
  const unexplained = files.filter(
    ({ status, assertionResults }) => status === 'failed' && !assertionResults.some((test) => test.status === 'failed'),
  ).length
  const failed = report.numFailedTests + report.numPendingTests + report.numTodoTests + unexplained
  return { passed: report.numPassedTests, failed: code !== 0 && failed === 0 ? 1 : failed }
}
