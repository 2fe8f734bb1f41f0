import { existsSync, readFileSync, statSync } from 'node:fs'
import { basename } from 'node:path'
import { pathToFileURL } from 'node:url'
import { DIST } from './build.mjs'
import { at, filesUnder } from './project.mjs'

/**
 * Adds up what a browser fetches. kB is 1000 bytes. The first screens are sign-in with what belongs to it, invitation
 * and jobs; everything behind a job is one more chunk (features/work.ts) and what it shares with other parts that are
 * no first screens (lib/behind-jobs.web.ts).
 */
const KB = 1000
const FIRST = { gz: 400 * KB, br: 330 * KB }
const WORK_GZ = 200 * KB
const DEEP = { gz: 600 * KB, br: 480 * KB }
/** Chunk names as the bundler gives them: the route's file name. The group's layouts load with the first screens. */
const FIRST_ROUTES = {
  'sign-in': 'sign-in',
  'forgotten password': 'forgotten',
  'invitation, reset': '[token]',
  jobs: 'index',
}
const SHELL = '_layout'
const WORK = 'work'

/** Words of each library that survive minifying, and that nothing else of ours contains. */
const KEPT_OUT = {
  zod: ['ZodError', 'invalid_union'],
  'a form library': ['useFormContext', 'shouldUnregister'],
  svg: ['RNSVG', 'feGaussianBlur'],
  contract: ['wedgeline.layout'],
  engine: ['OUTSIDE_METHOD'],
}

/** @typedef {{ name: string, gz: number, br: number }} Sized */

/** What the server sends: the compressed copy that the build made, otherwise (fonts, pictures) the file as it is.
 * @param {string} name from the root
 * @returns {Sized} */
function sized(name) {
  const sizeOf = (/** @type {string} */ copy) => statSync(at(existsSync(at(copy)) ? copy : name)).size
  return { name, gz: sizeOf(`${name}.gz`), br: sizeOf(`${name}.br`) }
}

/** @param {readonly Sized[]} files */
const sum = (files) => ({
  gz: files.reduce((total, { gz }) => total + gz, 0),
  br: files.reduce((total, { br }) => total + br, 0),
})

const kb = (/** @type {number} */ bytes) => `${(bytes / KB).toFixed(0)} kB`

/** The page itself and every script, style and font that it names.
 * @param {string} dist */
function named(dist) {
  const page = `${dist}/index.html`
  const text = readFileSync(at(page), 'utf8')
  const names = [...text.matchAll(/(?:src|href)="\/([^"]+)"/g)].flatMap(([, name]) => (name ? [`${dist}/${name}`] : []))
  return [page, ...new Set(names)].filter((name) => existsSync(at(name)))
}

/** Bundled scripts of one route, by the name in front of the hash.
 * @param {string} dist
 * @param {string} route */
const chunksOf = (dist, route) =>
  filesUnder(`${dist}/_expo/static/js/web`).filter((file) => basename(file).replace(/-[0-9a-f]{8,}\.js$/, '') === route)

/** @param {string} title @param {readonly string[]} names */
function firstScreen(title, names) {
  const { gz, br } = sum(names.map(sized))
  const problems = []
  if (gz >= FIRST.gz) problems.push(`${title}: ${kb(gz)} gz, must be under ${kb(FIRST.gz)}`)
  if (br >= FIRST.br) problems.push(`${title}: ${kb(br)} br, must be under ${kb(FIRST.br)}`)
  for (const name of names.filter((file) => file.endsWith('.js'))) {
    const text = readFileSync(at(name), 'utf8')
    for (const [what, words] of Object.entries(KEPT_OUT)) {
      const found = words.filter((word) => text.includes(word))
      if (found.length > 0) problems.push(`${title}: ${basename(name)} holds ${what} (${found.join(', ')})`)
    }
  }
  return { line: `${title.padEnd(22)} ${kb(gz).padStart(8)} gz ${kb(br).padStart(8)} br`, problems }
}

/** The script that the page names without loading it.
 * @param {string} dist */
function sharedScript(dist) {
  const page = readFileSync(at(`${dist}/index.html`), 'utf8')
  const [, address] = /name="wedgeline-shared-script" content="\/([^"]+)"/.exec(page) ?? []
  return address ? [`${dist}/${address}`] : []
}

/** @param {string} dist
 * @param {readonly string[]} first what every page loads */
function behindJob(dist, first) {
  const work = chunksOf(dist, WORK)
  if (work.length !== 1) {
    return { line: '', problems: [`There must be one chunk behind a job (features/work.ts); found ${work.length}.`] }
  }
  const behind = [...sharedScript(dist), ...work]
  const own = sum(behind.map(sized))
  const deep = sum([...first, ...behind].map(sized))
  const problems = []
  if (own.gz >= WORK_GZ) problems.push(`Behind a job: ${kb(own.gz)} gz, must be under ${kb(WORK_GZ)}`)
  if (deep.gz >= DEEP.gz) problems.push(`Deep link: ${kb(deep.gz)} gz, must be under ${kb(DEEP.gz)}`)
  if (deep.br >= DEEP.br) problems.push(`Deep link: ${kb(deep.br)} br, must be under ${kb(DEEP.br)}`)
  const line = (/** @type {string} */ title, /** @type {{ gz: number, br: number }} */ { gz, br }) =>
    `${title.padEnd(22)} ${kb(gz).padStart(8)} gz ${kb(br).padStart(8)} br`
  return { line: `${line('behind a job', own)}\n${line('deep link', deep)}`, problems }
}

/**
 * @param {string} [dist] folder of the built client, from the root
 * @returns {{ lines: string[], problems: string[] }} sizes, and what is over its budget
 */
export function budget(dist = DIST) {
  if (!existsSync(at(`${dist}/index.html`))) {
    return { lines: [], problems: [`${dist}/ holds no index.html: build the web client first.`] }
  }
  const page = [...new Set([...named(dist), ...chunksOf(dist, SHELL)])]
  const routes = Object.entries(FIRST_ROUTES).map(([title, route]) => {
    const chunks = chunksOf(dist, route)
    if (chunks.length === 0) return { line: '', problems: [`${title}: no chunk is called ${route}`] }
    return firstScreen(title, [...new Set([...page, ...chunks])])
  })
  const all = [...routes, behindJob(dist, page)]
  return { lines: all.map(({ line }) => line).filter(Boolean), problems: all.flatMap(({ problems }) => problems) }
}

if (import.meta.url === pathToFileURL(process.argv[1] ?? '').href) {
  const { lines, problems } = budget()
  if (lines.length > 0) console.log(lines.join('\n'))
  for (const problem of problems) console.error(problem)
  process.exitCode = problems.length === 0 ? 0 : 1
}
