import { existsSync, readFileSync, readdirSync } from 'node:fs'
import { describe, expect, test } from 'vitest'
import { at, filesUnder } from '../../scripts/project.mjs'

/** Not committed: what installing, building, running and testing leave behind. */
const MADE = ['.expo', '.git', 'data', 'dist', 'expo-env.d.ts', 'node_modules', 'test-results']

const TOP = [
  '.ci',
  '.gitignore',
  '.prettierignore',
  '.prettierrc.json',
  'CHANGELOG.md',
  'DEVELOPERS.md',
  'README.md',
  'app',
  'app.json',
  'babel.config.cjs',
  'components',
  'db',
  'docs',
  'drizzle',
  'drizzle.config.ts',
  'eslint.config.js',
  'features',
  'lib',
  'metro.config.cjs',
  'package.json',
  'packages',
  'pnpm-lock.yaml',
  'pnpm-workspace.yaml',
  'public',
  'scripts',
  'server',
  'tests',
  'tsconfig.base.json',
  'tsconfig.json',
  'vitest.config.ts',
]
const FOLDERS = [
  '.ci',
  'app',
  'components',
  'db',
  'docs',
  'features',
  'lib',
  'packages',
  'public',
  'scripts',
  'server',
  'tests',
]

const all = [
  ...FOLDERS.flatMap(filesUnder),
  ...TOP.filter((name) => name.includes('.') && name !== '.ci').flatMap(filesUnder),
]
const isText = (name: string) =>
  /\.(ts|tsx|js|mjs|cjs|json|md|yaml|html|css|svg|sql)$/.test(name) && name !== 'pnpm-lock.yaml'
const code = all.filter((name) => /\.(ts|tsx|mjs|cjs|js)$/.test(name))
const tests = code.filter((name) => /\.test\.tsx?$/.test(name))
const read = (name: string) => readFileSync(at(name), 'utf8')
const matching = (names: readonly string[], pattern: RegExp) =>
  names.flatMap((name) =>
    read(name)
      .split('\n')
      .flatMap((line, index) => (pattern.test(line) ? [`${name}:${index + 1}: ${line.trim()}`] : [])),
  )

describe('the house', () => {
  test('has the rooms that DEVELOPERS.md lists, and no other', () => {
    const found = readdirSync(at('.')).filter((name) => !MADE.includes(name))
    expect(found.sort()).toEqual([...TOP].sort())
  })

  test('has no src/app, which would win over app/ without a word', () => {
    expect(existsSync(at('src'))).toBe(false)
  })

  test('names each folder after what it holds', () => {
    const vague = ['shared', 'common', 'utils', 'util', 'helpers', 'helper', 'misc']
    expect(
      all.filter((name) =>
        name
          .split('/')
          .slice(0, -1)
          .some((folder) => vague.includes(folder)),
      ),
    ).toEqual([])
  })

  test('names each file in kebab-case', () => {
    const kebab = /^[a-z0-9]+(-[a-z0-9]+)*(\.[a-z0-9-]+)*$/
    const own = code.filter((name) => !name.startsWith('app/')).map((name) => name.split('/').at(-1) ?? '')
    expect(own.filter((name) => !kebab.test(name))).toEqual([])
  })
})

describe('routes', () => {
  test('are under 25 lines: a route only routes', () => {
    const long = filesUnder('app').filter((name) => read(name).trimEnd().split('\n').length >= 25)
    expect(long).toEqual([])
  })
})

describe('tests', () => {
  test('exist', () => expect(tests.length).toBeGreaterThan(0))

  test('are never skipped, singled out or expected to fail', () => {
    expect(matching(tests, /\b(test|it|describe)(\.\w+)*\.(skip|only|todo|skipIf|runIf|fails)\b/)).toEqual([])
    expect(matching(tests, /\b(xit|xtest|xdescribe|fit|fdescribe)\(/)).toEqual([])
    expect(matching(tests, /\b(context|ctx|task)\.skip\(/)).toEqual([])
  })
})

describe('text', () => {
  const text = all.filter(isText)

  test('names no path of the machine that it was written on', () => {
    const places = ['work', 'root', 'home', 'Users', 'farm', 'tmp']
    const path = new RegExp(`(^|["'\`( =])/(${places.join('|')})/\\w`)
    expect(matching(text, path)).toEqual([])
  })

  test('names no package registry', () => {
    expect(matching(text, new RegExp(['registry', 'npmjs'].join('\\.')))).toEqual([])
  })

  test('switches no rule off in passing', () => {
    const comment = new RegExp(
      ['eslint' + '-disable', '@ts' + '-ignore', '@ts' + '-nocheck', '@ts' + '-expect-error'].join('|'),
    )
    expect(matching(code, comment)).toEqual([])
  })
})
