import { readdirSync, readFileSync } from 'node:fs'
import { basisOf, BASIS_SOURCES } from '@wedgeline/engine'
import { beforeAll, describe, expect, test } from 'vitest'
import { METHODS } from '../../features/methods/method-table'
import { isCurrent, listMethods, type Written } from '../../scripts/methods/list-methods'
import { innerSteps } from '../../scripts/methods/inner-steps'
import { MEANINGS, PROOFS } from '../../scripts/methods/proofs-table'
import { at } from '../../scripts/project.mjs'
import { layout } from '../engine/sample-layout'
import { evaluated } from '../engine/step-text'

/** The list of methods (docs/methods.md and the page in the app) holds every formula of the engine, each with its proof. */

const ENGINE = at('packages/engine/src')
const nameOf = ({ symbol, formula }: { readonly symbol: string; readonly formula: string }) => `${symbol} = ${formula}`

/** Written in the source and never printed, each with its reason. */
const NEVER_PRINTED: Readonly<Record<string, string>> = {
  P: 'checks/joint.ts: stands in for a force without steps, which there is none of',
}

let written: Written
beforeAll(async () => {
  written = await listMethods()
}, 120_000)

/** Formulas that stand as plain text in the engine's source. */
function formulasInSource(): readonly { readonly file: string; readonly formula: string }[] {
  const files = readdirSync(ENGINE, { recursive: true })
    .map(String)
    .filter((name) => name.endsWith('.ts'))
  return files.flatMap((file) =>
    [...readFileSync(`${ENGINE}/${file}`, 'utf8').matchAll(/\bformula: '([^']+)'/g)].map(([, formula = '']) => ({
      file,
      formula,
    })),
  )
}

/** The title of the group that a test stands in. */
function groupOf(file: string, name: string): string {
  const text = readFileSync(at(file), 'utf8')
  const before = text.slice(0, text.indexOf(name))
  return [...before.matchAll(/^describe(?:\.each)?\((['"])(.*?)\1/gm)].at(-1)?.[2] ?? ''
}

/** Files of published and worked examples, with the titles that stand at their left edge. */
function publishedTitles(): readonly { readonly file: string; readonly title: string }[] {
  const files = readdirSync(at('tests/published')).filter((name) => name.endsWith('.test.ts'))
  return files.flatMap((file) =>
    [...readFileSync(at(`tests/published/${file}`), 'utf8').matchAll(TITLE)].map(([, , title = '']) => ({
      file,
      title,
    })),
  )
}
const TITLE = /^(?:describe|test)(?:\.each)?\((['"])(.*?)\1/gm

/** A source by name, or how the value came about. */
const SOURCED =
  /EN 1992|AS 3600|BS \d|EX\d|Eq\. |digest|memory|computed|derived|secondary|practice|\(read|drawn up|[Bb]y hand|\bW\d\d/
/** Groups that hold for whatever the source of a number is, or whose single tests name theirs. */
const WITHOUT_NUMBERS = ['One code’s force never meets another’s steel stress', 'Readings', 'limits of shapes']

test('each group of published examples names its source or says how its values came about', () => {
  const titles = publishedTitles().filter(({ file }) => !file.startsWith('worked-'))
  expect(titles.length).toBeGreaterThan(20)
  const unsaid = titles.filter(({ title }) => !SOURCED.test(title) && !WITHOUT_NUMBERS.includes(title))
  expect(unsaid).toEqual([])
})

test('files of worked examples say so at their head, with the sources of their formulas', () => {
  const files = readdirSync(at('tests/published')).filter((name) => /^worked-.*\.test\.ts$/.test(name))
  const unsaid = files.filter((file) => {
    const text = readFileSync(at(`tests/published/${file}`), 'utf8')
    return !/[Ww]orked by hand/.test(text) || !/memory|digest|secondary|derived/.test(text)
  })
  expect(unsaid).toEqual([])
})

describe('every formula is on the list', () => {
  test('each that the source holds is reached by the layouts from which the list is made', () => {
    const reached = new Set(written.formulas.flatMap(({ texts }) => texts))
    const found = formulasInSource()
    expect(found.length).toBeGreaterThan(120)
    expect(found.filter(({ formula }) => !reached.has(formula) && !(formula in NEVER_PRINTED))).toEqual([])
  })

  test('no reason is kept for a formula that is printed after all or is gone', () => {
    const reached = new Set(written.formulas.flatMap(({ texts }) => texts))
    const inSource = new Set(formulasInSource().map(({ formula }) => formula))
    const idle = Object.keys(NEVER_PRINTED).filter((formula) => reached.has(formula) || !inSource.has(formula))
    expect(idle).toEqual([])
  })

  test('docs/methods.md and the page’s table are what `npm run methods` writes', () => {
    expect(written.files.filter((file) => !isCurrent(file)).map(({ path }) => path)).toEqual([])
  })

  test('no two share the short name by which the calculation finds them', () => {
    expect(new Set(METHODS.map(({ id }) => id)).size).toBe(METHODS.length)
  })
})

describe('what a basis works out without printing its lines', () => {
  test.each(BASIS_SOURCES.map(({ id }) => id))('%s: each text gives what the engine gives', (id) => {
    const basis = basisOf({ ...layout().job, basis: id, factors: [], readings: [] })
    const steps = innerSteps(basis)
    expect(steps.length).toBeGreaterThan(8)
    for (const step of steps) expect(evaluated(step), step.symbol).toBeCloseTo(step.value, 9)
  })
})

describe('every formula is shown to be right', () => {
  test('each has a check value, published or by hand, and a test that holds it', () => {
    expect(METHODS.filter(({ proofs }) => proofs.length === 0).map(nameOf)).toEqual([])
  })

  test.each(PROOFS.map(({ test: file, name, of }) => ({ file, name, of })))('$file holds "$name"', ({ file, name }) => {
    const quoted = ["'", '"', '`'].map((quote) => `(${quote}${name}${quote},`)
    const text = readFileSync(at(file), 'utf8')
    expect(quoted.some((title) => text.includes(title))).toBe(true)
  })

  test('a formula from memory is tested under a name that says so', () => {
    const unsaid = METHODS.filter(({ clauses }) => clauses.every(({ tag }) => tag.startsWith('memory'))).flatMap(
      (method) =>
        method.proofs
          .filter(({ test: file, name }) => !/memory/.test(`${groupOf(file, name)} ${name}`))
          .map(({ name }) => `${nameOf(method)}: ${name}`),
    )
    expect(unsaid).toEqual([])
  })

  test('check values and words are kept for formulas that there are', () => {
    const names = new Set(METHODS.map(nameOf))
    const kept = [...PROOFS.flatMap(({ of }) => of), ...Object.keys(MEANINGS)]
    expect(kept.filter((name) => !names.has(name))).toEqual([])
  })

  test('each check value says whether it is from a source or by hand', () => {
    const says = /^(By hand|By proportion|EX\d|[A-Z]\d\d|Published|Exact series|Krishna Raju|AS 3600|E01)/
    expect(PROOFS.filter(({ value }) => !says.test(value)).map(({ value }) => value)).toEqual([])
  })
})
