import type { Check, Layout } from '@wedgeline/engine'
import { describe, expect, test } from 'vitest'
import { checksAt, compared, row } from './anchor-checks'
import { anchor, edge, layout, length, NORTH, rectangle, S4 } from './sample-layout'

const inAs3600 = (of: Layout): Layout => ({ ...of, job: { ...of.job, basis: 'as-3600' } })

const plan = (of: Layout, anchorId: string): Check => {
  const check = checksAt(inAs3600(of), anchorId).find(({ family }) => family === 'bursting-plan')
  if (!check) throw new Error(`No bursting in plan at ${anchorId}`)
  return check
}

const places = (...chainages: readonly number[]) =>
  layout({ anchors: chainages.map((chainage, i) => anchor('E4', i + 1, { chainage })) })

describe('AS 3600 12.5 covers at most two anchorages in plan (from a digest)', () => {
  test('inside a near-equal row the prism is as wide as the spacing, by a reading', () => {
    // 0.25 * 588.8 * (1 - 220 / 1750) = 128.7 kN unfactored; at 150 MPa 857.9 mm2
    const check = compared(plan(row('S4'), 'E4-4'))
    expect(check.demand).toBeCloseTo((0.25 * 588_800 * (1 - 220 / 1750)) / 150, 6)
    expect(check.readingIds).toContain('as-row')
    expect(check.status).toBe('needs-judgement')
  })

  test('the outermost of that row is not inside it', () => {
    expect(plan(row('S4'), 'E4-1')).toMatchObject({ status: 'not-covered', code: 'UNEVEN_ROW', field: 'chainage' })
  })

  test.each([
    { what: 'two anchors', of: places(4000, 9000), kind: 'compared' },
    { what: 'three anchors', of: places(4000, 9000, 14_000), kind: 'refused' },
  ])('$what: $kind', ({ of, kind }) => {
    expect(plan(of, 'E4-1').kind).toBe(kind)
  })

  test.each([
    { last: 1000 + 4 * 1500 + 300, kind: 'compared' },
    { last: 1000 + 4 * 1500 + 301, kind: 'refused' },
  ])('five anchors at 1500 with the last at $last: largest gap to smallest 1.2', ({ last, kind }) => {
    expect(plan(places(1000, 2500, 4000, 5500, last), 'E4-2').kind).toBe(kind)
  })

  test('two anchors rest on no reading for a row', () => {
    expect(compared(plan(places(4000, 9000), 'E4-1')).readingIds).not.toContain('as-row')
  })

  test('in EN the same uneven row is covered', () => {
    const check = checksAt(places(4000, 9000, 14_000), 'E4-1').find(({ family }) => family === 'bursting-plan')
    expect(check?.kind).toBe('compared')
  })
})

test('two anchors of 1000 kN at 150 from the ends of 1000, plates 165: 112.5 kN, 750 mm2 from 60 to 300 (digest of AS 3600)', () => {
  const of = layout({
    pour: { outline: rectangle(1000, 17_400) },
    edges: [edge(NORTH, 'c', [length(0, 1000)])],
    hardware: [{ ...S4, plate: { width: 165, height: 80 } }],
    anchors: [150, 850].map((chainage, i) => anchor('E4', i + 1, { chainage })),
    more: {
      strandTypes: [
        {
          id: 'strand',
          name: '',
          diameter: 12.7,
          area: 150,
          breakingLoad: 312_500,
          proofLoad: 300_000,
          modulus: 195_000,
        },
      ],
    },
  })
  for (const id of ['E4-1', 'E4-2']) {
    const check = compared(plan(of, id))
    expect(check.steps.find(({ symbol }) => symbol === 'T')?.value).toBeCloseTo(112_500, 6)
    expect(check.demand).toBeCloseTo(750, 6)
    expect(check.steps.at(-1)?.meaning).toContain('from 60 to 300')
  }
})
