import { ESLint, type Linter } from 'eslint'
import { describe, expect, test } from 'vitest'

const RULE = 'wedgeline/import-direction'

/** The project's own settings, without type information: the file that is judged need not exist. */
const eslint = new ESLint({
  overrideConfig: { languageOptions: { parserOptions: { projectService: false } } } as Linter.Config,
  ruleFilter: ({ ruleId }) => ruleId === RULE,
})

async function complaints(filePath: string, code: string): Promise<string[]> {
  const results = await eslint.lintText(code, { filePath })
  const messages = results.flatMap((result) => result.messages)
  expect(messages.filter((message) => message.fatal)).toEqual([])
  return messages.filter((message) => message.ruleId === RULE).map((message) => message.message)
}

/** Every way in which a module can name another one. */
const SPELLINGS: readonly [string, (source: string) => string][] = [
  ['value import', (source) => `import { thing } from '${source}'\nexport const kept = thing\n`],
  ['type import', (source) => `import type { Thing } from '${source}'\nexport type Kept = Thing\n`],
  ['inline type import', (source) => `import { type Thing } from '${source}'\nexport type Kept = Thing\n`],
  ['side effect', (source) => `import '${source}'\n`],
  ['export from', (source) => `export { thing } from '${source}'\n`],
  ['export type from', (source) => `export type { Thing } from '${source}'\n`],
  ['export star', (source) => `export * from '${source}'\n`],
  ['dynamic import', (source) => `export const kept = import('${source}')\n`],
  ['type of an import', (source) => `export type Kept = import('${source}').Thing\n`],
  ['require', (source) => `export const kept = require('${source}')\n`],
]

/** The file that imports, and the same wrong target as `@/`, relative and roundabout path. */
const REFUSED: readonly [string, string, readonly string[]][] = [
  ['app reaches the server', 'app/index.tsx', ['@/server/app', '../server/app', '../lib/../server/app']],
  ['app reaches the engine', 'app/index.tsx', ['@wedgeline/engine', '@/packages/engine/src/index']],
  ['app reaches the database', 'app/(work)/index.tsx', ['@/db/client', '../../db/client']],
  ['features reach app', 'features/edge/edge-screen.tsx', ['@/app/sign-in', '../../app/sign-in']],
  ['features reach the server', 'features/edge/edge-screen.tsx', ['@/server/router', '../../server/router']],
  ['features reach the database', 'features/edge/edge-screen.tsx', ['@/db/schema/job', '../../db/schema/job']],
  ['features reach tests', 'features/edge/edge-screen.tsx', ['@/tests/x', '../../tests/x']],
  ['components reach features', 'components/ui/field.tsx', ['@/features/edge/x', '../../features/edge/x']],
  ['components reach lib', 'components/ui/field.tsx', ['@/lib/trpc', '../../lib/trpc']],
  ['components reach the contract', 'components/ui/field.tsx', ['@wedgeline/contract', '@/packages/contract/src']],
  ['lib reaches features', 'lib/units.ts', ['@/features/edge/x', '../features/edge/x']],
  ['lib reaches the server', 'lib/units.ts', ['@/server/router', '../server/router', './../server/router']],
  ['lib/trpc.ts reaches the database', 'lib/trpc.ts', ['@/db/client', '../db/client']],
  ['contract reaches the server', 'packages/contract/src/layout.ts', ['@/server/app', '../../../server/app']],
  ['engine reaches the contract', 'packages/engine/src/model.ts', ['@wedgeline/contract', '../../contract/src/si']],
  ['engine reaches a package', 'packages/engine/src/model.ts', ['zod', 'node:fs', 'fs']],
  ['engine reaches lib', 'packages/engine/src/checks/bearing.ts', ['@/lib/units', '../../../../lib/units']],
  ['server reaches features', 'server/app.ts', ['@/features/edge/x', '../features/edge/x']],
  ['server reaches lib', 'server/routers/job.ts', ['@/lib/units', '../../lib/units']],
  ['database reaches the server', 'db/client.ts', ['@/server/app', '../server/app']],
  ['database reaches lib', 'db/seed/demo.ts', ['@/lib/units', '../../lib/units']],
]

