import { ESLint, type Linter } from 'eslint'
import { describe, expect, test } from 'vitest'

/** Those of the project's rules that need no type information, so that a made-up file can be judged. */
const RULES = [
  '@typescript-eslint/ban-ts-comment',
  '@typescript-eslint/no-explicit-any',
  '@typescript-eslint/no-non-null-assertion',
  'max-lines',
  'max-lines-per-function',
  'no-restricted-syntax',
  'no-warning-comments',
]
const eslint = new ESLint({
  overrideConfig: { languageOptions: { parserOptions: { projectService: false } } } as Linter.Config,
  ruleFilter: ({ ruleId }) => RULES.includes(ruleId),
})

async function refused(code: string, filePath = 'server/stores/made-up.ts'): Promise<(string | null)[]> {
  const results = await eslint.lintText(code, { filePath })
  return results.flatMap(({ messages }) =>
    messages.filter(({ severity }) => severity === 2).map(({ ruleId }) => ruleId),
  )
}

const SYNTAX = ['no-restricted-syntax']
const NON_NULL = ['@typescript-eslint/no-non-null-assertion']

/** A function of so many lines, its first and last included. */
const long = (lines: number) => `export function f() {\n${'  g()\n'.repeat(lines - 2)}}\n`

describe('house style', () => {
  test.each([
    ['any', 'export const f = (x: any) => x\n', ['@typescript-eslint/no-explicit-any']],
    ['non-null assertion', 'export const f = (x?: number) => x!\n', NON_NULL],
    ['export star', "export * from './x'\n", SYNTAX],
    ['export star with a name', "export * as x from './x'\n", SYNTAX],
    ['async in a transaction', 'db.transaction(async (tx) => { await tx.run() })\n', SYNTAX],
    ['async function in a transaction', 'db.transaction(async function (tx) { await tx.run() })\n', SYNTAX],
    ['four parameters', 'export function f(a: 1, b: 1, c: 1, d: 1) { return [a, b, c, d] }\n', SYNTAX],
    ['note for later', `// ${'TO' + 'DO'}: mend\nexport const a = 1\n`, ['no-warning-comments']],
    ['61 lines in a function', long(61), ['max-lines-per-function']],
    ['401 lines in a file', 'g()\n'.repeat(401), ['max-lines']],
    [
      'rule switched off',
      `// ${'eslint' + '-disable-next-line'}\nexport const f = (x: any) => x\n`,
      ['@typescript-eslint/no-explicit-any'],
    ],
  ])('%s is refused', async (_what, code, rules) => {
    expect(await refused(code)).toEqual(rules)
  })

  test.each([
    ['types by star', "export type * from './x'\n"],
    ['a synchronous transaction', 'db.transaction((tx) => tx.run())\n'],
    ['three parameters', 'export function f(a: 1, b: 1, c: 1) { return [a, b, c] }\n'],
    [
      "Express's error handler",
      'export function f(error: unknown, a: 1, b: 1, next: (e: unknown) => void) { next([error, a, b]) }\n',
    ],
    ['60 lines in a function', long(60)],
    ['400 lines in a file', 'g()\n'.repeat(400)],
  ])('%s: allowed', async (_what, code) => {
    expect(await refused(code)).toEqual([])
  })

  test('a component has 120 lines, a test as many as it needs', async () => {
    expect(await refused(long(120), 'features/edge/made-up.tsx')).toEqual([])
    expect(await refused(long(121), 'features/edge/made-up.tsx')).toEqual(['max-lines-per-function'])
    expect(await refused(long(300), 'tests/engine/made-up.test.ts')).toEqual([])
  })

  test('the engine may not index without asking either', async () => {
    const code = 'export const f = (x?: number) => x!\n'
    expect(await refused(code, 'packages/engine/src/checks/bearing.ts')).toEqual(NON_NULL)
  })

  test('a table of data is as long as what it holds', async () => {
    expect(await refused('g()\n'.repeat(401), 'packages/engine/src/schedule/shape-table.ts')).toEqual([])
  })
})
