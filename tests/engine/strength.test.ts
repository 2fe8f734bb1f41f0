import {
  checkPour,
  recheck,
  strengthAtStages,
  type Compared,
  type ConcreteResult,
  type Layout,
} from '@wedgeline/engine'
import { describe, expect, test } from 'vitest'
import { evaluated } from './step-text'
import { layout, POUR } from './sample-layout'

/** Stages of the sample pour: 25 % at 9 MPa, full at 22 MPa. */
const set = (ageHours: number, specimens: readonly number[], cured = 'on site beside the pour'): ConcreteResult => ({
  id: `P1-${ageHours}`,
  pourId: 'P1',
  ageHours,
  cured,
  certificate: 'CYL (invented)',
  specimens,
})

const withSets = (...concreteResults: readonly ConcreteResult[]): Layout => ({ ...layout(), concreteResults })

function strengths(...sets: readonly ConcreteResult[]): Compared[] {
  const zones = checkPour(withSets(...sets), { pourId: 'P1', withSteps: true }).zones
  return zones
    .filter(({ zone }) => zone.kind === 'pour')
    .flatMap(({ checks }) => checks)
    .filter((check) => check.kind === 'compared')
}

const told = (...sets: readonly ConcreteResult[]) =>
  strengths(...sets)
    .map(({ name, stage, demand, limit, status }) => `${name}, ${String(stage)}: ${demand} of ${limit} ${status}`)
    .sort()

test('the stages that these cases are worked for', () => {
  expect(POUR.stages.map(({ name, strength }) => [name, strength])).toEqual([
    ['25 %', 9],
    ['Full', 22],
  ])
})

describe('strength at stressing: the lowest specimen, cured on site, counts (common practice)', () => {
  test('nothing recorded is no result, within or over', () => {
    expect(checkPour(withSets(), { pourId: 'P1' }).zones.filter(({ zone }) => zone.kind === 'pour')).toEqual([])
  })

  test('a set of another pour says nothing of this one', () => {
    expect(strengths({ ...set(24, [30]), pourId: 'P2' })).toEqual([])
  })

  test.each([
    { lowest: 21.9, status: 'over' },
    { lowest: 22, status: 'within' },
    { lowest: 22.1, status: 'within' },
  ])('$lowest against 22 is $status, whatever the mean', ({ lowest, status }) => {
    // Mean of 21.9, 22.0 or 22.1 with 30 and 30 is over 27 in each case.
    const full = strengths(set(24, [9, 10]), set(96, [30, lowest, 30])).filter(({ stage }) => stage === 'Full')
    expect(full.map((check) => check.status)).toEqual([status])
    expect(full[0]?.demand).toBe(lowest)
  })

  test('a young set that reaches the first stage says nothing of the next', () => {
    expect(told(set(24, [10.5, 11.2]))).toEqual(['Lowest specimen at 24 h, 25 %: 10.5 of 9 within'])
  })

  test('one set may reach both stages', () => {
    expect(told(set(48, [23, 24]))).toEqual([
      'Lowest specimen at 48 h, 25 %: 23 of 9 within',
      'Lowest specimen at 48 h, Full: 23 of 22 within',
    ])
  })

  test('two sets that are short both stand, each at its age; order of entry does not matter', () => {
    // Mean of 21.4, 22.4 and 23.1: 66.9 / 3 = 22.3, above the 22 asked for.
    const sets = [set(144, [21.4, 22.4, 23.1]), set(24, [9.3, 9.7]), set(96, [17.2, 17.8])]
    const expected = [
      'Lowest specimen at 144 h, Full: 21.4 of 22 over',
      'Lowest specimen at 24 h, 25 %: 9.3 of 9 within',
      'Lowest specimen at 96 h, Full: 17.2 of 22 over',
    ]
    expect(told(...sets)).toEqual(expected)
    expect(told(...[...sets].reverse())).toEqual(expected)
    const [late] = strengths(...sets).filter(({ name }) => name.includes('144'))
    expect(late?.notes.join(' ')).toContain('mean of the set is 22.3 MPa; its lowest specimen counts')
  })

  test('a later set that is strong enough meets the stage, and tells of the short ones before it', () => {
    const [full, ...others] = strengths(set(24, [9.3]), set(96, [17.2, 17.8]), set(168, [22.6, 23])).filter(
      ({ stage }) => stage === 'Full',
    )
    expect(others).toEqual([])
    expect(full).toMatchObject({ name: 'Lowest specimen at 168 h', status: 'within', demand: 22.6 })
    // 22 - 17.2 = 4.8; mean (17.2 + 17.8) / 2 = 17.5.
    expect(full?.notes).toContain('Before it, at 96 h, the lowest was 17.2 MPa and the mean 17.5: short by 4.8.')
  })

  test('a set weaker than the one that reached the stage before it is for somebody to judge', () => {
    expect(told(set(48, [23]), set(72, [21]))).toEqual([
      'Lowest specimen at 48 h, 25 %: 23 of 9 within',
      'Lowest specimen at 48 h, Full: 23 of 22 within',
      'Lowest specimen at 72 h, Full: 21 of 22 needs-judgement',
    ])
  })

  test.each(['in the laboratory', 'off site', 'cured not on site', ''])(
    'cured "%s": never within by itself',
    (cured) => {
      expect(strengths(set(48, [40], cured)).map(({ status }) => status)).toEqual([
        'needs-judgement',
        'needs-judgement',
      ])
      expect(strengthAtStages(POUR, [set(48, [40], cured)]).every(({ reachedBy }) => reachedBy === null)).toBe(true)
    },
  )

  test('a set cured elsewhere gives way to one cured on site', () => {
    expect(told(set(24, [10], 'in water at the laboratory'), set(30, [9.4]))).toEqual([
      'Lowest specimen at 30 h, 25 %: 9.4 of 9 within',
    ])
  })

  test('more strength is never a worse result', () => {
    const rank = { over: 0, within: 1 } as Readonly<Record<string, number>>
    const statuses = [5, 8.9, 9, 15, 21.9, 22, 30].map((lowest) => {
      const checks = strengths(set(96, [lowest]))
      return checks.reduce((sum, { status }) => sum + (rank[status] ?? Number.NaN), 0)
    })
    expect(statuses).toEqual([...statuses].sort((a, b) => a - b))
  })

  test('a set that is added while somebody types is checked at once', () => {
    const [before, after] = [withSets(set(96, [17])), withSets(set(96, [17]), set(144, [23]))]
    const result = checkPour(before, { pourId: 'P1' })
    expect(recheck({ layout: before, result }, after, { pourId: 'P1' })).toEqual(checkPour(after, { pourId: 'P1' }))
  })

  test('every step has a text that evaluates to its value', () => {
    const steps = strengths(set(24, [9.3, 9.7, 9.9]), set(96, [17.2])).flatMap((check) => check.steps)
    expect(steps).toHaveLength(4)
    for (const line of steps) expect(evaluated(line)).toBeCloseTo(line.value, 9)
  })
})
