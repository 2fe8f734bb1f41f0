import { isBuiltin } from 'node:module'
import { dirname, posix, relative, sep } from 'node:path'

/**
 * Which folder may import what. Written by path and not by resolving a module, so that `@/lib/x`, `../lib/x` and
 * `../features/../lib/x` are the same import, and one to a file that does not exist yet is judged as well.
 */

const CLIENT = ['app', 'features', 'components', 'lib']
const ENGINE = 'packages/engine'
const CONTRACT = 'packages/contract'
const AREAS = [ENGINE, CONTRACT, ...CLIENT, 'assets', 'server', 'db', 'drizzle', 'scripts', 'tests', 'docs', 'public']

/** Folder to the folders that it may import from; a folder that is not named here (scripts, tests) is free. */
const ALLOWED = {
  app: ['app', 'features', 'components', 'lib', 'assets'],
  features: ['features', 'components', 'lib', 'assets', CONTRACT, ENGINE],
  components: ['components', 'assets', ENGINE],
  lib: ['lib', CONTRACT, ENGINE],
  server: ['server', 'db', CONTRACT, ENGINE],
  db: ['db', CONTRACT, ENGINE],
  [CONTRACT]: [CONTRACT, ENGINE],
  [ENGINE]: [ENGINE],
}

/** Pairs that are allowed for types alone; the engine's small entries may be taken from as well. */
const TYPES_ONLY = { [CONTRACT]: [ENGINE], components: [ENGINE] }

/** The engine as a whole runs in this file of the client; screens take its types and its small entries. */
const RUNS_ENGINE = /^lib\/engine-answer\.ts$/
const SMALL_ENTRIES = ['geometry', 'wedges', 'result', 'bases'].map((name) => `@wedgeline/engine/${name}`)

const SERVER_PACKAGES =
  /^(better-sqlite3|drizzle-orm|express|helmet|compression|pino|pino-http|lucia|@lucia-auth\/.*|@node-rs\/.*|nodemailer|flydrive|exceljs|piscina|tsx|@trpc\/server)(\/|$)/
const CLIENT_PACKAGES =
  /^(react|react-dom|react-native.*|expo.*|@expo\/.*|@tanstack\/.*|@trpc\/(client|tanstack-react-query)|idb-keyval)(\/|$)/
const ENGINE_PACKAGES = ['polygon-clipping']
const CONTRACT_PACKAGES = ['zod', 'uuid']

const areaOf = (path) => AREAS.find((area) => path === area || path.startsWith(`${area}/`))

/** @returns {string | undefined} path from the root of what an import names, undefined for a package from outside */
function target(from, specifier) {
  if (specifier.startsWith('@/')) return posix.normalize(specifier.slice(2))
  if (specifier.startsWith('.')) return posix.normalize(posix.join(dirname(from), specifier))
  const own = /^@wedgeline\/(engine|contract)(\/.*)?$/.exec(specifier)
  return own ? `packages/${own[1]}${own[2] ?? ''}` : undefined
}

function packageProblem(area, specifier) {
  if (area === ENGINE && !ENGINE_PACKAGES.includes(specifier)) return 'The engine imports nothing from outside itself.'
  if (area === CONTRACT && !CONTRACT_PACKAGES.includes(specifier)) return 'The contract imports zod and uuid alone.'
  if (CLIENT.includes(area) && (isBuiltin(specifier) || SERVER_PACKAGES.test(specifier))) {
    return `${specifier} belongs to the server.`
  }
  if ((area === 'server' || area === 'db') && CLIENT_PACKAGES.test(specifier))
    return `${specifier} belongs to the client.`
  return undefined
}

function areaProblem({ from, area, to, specifier, isType }) {
  const toArea = areaOf(to) ?? to
  const direct = ALLOWED[area]
  if (from === 'lib/trpc.ts' && toArea === 'server') {
    return isType ? undefined : 'lib/trpc.ts reaches the server by import type alone.'
  }
  if (!direct.includes(toArea)) return `${area}/ does not import from ${toArea}/.`
  if (toArea !== area && toArea.startsWith('packages/') && !specifier.startsWith('@wedgeline/')) {
    return `Import @wedgeline/${toArea.slice('packages/'.length)}, not its files.`
  }
  if (isType) return undefined
  const isSmall = SMALL_ENTRIES.includes(specifier)
  if (TYPES_ONLY[area]?.includes(toArea) && !isSmall)
    return `${area}/ takes types alone from ${toArea}/: write import type.`
  const isScreen = CLIENT.includes(area) && !RUNS_ENGINE.test(from)
  if (isScreen && toArea === ENGINE && !SMALL_ENTRIES.includes(specifier)) {
    return `The engine runs in lib/engine-answer.ts; elsewhere import types or ${SMALL_ENTRIES.join(', ')}.`
  }
  return undefined
}

/** @returns {string | undefined} why the file may not import this */
export function problemOf({ from, specifier, isType }) {
  const area = areaOf(from)
  if (area === undefined || !(area in ALLOWED)) return undefined
  const to = target(from, specifier)
  if (to === undefined) return isType && area !== ENGINE ? undefined : packageProblem(area, specifier)
  return areaProblem({ from, area, to, specifier, isType })
}

const isTypeDeclaration = (node) => node.importKind === 'type' || node.exportKind === 'type'

/** @type {import('eslint').Rule.RuleModule} */
const rule = {
  meta: { type: 'problem', schema: [], messages: { refused: '{{why}}' } },
  create(context) {
    const from = relative(context.cwd, context.filename).split(sep).join('/')
    const judge = (node, source, isType) => {
      if (typeof source?.value !== 'string') return
      const why = problemOf({ from, specifier: source.value, isType })
      if (why) context.report({ node, messageId: 'refused', data: { why } })
    }
    return {
      ImportDeclaration: (node) => judge(node, node.source, isTypeDeclaration(node)),
      ExportNamedDeclaration: (node) => judge(node, node.source, isTypeDeclaration(node)),
      ExportAllDeclaration: (node) => judge(node, node.source, isTypeDeclaration(node)),
      ImportExpression: (node) => judge(node, node.source, false),
      TSImportType: (node) => judge(node, node.source ?? node.argument?.literal ?? node.argument, true),
      TSExternalModuleReference: (node) => judge(node, node.expression, false),
      'CallExpression[callee.name="require"]': (node) => judge(node, node.arguments[0], false),
    }
  },
}

export default { rules: { 'import-direction': rule } }
