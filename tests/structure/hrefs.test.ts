import { existsSync } from 'node:fs'
import ts from 'typescript'
import { beforeAll, expect, test } from 'vitest'
import { writeRouteTypes } from '../../scripts/build.mjs'
import { at } from '../../scripts/project.mjs'

const ROUTES = at('.expo/types/router.d.ts')
const PAGE = at('features/made-up-page.ts')
const TIMEOUT = 120_000

beforeAll(async () => {
  if (!existsSync(ROUTES)) expect(await writeRouteTypes()).toBe(0)
}, TIMEOUT)

/** What tsc says, under the project's settings, of a file that exists only here. */
function complaints(source: string): readonly string[] {
  const { config } = ts.readConfigFile(at('tsconfig.json'), (path) => ts.sys.readFile(path))
  const { options } = ts.parseJsonConfigFileContent({ ...config, include: [], files: [] }, ts.sys, at('.'))
  const disk = ts.createCompilerHost(options)
  const host: ts.CompilerHost = {
    ...disk,
    fileExists: (path) => path === PAGE || disk.fileExists(path),
    getSourceFile: (path, version) =>
      path === PAGE ? ts.createSourceFile(path, source, version) : disk.getSourceFile(path, version),
  }
  const program = ts.createProgram([PAGE, ROUTES], options, host)
  const file = program.getSourceFile(PAGE)
  return program
    .getSemanticDiagnostics(file)
    .map(({ messageText }) => ts.flattenDiagnosticMessageText(messageText, '\n'))
}

test(
  'a made-up href fails tsc, a page of ours does not',
  () => {
    const found = complaints(`
      import type { Href } from 'expo-router'
      export const ours: Href = '/sign-in'
      export const madeUp: Href = '/no-such-page'
    `)
    expect(found).toHaveLength(1)
    expect(found[0]).toContain('/no-such-page')
  },
  TIMEOUT,
)