/** Allowed as types, refused as values. */
const TYPES_ONLY: readonly [string, string, string][] = [
  ['lib/trpc.ts', '@/server/router', 'the client types its calls from the router'],
  ['lib/trpc.ts', '../server/router', 'the same, relative'],
  ['features/edge/edge-screen.tsx', '@wedgeline/engine', 'screens do not run the engine'],
  ['lib/units.ts', '@wedgeline/engine', 'nor does the rest of lib'],
  ['components/drawing/axes.tsx', '@wedgeline/engine', 'drawings are fed'],
  ['packages/contract/src/layout.ts', '@wedgeline/engine', 'the contract only describes'],
]

/** An import whose names are all inline types still loads the module under verbatimModuleSyntax. */
const TYPE_SPELLINGS = ['type import', 'export type from', 'type of an import']
const TYPES = SPELLINGS.filter(([name]) => TYPE_SPELLINGS.includes(name))
const VALUES = SPELLINGS.filter(([name]) => !TYPE_SPELLINGS.includes(name))

const ALLOWED: readonly [string, string][] = [
  ['app/sign-in.tsx', '@/features/sign-in/sign-in-screen'],
  ['features/edge/edge-screen.tsx', '@/components/ui/field'],
  ['features/edge/edge-screen.tsx', '../../lib/units'],
  ['features/edge/edge-screen.tsx', '@wedgeline/contract'],
  ['features/edge/edge-screen.tsx', '@wedgeline/engine/geometry'],
  ['features/edge/edge-screen.tsx', '@wedgeline/engine/wedges'],
  ['features/edge/edge-screen.tsx', '@wedgeline/engine/result'],
  ['features/job/job-screen.tsx', '@wedgeline/engine/bases'],
  ['lib/engine-answer.ts', '@wedgeline/engine'],
  ['lib/engine.worker.ts', './engine-answer'],
  ['lib/engine-direct.ts', './engine-answer'],
  ['server/routers/job.ts', '../stores/job'],
  ['server/stores/job.ts', '@/db/client'],
  ['server/stores/job.ts', '@wedgeline/engine'],
  ['db/seed/demo.ts', '@wedgeline/contract'],
  ['packages/contract/src/layout.ts', 'zod'],
  ['packages/engine/src/checks/bearing.ts', '../step'],
  ['scripts/check.ts', '../server/exports/schedule'],
]

describe('imports point one way', () => {
  test.each(REFUSED)('%s: refused in every spelling', async (_title, file, sources) => {
    for (const source of sources) {
      for (const [spelling, write] of SPELLINGS) {
        const found = await complaints(file, write(source))
        expect(found, `${file}: ${spelling} of ${source}`).toHaveLength(1)
      }
    }
  })

  test.each(TYPES_ONLY)('%s takes types alone from %s: %s', async (file, source) => {
    for (const [spelling, write] of VALUES) {
      expect(await complaints(file, write(source)), spelling).toHaveLength(1)
    }
    for (const [spelling, write] of TYPES) expect(await complaints(file, write(source)), spelling).toEqual([])
  })

  test.each(ALLOWED)('%s may import %s', async (file, source) => {
    for (const [spelling, write] of SPELLINGS) expect(await complaints(file, write(source)), spelling).toEqual([])
  })

  test.each([
    ['lib/units.ts', 'better-sqlite3'],
    ['features/edge/edge-screen.tsx', 'express'],
    ['components/ui/field.tsx', 'node:fs'],
    ['app/index.tsx', 'drizzle-orm/sqlite-core'],
    ['server/app.ts', 'react-native'],
    ['db/client.ts', 'expo-router'],
    ['packages/contract/src/layout.ts', 'express'],
  ])('%s does not run the package %s', async (file, source) => {
    for (const [spelling, write] of VALUES) {
      expect(await complaints(file, write(source)), spelling).toHaveLength(1)
    }
  })
})
