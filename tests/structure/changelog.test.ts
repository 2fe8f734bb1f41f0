import { createHash } from 'node:crypto'
import { readFileSync, readdirSync } from 'node:fs'
import { expect, test } from 'vitest'
import { ENGINE_VERSION } from '@wedgeline/contract/engine-version'
import { engineHash } from '../../scripts/engine-version.mjs'
import { at, hashOf, readPackage } from '../../scripts/project.mjs'

const latest = readFileSync(at('CHANGELOG.md'), 'utf8').split(/^## /m)[1] ?? ''

test('the latest CHANGELOG entry stands beside the hash of this engine', () => {
  const stated = /^Engine: `([^`]+)`/m.exec(latest)?.[1]
  expect(stated, `Say in CHANGELOG.md which numbers move, and write: Engine: \`${engineHash()}\``).toBe(engineHash())
})

test('the latest entry says whether numbers move', () => {
  expect(latest).toMatch(/^Numbers: \S/m)
})

test('the version that results carry is the package version and the hash', () => {
  const { version } = readPackage('packages/engine/package.json')
  expect(ENGINE_VERSION).toBe(`${version}+${engineHash()}`)
  expect(engineHash()).toMatch(/^[0-9a-f]{12}$/)
})

test('the hash covers names and contents, with line ends as LF', () => {
  // One folder with one file, worked out beside it: name, NUL, content, NUL.
  const name = '.ci/run'
  expect(readdirSync(at('.ci'))).toEqual(['run'])
  const content = readFileSync(at(name), 'latin1').replaceAll('\r\n', '\n')
  const expected = createHash('sha256').update(`${name}\0`).update(content, 'latin1').update('\0').digest('hex')
  expect(hashOf(['.ci'])).toBe(expected)
})
