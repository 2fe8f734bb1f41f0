import { existsSync, readFileSync, writeFileSync } from 'node:fs'
import { pathToFileURL } from 'node:url'
import { at, hashOf, readPackage } from './project.mjs'

const TARGET = 'packages/contract/src/engine-version.ts'

/** The first 12 hex digits of SHA-256 over the engine's source: stands beside the latest CHANGELOG entry. */
export const engineHash = () => hashOf(['packages/engine/src']).slice(0, 12)

/** Package version and hash: what every stored result carries. */
export const engineVersion = () => `${readPackage('packages/engine/package.json').version}+${engineHash()}`

/**
 * Writes the version where client and server both read it. The engine itself stays pure, and the file is not
 * committed, so that it cannot be out of date in a clone: installing, building and testing each write it.
 */
export function writeEngineVersion() {
  const text = `/** Written by scripts/engine-version.mjs. */\nexport const ENGINE_VERSION = '${engineVersion()}'\n`
  if (existsSync(at(TARGET)) && readFileSync(at(TARGET), 'utf8') === text) return
  writeFileSync(at(TARGET), text)
}

if (import.meta.url === pathToFileURL(process.argv[1] ?? '').href) {
  writeEngineVersion()
  if (process.argv.includes('--print')) console.log(engineVersion())
}
