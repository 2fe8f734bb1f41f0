import { existsSync, readFileSync, writeFileSync } from 'node:fs'
import { at, hashOf, readPackage, run } from './project.mjs'

const STAMP = 'node_modules/.wedgeline-installed'
const DECLARED = [
  'package.json',
  'pnpm-lock.yaml',
  'pnpm-workspace.yaml',
  'packages/engine/package.json',
  'packages/contract/package.json',
]

/** Stops with a sentence where Node.js is older than package.json asks for. */
function assertNode() {
  const wanted = readPackage().engines?.node?.replace('>=', '') ?? '0'
  const [wantedMajor = 0, wantedMinor = 0] = wanted.split('.').map(Number)
  const [major = 0, minor = 0] = process.versions.node.split('.').map(Number)
  if (major > wantedMajor || (major === wantedMajor && minor >= wantedMinor)) return
  throw new Error(`Node.js ${process.versions.node} is too old: install ${wanted} or newer.`)
}

/**
 * Installs the packages that the lock file names, where they are missing or the lock file has changed since.
 * npx fetches the package manager itself, so that Node.js and npm are all that a machine needs.
 */
export async function install() {
  assertNode()
  const declared = hashOf(DECLARED)
  if (existsSync(at(STAMP)) && readFileSync(at(STAMP), 'utf8') === declared) return
  const manager = readPackage().packageManager
  if (!manager) throw new Error('package.json names no packageManager.')
  const code = await run('npx', ['-y', manager, 'install', '--frozen-lockfile'])
  if (code !== 0) throw new Error(`Installing the packages failed (exit code ${code}); its message stands above.`)
  writeFileSync(at(STAMP), declared)
}
