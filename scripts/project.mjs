import { spawn } from 'node:child_process'
import { createHash } from 'node:crypto'
import { existsSync, readFileSync, readdirSync, statSync } from 'node:fs'
import { dirname, join, relative, sep } from 'node:path'
import { fileURLToPath } from 'node:url'

export const ROOT = dirname(dirname(fileURLToPath(import.meta.url)))

/** Expo asks for no network and no answer while it builds. */
export const EXPO_ENV = { EXPO_OFFLINE: '1', EXPO_NO_TELEMETRY: '1', CI: '1' }

/** @param {string} path from the project's root */
export const at = (path) => join(ROOT, path)

/** @param {string} path from the project's root
 * @returns {{ version: string, packageManager?: string, engines?: Record<string, string> }} */
export const readPackage = (path = 'package.json') => JSON.parse(readFileSync(at(path), 'utf8'))

/**
 * Runs a program with this terminal's input and output.
 * @param {string} program
 * @param {readonly string[]} args
 * @param {Record<string, string>} [env] added to this process's environment
 * @returns {Promise<number>} its exit code; 1 where a signal ended it or it could not be started
 */
export function run(program, args, env = {}) {
  return new Promise((resolve) => {
    const child = spawn(program, args, {
      cwd: ROOT,
      stdio: 'inherit',
      env: { ...process.env, ...env },
      shell: process.platform === 'win32' && program !== process.execPath,
    })
    child.on('error', (error) => {
      console.error(`${program} could not be started: ${error.message}`)
      resolve(1)
    })
    child.on('exit', (code) => resolve(code ?? 1))
  })
}

/** Runs a file under node_modules or the project with this Node. */
export const runNode = (/** @type {readonly string[]} */ args, /** @type {Record<string, string>} */ env = {}) =>
  run(process.execPath, args, env)

/** Every file below a folder (or the file itself), sorted, as paths from the root with forward slashes.
 * @param {string} path
 * @returns {string[]} */
export function filesUnder(path) {
  if (!existsSync(at(path))) return []
  if (statSync(at(path)).isFile()) return [path]
  return readdirSync(at(path), { recursive: true, withFileTypes: true })
    .filter((entry) => entry.isFile())
    .map((entry) => relative(ROOT, join(entry.parentPath, entry.name)).split(sep).join('/'))
    .filter((name) => !name.includes('node_modules/'))
    .sort()
}

/**
 * SHA-256 over names and contents. Line ends are read as LF, so that a checkout with CRLF has the same hash.
 * @param {readonly string[]} paths files or folders, from the root
 */
export function hashOf(paths) {
  const hash = createHash('sha256')
  for (const name of paths.flatMap(filesUnder)) {
    hash.update(name).update('\0')
    hash.update(readFileSync(at(name), 'latin1').replaceAll('\r\n', '\n'), 'latin1').update('\0')
  }
  return hash.digest('hex')
}

/** @param {number} startedAt from performance.now() */
export const seconds = (startedAt) => `${((performance.now() - startedAt) / 1000).toFixed(1)} s`
