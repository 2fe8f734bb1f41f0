import { readFileSync } from 'node:fs'
import { readLayoutText, toEngine } from '@wedgeline/contract'
import { checkPour, layoutIndex, signedArea } from '@wedgeline/engine'
import type { Layout } from '@wedgeline/engine'
import { expect, test } from 'vitest'
import { stripData } from '@/features/edge/strip/strip-data'
import { planData } from '@/features/pour/plan-data'

const read = readLayoutText(readFileSync('db/seed/demo-layout.json', 'utf8'))
if (!('layout' in read)) throw new Error('The demo cannot be read.')
const demo = toEngine(read.layout)

const withSettings = (settings: Partial<Layout['job']['settings']>): Layout => ({
  ...demo,
  job: { ...demo.job, settings: { ...demo.job.settings, ...settings } },
})

const CASES: readonly [string, Layout][] = [
  ['as it is', demo],
  ['spread from the end of the device', withSettings({ spreadStart: 'device-end' })],
  ['spread at 30 degrees', withSettings({ wedgeSpread: Math.PI / 6 })],
]

/** Depths by zone as the checks of the gaps give them. */
const depthsIn = (layout: Layout, pourId: string): ReadonlyMap<string, number> =>
  new Map(
    checkPour(layout, { pourId }).zones.flatMap(({ zone, checks }) =>
      checks.flatMap((check): [string, number][] =>
        check.kind === 'advice' && check.name === 'Depth of the edge wedge' ? [[zone.id, check.measured]] : [],
      ),
    ),
  )

test.each(CASES)('every wedge on a strip is as deep as in the check of its gap: %s', (_name, layout) => {
  const index = layoutIndex(layout)
  const edgesWithWedges = layout.pours.flatMap((pour) => {
    const depths = depthsIn(layout, pour.id)
    return (index.edgesOfPour.get(pour.id) ?? []).filter((edge) => {
      const { wedges } = stripData(index, edge.id)
      for (const { zoneId, depth } of wedges) expect(depth, zoneId).toBe(depths.get(zoneId))
      return wedges.length > 0
    })
  })
  expect(edgesWithWedges.length).toBeGreaterThan(3)
})

test('a drawn outline encloses the area and reaches the depth that are said of it', () => {
  const index = layoutIndex(demo)
  for (const edge of demo.edges) {
    for (const { area, depth, outline, zoneId } of stripData(index, edge.id).wedges) {
      expect(Math.abs(signedArea(outline.map((p) => ({ x: p.chainage, y: p.depth })))), zoneId).toBeCloseTo(area, 2)
      expect(Math.max(...outline.map((p) => p.depth)), zoneId).toBeCloseTo(depth, 6)
    }
  }
})

test('the plan of a pour and the strips of its edges draw the same wedges and corners', () => {
  const index = layoutIndex(demo)
  for (const pour of demo.pours) {
    const strips = (index.edgesOfPour.get(pour.id) ?? []).map((edge) => stripData(index, edge.id))
    const areaOf = (outline: readonly { readonly x: number; readonly y: number }[]) => Math.abs(signedArea(outline))
    const sum = (values: readonly number[]) => values.reduce((total, value) => total + value, 0)
    const plan = planData(index, pour.id)
    const onStrips = sum(strips.flatMap(({ wedges }) => wedges.map(({ area }) => area)))
    expect(sum(plan.wedges.map(({ outline }) => areaOf(outline))) / 1e6).toBeCloseTo(onStrips / 1e6, 6)
    // Each corner lies at the end of two edges, and is drawn on both.
    const corners = sum(
      strips.flatMap((strip) =>
        strip.corners.map((corner) => areaOf(corner.map((p) => ({ x: p.chainage, y: p.depth })))),
      ),
    )
    expect(2 * sum(plan.corners.map(({ outline }) => areaOf(outline)))).toBeCloseTo(corners, 2)
  }
})
