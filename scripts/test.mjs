import { mkdirSync, rmSync } from 'node:fs'
import { build, writeRouteTypes } from './build.mjs'
import { countOf } from './count.mjs'
import { writeEngineVersion } from './engine-version.mjs'
import { install } from './install.mjs'
import { at, runNode, seconds } from './project.mjs'

const RESULTS = 'test-results'
const bin = (/** @type {string} */ path) => `node_modules/${path}`

/**
 * @typedef {import('./count.mjs').Count} Count
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

/** @param {string} title
 * @param {readonly string[]} args
 * @returns {Part} */
const vitest = (title, args) => ({
  title,
  work: async () => {
    const file = `${RESULTS}/${title.replaceAll(/\W+/g, '-')}.json`
    rmSync(at(file), { force: true })
    const reporters = ['--reporter=default', '--reporter=json', `--outputFile.json=${file}`]
    return countOf(at(file), await runNode([bin('vitest/vitest.mjs'), 'run', ...args, ...reporters]))
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

/** @param {Part} part @returns {Promise<Count>} one failure where the part itself broke */
async function counted({ title, work }) {
  try {
    return await work()
  } catch (error) {
    console.error(`${title}:`, error)
    return { passed: 0, failed: 1 }
  }
}

async function main() {
  const startedAt = performance.now()
  await install()
  writeEngineVersion()
  mkdirSync(at(RESULTS), { recursive: true })
  const lines = []
  const total = { passed: 0, failed: 0 }
  for (const part of parts) {
    console.log(`\n== ${part.title}`)
    const partAt = performance.now()
    const { passed, failed } = await counted(part)
    total.passed += passed
    total.failed += failed
    lines.push(`${part.title.padEnd(26)} ${seconds(partAt).padStart(8)}   ${passed} passed, ${failed} failed`)
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
