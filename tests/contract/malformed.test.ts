import { LIMITS, PROBLEMS_MAX, readLayout, readLayoutText, type Problem } from '@wedgeline/contract'
import { describe, expect, test } from 'vitest'
import { demoLayout } from '../../db/seed/demo-layout'
import { demoRow, demoWith, placeOf } from './layout-edits'
import { CONTRADICTIONS, STOPS, WRONG_FIELDS } from './malformed-tables'

const problemAt = (problems: readonly Problem[], field: string) => {
  const found = problems.find((problem) => problem.field === field)
  return (
    found ?? { message: `nothing at ${field}, but at ${problems.map((one) => one.field).join(', ')}`, severity: null }
  )
}

describe('text that is no layout', () => {
  const whole = JSON.stringify(demoLayout())
  const texts: [string, string, string, RegExp][] = [
    ['nothing', '', 'file', /is empty/],
    ['blanks', ' \n', 'file', /is empty/],
    ['not JSON', 'E2, 900, 110', 'file', /is not JSON/],
    ['half a file', whole.slice(0, whole.length / 2), 'file', /is not JSON, or only part of one/],
    ['NaN, which JSON does not know', whole.replace('"thicknessMm":220', '"thicknessMm":NaN'), 'file', /is not JSON/],
    ['a list', '[]', 'file', /must be a group of fields in curly brackets, not a list/],
    ['null', 'null', 'file', /not null/],
    ['a number', '7', 'file', /not a number/],
    ['an empty object', '{}', 'format', /must be "wedgeline.layout"/],
  ]
  const cases = texts.map(([what, text, field, message]) => ({ what, text, field, message }))
  test.each(cases)('$what', ({ text, field, message }) => {
    const read = readLayoutText(text)
    expect(read.ok).toBe(false)
    expect(problemAt(read.problems, field).message).toMatch(message)
  })

  test('a byte order mark in front does no harm', () => {
    expect(readLayoutText(`\uFEFF${whole}`).ok).toBe(true)
  })
})

describe('fields of the wrong kind or size', () => {
  test.each(WRONG_FIELDS)('$what', ({ path, value, field, message }) => {
    const read = readLayout(demoWith(path, value))
    expect(read.ok).toBe(false)
    expect(problemAt(read.problems, field).message).toMatch(message)
  })

  test('a chainage of -0 is the start of the edge', () => {
    expect(readLayout(demoWith('anchors.0.chainageMm', -0)).ok).toBe(true)
  })

  test('one anchor more than the limit is refused before any row is read', () => {
    const rows = (count: number) => Array.from({ length: count }, () => ({}))
    const over = readLayout(demoWith('anchors', rows(LIMITS.anchors + 1)))
    expect(over.problems).toEqual([
      {
        path: ['anchors'],
        field: 'anchors',
        message: 'there are 20001; must be at most 20000',
        severity: 'refused',
      },
    ])
    expect(problemAt(readLayout(demoWith('anchors', rows(1))).problems, 'anchors[0].id').message).toMatch(/is missing/)
  })

  test('a file that is wrong throughout gives a list that somebody can read', () => {
    const { problems } = readLayout(
      demoWith(
        'anchors',
        Array.from({ length: LIMITS.anchors }, () => ({})),
      ),
    )
    expect(problems).toHaveLength(PROBLEMS_MAX + 1)
    expect(problems.at(-1)?.message).toMatch(/more problems are not listed/)
  })
})

describe('layouts that contradict themselves are refused', () => {
  test.each(CONTRADICTIONS)('$what', ({ path, value, field, message }) => {
    const read = readLayout(demoWith(path, value))
    expect(read.ok).toBe(false)
    const problem = problemAt(read.problems, field)
    expect(problem.message).toMatch(message)
    expect(problem.severity).toBe('refused')
  })

  test('a gap may end at an anchor in a pan of its pour', () => {
    const zone = { kind: 'gap', edgeId: 'E4-P1', afterAnchorId: 'L1P1-N03N', beforeAnchorId: 'L1P1-N04P' }
    const shape = { kind: 'wedge-bars', diameterMm: 12, lengthMm: 3000, count: 4, layers: 'both' }
    const steel = demoRow('steel', 'edge-bars-E4-P1-1', { id: 'wedge-bars', zone, shape })
    expect(readLayout(demoWith('steel.0', steel)).ok).toBe(true)
  })
})

describe('what cannot be built but was typed is kept, and said', () => {
  const e1 = placeOf('anchors', 'L1P1-E01W')
  test.each(STOPS)('$what', ({ path, value, field, message }) => {
    const read = readLayout(demoWith(path, value))
    const problem = problemAt(read.problems, field)
    expect(problem.message).toMatch(message)
    expect(problem.severity).toBe('stop')
    expect(read.ok).toBe(true)
  })

  test('a place on the limit is no stop', () => {
    expect(readLayout(demoWith('anchors.0.chainageMm', 110)).problems).toEqual([])
    expect(readLayout(demoWith(`anchors.${e1}.heightMm`, 40)).problems).toEqual([])
    // Plates 220 wide stand face to face at 220: 8200 - 220 = 7980.
    expect(readLayout(demoWith(`anchors.${e1}.chainageMm`, 7980)).problems).toEqual([])
  })
})
