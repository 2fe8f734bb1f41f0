import { toEngine } from '@wedgeline/contract'
import { layoutIndex, wedgesOfEdge, type GapWedge } from '@wedgeline/engine'
import { describe, expect, test } from 'vitest'
import { demoLayout } from '../../db/seed/demo-layout'
import { EXPECTED_OUTLINES, EXPECTED_WEDGES } from './demo-wedges'

const demo = layoutIndex(toEngine(demoLayout()))

function wedgeOf(of: { edgeId: string; after: string | null; before: string | null }): GapWedge {
  const wedge = wedgesOfEdge(demo, of.edgeId).get(`gap:${of.edgeId}:${of.after ?? 'start'}:${of.before ?? 'end'}`)
  if (!wedge) throw new Error(`No gap from ${of.after} to ${of.before} at ${of.edgeId}`)
  return wedge
}

const bySpread = ({ depthBySpread }: GapWedge) => {
  const usual = depthBySpread.find(({ angle }) => Math.abs(angle - Math.PI / 4) < 1e-9)
  const ofBasis = depthBySpread.find(({ angle }) => Math.abs(Math.tan(angle) - 2 / 3) < 1e-9)
  if (!usual || !ofBasis) throw new Error('Both spreads are shown')
  return [usual, ofBasis] as const
}

describe('edge wedges of the podium (drawn up with it, all tendons stressed)', () => {
  test.each(EXPECTED_WEDGES)('$edgeId, $after to $before: $depths', (expected) => {
    const [usual, ofBasis] = bySpread(wedgeOf(expected))
    const depths = [usual, ofBasis].flatMap((one) => [one.depthFromBulbs, one.depthFromBond ?? one.depthFromBulbs])
    const areas = [usual, ofBasis].flatMap((one) => [one.areaFromBulbs, one.areaFromBond ?? one.areaFromBulbs])
    for (const [i, depth] of expected.depths.entries())
      expect(Math.abs((depths[i] ?? NaN) - depth)).toBeLessThanOrEqual(1)
    for (const [i, area] of expected.areas.entries()) {
      expect(Math.abs((areas[i] ?? NaN) / 1e6 - area)).toBeLessThanOrEqual(0.001)
    }
  })
})
describe('their outlines in plan, corner by corner (drawn up with it)', () => {
  const withSpread = (spread: '45' | 'EN') => {
    const layout = toEngine(demoLayout())
    const wedgeSpread = spread === '45' ? Math.PI / 4 : Math.atan(2 / 3)
    return layoutIndex({ ...layout, job: { ...layout.job, settings: { ...layout.job.settings, wedgeSpread } } })
  }
  const bySetting = { '45': withSpread('45'), EN: withSpread('EN') }

  test.each(EXPECTED_OUTLINES)(
    '$edgeId, $after to $before at $spread',
    ({ edgeId, after, before, spread, corners }) => {
      const index = bySetting[spread]
      const frame = index.frames.get(edgeId)
      const wedge = wedgesOfEdge(index, edgeId).get(`gap:${edgeId}:${after}:${before ?? 'end'}`)
      const outline = (wedge?.polygons[0] ?? []).flatMap(({ chainage, depth }) => frame?.pointAt(chainage, depth) ?? [])
      expect(outline).toHaveLength(corners.length)
      for (const [x, y] of corners) {
        const nearest = Math.min(...outline.map((point) => Math.hypot(point.x - x, point.y - y)))
        expect(nearest).toBeLessThanOrEqual(1)
      }
    },
  )
})
