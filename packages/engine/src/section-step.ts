/** Where the depth of the section changes near an anchor: there the rule for a constant section does not hold. */

import type { AnchorSite } from './anchor-site'
import { isInside, sidesOf } from './geometry'
import type { Point } from './model'
import { sectionBehind } from './section'

export interface SectionStep {
  /** Behind the bearing face, or along the edge from the side of the plate: whichever is farther. */
  readonly where: 'behind' | 'along'
  readonly distance: number
  readonly topBeyond: number
  readonly soffitBeyond: number
}

/** A place from the anchor: to the side of its plate and behind its bearing face, mm. */
interface Local {
  readonly aside: number
  readonly behind: number
}

/** On either side of a region's outline the section is asked for this far away, mm. */
const NEXT_TO = 1

/** The nearest step in top or soffit within `reach` of the anchor, behind it or along its edge; null where there is none. */
export function sectionStepNear(site: AnchorSite, reach: number): SectionStep | null {
  const steps = [...stepsAlong(site), ...stepsOfRegions(site, reach)].filter(({ distance }) => distance < reach)
  return steps.sort((one, other) => one.distance - other.distance)[0] ?? null
}

function stepsAlong({ anchor, edge, hardware, top, soffit }: AnchorSite): SectionStep[] {
  return (edge?.lengths ?? [])
    .filter((length) => length.top !== top || length.soffit !== soffit)
    .map((length) => {
      const aside = Math.max(length.from - anchor.chainage, anchor.chainage - length.to, 0)
      const distance = Math.max(0, aside - hardware.plate.width / 2)
      return { where: 'along', distance, topBeyond: length.top, soffitBeyond: length.soffit }
    })
}

/** Sides of regions in the concrete that the anchor's force spreads through: `reach` behind it and to each side. */
function stepsOfRegions(site: AnchorSite, reach: number): SectionStep[] {
  const half = site.hardware.plate.width / 2
  const from = { aside: -half - reach, behind: 0 }
  const to = { aside: half + reach, behind: reach }
  return site.pour.regions.flatMap(({ outline }) =>
    sidesOf(outline).flatMap(([a, b]) => {
      const piece = clipped([localOf(site, a), localOf(site, b)], from, to)
      const beyond = piece && sectionBeyond(site, piece)
      if (!piece || !beyond) return []
      const aside = Math.max(0, Math.min(...piece.map((end) => Math.abs(end.aside))) - half)
      const isAcross = piece[0].aside * piece[1].aside <= 0
      const lateral = isAcross ? 0 : aside
      const behind = Math.min(piece[0].behind, piece[1].behind)
      const where = behind >= lateral ? 'behind' : 'along'
      return [{ where, distance: Math.max(behind, lateral), ...beyond } as const]
    }),
  )
}

function localOf({ anchor, frame }: AnchorSite, point: Point): Local {
  const { chainage, depth } = frame.local(point)
  return { aside: chainage - anchor.chainage, behind: depth - anchor.setBack }
}

/** The part of a side inside the box; null where it stays outside. */
function clipped([a, b]: readonly [Local, Local], from: Local, to: Local): readonly [Local, Local] | null {
  let [start, end] = [0, 1]
  for (const axis of ['aside', 'behind'] as const) {
    const way = b[axis] - a[axis]
    const [low, high] = [from[axis] - a[axis], to[axis] - a[axis]]
    if (way === 0) {
      if (low > 0 || high < 0) return null
      continue
    }
    start = Math.max(start, Math.min(low / way, high / way))
    end = Math.min(end, Math.max(low / way, high / way))
  }
  if (start >= end) return null
  const at = (share: number): Local => ({
    aside: a.aside + share * (b.aside - a.aside),
    behind: a.behind + share * (b.behind - a.behind),
  })
  return [at(start), at(end)]
}

/** The section on that side of a piece which differs from the anchor's; null where both are in the concrete and alike. */
function sectionBeyond({ anchor, frame, pour, top, soffit }: AnchorSite, [a, b]: readonly [Local, Local]) {
  const [along, into] = [b.aside - a.aside, b.behind - a.behind]
  const length = Math.hypot(along, into)
  const sections = [-NEXT_TO, NEXT_TO].flatMap((by) => {
    const chainage = anchor.chainage + (a.aside + b.aside) / 2 - (by * into) / length
    const depth = anchor.setBack + (a.behind + b.behind) / 2 + (by * along) / length
    if (!isInside(frame.pointAt(chainage, depth), pour.outline)) return []
    return [sectionBehind(pour, { frame, chainage, depth })]
  })
  const other = sections.find((section) => section.top !== top || section.soffit !== soffit)
  return other ? { topBeyond: other.top, soffitBeyond: other.soffit } : null
}
