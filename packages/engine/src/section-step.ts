/** Where the depth of the section changes near an anchor: there the rule for a constant section does not hold. */

import type { AnchorSite } from './anchor-site'
import { cross, sidesOf, subtract } from './geometry'
import type { Point } from './model'
import { sectionBehind } from './section'

/** A piece between two crossings shorter than this is rounding, mm. */
const SHORTEST = 1

export interface SectionStep {
  /** Behind the bearing face, or along the edge from the side of the plate. */
  readonly where: 'behind' | 'along'
  readonly distance: number
  readonly topBeyond: number
  readonly soffitBeyond: number
}

/** The nearest step in top or soffit within `reach` of the anchor, behind it or along its edge; null where there is none. */
export function sectionStepNear(site: AnchorSite, reach: number): SectionStep | null {
  const steps = [...stepsAlong(site), ...stepBehind(site, reach)].filter(({ distance }) => distance < reach)
  return steps.sort((one, other) => one.distance - other.distance)[0] ?? null
}

function stepsAlong({ anchor, edge, hardware, top, soffit }: AnchorSite): SectionStep[] {
  return edge.lengths
    .filter((length) => length.top !== top || length.soffit !== soffit)
    .map((length) => {
      const aside = Math.max(length.from - anchor.chainage, anchor.chainage - length.to, 0)
      const distance = Math.max(0, aside - hardware.plate.width / 2)
      return { where: 'along', distance, topBeyond: length.top, soffitBeyond: length.soffit }
    })
}

/** Along the line square to the edge into the slab, through the regions of the pour. */
function stepBehind({ anchor, frame, pour, top, soffit }: AnchorSite, reach: number): SectionStep[] {
  if (pour.regions.length === 0) return []
  const { chainage, setBack } = anchor
  const a = frame.pointAt(chainage, setBack)
  const b = frame.pointAt(chainage, setBack + reach)
  const cuts = [0, ...pour.regions.flatMap(({ outline }) => cutsOf(a, b, outline)), 1].sort((one, other) => one - other)
  for (const [i, to] of cuts.entries()) {
    const from = cuts[i - 1]
    if (from === undefined || (to - from) * reach < SHORTEST) continue
    const beyond = sectionBehind(pour, { frame, chainage, depth: setBack + ((from + to) / 2) * reach })
    if (beyond.top === top && beyond.soffit === soffit) continue
    return [{ where: 'behind', distance: from * reach, topBeyond: beyond.top, soffitBeyond: beyond.soffit }]
  }
  return []
}

/** Share of the way from a to b at which the outline is crossed. */
function cutsOf(a: Point, b: Point, outline: readonly Point[]): number[] {
  const way = subtract(b, a)
  return sidesOf(outline).flatMap(([from, to]) => {
    const side = subtract(to, from)
    const turn = cross(way, side)
    if (turn === 0) return []
    const t = cross(subtract(from, a), side) / turn
    const u = cross(subtract(from, a), way) / turn
    return t > 0 && t < 1 && u >= 0 && u <= 1 ? [t] : []
  })
}
