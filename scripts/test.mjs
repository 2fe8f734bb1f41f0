import { existsSync, mkdirSync, readFileSync, rmSync } from 'node:fs'
import { build, writeRouteTypes } from './build.mjs'
import { writeEngineVersion } from './engine-version.mjs'
import { install } from './install.mjs'
import { at, runNode, seconds } from './project.mjs'

const RESULTS = 'test-results'
const bin = (/** @type {string} */ path) => `node_modules/${path}`

/**
 * @typedef {{ passed: number, failed: number }} Count
 * @typedef {{ title: string, work: () => Promise<Count> }} Part
 */

/** A part that is one test: it passes where every one of its commands ends with 0.
 * @param {string} title
 * @param {readonly (() => Promise<number>)[]} commands
 * @returns {Part} */
const single = (title, commands) => ({
  title,
  work: async () => {
    let isFailed = false
    for (const command of commands) if ((await command()) !== 0) isFailed = true
    return isFailed ? { passed: 0, failed: 1 } : { passed: 1, failed: 0 }
  },
})

/** Reads vitest's own count; a file that could not be loaded, and an exit code without a failed test, count as one.
 * @param {string} file
 * @param {number} code
 * @returns {Count} */
function countOf(file, code) {
  if (!existsSync(at(file))) return { passed: 0, failed: 1 }
  const report = JSON.parse(readFileSync(at(file), 'utf8'))
  const unloaded = report.testResults.filter(
    (/** @type {{ status: string, assertionResults: unknown[] }} */ result) =>
      result.status === 'failed' && result.assertionResults.length === 0,
  ).length
  const failed = report.numFailedTests + unloaded
  return { passed: report.numPassedTests, failed: code !== 0 && failed === 0 ? 1 : failed }
}

/** @param {string} title
 * @param {readonly string[]} args
 * @returns {Part} */
const vitest = (title, args) => ({
  title,
  work: async () => {
    const file = `${RESULTS}/${title.replaceAll(/\W+/g, '-')}.json`
    rmSync(at(file), { force: true })
    const reporters = ['--reporter=default', '--reporter=json', `--outputFile.json=${file}`]
    return countOf(file, await runNode([bin('vitest/vitest.mjs'), 'run', ...args, ...reporters]))
  },
})

/** @type {Part[]} */
const parts = [
  single('types', [
    writeRouteTypes,
    () => runNode([bin('typescript/bin/tsc'), '-p', '.']),
    () => runNode([bin('typescript/bin/tsc'), '-p', 'packages/engine']),
  ]),
  single('lint', [() => runNode([bin('eslint/bin/eslint.js'), '.', '--max-warnings', '0'])]),
  single('format', [() => runNode([bin('prettier/bin/prettier.cjs'), '--check', '--log-level', 'warn', '.'])]),
  single('web build', [build]),
  single('bundle budget', [() => runNode(['scripts/budget.mjs'])]),
  vitest('unit, server and screens', ['--project', 'node', '--project', 'ui']),
  vitest('browser', ['--project', 'e2e', '--no-file-parallelism']),
]

async function main() {
  const startedAt = performance.now()
  await install()
  writeEngineVersion()
  mkdirSync(at(RESULTS), { recursive: true })
  const lines = []
  const total = { passed: 0, failed: 0 }
  for (const { title, work } of parts) {
    console.log(`\n== ${title}`)
    const partAt = performance.now()
    const { passed, failed } = await work()
    total.passed += passed
    total.failed += failed
    lines.push(`${title.padEnd(26)} ${seconds(partAt).padStart(8)}   ${passed} passed, ${failed} failed`)
  }
  console.log(`\n${lines.join('\n')}\n${'all'.padEnd(26)} ${seconds(startedAt).padStart(8)}\n`)
  console.log(`${total.passed} passed, ${total.failed} failed`)
  process.exitCode = total.failed === 0 ? 0 : 1
}

try {
  await main()
} catch (error) {
  console.error(error instanceof Error ? error.message : error)
  console.log('0 passed, 1 failed')
  process.exitCode = 1
}
