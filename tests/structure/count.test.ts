import { mkdirSync, rmSync, writeFileSync } from 'node:fs'
import { afterEach, expect, test } from 'vitest'
import { countOf } from '../../scripts/count.mjs'
import { at } from '../../scripts/project.mjs'

const FILE = at('test-results/count-report.json')

interface Report {
  readonly passed: number
  readonly failed?: number
  readonly skipped?: number
  readonly files?: readonly { readonly status: string; readonly tests: readonly string[] }[]
}

/** As vitest writes it, as far as the count reads it. */
function report({ passed, failed = 0, skipped = 0, files = [] }: Report) {
  mkdirSync(at('test-results'), { recursive: true })
  const testResults = files.map(({ status, tests }) => ({
    status,
    assertionResults: tests.map((was) => ({ status: was })),
  }))
  const counts = { numPassedTests: passed, numFailedTests: failed, numPendingTests: skipped, numTodoTests: 0 }
  writeFileSync(FILE, JSON.stringify({ ...counts, testResults }))
}

afterEach(() => rmSync(FILE, { force: true }))

test('all passed', () => {
  report({ passed: 7, files: [{ status: 'passed', tests: ['passed'] }] })
  expect(countOf(FILE, 0)).toEqual({ passed: 7, failed: 0 })
})

test('failed tests are counted once, with the exit code that they cause', () => {
  report({ passed: 5, failed: 2, files: [{ status: 'failed', tests: ['failed', 'failed', 'passed'] }] })
  expect(countOf(FILE, 1)).toEqual({ passed: 5, failed: 2 })
})

test('a file that could not be loaded is one failure', () => {
  report({ passed: 5, files: [{ status: 'failed', tests: [] }] })
  expect(countOf(FILE, 1)).toEqual({ passed: 5, failed: 1 })
})

test('a file whose setup failed is one failure beside failed tests of other files', () => {
  const files = [
    { status: 'failed', tests: ['failed'] },
    { status: 'failed', tests: ['passed'] },
  ]
  report({ passed: 1, failed: 1, files })
  expect(countOf(FILE, 1)).toEqual({ passed: 1, failed: 2 })
})

test('a skipped test is a failure', () => {
  report({ passed: 5, skipped: 1 })
  expect(countOf(FILE, 0)).toEqual({ passed: 5, failed: 1 })
})

test('an exit code that no test explains is one failure', () => {
  report({ passed: 5 })
  expect(countOf(FILE, 1)).toEqual({ passed: 5, failed: 1 })
})

test('a run that wrote no report is one failure', () => {
  expect(countOf(FILE, 0)).toEqual({ passed: 0, failed: 1 })
})
