import { existsSync, readFileSync, renameSync, rmSync, writeFileSync } from 'node:fs'
import { readFile, writeFile } from 'node:fs/promises'
import { pathToFileURL } from 'node:url'
import { promisify } from 'node:util'
import { brotliCompress, constants, gzip } from 'node:zlib'
import { writeEngineVersion } from './engine-version.mjs'
import { EXPO_ENV, at, filesUnder, hashOf, runNode, seconds } from './project.mjs'

export const DIST = 'dist'
/** Exported beside dist and renamed at the end: a build that fails leaves the previous one whole. */
const FRESH = `.expo/web-build-${process.pid}`
/** A dot file, so that the server's static files never serve it. */
const STAMP = `${DIST}/.sources`
const SOURCES = [
  'app',
  'features',
  'components',
  'lib',
  'public',
  'packages/engine/src',
  'packages/contract/src',
  'app.json',
  'babel.config.cjs',
  'metro.config.cjs',
  'tsconfig.json',
  'tsconfig.base.json',
  'package.json',
  'pnpm-lock.yaml',
  'scripts/build.mjs',
]
const COMPRESSIBLE = /\.(js|css|html|json|svg|ttf|otf|map|txt|webmanifest)$/
const brotli = promisify(brotliCompress)
const gz = promisify(gzip)

/** Writes the types of the routes, which type-check and lint need and the export does not write. */
export const writeRouteTypes = () => runNode(['node_modules/expo/bin/cli', 'customize', 'tsconfig.json'], EXPO_ENV)

/** @param {string} name */
async function precompress(name) {
  const content = await readFile(at(name))
  const params = {
    [constants.BROTLI_PARAM_QUALITY]: constants.BROTLI_MAX_QUALITY,
    [constants.BROTLI_PARAM_SIZE_HINT]: content.length,
  }
  await writeFile(at(`${name}.br`), await brotli(content, { params }))
  await writeFile(at(`${name}.gz`), await gz(content, { level: constants.Z_BEST_COMPRESSION }))
}

const SHARED_SCRIPT = /<script src="([^"]*\/__common-[^"]*\.js)" defer><\/script>/

/**
 * The bundler puts what parts behind the jobs share into one script and loads it with every page. The first screens
 * need none of it: the page names it instead, and lib/behind-jobs.web.ts loads it before the first such part.
 * @param {string} page
 */
function takeSharedScriptOff(page) {
  const html = readFileSync(at(page), 'utf8')
  const [tag, address] = SHARED_SCRIPT.exec(html) ?? []
  if (!tag) throw new Error(`${page} loads no shared script: look at what the bundler makes of features/*.ts now.`)
  const named = `<meta name="wedgeline-shared-script" content="${address}" />`
  writeFileSync(at(page), html.replace(tag, '').replace('</head>', `  ${named}\n  </head>`))
}

/** @returns {Promise<number>} exit code of the export */
async function exportWeb() {
  rmSync(at(FRESH), { recursive: true, force: true })
  const args = ['export', '--platform', 'web', '--max-workers', '2', '--output-dir', FRESH]
  const code = await runNode(['node_modules/expo/bin/cli', ...args], EXPO_ENV)
  if (code !== 0) return code
  takeSharedScriptOff(`${FRESH}/index.html`)
  await Promise.all(
    filesUnder(FRESH)
      .filter((name) => COMPRESSIBLE.test(name))
      .map(precompress),
  )
  return 0
}

/**
 * Builds the web client into dist/ where it is missing or its sources have changed since the last build.
 * @returns {Promise<number>} 0 where dist/ is up to date afterwards
 */
export async function build({ force = false } = {}) {
  writeEngineVersion()
  const sources = hashOf(SOURCES)
  const isCurrent = existsSync(at(STAMP)) && readFileSync(at(STAMP), 'utf8') === sources
  if (isCurrent && !force) return 0
  const startedAt = performance.now()
  const code = (await writeRouteTypes()) || (await exportWeb())
  if (code !== 0) return code
  rmSync(at(DIST), { recursive: true, force: true })
  renameSync(at(FRESH), at(DIST))
  writeFileSync(at(STAMP), sources)
  console.log(`Web client built in ${seconds(startedAt)}.`)
  return 0
}

if (import.meta.url === pathToFileURL(process.argv[1] ?? '').href) {
  process.exitCode = await build({ force: process.argv.includes('--force') })
}
